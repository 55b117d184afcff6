import { FLAG_RULES, type FlagRule } from '@/lib/vocabulary';
import { SIMULATED_FAULTS } from '@/seed/simulation/options';
import {
  type Bin,
  calibration,
  earlyStops,
  entrySlips,
  type JudgedCompany,
  precisionOf,
  ratio,
  type Share,
  surestTrue,
} from './score';

const rounded = (value: number): number => Number(value.toFixed(3));
const toBin = ({ from, flags, certainty, trueShare }: Bin) => ({
  from,
  flags,
  certainty: rounded(certainty),
  trueShare: rounded(trueShare),
});

/** Everything that is measured of flags against what was planted, for print and for the file of results. */
export const detectionFigures = (companies: readonly JudgedCompany[]) => {
  const raised = (rule: FlagRule) =>
    companies.flatMap(({ flags }) => flags.filter((flag) => flag.rule === rule)).length;
  const surest = surestTrue(companies);
  return {
    stoppedEarly: earlyStops(companies),
    entrySlips: entrySlips(companies),
    /** Found of each kind; a row that the import refused counts as found. */
    slipsFound: SIMULATED_FAULTS.filter((fault) => fault !== 'stopped_early').map((kind) => ({
      kind,
      found: entrySlips(companies, kind).recall,
    })),
    /** True in the way they say, by rule. */
    rules: FLAG_RULES.filter((rule) => raised(rule) > 0).map((rule) => ({
      rule,
      flags: raised(rule),
      precision: precisionOf(companies, rule),
      calibration: calibration(companies, rule).map(toBin),
    })),
    calibration: calibration(companies, null).map(toBin),
    /** True among the fifty surest flags, company by company. */
    surest50: { worst: Math.min(...surest), each: surest.join(' ') },
  };
};
export type DetectionFigures = ReturnType<typeof detectionFigures>;

const shown = (share: Share): string =>
  share.of ? `${(100 * ratio(share)).toFixed(1)} % (${share.hits}/${share.of})` : '';
const percent = (part: number): number => Math.round(100 * part);
const shownBins = (bins: DetectionFigures['calibration']): string =>
  bins.map(({ flags, certainty, trueShare }) => `${percent(certainty)}→${percent(trueShare)} (${flags})`).join('  ');

/** Prints what was found of what was planted, and how far certainty can be believed: mean certainty→share true (flags). */
export const printDetection = (title: string, figures: DetectionFigures): void => {
  console.log(`\n## ${title}`);
  const both = ({ precision, recall }: DetectionFigures['entrySlips']) => ({
    precision: shown(precision),
    recall: shown(recall),
  });
  console.table({
    'stopped early': both(figures.stoppedEarly),
    'entry slips together': both(figures.entrySlips),
    ...Object.fromEntries(figures.slipsFound.map(({ kind, found }) => [kind, { precision: '', recall: shown(found) }])),
  });
  console.log(`true among the 50 surest, company by company: ${figures.surest50.each}`);
  console.log(`certainty→true, per cent (flags)\nall: ${shownBins(figures.calibration)}`);
  for (const { rule, flags, precision, calibration: bins } of figures.rules)
    console.log(`${rule}: ${flags} flags${precision.of ? `, true ${shown(precision)}; ${shownBins(bins)}` : ''}`);
};
