import { median } from 'simple-statistics';
import { benjaminiHochberg } from '../statistics/comparison/adjusted-p';
import { whetherJudged } from '../statistics/comparison/who-is-judged';
import { studentTCdf } from '../statistics/distributions/student-t';
import { chanceOfSoMany, type EarlyStops, usualShare } from './early-stops';
import { type NormalSpread, normalSpread } from './normal-spread';
import { type PersonSums, standardErrorOf } from './person-sums';
import type { PlainEffect } from './plain-effects';
import { COMPARISON_SETTINGS as S } from './settings';

/** What speaks for a technician being below his colleagues (or above them, for `high`): chances by luck alone. */
export type Evidence = {
  /** Whether anything is said of him. */
  judged: boolean;
  /** Whether his final vacuums can bear out what his yields say. */
  byVacuum: boolean;
  /** Full pulls and vacuums against the technician in the middle, in standard deviations that allow for normal spread. */
  yieldScore: number;
  vacuumScore: number;
  early: number;
  earlyOf: number;
  usualEarlyShare: number;
  low: Chance;
  high: Chance;
  /** Of so many early stops. */
  stops: Chance;
  /** Of yields so low, or vacuums so shallow, each taken alone. */
  lowYield: Chance;
  shallowVacuum: Chance;
};
/** A chance by luck, and the same allowed for the size of the crew (Benjamini-Hochberg). */
export type Chance = { p: number; adjusted: number };
export type CrewEvidence = {
  technicians: Evidence[];
  yieldSpread: NormalSpread;
  vacuumSpread: NormalSpread;
  /** Whether the crew is large enough to know how sound people differ. */
  spreadKnown: boolean;
};

const scoreOf = (mean: number, error: number, { centre, spread }: NormalSpread): number =>
  Number.isFinite(error) ? (mean - centre) / Math.max(Math.hypot(error, spread), Number.MIN_VALUE) : 0;

const stopsOf = ({ early, earlyOf }: PersonSums): EarlyStops => ({ early, of: earlyOf });

/** Benjamini-Hochberg over lists that are tested together. */
const adjustTogether = (lists: readonly (readonly number[])[]): number[][] => {
  const adjusted = benjaminiHochberg(lists.flat());
  let from = 0;
  return lists.map((list) => {
    from += list.length;
    return adjusted.slice(from - list.length, from);
  });
};

/** The yield decides, but the vacuum must bear it out; else the weaker of the two counts. */
const borneOut = (byYield: number, byVacuum: number): number =>
  byVacuum <= S.vacuumBearsOut ? byYield : Math.max(byYield, byVacuum);

/** Without vacuums: full pulls and the mean of all jobs are two tries to find somebody. */
const withoutVacuum = (byFullPulls: number, byAllJobs: number): number =>
  Math.min(1, 2 * Math.min(byFullPulls, byAllJobs));

/**
 * Chances by luck for everybody of a crew. A scale that reads too little does not make a vacuum shallow, a gauge that
 * reads wrong does not make a yield low, and a leak does neither to the other: so both together tell of the work.
 */
export const crewEvidence = (sums: readonly PersonSums[], plain: readonly PlainEffect[]): CrewEvidence => {
  const judged = sums.map((own) => whetherJudged(own).judged);
  const members = sums.filter((_, person) => judged[person]);
  const ownSpread = members.length > 0 ? Math.sqrt(median(members.map(({ full }) => full.variance))) : 0;
  const yieldSpread = normalSpread(
    members.map(({ full }) => full.mean),
    members.map(({ full }) => standardErrorOf(full)),
    S.usualYieldSpread * ownSpread,
  );
  const plainMembers = plain.filter((_, person) => judged[person]);
  const plainSpread = normalSpread(
    plainMembers.map(({ effect }) => effect),
    plainMembers.map(({ standardError }) => standardError),
    S.usualYieldSpread * ownSpread,
  );
  const told = (own: PersonSums) => own.vacuumJobs >= Math.max(S.leastVacuums, S.leastVacuumShare * own.jobs);
  const withVacuum = members.filter(told);
  const vacuumSpread = normalSpread(
    withVacuum.map(({ vacuum }) => vacuum.mean),
    withVacuum.map(({ vacuum }) => standardErrorOf(vacuum)),
    S.usualVacuumSpread,
  );

  const single = sums.map((own, person) => {
    const counts = judged[person] ?? false;
    const byVacuum = counts && told(own) && withVacuum.length >= S.leastTechnicians;
    const yieldScore = counts ? scoreOf(own.full.mean, standardErrorOf(own.full), yieldSpread) : 0;
    const vacuumScore = byVacuum ? scoreOf(own.vacuum.mean, standardErrorOf(own.vacuum), vacuumSpread) : 0;
    const usualEarlyShare = usualShare(members.filter((member) => member !== own).map(stopsOf));
    const allJobs = plain[person];
    const plainScore = counts && allJobs ? scoreOf(allJobs.effect, allJobs.standardError, plainSpread) : 0;
    const lowYield = studentTCdf(yieldScore, yieldSpread.freedom);
    const highYield = studentTCdf(-yieldScore, yieldSpread.freedom);
    const shallow = byVacuum ? studentTCdf(-vacuumScore, vacuumSpread.freedom) : 1;
    const deep = byVacuum ? studentTCdf(vacuumScore, vacuumSpread.freedom) : 1;
    const plainLow = studentTCdf(plainScore, plainSpread.freedom);
    const plainHigh = studentTCdf(-plainScore, plainSpread.freedom);
    return {
      counts,
      byVacuum,
      yieldScore,
      vacuumScore,
      usualEarlyShare,
      lowYield,
      shallow,
      low: byVacuum ? borneOut(lowYield, shallow) : withoutVacuum(lowYield, plainLow),
      high: byVacuum ? borneOut(highYield, deep) : withoutVacuum(highYield, plainHigh),
      stops: byVacuum ? chanceOfSoMany(stopsOf(own), usualEarlyShare) : 1,
    };
  });
  const tested = single.filter((own) => own.counts);
  const [low = [], stops = []] = adjustTogether([tested.map((own) => own.low), tested.map((own) => own.stops)]);
  const high = benjaminiHochberg(tested.map((own) => own.high));
  const [lowYield = [], shallowVacuum = []] = adjustTogether([
    tested.map((own) => own.lowYield),
    tested.map((own) => own.shallow),
  ]);

  let place = -1;
  const technicians = single.map((own, person): Evidence => {
    if (own.counts) place += 1;
    const chance = (p: number, adjusted: readonly number[]): Chance =>
      own.counts ? { p, adjusted: adjusted[place] ?? 1 } : { p: 1, adjusted: 1 };
    return {
      judged: own.counts,
      byVacuum: own.byVacuum,
      yieldScore: own.yieldScore,
      vacuumScore: own.vacuumScore,
      early: sums[person]?.early ?? 0,
      earlyOf: sums[person]?.earlyOf ?? 0,
      usualEarlyShare: own.usualEarlyShare,
      low: chance(own.low, low),
      high: chance(own.high, high),
      stops: chance(own.stops, stops),
      lowYield: chance(own.lowYield, lowYield),
      shallowVacuum: chance(own.shallow, shallowVacuum),
    };
  });
  return { technicians, yieldSpread, vacuumSpread, spreadKnown: members.length >= S.leastTechnicians };
};
