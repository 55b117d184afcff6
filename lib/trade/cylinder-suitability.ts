import { leastServicePressurePsig } from './cylinder-fill';
import { requalificationState } from './requalification';

/** What is stamped on a cylinder and known of it. */
export type CylinderMarks = {
  /** Service pressure in psig: 400 of "DOT-4BA400". Null where it cannot be read. */
  servicePressurePsig: number | null;
  /** Non-refillable, as DOT-39. */
  isDisposable: boolean;
  /** Marked for flammable gas: red band or top, left-hand thread. */
  isMarkedFlammable: boolean;
  /** Day of the next test, null where not known. */
  requalificationDueOn: string | null;
  /** What it already holds, null where it is empty. */
  holds: string | null;
};

export type RefrigerantToFill = {
  designation: string;
  /** ASHRAE 34 class: A1, A2L, A2, A3, B1 … */
  safetyClass: string;
};

export type FillCaution = {
  kind:
    | 'disposable'
    | 'rating too low'
    | 'rating unknown'
    | 'not marked for flammable gas'
    | 'test overdue'
    | 'test due soon'
    | 'test date unknown'
    | 'holds another refrigerant';
  /** Whether a fill must not begin, or a person has to look. */
  stops: boolean;
  /** The paragraph or practice behind it. */
  source: string;
};

const isFlammable = (safetyClass: string): boolean => !/1$/.test(safetyClass);

const ratingCaution = (marked: number | null, designation: string): FillCaution[] => {
  const source = '49 CFR 173.301(a)(8)';
  const least = leastServicePressurePsig(designation);
  if (marked === null || least === null) return [{ kind: 'rating unknown', stops: false, source }];
  // 240 psig is named as enough for R-22, whose computed need is a fraction above it.
  return marked < Math.floor(least) ? [{ kind: 'rating too low', stops: true, source }] : [];
};

const testCaution = (dueOn: string | null, today: string): FillCaution[] => {
  const source = '49 CFR 173.301(a)(6), 180.209';
  if (dueOn === null) return [{ kind: 'test date unknown', stops: false, source }];
  const state = requalificationState(dueOn, today);
  if (state === 'overdue') return [{ kind: 'test overdue', stops: true, source }];
  return state === 'due soon' ? [{ kind: 'test due soon', stops: false, source }] : [];
};

/**
 * What speaks against filling a cylinder with a refrigerant today, the gravest first. An empty list means that nothing
 * recorded speaks against it, never that it is safe: the cylinder must be looked at, and label, maker and local codes
 * decide.
 */
export const fillCautions = (
  marks: CylinderMarks,
  { designation, safetyClass }: RefrigerantToFill,
  today: string,
): FillCaution[] => {
  const cautions: FillCaution[] = [];
  if (marks.isDisposable) {
    cautions.push({ kind: 'disposable', stops: true, source: 'DOT-39 cylinders are never refilled, 49 CFR 178.65(i)' });
  }
  if (isFlammable(safetyClass) && !marks.isMarkedFlammable) {
    cautions.push({
      kind: 'not marked for flammable gas',
      stops: true,
      source: 'AHRI Guideline K covers non-flammable refrigerants only; flammable ones need a cylinder marked for them',
    });
  }
  cautions.push(...ratingCaution(marks.servicePressurePsig, designation));
  if (marks.holds !== null && marks.holds !== designation) {
    cautions.push({
      kind: 'holds another refrigerant',
      stops: true,
      source: 'One refrigerant a cylinder: common practice',
    });
  }
  cautions.push(...testCaution(marks.requalificationDueOn, today));
  return cautions.sort((a, b) => Number(b.stops) - Number(a.stops));
};
