import type { Case, Rule } from './rule';

/** A cylinder marked for another refrigerant; one that merely holds another by the tickets is less sure. */
const MARKED = 0.9;
/** Pulls of another refrigerant before the same cylinder says more than one mistake elsewhere would. */
const LEAST_OTHERS = 2;

type Held = { refrigerant: string; pulls: number; certainty: number };

/** What the cylinder's other tickets of these months say is in it, where they agree. */
const heldBy = ({ record, neighbours }: Case): Held | null => {
  const all = neighbours.ofCylinder.get(record.cylinderId ?? '') ?? [];
  const at = all.findIndex(({ id }) => id === record.id);
  // An emptied cylinder begins anew: only what stands next to this ticket in time counts.
  const near = all.slice(Math.max(0, at - 3), at + 4).filter(({ id }) => id !== record.id);
  const others = near.filter(({ refrigerant }) => refrigerant !== record.refrigerant);
  const refrigerant = others[0]?.refrigerant;
  const agree = refrigerant !== undefined && others.every((other) => other.refrigerant === refrigerant);
  if (!agree || others.length < LEAST_OTHERS || others.length < near.length) return null;
  return { refrigerant, pulls: others.length, certainty: others.length / (others.length + 1) };
};

/** Another refrigerant than the cylinder is marked for, or than went into it before and after. */
export const wrongCylinder: Rule = (of) => {
  const { record, neighbours } = of;
  if (record.cylinderId === null) return null;
  const marked = neighbours.cylinders.get(record.cylinderId)?.refrigerant ?? null;
  const isMarked = marked !== null && marked !== record.refrigerant;
  const held: Held | null = isMarked ? { refrigerant: marked, pulls: 0, certainty: MARKED } : heldBy(of);
  return (
    held && {
      rule: 'wrong_cylinder',
      certainty: held.certainty,
      expectedMassKg: null,
      evidence: {
        refrigerant: record.refrigerant,
        cylinderRefrigerant: held.refrigerant,
        otherPulls: held.pulls,
      },
    }
  );
};
