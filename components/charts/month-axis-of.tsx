import { tickedMonths, tickName, tickYear } from './month-ticks';
import type { Band } from './use-band';

export type MonthAxisProps = { months: readonly string[]; narrow: boolean };

/** The months under the marks and the years under the months, at the places of a band. */
export const MonthAxisOf = ({ band, months, narrow }: MonthAxisProps & { band: Band }) => {
  const ticked = tickedMonths(months, band.step, narrow);
  const onlyYears = ticked.length < months.length / 6;
  const size = narrow ? 14 : 12.5;
  return (
    <g fill="var(--ink-2)" fontSize={size} textAnchor="middle">
      <line x1={band.left} x2={band.right} y1={band.bottom} y2={band.bottom} stroke="var(--ink)" strokeWidth={1.5} />
      {ticked.map((month) => {
        const x = band.xOf(month) + band.width / 2;
        return (
          <g key={month}>
            <text x={x} y={band.bottom + 18}>
              {tickName(month, onlyYears, narrow)}
            </text>
            <text x={x} y={band.bottom + (onlyYears ? 18 : 35)} fontWeight={600}>
              {tickYear(month, ticked)}
            </text>
          </g>
        );
      })}
    </g>
  );
};
