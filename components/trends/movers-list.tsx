import type { Dimension } from '@/analytics/dimensions';
import { onlyOf, type ScopeSelection } from '@/analytics/scope-address';
import type { Comparison } from '@/analytics/trends-comparison/contract';
import { FigureLink } from '@/components/figures/figure-link';
import { choiceName } from '@/components/scope/wording';
import { formatMass, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';

const signed = (kg: number, unit: DisplayUnit): string => `${kg > 0 ? '+' : ''}${formatMass(kg, unit, 0)}`;

type MoversListProps = { comparison: Comparison; by: Dimension; scope: ScopeSelection };

/** What came in more or less of, the largest difference first, with a bar to either side of nothing. */
export const MoversList = ({ comparison: { movers, otherKeys, now }, by, scope }: MoversListProps) => {
  const most = Math.max(...movers.map(({ difference }) => Math.abs(difference)), 1e-9);
  return (
    <div>
      <h3 className="mb-1 border-b-2 border-ink pb-1.5 text-sm font-medium text-ink-2">
        What moved most, {scope.unit}
      </h3>
      <ul className="text-[0.9375rem]">
        {movers.map(({ key, difference }) => {
          const width = `${(Math.abs(difference) / most) * 50}%`;
          return (
            <li
              key={key}
              className="grid grid-cols-[minmax(0,1fr)_minmax(4rem,7rem)_5rem] items-center gap-3 border-b border-rule-2 py-2"
            >
              <span className="truncate">{choiceName(by, key)}</span>
              <span aria-hidden="true" className="relative h-3">
                <span className="absolute inset-y-[-0.5rem] left-1/2 w-px bg-rule" />
                <span
                  className="absolute inset-y-0 bg-ink-2"
                  style={difference < 0 ? { right: '50%', width } : { left: '50%', width }}
                />
              </span>
              <FigureLink
                measure="recoveredMass"
                scope={onlyOf({ ...scope, from: now.from, to: now.to }, by, [key])}
                className="figure-link text-right decoration-transparent hover:decoration-current"
              >
                {signed(difference, scope.unit)}
              </FigureLink>
            </li>
          );
        })}
        {otherKeys.keys ? (
          <li className="flex justify-between py-2 text-ink-2">
            <span>{plural(otherKeys.keys, 'other', 'others')} together</span>
            <span>{signed(otherKeys.difference, scope.unit)}</span>
          </li>
        ) : null}
      </ul>
    </div>
  );
};
