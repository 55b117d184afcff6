import type { Measure } from '@/analytics/figures/measures';
import {
  formatCount,
  formatDesignation,
  formatList,
  formatMassWithUnit,
  formatNumber,
  formatPercent,
  plural,
} from '@/lib/format';
import { LEAST_LIKE_JOBS } from '@/lib/like-jobs';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Explained, ExplainParts } from './contract';

const WORDS: Record<Measure, string> = {
  recoveredMass: 'The recovered masses of the recoveries, added up.',
  recoveries: 'The recoveries, counted.',
  fullCharge:
    'The full charges of the appliances recovered from, added up. Full charge = nameplate charge + added charge.',
  totalYield: 'Total yield = recovered mass ÷ full charge, each added up over all recoveries first.',
  medianYield: 'The yields (recovered mass ÷ full charge) put in order; the median is the one in the middle.',
  co2e: 'The recovered mass of each refrigerant times its global warming potential, added up.',
  co2eAr6:
    'The recovered mass of each refrigerant times its global warming potential, added up; refrigerants without one in AR6 count as nothing.',
  appliances: 'The appliances with at least one of these recoveries, counted.',
  flagged:
    'Records with an open flag of certainty 50% or more that speaks against the recovery or the record, counted once each. A system that came short is no fault: those flags alone do not count.',
  farBelow:
    'Recoveries whose yield lies below Q1 − 1.5 × (Q3 − Q1) of their like jobs, counted. Q1 and Q3 are the lower and the upper quartile.',
  routineMass: 'The recovered masses of routine jobs (full charge below 100 lb), added up.',
  heldShare: 'Recoveries with a hold after the pull-down, out of those that state whether one was made.',
  downToLevelShare: 'Recoveries whose final vacuum reached the required level, out of those that state a vacuum.',
};

const SOURCES: Partial<Record<Measure, string>> = {
  fullCharge: '“Full charge” in 40 CFR 82.152.',
  totalYield:
    '“Full charge” in 40 CFR 82.152; the ratio of the sums, so that a large system weighs more than a small one.',
  medianYield: '“Full charge” in 40 CFR 82.152.',
  co2e: 'Global warming potentials over 100 years of the IPCC’s Fourth Assessment Report (AR4), as in 40 CFR 98, Table A‑1.',
  co2eAr6: 'Global warming potentials over 100 years of the IPCC’s Sixth Assessment Report (AR6), Table 7.SM.7.',
  downToLevelShare:
    '40 CFR 82.156, Table 1 (machines made since November 15, 1993); small appliances by paragraph (b).',
  farBelow: 'J. W. Tukey, Exploratory Data Analysis, Addison-Wesley 1977, chapter 2 (the lower fence).',
};

/** How a measure is computed, in words. */
export const formulaWords = (measure: Measure): string => WORDS[measure];

/** Where its formula or constants come from; null for what is only added up or counted. */
export const formulaSource = (measure: Measure): string | null => SOURCES[measure] ?? null;

const YIELD_DIGITS = 1;
const MOST_TERMS = 6;

const median = ({ recoveries, lower, upper }: Extract<ExplainParts, { kind: 'median' }>, value: number | null) => {
  if (value === null || lower === null || upper === null) return 'No recovery in this scope.';
  const result = formatPercent(value, YIELD_DIGITS);
  if (recoveries % 2 === 1)
    return `Number ${formatCount((recoveries + 1) / 2)} of ${plural(recoveries, 'yield', 'yields')} in order: ${result}`;
  const middle = `${formatCount(recoveries / 2)} and ${formatCount(recoveries / 2 + 1)}`;
  return `Between numbers ${middle} of ${formatCount(recoveries)} in order: (${formatPercent(lower, YIELD_DIGITS)} + ${formatPercent(upper, YIELD_DIGITS)}) ÷ 2 = ${result}`;
};

const gwp = ({ refrigerants }: Extract<ExplainParts, { kind: 'gwp' }>, value: number, unit: DisplayUnit): string => {
  const terms = refrigerants.map(
    ({ refrigerant, recoveredMass, gwp: potential }) =>
      `${formatDesignation(refrigerant)} ${formatMassWithUnit(recoveredMass, unit)} × ${formatNumber(potential, potential % 1 ? 1 : 0)}`,
  );
  const rest = terms.length - MOST_TERMS;
  const shown = rest > 1 ? [...terms.slice(0, MOST_TERMS), `${rest} more refrigerants`] : terms;
  return `${shown.join(' + ') || 'Nothing'} = ${formatMassWithUnit(value, unit, 0)} CO₂e`;
};

/** The formula with its numbers put in, masses in the given unit. */
export const formulaFilled = (
  { measure, value, count, parts }: Pick<Explained, 'measure' | 'value' | 'count' | 'parts'>,
  unit: DisplayUnit,
): string => {
  switch (parts.kind) {
    case 'sum':
      return `${plural(parts.recoveries, 'recovery', 'recoveries')} = ${formatMassWithUnit(value ?? 0, unit)}`;
    case 'ratio':
      if (value === null) return 'No recovery in this scope.';
      return `${formatMassWithUnit(parts.recoveredMass, unit)} ÷ ${formatMassWithUnit(parts.fullCharge, unit)} = ${formatPercent(value, YIELD_DIGITS)}`;
    case 'part':
      if (value === null) return 'No recovery in this scope states it.';
      return `${formatCount(parts.part)} ÷ ${plural(parts.of, 'recovery that states it', 'recoveries that state it')} = ${formatPercent(value, YIELD_DIGITS)}`;
    case 'median':
      return median(parts, value);
    case 'gwp':
      return gwp(parts, value ?? 0, unit);
    case 'standing':
      return `${formatCount(count)} of ${plural(parts.judged, 'recovery', 'recoveries')} judged, in ${plural(parts.groups, 'group', 'groups')} of like jobs`;
    case 'count':
      return measure === 'appliances'
        ? `${plural(value ?? 0, 'appliance', 'appliances')} in ${plural(count, 'recovery', 'recoveries')}`
        : plural(value ?? 0, 'recovery', 'recoveries');
  }
};

const REASONS = {
  entry_error: ['record is left out as an entry error', 'records are left out as entry errors'],
  too_few_like_jobs: [
    `record is not judged: fewer than ${LEAST_LIKE_JOBS} jobs are like it`,
    `records are not judged: fewer than ${LEAST_LIKE_JOBS} jobs are like them`,
  ],
  no_hold_stated: ['record says nothing of a hold', 'records say nothing of a hold'],
  no_vacuum_stated: ['record states no final vacuum', 'records state no final vacuum'],
  large_plant: ['record is of large plant', 'records are of large plant'],
} as const;

/** What was left out and why, as a sentence; empty when nothing was. */
export const leftOutWords = (leftOut: Explained['leftOut']): string => {
  const said = leftOut.map(({ reason, count }) => {
    const [one, many] = REASONS[reason];
    return plural(count, one, many);
  });
  return said.length ? `${formatList(said)}.` : '';
};
