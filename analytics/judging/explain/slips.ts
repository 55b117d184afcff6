import { formatDay } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { Meaning } from '../hypotheses/hypotheses';
import type { EvidenceByRule } from '../judgement';
import { massText, sentences } from './figures';

/** What a slip looks like, in a technician's words. */
const LOOKS_LIKE: Partial<Record<Meaning, string>> = {
  mass_tenth: 'a decimal point one place too far left',
  mass_tenfold: 'a decimal point one place too far right',
  mass_hundredth: 'a decimal point two places too far left',
  kg_as_lb: 'kilograms written as pounds',
  lb_as_kg: 'pounds written as kilograms',
  oz_as_lb: 'ounces written as pounds',
  lb_as_oz: 'pounds written as ounces',
  plate_tenfold: 'a decimal point one place too far right',
  plate_tenth: 'a decimal point one place too far left',
  plate_digits: 'two digits changed over',
  plate_kg_as_lb: 'kilograms written as pounds',
  plate_lb_as_kg: 'pounds written as kilograms',
  plate_oz_as_lb: 'ounces written as pounds',
};

export const explainUnitSlip = (evidence: EvidenceByRule['unit_slip'], unit: DisplayUnit): string => {
  const { nextWeighing: next } = evidence;
  return sentences(
    `${massText(evidence.recoveredMassKg, unit)} are written for a full charge of ${massText(evidence.fullChargeKg, unit)}.`,
    `Looks like ${LOOKS_LIKE[evidence.meaning] ?? 'another unit'}: ${massText(evidence.meantMassKg, unit)} would fit.`,
    evidence.isOffStep ? 'The figure lies between the steps of the scale.' : '',
    next
      ? `The cylinder’s next weighing, on ticket ${next.recordRef}, starts at ${massText(next.startWeightKg, unit)}; this ticket ends at ${massText(next.endWeightKg, unit)}.`
      : '',
  );
};

export const explainNameplate = (evidence: EvidenceByRule['nameplate_doubtful'], unit: DisplayUnit): string => {
  const others = evidence.otherVisits
    .map(({ recordRef, nameplateChargeKg }) => `${massText(nameplateChargeKg, unit)} on ticket ${recordRef}`)
    .join(', ');
  const looks = LOOKS_LIKE[evidence.meaning];
  return sentences(
    `The nameplate says ${massText(evidence.nameplateChargeKg, unit)}, and ${massText(evidence.recoveredMassKg, unit)} came out.`,
    others ? `Other visits to the unit say ${others}.` : '',
    looks
      ? `Looks like ${looks}: ${massText(evidence.meantChargeKg, unit)} would fit.`
      : `${massText(evidence.meantChargeKg, unit)} would fit.`,
  );
};

export const explainOverFullCharge = (evidence: EvidenceByRule['over_full_charge'], unit: DisplayUnit): string =>
  `${massText(evidence.recoveredMassKg, unit)} came out of a unit that holds ${massText(evidence.fullChargeKg, unit)} when full. Check the nameplate, the unit of mass and the weights.`;

export const explainWeights = (evidence: EvidenceByRule['weights_disagree'], unit: DisplayUnit): string =>
  evidence.weighedKg < 0
    ? `The cylinder weighed ${massText(evidence.startWeightKg, unit)} before and ${massText(evidence.endWeightKg, unit)} after: it cannot have grown lighter. The two weights may be changed over.`
    : `By the weights ${massText(evidence.weighedKg, unit)} went in, by the recovered mass ${massText(evidence.recoveredMassKg, unit)}. One of the three figures is wrong.`;

export const explainDuplicate = (evidence: EvidenceByRule['duplicate'], unit: DisplayUnit): string =>
  `The same pull as ticket ${evidence.ofRef}: unit, technician, ${formatDay(evidence.recoveredOn)}, ${massText(evidence.recoveredMassKg, unit)} and weights are the same. It may have been written down twice.`;
