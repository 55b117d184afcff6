import { groupBy } from '../../statistics/group-by';
import type { JudgedCylinder, JudgedRecord } from '../record';

/** The records that a record is judged together with: of the same appliance and of the same cylinder, by time. */
export type Neighbours = {
  ofAppliance: ReadonlyMap<string, readonly JudgedRecord[]>;
  ofCylinder: ReadonlyMap<string, readonly JudgedRecord[]>;
  cylinders: ReadonlyMap<string, JudgedCylinder>;
};

const momentOf = (record: JudgedRecord): string => record.recoveredAt ?? record.recoveredOn;

const byNumber = new Intl.Collator('en', { numeric: true });

/** Orders records by time, those of one moment by their ticket number. */
export const byTime = (a: JudgedRecord, b: JudgedRecord): number => {
  const [first, second] = [momentOf(a), momentOf(b)];
  if (first !== second) return first < second ? -1 : 1;
  return byNumber.compare(a.recordRef, b.recordRef);
};

/** Whether two records tell of one instant, or of one day where no time is told, with the same masses. */
export const isSameMoment = (a: JudgedRecord, b: JudgedRecord): boolean =>
  a.recoveredOn === b.recoveredOn &&
  a.recoveredAt === b.recoveredAt &&
  a.applianceId === b.applianceId &&
  a.recoveredMassKg === b.recoveredMassKg;

/** Groups records by appliance and by cylinder. Records decided to be entry errors are nobody's witness. */
export const neighboursOf = (
  records: readonly JudgedRecord[],
  cylinders: readonly JudgedCylinder[] = [],
): Neighbours => {
  const counted = records.filter(({ isExcluded }) => !isExcluded).sort(byTime);
  const filled = counted.filter(({ cylinderId }) => cylinderId !== null);
  return {
    ofAppliance: groupBy(counted, ({ applianceId }) => applianceId),
    ofCylinder: groupBy(filled, ({ cylinderId }) => cylinderId ?? ''),
    cylinders: new Map(cylinders.map((cylinder) => [cylinder.id, cylinder])),
  };
};

/** The other visits to one appliance; a doubled ticket is no visit. */
export const otherVisits = (neighbours: Neighbours, record: JudgedRecord): JudgedRecord[] =>
  (neighbours.ofAppliance.get(record.applianceId) ?? []).filter(
    (other) => other.id !== record.id && !isSameMoment(other, record),
  );
