import { expect, test } from 'vitest';
import { calendarYears } from '@/analytics/leak-rate/calendar-years';
import { againstTrigger } from '@/analytics/leak-rate/judge';
import { leakRuleVerdicts, type RuledAppliance, triggerPercent } from '@/analytics/leak-rate/rules';
import { CATALOGUE } from '@/db/catalogue/refrigerants';
import { blendFigure } from '@/db/catalogue/write';
import { added, lb } from './additions';

const rack = (pounds: number): RuledAppliance => ({
  fullChargeKg: lb(pounds),
  category: 'commercial_refrigeration',
  lightCommercial: null,
});
const refrigerantFigures = (designation: string) => {
  const entry = CATALOGUE.find((known) => known.designation === designation);
  if (!entry) throw new Error(`The catalogue has no ${designation}`);
  return { gwpAr4: blendFigure(entry, 'gwpAr4'), components: entry.components.map(([component]) => component) };
};
const holding = (appliance: RuledAppliance, designation: string) =>
  leakRuleVerdicts(appliance, refrigerantFigures(designation)).map(({ rule, holds }) => [rule.name, holds]);

// 40 CFR 82.157(a): appliances with a full charge of 50 or more pounds of a class I or II substance or a blend with one.
test('ozone-depleting refrigerants are ruled from 50 lb on', () => {
  expect(holding(rack(50), 'R-22')).toEqual([
    ['ozone', 'yes'],
    ['hfc', 'no'],
  ]);
  expect(holding(rack(49.9), 'R-22')).toEqual([
    ['ozone', 'no'],
    ['hfc', 'no'],
  ]);
});

// 89 FR 82682, 40 CFR 84.106: from 15 lb of an HFC or of a substitute with a GWP above 53.
test('HFCs are ruled from 15 lb on, and not by part 82', () => {
  expect(holding(rack(15), 'R-404A')).toEqual([
    ['ozone', 'no'],
    ['hfc', 'yes'],
  ]);
  expect(holding(rack(14.9), 'R-404A')).toEqual([
    ['ozone', 'no'],
    ['hfc', 'no'],
  ]);
});

// R-401A is R-22, R-152a and R-124 (ASHRAE 34): a blend with class II substances that also holds an HFC.
test('a blend of both stands under both', () => {
  expect(holding(rack(60), 'R-401A')).toEqual([
    ['ozone', 'yes'],
    ['hfc', 'yes'],
  ]);
});

test.each(['R-744', 'R-290', 'R-1234yf', 'R-1234ze(E)', 'R-1233zd(E)', 'R-514A'])(
  '%s has a GWP under 54 and no HFC in it: neither rule holds',
  (designation) => {
    expect(holding(rack(500), designation)).toEqual([
      ['ozone', 'no'],
      ['hfc', 'no'],
    ]);
  },
);

test('every refrigerant of the catalogue gets a verdict of both rules', () => {
  for (const { designation } of CATALOGUE) expect(holding(rack(100), designation)).toHaveLength(2);
});

// 40 CFR 84.106: the residential and light commercial air-conditioning and heat pump subsector is left out.
test('for comfort cooling on an HFC somebody must say whether it is light commercial', () => {
  const rooftop = (lightCommercial: boolean | null): RuledAppliance => ({
    fullChargeKg: lb(20),
    category: 'comfort_cooling',
    lightCommercial,
  });
  expect(holding(rooftop(null), 'R-410A')[1]).toEqual(['hfc', 'ask']);
  expect(holding(rooftop(true), 'R-410A')[1]).toEqual(['hfc', 'no']);
  expect(holding(rooftop(false), 'R-410A')[1]).toEqual(['hfc', 'yes']);
});

// 40 CFR 82.157(c)(2): 20 % commercial refrigeration, 30 % industrial process, 10 % comfort cooling and other.
test('triggers by category', () => {
  expect(triggerPercent('commercial_refrigeration')).toBe(20);
  expect(triggerPercent('industrial_process')).toBe(30);
  expect(triggerPercent('comfort_cooling')).toBe(10);
  expect(triggerPercent('other')).toBe(10);
  expect(triggerPercent(null)).toBeNull();
});

// 40 CFR 82.157(c): leaks are repaired where the rate is above the percentage; 10.0 % of comfort cooling is not.
test('a rate that equals the trigger is not above it', () => {
  expect(againstTrigger({ percent: (lb(20) / lb(200)) * 100, uncertainty: 0 }, 10).above).toBe(false);
  expect(againstTrigger({ percent: 10.01, uncertainty: 0 }, 10)).toEqual({ above: true, close: false });
});

test('a rate within twice its uncertainty of the trigger is close to it, on either side', () => {
  expect(againstTrigger({ percent: 9.2, uncertainty: 0.4 }, 10)).toEqual({ above: false, close: true });
  expect(againstTrigger({ percent: 10.9, uncertainty: 0.4 }, 10)).toEqual({ above: true, close: false });
});

// 40 CFR 82.157(j): 125 percent or more of the full charge in a calendar year.
test('a chronic leaker takes 125 % of its full charge in one calendar year', () => {
  const years = calendarYears(
    [
      added('2025-03-01', 70),
      added('2025-12-31', 55),
      added('2026-01-01', 124),
      added('2026-02-01', 50, { reason: 'retrofit' }),
    ],
    lb(100),
  );
  expect(years.map(({ year, chronic }) => [year, chronic])).toEqual([
    [2025, true],
    [2026, false],
  ]);
  expect(years[0]?.percent).toBeCloseTo(125, 9);
});

test('rules and years need a full charge', () => {
  expect(() => holding(rack(0), 'R-22')).toThrow(RangeError);
  expect(() => calendarYears([], 0)).toThrow(RangeError);
});
