import { describe, expect, test } from 'vitest';
import { massToKg } from '@/lib/units';
import { MASS_UNITS } from '@/lib/vocabulary';
import type { Ticket } from '@/seed/ticket';
import { type Habit, PLANTED_FAULTS, refsWith } from '@/seed/truth';
import { DEMO, median, share, yieldOf } from '@/tests/support/demo-company';

const { tickets, truth } = DEMO;
const SLIPS = PLANTED_FAULTS.filter((f) => !['stopped_early', 'mixed_cylinder', 'overfilled'].includes(f));
const slipped = refsWith(truth, ...SLIPS);
const stopped = refsWith(truth, 'stopped_early');
const namesOf = (...habits: Habit[]) =>
  truth.technicians.filter((t) => habits.includes(t.habit)).map(({ name }) => name);
const ticketsOf = (...habits: Habit[]) => {
  const names = new Set(namesOf(...habits));
  return tickets.filter(({ technician = '' }) => names.has(technician));
};

test('every fault is planted, each on a ticket that is there', () => {
  const refs = new Set(tickets.map(({ record_ref }) => record_ref));
  for (const fault of PLANTED_FAULTS) {
    const planted = refsWith(truth, fault);
    expect([fault, planted.size]).toEqual([fault, expect.toSatisfy((n: number) => n >= 15)]);
    expect([...planted].filter((ref) => !refs.has(ref))).toEqual([]);
  }
});

test('about one ticket in a hundred is written wrongly', () => {
  expect(slipped.size / tickets.length).toBeGreaterThan(0.007);
  expect(slipped.size / tickets.length).toBeLessThan(0.016);
});

test('a fifth of the systems were short when somebody came', () => {
  const short = truth.shortOnArrival.length / tickets.length;
  expect(short).toBeGreaterThan(0.15);
  expect(short).toBeLessThan(0.3);
});

describe('the crew', () => {
  test('those who cut the hold short pull less, to a shallow vacuum, and hardly wait', () => {
    const all = ticketsOf('cuts_hold_short');
    const cut = all.filter(({ record_ref }) => stopped.has(record_ref) && !slipped.has(record_ref));
    const others = ticketsOf('ordinary');
    expect(cut.length / all.length).toBeGreaterThan(0.2);
    expect(share(others, ({ record_ref }) => stopped.has(record_ref))).toBeLessThan(0.02);
    const inHg = (t: Ticket) => (t.vacuum_unit === 'inhg' ? Number(t.final_vacuum) : Number.NaN);
    expect(median(cut.map(inHg))).toBeLessThan(0.5 * median(others.map(inHg)));
    expect(median(cut.map(yieldOf))).toBeLessThan(median(others.map(yieldOf)) - 0.2);
    expect(Math.max(...cut.map(({ hold_minutes }) => Number(hold_minutes || 0)))).toBeLessThanOrEqual(2);
  });

  test('the coached one is like them before that day and like the others after', () => {
    const [name] = namesOf('coached');
    const coachedOn = truth.technicians.find((t) => t.name === name)?.coachedOn ?? '';
    expect(coachedOn).toMatch(/^20\d\d-\d\d-\d\d$/);
    const own = tickets.filter(({ technician }) => technician === name);
    const stops = ({ record_ref }: Ticket) => stopped.has(record_ref);
    const before = own.filter(({ recovered_at = '' }) => recovered_at < coachedOn);
    const after = own.filter(({ recovered_at = '' }) => recovered_at >= coachedOn);
    expect(share(before, stops)).toBeGreaterThan(0.3);
    expect(share(after, stops)).toBeLessThan(0.05);
    expect(after.length).toBeGreaterThan(60);
  });

  test('the leak specialist brings back less than the others and is the best of them', () => {
    const own = ticketsOf('leak_specialist');
    const yields = (of: readonly Ticket[]) => of.map(yieldOf).filter((y) => y < 1.2);
    const mean = (values: number[]) => values.reduce((sum, v) => sum + v, 0) / values.length;
    expect(mean(yields(own))).toBeLessThan(mean(yields(ticketsOf('ordinary'))) - 0.06);
    const ordinary = truth.technicians.filter(({ habit }) => habit === 'ordinary');
    const best = Math.max(...ordinary.map(({ meanEfficiency }) => meanEfficiency));
    expect(truth.technicians.find(({ habit }) => habit === 'leak_specialist')?.meanEfficiency).toBeGreaterThan(
      best - 0.005,
    );
  });

  test('the large-plant specialist does most of the large plant of his branch', () => {
    const own = ticketsOf('large_plant');
    const isLarge = ({ appliance = '' }: Ticket) => /^(CH|RACK|PC)-/.test(appliance);
    expect(share(own, isLarge)).toBeGreaterThan(0.5);
    expect(share(ticketsOf('ordinary'), isLarge)).toBeLessThan(0.1);
  });
});

test('the tickets without slips weigh what truly came out, but for the scale that drifts', () => {
  const kgOf = (t: Ticket) => {
    const unit = MASS_UNITS.find((u) => u === t.mass_unit) ?? 'lb';
    const kg = (text: string | undefined) => Number(massToKg(text ?? '', unit));
    return t.recovered_mass ? kg(t.recovered_mass) : kg(t.end_weight) - kg(t.start_weight);
  };
  const written = tickets.filter(({ record_ref }) => !slipped.has(record_ref)).reduce((sum, t) => sum + kgOf(t), 0);
  const months = Object.values(truth.monthlyMassKg);
  const true_ = months.flatMap((month) => Object.values(month)).reduce((sum, kg) => sum + kg, 0);
  expect(months).toHaveLength(120);
  expect(written / true_).toBeGreaterThan(0.97);
  expect(written / true_).toBeLessThan(1.001);
});

test('one scale reads low from a known month on', () => {
  const drift = truth.driftingScale;
  expect(drift?.technician).toBe(namesOf('drifting_scale')[0]);
  expect(drift?.factor).toBeLessThan(0.95);
  const own = tickets.filter((t) => t.technician === drift?.technician && !truth.shortOnArrival.includes(t.record_ref));
  const isBefore = ({ recovered_at = '' }: Ticket) => recovered_at < (drift?.fromMonth ?? '');
  const [before, after] = [own.filter(isBefore), own.filter((t) => !isBefore(t))].map((of) => median(of.map(yieldOf)));
  expect((after ?? 0) / (before ?? 1)).toBeCloseTo(drift?.factor ?? 0, 1);
});

test('units that leak come back', () => {
  const counts = new Map<string, number>();
  for (const { site, appliance } of tickets)
    counts.set(`${site} / ${appliance}`, (counts.get(`${site} / ${appliance}`) ?? 0) + 1);
  const meanOf = (keys: string[]) => keys.reduce((sum, key) => sum + (counts.get(key) ?? 0), 0) / keys.length;
  const chronic = new Set(truth.chronicLeaks);
  expect(chronic.size).toBeGreaterThan(50);
  expect(meanOf([...chronic])).toBeGreaterThan(1.6 * meanOf([...counts.keys()].filter((key) => !chronic.has(key))));
});
