'use client';

import { scaleLinear, scaleTime } from '@visx/scale';
import type { ApplianceLeaks } from '@/analytics/leak-rate/contract';
import { SHORT_FROM } from '@/analytics/leak-suspicion/limits';
import type { Visit } from '@/analytics/visits/contract';
import { formatNumber, formatPercent, plural } from '@/lib/format';
import { kgToUnit } from '@/lib/units';
import type { DisplayUnit } from '@/lib/vocabulary';

/** Height of the whole picture, in pixels. */
export const TIMELINE_HEIGHT = 318;
const LEFT = 64;
const RIGHT = 10;
const FOUND = { top: 28, bottom: 140 };
const ADDED = { top: 184, bottom: 286 };
const BAR = 7;

const dateOf = (day: string): Date => new Date(`${day}T00:00:00Z`);

type TimelineProps = { leaks: ApplianceLeaks; visits: readonly Visit[]; unit: DisplayUnit; width: number };

/**
 * What came out and what went in on one time axis: above the share of the full charge that each visit found, below the
 * refrigerant added. Visits that found the unit short are ringed; additions that are no leak are hollow; a triangle stands
 * where a test showed the leaks repaired. The tables under it are its equal for who does not see it.
 */
export const UnitTimeline = ({ leaks: { events, additions, suspicion }, visits: all, unit, width }: TimelineProps) => {
  const visits = all.filter(({ counts }) => counts);
  const verified = additions.flatMap(({ leaksVerifiedOn }) => leaksVerifiedOn ?? []);
  const days = [
    ...visits.map(({ recoveredOn }) => recoveredOn),
    ...events.map(({ addedOn }) => addedOn),
    ...verified,
  ].sort();
  const [first, last] = [dateOf(days[0] ?? '2000-01-01'), dateOf(days.at(-1) ?? '2000-01-01')];
  const x = scaleTime({ domain: [first, last], range: [LEFT + BAR, width - RIGHT - BAR] });
  const xOf = (day: string): number => (first < last ? x(dateOf(day)) : (LEFT + width - RIGHT) / 2);
  const found = scaleLinear<number>({ domain: [0, 1], range: [FOUND.bottom, FOUND.top], clamp: true });
  const highest = Math.max(...events.map(({ added }) => kgToUnit(added, unit)), 1e-9);
  const added = scaleLinear<number>({ domain: [0, highest], range: [ADDED.bottom, ADDED.top], nice: 3 });
  const short = new Set(
    suspicion.history.filter((visit) => visit.short >= SHORT_FROM).map(({ visitedOn }) => visitedOn),
  );
  const grid = [
    ...[0, 0.5, 1].map((share) => ({ key: `found ${share}`, at: found(share), text: formatPercent(share) })),
    // An axis without anything on it would be noughts one over the other.
    ...(events.length ? added.ticks(3) : []).map((value) => ({
      key: `added ${value}`,
      at: added(value),
      text: formatNumber(value, highest < 5 ? 1 : 0),
    })),
  ];
  return (
    <svg
      width={width}
      height={TIMELINE_HEIGHT}
      role="img"
      aria-label={`${plural(visits.length, 'visit', 'visits')} and ${plural(events.length, 'day', 'days')} with additions on one time axis; the tables below have the figures`}
      className="block"
    >
      <g fill="var(--ink-2)" fontSize={13}>
        <text x={0} y={14} fill="var(--ink)">
          Recovered, share of the full charge
        </text>
        <text x={0} y={ADDED.top - 18} fill="var(--ink)">
          Refrigerant added{events.length ? `, ${unit}` : ': none is written down'}
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
          ? x.ticks(Math.max(2, Math.floor(width / 150))).map((day) => (
              <text key={day.toISOString()} x={x(day)} y={TIMELINE_HEIGHT - 6} textAnchor="middle">
                {new Intl.DateTimeFormat('en-US', { month: 'short', year: 'numeric', timeZone: 'UTC' }).format(day)}
              </text>
            ))
          : null}
        <line x1={LEFT} x2={width - RIGHT} y1={ADDED.bottom} y2={ADDED.bottom} stroke="var(--ink)" strokeWidth={1.5} />
      </g>
      {visits.map(({ recoveryId, recoveredOn, yield: share }) => (
        <g key={recoveryId}>
          {short.has(recoveredOn) ? (
            <circle
              cx={xOf(recoveredOn)}
              cy={found(share)}
              r={7}
              fill="var(--shoulder)"
              stroke="var(--ink)"
              strokeWidth={1.5}
            />
          ) : null}
          <circle
            cx={xOf(recoveredOn)}
            cy={found(share)}
            r={3.5}
            fill={short.has(recoveredOn) ? 'var(--shoulder-ink)' : 'var(--ink)'}
          />
        </g>
      ))}
      {events.map(({ addedOn, added: kg, counted }) => {
        const top = added(kgToUnit(kg, unit));
        return (
          <rect
            key={addedOn}
            x={xOf(addedOn) - BAR / 2}
            width={BAR}
            y={top}
            height={Math.max(1, ADDED.bottom - top)}
            fill={counted > 0 ? 'var(--act)' : 'var(--sheet)'}
            stroke="var(--act)"
            strokeWidth={1.5}
          />
        );
      })}
      {[...new Set(verified)].map((day) => (
        <path
          key={day}
          d={`M${xOf(day) - 5} ${ADDED.top - 4}h10l-5 8z`}
          fill="var(--sheet)"
          stroke="var(--ink)"
          strokeWidth={1.5}
        />
      ))}
    </svg>
  );
};
