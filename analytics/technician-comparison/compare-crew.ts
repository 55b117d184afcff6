import { LEAST_JOBS } from '../statistics/comparison/who-is-judged';
import { type Change, changes as changesIn } from './changes';
import { type Columns, toColumns } from './columns';
import { type EarlyStopChange, earlyStopChanges } from './early-stop-change';
import { type CrewEvidence, crewEvidence } from './evidence';
import { type FairEffect, fairEffect } from './fair-effect';
import { type JobChances, jobChances } from './job-chances';
import { COUNTS, judgedJobs, SCALE_IN_DOUBT, type SetAside } from './judged-jobs';
import { type PersonSums, personSums } from './person-sums';
import { type PlainEffects, plainEffects } from './plain-effects';
import type { ComparedRecovery } from './recovery';
import { startingPoint } from './starting-point';
import { type Judgement, judge } from './verdict';

/** Everything that is known of a crew, by position of the technician in `columns.technicians`. */
export type CrewComparison = {
  columns: Columns;
  chances: JobChances;
  /** By job: why it does not count for the judgement, or COUNTS. */
  reasons: Uint8Array;
  sums: PersonSums[];
  /** By job, what colleagues' like jobs gave on units that did not come short, and the usual variance of one about it. */
  expected: Float64Array;
  usualVariance: number;
  plain: PlainEffects;
  evidence: CrewEvidence;
  effects: FairEffect[];
  judgements: Judgement[];
  changes: Change[];
  earlyStopChanges: EarlyStopChange[];
};

/** Whether the jobs of a change are set aside: the scale is in doubt, or nothing tells the scale from the work. */
const isInDoubt = ({ cause, share, shallower }: Change): boolean =>
  cause === 'scale' || (share < 0 && cause === 'open' && shallower === null);

/** From when on each technician is judged, where his work has changed and enough jobs have come since. */
const judgedSince = (
  columns: Columns,
  reasons: Uint8Array,
  changed: readonly { technician: number; fromDay: number }[],
): Map<number, number> => {
  const from = new Map<number, number>();
  for (const { technician, fromDay } of changed)
    from.set(technician, Math.max(fromDay, from.get(technician) ?? Number.NEGATIVE_INFINITY));
  const since = new Map<number, number>();
  for (let at = 0; at < columns.count; at++) {
    const person = columns.technician[at] ?? 0;
    const day = from.get(person);
    if (day !== undefined && reasons[at] === COUNTS && (columns.days[at] ?? 0) >= day)
      since.set(person, (since.get(person) ?? 0) + 1);
  }
  return new Map([...from].filter(([person]) => (since.get(person) ?? 0) >= LEAST_JOBS));
};

/**
 * Compares the technicians of a company on like jobs. Recoveries come in the order of time, entry errors left out;
 * `earlierJobs` tells how many a technician did before the first of them. Pure: the same records, the same answer.
 */
export const compareCrew = (
  recoveries: readonly ComparedRecovery[],
  earlierJobs: ReadonlyMap<string, number> = new Map(),
): CrewComparison => {
  const columns = toColumns(recoveries);
  const start = startingPoint(columns);
  const first = jobChances(columns, start, new Uint8Array(columns.count).fill(1));
  const firstReasons = judgedJobs(columns, earlierJobs);
  const changes = changesIn(columns, first, firstReasons);
  const stopChanges = earlyStopChanges(columns, first, firstReasons);

  const aside = new Map<number, SetAside>(
    changes
      .filter(isInDoubt)
      .map(({ technician, fromDay, toDay }) => [technician, { fromDay, toDay: toDay ?? Number.POSITIVE_INFINITY }]),
  );
  const ofWork = changes.filter(
    (own) => !isInDoubt(own) && own.toDay === null && (own.cause === 'work' || own.share > 0),
  );
  const counted = judgedJobs(columns, earlierJobs, aside);
  const since = judgedSince(columns, counted, [...ofWork, ...stopChanges]);
  const reasons = since.size > 0 ? judgedJobs(columns, earlierJobs, aside, since) : counted;
  const chances =
    aside.size > 0
      ? jobChances(
          columns,
          start,
          reasons.map((reason) => Number(reason !== SCALE_IN_DOUBT)),
        )
      : first;

  const { technicians: sums, expected, usualVariance } = personSums(columns, chances, reasons);
  const plain = plainEffects(columns, reasons);
  const evidence = crewEvidence(sums, plain.technicians);
  const effects = sums.map((own, person) => {
    const [allJobs, found] = [plain.technicians[person], evidence.technicians[person]];
    if (!allJobs || !found) throw new RangeError(`Technician ${person} has no figures`);
    return fairEffect(own, allJobs, found);
  });
  const changed = new Set(changes.filter((own) => own.share < 0).map((own) => own.technician));
  for (const { technician, before, after } of stopChanges) if (after > before) changed.add(technician);
  const judgements = effects.map((fair, person) => {
    const found = evidence.technicians[person];
    if (!found) throw new RangeError(`Technician ${person} has no figures`);
    return judge(found, fair, evidence.spreadKnown, changed.has(person));
  });
  return {
    columns,
    chances,
    reasons,
    sums,
    expected,
    usualVariance,
    plain,
    evidence,
    effects,
    judgements,
    changes,
    earlyStopChanges: stopChanges,
  };
};
