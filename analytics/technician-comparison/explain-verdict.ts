import { formatCount, formatDay, formatNumber, formatPercent, plural } from '@/lib/format';
import { LEAST_JOBS } from '../statistics/comparison/who-is-judged';
import type { Ranged, TechnicianResult } from './technician-result';

const points = (value: number): string => `${formatNumber(Math.abs(value), 1)} points`;
const KPA_IN_INHG = 3.386389;

const rangeOf = ({ value, low, high }: Ranged): string => {
  // Said in the direction of the sentence: "less" turns the range round.
  const [from, to] = value < 0 ? [-high, -low] : [low, high];
  return `likely range ${formatNumber(from, 1)} to ${formatNumber(to, 1)}`;
};

const byLuck = (p: number): string => {
  if (p < 0.001) return 'under 1 in 1,000 by luck';
  return `about 1 in ${formatCount(Math.round(1 / p))} by luck`;
};

const vacuumWords = ({ shallowerKpa }: TechnicianResult): string => {
  if (!shallowerKpa) return '';
  const inHg = shallowerKpa.value / KPA_IN_INHG;
  if (shallowerKpa.low > 0) return `, and the final vacuum is shallower too, by ${formatNumber(inHg, 1)} inHg`;
  if (shallowerKpa.high < 0) return `, while the final vacuum is deeper, by ${formatNumber(-inHg, 1)} inHg`;
  return ', while the final vacuum is as deep as theirs';
};

const effectSentence = (name: string, result: TechnicianResult, effect: Ranged): string => {
  const jobs = plural(result.judgedJobs, 'job', 'jobs');
  const side = effect.value < 0 ? 'less' : 'more';
  const difference =
    Math.abs(effect.value) < 0.05 ? 'as much of nameplate as' : `${points(effect.value)} ${side} of nameplate than`;
  return `After allowing for the kind of jobs, ${name} recovers ${difference} colleagues would have (${rangeOf(effect)}, ${jobs})`;
};

const scaleSentence = (name: string, result: TechnicianResult): string => {
  if (!result.scale) return '';
  const { from, to, jobs, readsLow } = result.scale;
  const until = to ? `From ${formatDay(from)} until ${formatDay(to)}` : `Since ${formatDay(from)}`;
  const aside = result.leftOut.scaleInDoubt > 0 ? ` Those ${plural(jobs, 'job', 'jobs')} are set aside here.` : '';
  return ` ${until} the scale of ${name} seems to read about ${formatPercent(readsLow.value)} low (likely range ${formatPercent(readsLow.low)} to ${formatPercent(readsLow.high)}): all pulls came out lower, the final vacuum did not. Have the scale checked.${aside}`;
};

const changeSentence = ({ workChange, judgedFrom }: TechnicianResult): string => {
  if (!workChange) return '';
  const since = judgedFrom ? ' Jobs before that are not counted.' : '';
  const what =
    workChange.of === 'early stops'
      ? `the share of pulls that look stopped early went from ${formatPercent(workChange.before)} to ${formatPercent(workChange.after)}`
      : `full pulls came out ${formatNumber(100 * Math.abs(workChange.after - workChange.before), 0)}% ${workChange.better ? 'higher' : 'lower'} than before`;
  return ` Since ${formatDay(workChange.from)} ${what}.${since}`;
};

const lookSentence = (result: TechnicianResult): string => {
  if (!result.look || result.verdict === 'below' || result.scale || result.workChange) return '';
  return ' One sign alone stands out, and it is not enough to say more: a reason to look, not a finding.';
};

/**
 * The verdict in plain words, with the numbers it rests on. `name` is how the reader knows the technician. Ranges are
 * 95 % ranges.
 */
export const explainVerdict = (name: string, result: TechnicianResult): string => {
  const scale = scaleSentence(name, result);
  if (result.verdict === 'too few' || !result.effect) {
    const { judgedJobs } = result;
    const why =
      judgedJobs < LEAST_JOBS
        ? `${plural(judgedJobs, 'job', 'jobs')} to judge by, and nothing is said below ${LEAST_JOBS}`
        : 'too few colleagues did jobs like these';
    const first = result.leftOut.firstJobs > 0 ? ' The first 40 jobs of a newcomer are not counted.' : '';
    return `Not judged: ${why}.${first}${scale}`;
  }
  const sentence = effectSentence(name, result, result.effect);
  const more = `${changeSentence(result)}${scale}`;
  if (result.restsOn === 'early stops' && result.earlyStops) {
    const { found, of, usualShare, share } = result.earlyStops;
    return `About ${formatCount(found)} of ${formatCount(of)} pulls on units that had not come short look stopped early: ${formatPercent(share)}, where ${formatPercent(usualShare)} is usual (${byLuck(result.p ?? 1)}). ${sentence}.${more}`;
  }
  if (result.restsOn === 'usual pull') return `${sentence}${vacuumWords(result)}: ${byLuck(result.p ?? 1)}.${more}`;
  if (result.verdict === 'above') return `${sentence}${vacuumWords(result)}.${more}`;
  return `${sentence}: within what sound technicians differ by.${lookSentence(result)}${more}`;
};
