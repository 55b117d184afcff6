import { formatDesignation, plural } from '@/lib/format';
import type { DisplayUnit } from '@/lib/vocabulary';
import type { EvidenceByRule } from '../judgement';
import { massText } from './figures';

export const explainChain = (evidence: EvidenceByRule['cylinder_chain'], unit: DisplayUnit): string =>
  `This ticket leaves the cylinder at ${massText(evidence.endWeightKg, unit)}, but ticket ${evidence.nextRef} finds it at ${massText(evidence.nextStartWeightKg, unit)}. By that ${massText(evidence.wentInKg, unit)} went in, not ${massText(evidence.recoveredMassKg, unit)}.`;

export const explainOverfilled = (evidence: EvidenceByRule['cylinder_overfilled'], unit: DisplayUnit): string =>
  `The cylinder holds ${massText(evidence.netKg, unit)} (${massText(evidence.grossKg, unit)} less ${massText(evidence.tareKg, unit)} tare); it may hold ${massText(evidence.fillLimitKg, unit)}. A full cylinder can burst when it warms: the cylinder’s marking and local codes decide what to do with it.`;

export const explainWrongCylinder = (evidence: EvidenceByRule['wrong_cylinder']): string => {
  const [gas, held] = [formatDesignation(evidence.refrigerant), formatDesignation(evidence.cylinderRefrigerant)];
  return evidence.otherPulls === 0
    ? `${gas} went into a cylinder that is marked for ${held}. Mixed refrigerant earns no credit.`
    : `${gas} went into a cylinder that ${plural(evidence.otherPulls, 'other ticket fills', 'other tickets fill')} with ${held}. Mixed refrigerant earns no credit.`;
};
