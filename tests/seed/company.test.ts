import { Temporal } from 'temporal-polyfill';
import { describe, expect, test } from 'vitest';
import { monthBefore, monthsUntil } from '@/seed/calendar';
import { makeCompany } from '@/seed/company';
import { smallPlan } from '@/seed/plan';
import { DEMO, monthOf, share, yearOf } from '@/tests/support/demo-company';

const { tickets } = DEMO;

describe('the company', () => {
  test('is the same for the same plan and another for another end', () => {
    const plan = smallPlan('2026-11');
    expect(makeCompany(plan)).toEqual(makeCompany(plan));
    expect(makeCompany(plan).tickets).not.toEqual(makeCompany(smallPlan('2026-10')).tickets);
    expect(makeCompany(plan).tickets).not.toEqual(makeCompany({ ...plan, seed: 'another' }).tickets);
  });

  test('has the size of a contractor with three branches', () => {
    expect(tickets.length).toBeGreaterThan(20_000);
    expect(tickets.length).toBeLessThan(25_000);
    expect(new Set(tickets.map(({ branch }) => branch)).size).toBe(3);
    expect(new Set(DEMO.technicians.map(({ name }) => name)).size).toBe(30);
    expect(new Set(DEMO.sites.map(({ name }) => name)).size).toBe(400);
    const units = new Set(tickets.map(({ site, appliance }) => `${site}/${appliance}`)).size;
    expect(units).toBeGreaterThan(1300);
    expect(units).toBeLessThan(1700);
  });

  test('has records in every month of ten years and none outside', () => {
    const dated = tickets.filter(({ recovered_at = '' }) => !recovered_at.endsWith('-02-30'));
    expect([...new Set(dated.map(monthOf))].sort()).toEqual(monthsUntil('2026-11', 120));
  });

  test('numbers every ticket once', () => {
    expect(new Set(tickets.map(({ record_ref }) => record_ref)).size).toBe(tickets.length);
  });
});

test('the last whole month is that of the company’s own calendar', () => {
  // 03:00 in Greenwich on 1 December is still 30 November in New York.
  expect(monthBefore(Temporal.Instant.from('2026-12-01T03:00:00Z'), 'America/New_York')).toBe('2026-10');
  expect(monthBefore(Temporal.Instant.from('2026-12-01T06:00:00Z'), 'America/New_York')).toBe('2026-11');
  expect(monthBefore(Temporal.Instant.from('2026-01-15T12:00:00Z'), 'America/New_York')).toBe('2025-12');
});

describe('seasons', () => {
  const inMonths = (category: string, ...months: string[]) =>
    tickets.filter((t) => t.appliance_category === category && months.includes(monthOf(t).slice(5))).length;

  test('cooling peaks in summer and has a low second hump in winter', () => {
    const summer = inMonths('comfort_cooling', '06', '07', '08');
    expect(summer / inMonths('comfort_cooling', '12', '01', '02')).toBeGreaterThan(1.9);
    expect(inMonths('comfort_cooling', '01')).toBeGreaterThan(inMonths('comfort_cooling', '03'));
  });

  test('refrigeration is nearly flat', () => {
    const summer = inMonths('commercial_refrigeration', '06', '07', '08');
    const ratio = summer / inMonths('commercial_refrigeration', '12', '01', '02');
    expect(ratio).toBeGreaterThan(0.95);
    expect(ratio).toBeLessThan(1.3);
  });
});

describe('the mix of refrigerants', () => {
  const shareIn = (from: number, to: number, ...refrigerants: string[]) =>
    share(
      tickets.filter((t) => yearOf(t) >= from && yearOf(t) <= to),
      ({ refrigerant = '' }) => refrigerants.includes(refrigerant),
    );

  test('R-22 goes, R-410A leads and begins to fall, R-32 and R-454B come', () => {
    expect(shareIn(2017, 2018, 'R-22')).toBeGreaterThan(0.35);
    expect(shareIn(2026, 2026, 'R-22')).toBeLessThan(0.1);
    expect(shareIn(2026, 2026, 'R-410A')).toBeGreaterThan(0.4);
    expect(shareIn(2026, 2026, 'R-410A')).toBeLessThan(shareIn(2024, 2024, 'R-410A'));
    expect(shareIn(2017, 2021, 'R-32', 'R-454B')).toBe(0);
    expect(shareIn(2026, 2026, 'R-32', 'R-454B')).toBeGreaterThan(0.06);
  });

  test('R-404A gives way to R-448A and R-449A', () => {
    expect(shareIn(2017, 2017, 'R-404A')).toBeGreaterThan(5 * shareIn(2017, 2017, 'R-448A', 'R-449A'));
    expect(shareIn(2026, 2026, 'R-448A', 'R-449A')).toBeGreaterThan(2 * shareIn(2026, 2026, 'R-404A'));
  });
});
