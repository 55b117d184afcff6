import { describe, expect, test } from 'vitest';
import { comparedPeriods, type Side } from '@/analytics/trends-comparison/periods';
import { parseVersus, versusText } from '@/analytics/trends-comparison/versus';

const ask = (
  question: { from?: string; to?: string; versus?: string; today?: string; begins?: string } = {},
): { now: string[]; before: string[]; shortened: string | null } | null => {
  const { from = null, to = null, versus, today = '2026-12-09', begins = '2017-01' } = question;
  const found = comparedPeriods({ from, to, versus: versus ? parseVersus(versus) : null, today, begins });
  const spans = ({ spans: all }: Side) => all.map((span) => `${span.from}/${span.until}`);
  return found && { now: spans(found.now), before: spans(found.before), shortened: found.shortened };
};

describe('the same period a year before', () => {
  test('whole months stand against whole months, the running month against the same days', () => {
    expect(ask({ from: '2026-10' })).toEqual({
      now: ['2026-10-01/2026-12-10'],
      before: ['2025-10-01/2025-12-10'],
      shortened: null,
    });
    expect(ask({ from: '2026-10', to: '2026-11' })?.before).toEqual(['2025-10-01/2025-12-01']);
  });

  test('the sides say which months are whole and which are parts', () => {
    const found = comparedPeriods({
      from: '2026-10',
      to: null,
      versus: null,
      today: '2026-12-09',
      begins: '2017-01',
    });
    expect(found?.now).toEqual({
      wholeMonths: ['2026-10', '2026-11'],
      parts: [{ from: '2026-12-01', until: '2026-12-10' }],
      spans: [{ from: '2026-10-01', until: '2026-12-10' }],
    });
  });

  test('a period longer than a year stands with its last twelve months', () => {
    expect(ask({ from: '2024-12' })).toEqual({
      now: ['2026-01-01/2026-12-10'],
      before: ['2025-01-01/2025-12-10'],
      shortened: 'to twelve months',
    });
    expect(ask({ to: '2026-06' })?.now).toEqual(['2025-07-01/2026-07-01']);
  });

  test('what ends in the future ends today, what lies in it is not there', () => {
    expect(ask({ from: '2026-12', to: '2027-03' })?.now).toEqual(['2026-12-01/2026-12-10']);
    expect(ask({ from: '2027-01' })).toBeNull();
  });

  test.each([
    // Running on the last day of a month: the month is not over, and its days are compared, not the month.
    [
      'a month of 31 days has 31 on both sides',
      '2026-10',
      '2026-10-31',
      '2026-10-01/2026-11-01',
      '2025-10-01/2025-11-01',
    ],
    [
      '28 February against 28 days of a leap one',
      '2025-02',
      '2025-02-28',
      '2025-02-01/2025-03-01',
      '2024-02-01/2024-02-29',
    ],
    [
      '29 February of a leap year against all 28',
      '2028-02',
      '2028-02-29',
      '2028-02-01/2028-03-01',
      '2027-02-01/2027-03-01',
    ],
    [
      '28 February of a leap year against all 28',
      '2028-02',
      '2028-02-28',
      '2028-02-01/2028-02-29',
      '2027-02-01/2027-03-01',
    ],
    ['the first day alone', '2026-12', '2026-12-01', '2026-12-01/2026-12-02', '2025-12-01/2025-12-02'],
  ])('at the end of a month: %s', (_what, from, today, now, before) => {
    expect(ask({ from, today })).toMatchObject({ now: [now], before: [before] });
  });

  test('a whole leap February stands against a whole February', () => {
    expect(ask({ from: '2024-02', to: '2024-02' })?.before).toEqual(['2023-02-01/2023-03-01']);
    expect(ask({ from: '2025-02', to: '2025-02' })?.before).toEqual(['2024-02-01/2024-03-01']);
  });

  test('days that cut a month cut its counterpart', () => {
    expect(ask({ from: '2026-03-10', to: '2026-04-20' })).toMatchObject({
      now: ['2026-03-10/2026-04-21'],
      before: ['2025-03-10/2025-04-21'],
    });
    expect(ask({ from: '2026-03-01', to: '2026-03-31' })?.before).toEqual(['2025-03-01/2025-04-01']);
  });

  test('months without records yet are left out on both sides', () => {
    expect(ask({ from: '2026-01', to: '2026-12', begins: '2025-11' })).toEqual({
      now: ['2026-11-01/2026-12-10'],
      before: ['2025-11-01/2025-12-10'],
      shortened: 'to where records begin',
    });
    expect(ask({ from: '2026-01', begins: '2026-03' })).toBeNull();
  });
});

describe('another period that was chosen', () => {
  test('of the same length is laid month on month', () => {
    expect(ask({ from: '2026-01', versus: '2024-01..2024-12' })).toEqual({
      now: ['2026-01-01/2026-12-10'],
      before: ['2024-01-01/2024-12-10'],
      shortened: null,
    });
    expect(ask({ from: '2026-10', to: '2026-11', versus: '2026-02..2026-03' })).toMatchObject({
      before: ['2026-02-01/2026-04-01'],
    });
  });

  test('31 days against 30: the counterpart ends where it ends', () => {
    expect(ask({ from: '2026-10', today: '2026-10-31', versus: '2026-09' })).toMatchObject({
      now: ['2026-10-01/2026-11-01'],
      before: ['2026-09-01/2026-10-01'],
    });
    expect(ask({ from: '2026-10-31', to: '2026-10-31', versus: '2026-09' })).toBeNull();
  });

  test('a cut end of either cuts both', () => {
    expect(ask({ from: '2026-05', to: '2026-06', versus: '2024-05-10..2024-06-20' })).toMatchObject({
      now: ['2026-05-10/2026-06-21'],
      before: ['2024-05-10/2024-06-21'],
    });
  });

  test('a shorter one is laid beside the latest months of the same name', () => {
    expect(ask({ from: '2025-01', to: '2026-11', versus: '2023-03..2023-05' })).toEqual({
      now: ['2026-03-01/2026-06-01'],
      before: ['2023-03-01/2023-06-01'],
      shortened: 'to the shorter one',
    });
    expect(ask({ from: '2026-01', to: '2026-06', versus: '2023-10..2023-11' })?.now).toEqual(['2026-01-01/2026-03-01']);
  });

  test('a longer one gives the latest months of the same name', () => {
    expect(ask({ from: '2026-03', to: '2026-04', versus: '2022-01..2024-12' })).toMatchObject({
      before: ['2024-03-01/2024-05-01'],
      shortened: 'to the shorter one',
    });
  });

  test('before the first record there is nothing', () => {
    expect(ask({ from: '2026-03', to: '2026-04', versus: '2016-03..2016-04' })).toBeNull();
  });
});

test('a period in the address is read as it is written', () => {
  for (const text of ['2024-01..2024-12', '2024-03', '2024-02-01..2024-02-29', '2024-03..2024-04-10'])
    expect(versusText(parseVersus(text) ?? { from: '', to: '' })).toBe(text);
  for (const text of ['', '2024', '2024-13', '2024-02-30', '2024-05..2024-04', '2024-01..2024-02..2024-03', '1899-01'])
    expect(parseVersus(text)).toBeNull();
});
