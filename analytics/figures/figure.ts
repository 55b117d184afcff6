import { SCOPE_PARTS, type ScopePart } from '@/analytics/dimensions';
import { type ScopeQuery, type ScopeSelection, scopeQuery } from '@/analytics/scope-address';
import { MEASURES, type Measure, type MeasureRecords, RECORDS_OF } from './measures';

/** The records that a figure is about. */
export type FigureScope = Omit<ScopeSelection, 'unit'>;

/** One figure of any screen: what is measured, over which records. The records follow from it, and so does its value. */
export type Figure = { measure: Measure; scope: FigureScope };

const MONTH = /^\d{4}-\d{2}$/;
const PREFIX = 'open.';

/** The parameters that a figure has in the address. */
export const isFigureKey = (key: string): boolean => key === 'open' || key.startsWith(PREFIX);

const sameNames = (a: readonly string[], b: readonly string[]): boolean =>
  a.length === b.length && a.every((name, index) => name === b[index]);

const periodParams = ({ from, to }: FigureScope): [string, string][] => {
  if (from && from === to && MONTH.test(from)) return [['open.month', from]];
  return [
    ...(from ? [['open.from', from] as [string, string]] : []),
    ...(to ? [['open.to', to] as [string, string]] : []),
  ];
};

/**
 * A figure as parameters of the address of a screen with the scope `page`: `open=recoveredMass`,
 * `open.month=2026-11`, `open.refrigerant=R-22`. The period is always said, since a page's own may be a default that
 * moves on; of the other parts those that differ from the page's (an empty one stands for all).
 */
export const figureParams = ({ measure, scope }: Figure, page: FigureScope): [key: string, value: string][] => [
  ['open', measure],
  ...periodParams(scope),
  ...([...SCOPE_PARTS, 'except'] as const).flatMap((part): [string, string][] => {
    const names = scope[part];
    if (sameNames(names, page[part])) return [];
    return (names.length ? names : ['']).map((name) => [`${PREFIX}${part}`, name]);
  }),
];

/** The figure that an address of a screen with the scope `page` opens; null when it opens none. */
export const figureOfAddress = (search: URLSearchParams, page: FigureScope): Figure | null => {
  const measure = MEASURES.find((one) => one === search.get('open'));
  if (!measure) return null;
  const month = search.get('open.month');
  const namesOf = (part: ScopePart): string[] => {
    const key = `${PREFIX}${part}`;
    return search.has(key) ? search.getAll(key).filter(Boolean) : page[part];
  };
  const except = search.getAll(`${PREFIX}except`);
  return {
    measure,
    scope: {
      from: month ?? search.get('open.from'),
      to: month ?? search.get('open.to'),
      refrigerant: namesOf('refrigerant'),
      technician: namesOf('technician'),
      site: namesOf('site'),
      branch: namesOf('branch'),
      category: namesOf('category'),
      jobType: namesOf('jobType'),
      appliance: namesOf('appliance'),
      except: search.has(`${PREFIX}except`) ? SCOPE_PARTS.filter((part) => except.includes(part)) : page.except,
    },
  };
};

/** Which of the records in scope make a figure, as /api/recoveries and the records screen are asked. */
export type FigureRecords = ScopeQuery & { exclusion: 'none' } & MeasureRecords;

/** The records that make a figure: those of its scope that count, and that stand as its measure says. */
export const figureRecords = ({ measure, scope }: Figure): FigureRecords => ({
  ...scopeQuery(scope),
  exclusion: 'none',
  ...RECORDS_OF[measure],
});

/** A month's part of a scope: the month itself, or what the scope's own days leave of it. */
export const monthInScope = <Scope extends FigureScope>(scope: Scope, month: string): Scope => ({
  ...scope,
  from: scope.from?.startsWith(`${month}-`) ? scope.from : month,
  to: scope.to?.startsWith(`${month}-`) ? scope.to : month,
});
