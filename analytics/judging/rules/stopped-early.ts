import { stopsEarlyOf } from '../arrivals/stops-early';
import { expectedMassKg, lowEvidence } from './low';
import type { Rule } from './rule';

/** Low, and the final vacuum shallow: somebody may have stopped before all of it was out. */
export const stoppedEarly: Rule = (of) => {
  const { record, weighed, baselines, settings, vacuum } = of;
  if (!vacuum || weighed.stopped < settings.raiseStopsFrom) return null;
  const share = stopsEarlyOf(baselines.arrivals, record.technicianId, { pulls: 1, stopped: weighed.stopped });
  return {
    rule: 'stopped_early',
    certainty: weighed.stopped,
    expectedMassKg: expectedMassKg(of),
    evidence: { ...lowEvidence(of), share },
  };
};
