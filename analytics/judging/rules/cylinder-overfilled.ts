import type { Rule } from './rule';

/** Share above the limit that a scale's own error explains. */
const SCALE_SHARE = 0.005;

/** More in the cylinder than it may hold. As certain as it is that the weight was written as it was. */
export const cylinderOverfilled: Rule = ({ record, neighbours, weighed }) => {
  const cylinder = record.cylinderId === null ? undefined : neighbours.cylinders.get(record.cylinderId);
  const { endWeightKg: grossKg } = record;
  if (!cylinder?.fillLimitKg || cylinder.tareWeightKg === null || grossKg === null) return null;
  const { tareWeightKg: tareKg, fillLimitKg } = cylinder;
  const netKg = grossKg - tareKg;
  if (netKg <= fillLimitKg * (1 + SCALE_SHARE)) return null;
  return {
    rule: 'cylinder_overfilled',
    certainty: weighed.meanings[0]?.probability ?? 0,
    expectedMassKg: null,
    evidence: { grossKg, tareKg, netKg, fillLimitKg },
  };
};
