import type { FlagRule } from '@/lib/vocabulary';
import type { SimulatedFault } from '@/seed/simulation/options';
import { isTrue, type PlantedFaults, type ScoredFlag, SLIP_RULES } from './truth-of-flags';

/** One company after judging: its flags with the surest first, the rows its import refused, what was planted. */
export type JudgedCompany = { flags: readonly ScoredFlag[]; refused: readonly number[]; planted: PlantedFaults };

export type Share = { of: number; hits: number };
const share = (items: readonly boolean[]): Share => ({ of: items.length, hits: items.filter(Boolean).length });
export const ratio = ({ of, hits }: Share): number => (of ? hits / of : Number.NaN);

const SLIPS: ReadonlySet<SimulatedFault> = new Set([
  'decimal_low',
  'decimal_high',
  'kg_as_lb',
  'oz_as_lb',
  'swapped_weights',
  'zero_recovered',
  'duplicate',
  'nameplate_x10',
  'nameplate_digits_swapped',
]);
const hasSlip = (kinds: ReadonlySet<SimulatedFault> | undefined): boolean =>
  [...(kinds ?? [])].some((k) => SLIPS.has(k));

/** How many flags of a rule are true in the way they say; none for a rule whose truth is not planted. */
export const precisionOf = (companies: readonly JudgedCompany[], rule: FlagRule): Share =>
  share(
    companies.flatMap(({ flags, planted }) =>
      flags.filter((flag) => flag.rule === rule).flatMap((flag) => isTrue(flag, planted) ?? []),
    ),
  );

/** Precision and recall of early stops. */
export const earlyStops = (companies: readonly JudgedCompany[]): { precision: Share; recall: Share } => {
  const found = companies.flatMap(({ flags, planted }) => {
    const ids = new Set(flags.filter(({ rule }) => rule === 'stopped_early').map(({ recordId }) => recordId));
    return [...planted.kinds].filter(([, kinds]) => kinds.has('stopped_early')).map(([id]) => ids.has(id));
  });
  return { precision: precisionOf(companies, 'stopped_early'), recall: share(found) };
};

const slipRecords = ({ flags, refused }: JudgedCompany): Set<string> =>
  new Set([
    ...refused.map(String),
    ...flags.filter(({ rule }) => SLIP_RULES.has(rule)).map(({ recordId }) => recordId),
    ...flags.filter((f) => f.rule === 'low_unexplained' && f.recoveredMassKg === 0).map((f) => f.recordId),
  ]);

/** Precision and recall of entry slips; a row that the import refuses counts as found. `among` narrows the recall. */
export const entrySlips = (
  companies: readonly JudgedCompany[],
  among: SimulatedFault | null = null,
): { precision: Share; recall: Share } => {
  const precision = companies.flatMap((company) =>
    [...slipRecords(company)].map((id) => hasSlip(company.planted.kinds.get(id))),
  );
  const recall = companies.flatMap((company) => {
    const found = slipRecords(company);
    return [...company.planted.kinds]
      .filter(([, kinds]) => (among ? kinds.has(among) : hasSlip(kinds)))
      .map(([id]) => found.has(id));
  });
  return { precision: share(precision), recall: share(recall) };
};

/** How many of the surest flags of each company are true in the way they say. */
export const surestTrue = (companies: readonly JudgedCompany[], count = 50): number[] =>
  companies.map(({ flags, planted }) => flags.slice(0, count).filter((flag) => isTrue(flag, planted) === true).length);

export type Bin = { from: number; flags: number; certainty: number; trueShare: number };

/** Certainty against truth in bins of ten per cent, for one rule or all whose truth is planted. */
export const calibration = (companies: readonly JudgedCompany[], rule: FlagRule | null): Bin[] => {
  const all = companies.flatMap(({ flags, planted }) =>
    flags
      .filter((flag) => (rule ? flag.rule === rule : true))
      .map((flag) => ({ certainty: flag.certainty, isTrue: isTrue(flag, planted) }))
      .filter((flag) => flag.isTrue !== null),
  );
  return Array.from({ length: 10 }, (_, i) => {
    const own = all.filter(({ certainty }) => Math.min(9, Math.floor(certainty * 10)) === i);
    const mean = own.reduce((sum, { certainty }) => sum + certainty, 0) / own.length;
    return {
      from: i / 10,
      flags: own.length,
      certainty: mean,
      trueShare: own.filter((flag) => flag.isTrue).length / own.length,
    };
  }).filter(({ flags }) => flags > 0);
};
