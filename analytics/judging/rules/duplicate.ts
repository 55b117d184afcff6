import { byTime, type Neighbours } from '../neighbours/neighbours';
import type { JudgedRecord } from '../record';

/** How sure it is that two like tickets are one: with the time of day, with weights, with neither. */
const SAME = { moment: 0.99, weights: 0.97, day: 0.85 } as const;

export type Doubled = { of: JudgedRecord; certainty: number };

const sameMass = (a: JudgedRecord, b: JudgedRecord): boolean =>
  a.recoveredMassKg === b.recoveredMassKg && a.startWeightKg === b.startWeightKg && a.endWeightKg === b.endWeightKg;

/** The earlier ticket that says the same pull: unit, person, day, masses and cylinder. The first of them is right. */
export const doubledOf = (neighbours: Neighbours, record: JudgedRecord): Doubled | null => {
  const earlier = (neighbours.ofAppliance.get(record.applianceId) ?? []).find(
    (other) =>
      other.id !== record.id &&
      other.technicianId === record.technicianId &&
      other.cylinderId === record.cylinderId &&
      other.recoveredOn === record.recoveredOn &&
      other.recoveredAt === record.recoveredAt &&
      sameMass(other, record) &&
      byTime(other, record) < 0,
  );
  if (!earlier) return null;
  const hasWeights = record.startWeightKg !== null && record.endWeightKg !== null;
  const certainty = record.recoveredAt !== null ? SAME.moment : hasWeights ? SAME.weights : SAME.day;
  return { of: earlier, certainty };
};
