import { expect, test } from 'vitest';
import type { ApplianceLeaks, ShownLeakRate, ShownRule } from '@/analytics/leak-rate/contract';
import { lastRateSentence, rateText, ruleSentence, triggerText } from '@/analytics/leak-rate/sentence';

const rate: ShownLeakRate = {
  ...{ percent: 25, low: 23.6, high: 26.4, after: '2026-01-02', leaksVerifiedOn: null },
  ...{ trigger: 20, paragraphs: ['40 CFR 84.106'], above: true, close: false },
};
const event = { addedOn: '2026-05-28', additionIds: ['1'], added: 9.072, counted: 9.072, reasons: [], rate };
type Told = Parameters<typeof lastRateSentence>[0];
const told = (rest: Partial<Told> = {}): Told => ({
  events: [event],
  fullCharge: 90.718,
  methodUsed: 'annualizing',
  // Only how many there are is asked.
  additions: [{} as ApplianceLeaks['additions'][number]],
  ...rest,
});

test('a rate is told with its range', () => {
  expect(rateText(rate)).toBe('25.0% (23.6% to 26.4%)');
});

test('a rate against its trigger names the paragraph, and says when it is close', () => {
  expect(triggerText(rate)).toBe('above the 20% of 40 CFR 84.106');
  expect(triggerText({ ...rate, percent: 19.8, above: false, close: true })).toBe(
    'not above the 20% of 40 CFR 84.106, but close to it',
  );
  expect(triggerText({ ...rate, trigger: null, above: null, paragraphs: [] })).toBe('');
});

test('the last rate is one sentence', () => {
  expect(lastRateSentence(told(), 'lb')).toBe(
    '20.0\u00a0lb on May 28, 2026 make a leak rate of 25.0% (23.6% to 26.4%) of the full charge a year by the annualizing method, above the 20% of 40 CFR 84.106.',
  );
});

test('a first addition is the least that is possible, and says so', () => {
  const first = lastRateSentence(told({ events: [{ ...event, rate: { ...rate, after: null } }] }), 'lb');
  expect(first).toContain('at least 25.0%');
  expect(first).toContain('No earlier addition is known');
});

test('says why there is no rate', () => {
  expect(lastRateSentence(told({ additions: [], events: [] }), 'lb')).toContain('No addition');
  expect(lastRateSentence(told({ fullCharge: null, events: [] }), 'lb')).toContain('full charge');
  expect(lastRateSentence(told({ events: [{ ...event, rate: null }] }), 'lb')).toContain('Nothing that was added');
});

const rule = (rest: Partial<ShownRule>): ShownRule => ({
  ...{ rule: 'hfc', paragraph: '40 CFR 84.106', since: '2026-01-01', leastCharge: 6.804 },
  ...{ holds: 'yes', why: 'in_scope' },
  ...rest,
});

test('each reason about a rule is told with its paragraph', () => {
  expect(ruleSentence(rule({}), 'lb')).toBe(
    '40 CFR 84.106 holds from Jan 1, 2026 on: the unit has at least 15\u00a0lb of an HFC or a substitute with a GWP above 53.',
  );
  expect(ruleSentence(rule({ holds: 'no', why: 'charge' }), 'lb')).toContain('begins at 15');
  expect(ruleSentence(rule({ holds: 'no', why: 'refrigerant' }), 'lb')).toContain('does not hold');
  expect(ruleSentence(rule({ rule: 'ozone', holds: 'no', why: 'refrigerant' }), 'lb')).toMatch(
    /the refrigerant is not ozone-depleting\.$/,
  );
  expect(ruleSentence(rule({ holds: 'no', why: 'light_commercial' }), 'lb')).toContain('leaves out residential');
  expect(ruleSentence(rule({ holds: 'ask', why: 'light_commercial_unstated' }), 'lb')).toContain('must say');
});
