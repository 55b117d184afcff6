'use client';

import { scaleLinear, scaleTime } from '@visx/scale';
import type { Visit } from '@/analytics/visits/contract';
import { formatDay, formatNumber, formatPercent, plural } from '@/lib/format';
import { kgToUnit } from '@/lib/units';
import type { DisplayUnit } from '@/lib/vocabulary';

const HEIGHT = 330;
const LEFT = 64;
const RIGHT = 10;
/** Where the two panels lie, in pixels from the top. */
const YIELD = { top: 26, bottom: 160 };
const MASS = { top: 204, bottom: 300 };
const BAR = 6;
const TICKS = { yield: [0, 0.5, 1], mass: 3 };

const dayOf = ({ recoveredOn }: Visit): Date => new Date(`${recoveredOn}T00:00:00Z`);

type VisitsPictureProps = { visits: readonly Visit[]; unit: DisplayUnit; width: number };

/**
 * Visits in time: above their yields, below their masses with a stroke at the full charge. What lies far below like jobs
 * is ringed, entry errors are hollow. The table under it is its equal for who does not see it.
 */
export const VisitsPicture = ({ visits, unit, width }: VisitsPictureProps) => {
  const days = visits.map(dayOf);
  const [first, last] = [days[0] ?? new Date(0), days.at(-1) ?? new Date(0)];
  const x = scaleTime({ domain: [first, last], range: [LEFT + BAR, width - RIGHT - BAR] });
  const xOf = (visit: Visit): number => (first < last ? x(dayOf(visit)) : (LEFT + width - RIGHT) / 2);
  const y = scaleLinear<number>({
    domain: [0, Math.max(1, ...visits.map((visit) => visit.yield))],
    range: [YIELD.bottom, YIELD.top],
  });
  const masses = visits.flatMap(({ recoveredMass, fullCharge }) => [recoveredMass, fullCharge]);
  const highest = Math.max(...masses.map((kg) => kgToUnit(kg, unit)), 1e-9);
  const mass = scaleLinear<number>({ domain: [0, highest], range: [MASS.bottom, MASS.top], nice: TICKS.mass });
  const massOf = (kg: number): number => mass(kgToUnit(kg, unit));
  const years = x.ticks(Math.max(2, Math.floor(width / 150))).filter((day) => day >= first && day <= last);
  const grid = [
    ...TICKS.yield.map((share) => ({ key: `yield ${share}`, at: y(share), text: formatPercent(share) })),
    ...mass.ticks(TICKS.mass).map((value) => ({
      key: `mass ${value}`,
      at: mass(value),
      text: formatNumber(value, highest < 5 ? 1 : 0),
    })),
  ];
  const low = visits.filter((visit) => visit.low).length;
  return (
    <svg
      width={width}
      height={HEIGHT}
      role="img"
      aria-label={`${plural(visits.length, 'visit', 'visits')} from ${formatDay(visits[0]?.recoveredOn ?? '')} to ${formatDay(visits.at(-1)?.recoveredOn ?? '')} by yield and recovered mass, ${low} of them far below like jobs; the table below has the figures`}
      className="block"
    >
      <g fill="var(--ink-2)" fontSize={13}>
        <text x={0} y={14} fill="var(--ink)">
          Yield
        </text>
        <text x={0} y={MASS.top - 14} fill="var(--ink)">
          Recovered, {unit}; the stroke is the full charge
        </text>
        {grid.map(({ key, at, text }) => (
          <g key={key}>
            <line x1={LEFT} x2={width - RIGHT} y1={at} y2={at} stroke="var(--rule-2)" />
            <text
              x={LEFT - 8}
              y={at}
              textAnchor="end"
              dominantBaseline="central"
              fontFamily="var(--font-reading), ui-monospace, monospace"
            >
              {text}
            </text>
          </g>
        ))}
        {first < last
          ? years.map((day) => (
              <text key={day.toISOString()} x={x(day)} y={HEIGHT - 8} textAnchor="middle">
                {new Intl.DateTimeFormat('en-US', { month: 'short', year: 'numeric', timeZone: 'UTC' }).format(day)}
              </text>
            ))
          : null}
        <line x1={LEFT} x2={width - RIGHT} y1={MASS.bottom} y2={MASS.bottom} stroke="var(--ink)" strokeWidth={1.5} />
      </g>
      {visits.map((visit) => {
        const at = xOf(visit);
        const ink = visit.counts ? 'var(--ink)' : 'var(--sheet)';
        return (
          <g key={visit.recoveryId}>
            <rect
              x={at - BAR / 2}
              width={BAR}
              y={massOf(visit.recoveredMass)}
              height={MASS.bottom - massOf(visit.recoveredMass)}
              fill={visit.counts ? 'var(--ink-2)' : 'none'}
              stroke={visit.counts ? 'none' : 'var(--ink-2)'}
            />
            <line
              x1={at - BAR}
              x2={at + BAR}
              y1={massOf(visit.fullCharge)}
              y2={massOf(visit.fullCharge)}
              stroke="var(--act)"
              strokeWidth={2}
            />
            {visit.low ? (
              <circle cx={at} cy={y(visit.yield)} r={7} fill="var(--shoulder)" stroke="var(--ink)" strokeWidth={1.5} />
            ) : null}
            <circle
              cx={at}
              cy={y(visit.yield)}
              r={3.5}
              fill={visit.low ? 'var(--shoulder-ink)' : ink}
              stroke={visit.low ? 'var(--shoulder-ink)' : 'var(--ink)'}
              strokeWidth={visit.counts ? 0 : 1.5}
            />
          </g>
        );
      })}
    </svg>
  );
};
