import type { Peers } from '../baselines/peers';
import type { Bench } from '../hypotheses/bench';
import type { Weighed } from '../hypotheses/weigh-hypotheses';
import type { Finding } from '../judgement';
import type { VacuumReading } from '../readings/vacuum-groups';
import type { JudgedRecord } from '../record';

/** Everything a rule may look at. */
export type Case = Bench & {
  record: JudgedRecord;
  weighed: Weighed;
  peers: Peers | null;
  vacuum: VacuumReading | null;
};

/** One check: a finding, or null where there is nothing to look at. */
export type Rule = (of: Case) => Finding | null;
