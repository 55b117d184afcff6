import { type ScopePart, UNSTATED } from '@/analytics/dimensions';
import type { ScopeSelection } from '@/analytics/scope-address';
import { formatDay, formatDesignation, formatList, formatMonth } from '@/lib/format';
import { CATEGORY_NAMES, JOB_TYPE_NAMES } from '@/lib/wording';

/** How one dimension is spoken of: what all of it is called, what a record without it is called. */
export const DIMENSION_WORDS: Record<ScopePart, { one: string; many: string; all: string; unstated: string }> = {
  branch: { one: 'branch', many: 'Branches', all: 'all branches', unstated: 'no branch stated' },
  refrigerant: { one: 'refrigerant', many: 'Refrigerants', all: 'all refrigerants', unstated: 'no refrigerant stated' },
  technician: { one: 'technician', many: 'Technicians', all: 'all technicians', unstated: 'no technician stated' },
  site: { one: 'site', many: 'Sites', all: 'all sites', unstated: 'no site stated' },
  category: {
    one: 'appliance category',
    many: 'Appliance categories',
    all: 'all appliance categories',
    unstated: 'no category stated',
  },
  jobType: { one: 'job type', many: 'Job types', all: 'all job types', unstated: 'no job type stated' },
  appliance: { one: 'appliance', many: 'Appliances', all: 'all appliances', unstated: 'no appliance stated' },
};

const CLOSED_LISTS: Partial<Record<ScopePart, Record<string, string>>> = {
  category: CATEGORY_NAMES,
  jobType: JOB_TYPE_NAMES,
};

/** One value of a dimension as it is read. */
export const choiceName = (dimension: ScopePart, value: string): string => {
  if (value === UNSTATED) return DIMENSION_WORDS[dimension].unstated;
  if (dimension === 'refrigerant' || dimension === 'appliance') return formatDesignation(value);
  return CLOSED_LISTS[dimension]?.[value] ?? value;
};

/** A dimension's part of the sentence: `all branches`, `R‑22 and R‑410A`. */
export const choicePhrase = (dimension: ScopePart, values: readonly string[]): string =>
  values.length ? formatList(values.map((value) => choiceName(dimension, value))) : DIMENSION_WORDS[dimension].all;

/** The same of a scope, which may leave the values out: `all sites but Pier 5`. */
export const partPhrase = (scope: Pick<ScopeSelection, ScopePart | 'except'>, part: ScopePart): string =>
  scope.except.includes(part) && scope[part].length
    ? `${DIMENSION_WORDS[part].all} but ${choicePhrase(part, scope[part])}`
    : choicePhrase(part, scope[part]);

const PERIOD_PART = /^\d{4}-(0[1-9]|1[0-2])(-(0[1-9]|[12]\d|3[01]))?$/;

/** Whether the text is a month or a day as the address takes it. */
export const isPeriodPart = (text: string): boolean => PERIOD_PART.test(text);

const moment = (text: string): string => {
  if (!isPeriodPart(text)) return `“${text}”, which is no month`;
  return text.length > 7 ? formatDay(text) : formatMonth(text);
};

/** The period's part of the sentence: `December 2024 to November 2026`, `since January 2017`. */
export const periodPhrase = ({ from, to }: Pick<ScopeSelection, 'from' | 'to'>): string => {
  if (from && to) return from === to ? moment(from) : `${moment(from)} to ${moment(to)}`;
  if (from) return `${moment(from)} to today`;
  return to ? `up to ${moment(to)}` : 'the whole time';
};
