import { expect, test } from 'vitest';
import * as format from '@/lib/format';

test('masses are turned into the unit that is read', () => {
  // 1 lb = 0.45359237 kg exactly: NIST SP 811 (2008), B.8.
  expect(format.formatMass(0.45359237, 'lb')).toBe('1.0');
  expect(format.formatMass(550.9509, 'lb')).toBe('1,214.6');
  expect(format.formatMass(550.9509, 'kg')).toBe('551.0');
  expect(format.formatMassWithUnit(550.9509, 'kg', 0)).toBe('551\u00a0kg');
});

test('a negative figure carries a minus sign, and zero none', () => {
  expect(format.formatNumber(-3.25, 1)).toBe('\u22123.3');
  expect(format.formatNumber(-0.04, 1)).toBe('0.0');
  expect(format.formatPercent(-0.031)).toBe('\u22123%');
});

test('what is no number is a dash', () => {
  expect(format.formatNumber(Number.NaN)).toBe('—');
  expect(format.formatPercent(Number.POSITIVE_INFINITY)).toBe('—');
});

test('a change always says its sign', () => {
  expect(format.formatChange(0.258)).toBe('+26%');
  expect(format.formatChange(-0.03)).toBe('\u22123%');
  expect(format.formatChange(0.001)).toBe('0%');
});

test('months and days stay on their date in every zone', () => {
  // The suite runs in Los Angeles, where UTC midnight is still the day before.
  expect(format.formatMonth('2026-11')).toBe('November 2026');
  expect(format.formatMonth('2026-11-01', 'short')).toBe('Nov 2026');
  expect(format.formatMonthName('2026-01')).toBe('January');
  expect(format.formatDay('2026-03-01')).toBe('Mar 1, 2026');
  expect(format.formatDay('soon')).toBe('soon');
});

test('an instant is read in the zone of the company', () => {
  // New York is four hours behind UTC in summer (IANA tzdata, America/New_York).
  expect(format.formatInstant('2026-07-01T03:30:00Z', 'America/New_York')).toBe('Jun 30, 2026, 23:30');
  expect(format.formatInstant('never', 'America/New_York')).toBe('never');
});

test('counts carry the right noun', () => {
  expect(format.plural(1, 'recovery', 'recoveries')).toBe('1\u00a0recovery');
  expect(format.plural(1204, 'recovery', 'recoveries')).toBe('1,204\u00a0recoveries');
  expect(format.plural(0, 'recovery', 'recoveries')).toBe('0\u00a0recoveries');
});

test('a designation does not break at its hyphen', () => {
  expect(format.formatDesignation('R-410A')).toBe('R\u2011410A');
});

test('a list reads as part of a sentence', () => {
  expect(format.formatList([])).toBe('');
  expect(format.formatList(['R-22'])).toBe('R-22');
  expect(format.formatList(['R-22', 'R-32'])).toBe('R-22 and R-32');
  expect(format.formatList(['a', 'b', 'c'])).toBe('a, b and c');
  expect(format.formatList(['a', 'b', 'c', 'd', 'e'])).toBe('a, b and 3 more');
});
