import { expect, test } from 'vitest';
import { fillLimitLb } from '@/seed/cylinders';
import { refsWith } from '@/seed/truth';
import { DEMO } from '@/tests/support/demo-company';

const { tickets, truth, cylinders } = DEMO;
const odd = refsWith(truth, 'swapped_digits', 'refused', 'mixed_cylinder', 'overfilled');
const ofSerial = new Map(cylinders.map((cylinder) => [cylinder.serial, cylinder]));

// In pounds, by a scale that is right.
const weighed = tickets
  .filter((t) => t.mass_unit === 'lb' && t.start_weight && t.technician !== truth.driftingScale?.technician)
  .filter(({ record_ref }) => !odd.has(record_ref))
  .map((t) => ({
    ...t,
    start: Number(t.start_weight),
    end: Number(t.end_weight),
    bottle: ofSerial.get(t.cylinder ?? ''),
  }));

type Weighed = (typeof weighed)[number];
const refsWhere = (isOdd: (ticket: Weighed) => boolean) => weighed.filter(isOdd).map(({ record_ref }) => record_ref);

test('weights, net and vacuum of a ticket agree with each other', () => {
  expect(weighed.length).toBeGreaterThan(15_000);
  expect(refsWhere(({ start, end }) => end < start)).toEqual([]);
  const net = ({ recovered_mass }: Weighed) => Number(recovered_mass);
  expect(refsWhere((t) => Boolean(t.recovered_mass) && Math.abs(t.end - t.start - net(t)) > 1e-6)).toEqual([]);
  expect(refsWhere((t) => t.vacuum_unit === 'inhg' && Number(t.final_vacuum) > 29.9)).toEqual([]);
});

test('a cylinder never weighs less than its tare', () => {
  expect(refsWhere(({ start, bottle }) => start < (bottle?.tareLb ?? 0) - 0.3)).toEqual([]);
});

// AHRI Guideline K: net content up to 0.8 x water capacity x specific gravity at 77 °F.
test('cylinders are filled past their limit only where that was planted', () => {
  // Half a pound: the step of a floor scale.
  expect(refsWhere(({ end, bottle }) => !bottle || end - bottle.tareLb > fillLimitLb(bottle) * 1.011 + 0.6)).toEqual(
    [],
  );
  expect(refsWith(truth, 'overfilled').size).toBeLessThan(0.01 * tickets.length);
});

test('R-410A in a cylinder of 47.6 lb water capacity: 40.44 lb at most', () => {
  expect(fillLimitLb({ waterCapacityLb: 47.6, refrigerant: 'R-410A' })).toBeCloseTo(40.44, 1);
  expect(fillLimitLb({ waterCapacityLb: 47.6, refrigerant: 'R-22' })).toBeCloseTo(45.48, 1);
  expect(fillLimitLb({ waterCapacityLb: 47.6, refrigerant: 'R-32' })).toBeCloseTo(36.7, 1);
});

test('a cylinder begins where it ended, or emptier', () => {
  const last = new Map<string, number>();
  let gaps = 0;
  let followed = 0;
  for (const { cylinder = '', start, end } of weighed) {
    const before = last.get(cylinder);
    // What was weighed in between in other units, or not at all, is not seen here.
    if (before !== undefined) {
      followed++;
      if (start > before + 0.5) gaps++;
    }
    last.set(cylinder, end);
  }
  expect(followed).toBeGreaterThan(10_000);
  expect(gaps / followed).toBeLessThan(0.2);
});

test('a cylinder holds one refrigerant, but for what was planted as mixed', () => {
  // A refused row may name no refrigerant at all, a copy repeats what its original says.
  const planted = refsWith(truth, 'mixed_cylinder', 'refused', 'doubled');
  const wrong = tickets.filter((t) => t.refrigerant !== ofSerial.get(t.cylinder ?? '')?.refrigerant);
  expect(wrong.filter(({ record_ref }) => !planted.has(record_ref))).toEqual([]);
  const mixed = refsWith(truth, 'mixed_cylinder');
  expect(wrong.filter(({ record_ref }) => mixed.has(record_ref))).toHaveLength(mixed.size);
});
