import type { DisplayUnit } from '@/lib/vocabulary';
import type { Told } from '../judgement';
import { explainChain, explainOverfilled, explainWrongCylinder } from './cylinders';
import { explainLowUnexplained, explainShortOnArrival, explainStoppedEarly } from './low';
import { explainDate, explainHold, explainLevel } from './practice';
import { explainDuplicate, explainNameplate, explainOverFullCharge, explainUnitSlip, explainWeights } from './slips';

/** Says in a technician's words why a record is flagged, with the numbers in his unit. A reason to look, no finding. */
export const explain = (flag: Told, unit: DisplayUnit): string => {
  switch (flag.rule) {
    case 'stopped_early':
      return explainStoppedEarly(flag.evidence, unit);
    case 'short_on_arrival':
      return explainShortOnArrival(flag.evidence, unit);
    case 'low_unexplained':
      return explainLowUnexplained(flag.evidence, unit);
    case 'unit_slip':
      return explainUnitSlip(flag.evidence, unit);
    case 'weights_disagree':
      return explainWeights(flag.evidence, unit);
    case 'cylinder_chain':
      return explainChain(flag.evidence, unit);
    case 'over_full_charge':
      return explainOverFullCharge(flag.evidence, unit);
    case 'nameplate_doubtful':
      return explainNameplate(flag.evidence, unit);
    case 'duplicate':
      return explainDuplicate(flag.evidence, unit);
    case 'level_not_reached':
      return explainLevel(flag.evidence);
    case 'hold_missing':
      return explainHold(flag.evidence);
    case 'cylinder_overfilled':
      return explainOverfilled(flag.evidence, unit);
    case 'wrong_cylinder':
      return explainWrongCylinder(flag.evidence);
    case 'date_doubtful':
      return explainDate(flag.evidence);
  }
};
