import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { contrastRatio, linearRgb } from '@/lib/colour/contrast';
import { COLOURED_REFRIGERANTS, refrigerantColour } from '@/lib/colour/refrigerant-colour';
import { seenBy, seenDifference, VISIONS, type Vision } from '@/lib/colour/vision';

const [light = '', dark = ''] = readFileSync('app/globals.css', 'utf8').split(/^\[data-theme=.dark.\] \{$/m);

const variables = (css: string): Record<string, string> =>
  Object.fromEntries([...css.matchAll(/--([\w-]+): (#[0-9a-f]{6});/g)].map(([, name, value]) => [name, value]));

const THEMES = {
  light: variables(light.split('@theme')[0] ?? ''),
  dark: variables(dark.split('@custom-variant')[0] ?? ''),
};

const colour = (theme: keyof typeof THEMES, name: string): string => {
  const value = THEMES[theme][name];
  if (!value) throw new Error(`${name} has no value in the ${theme} theme`);
  return value;
};

const nameOf = (designation: string) => /^var\(--(.+)\)$/.exec(refrigerantColour(designation))?.[1] ?? '';
const refrigerants = [...COLOURED_REFRIGERANTS, 'other'].map(nameOf);

// Those that stand on each other in the charts of a contractor for comfort cooling, supermarkets and chillers.
const STACKED = [
  'R-410A',
  'R-22',
  'R-404A',
  'R-134a',
  'R-448A',
  'R-449A',
  'R-454B',
  'R-32',
  'R-407C',
  'R-1233zd(E)',
  'other',
].map(nameOf);

test('black on white is the greatest contrast there is', () => {
  // WCAG 2.2: contrast ratios range from 1 to 21.
  expect(contrastRatio('#000000', '#ffffff')).toBeCloseTo(21, 5);
  expect(contrastRatio('#777777', '#ffffff')).toBeCloseTo(4.48, 2);
});

test('red and green draw together for eyes without red or green cones', () => {
  const [red, green] = [linearRgb('#c8282f'), linearRgb('#5f7d1e')];
  expect(seenDifference('deuteranopia', red, green)).toBeLessThan(seenDifference('usual', red, green) / 2);
  // Grey has no colour to lose: each row of the published matrices sums to one.
  for (const vision of Object.keys(VISIONS) as Vision[])
    for (const part of seenBy(vision, [0.5, 0.5, 0.5])) expect(part).toBeCloseTo(0.5, 4);
});

describe.each(['light', 'dark'] as const)('%s theme', (theme) => {
  // WCAG 2.2, 1.4.3: text 4.5:1.
  test.each(['ink', 'ink-2', 'ink-3', 'act', 'act-strong', 'flag', 'danger', 'good'])(
    '%s is read on every ground',
    (name) => {
      for (const ground of ['ground', 'sheet', 'sheet-2'])
        expect(contrastRatio(colour(theme, name), colour(theme, ground))).toBeGreaterThanOrEqual(4.5);
    },
  );

  test.each([
    ['body-ink', 'body'],
    ['body-ink-2', 'body'],
    ['shoulder-ink', 'shoulder'],
    ['act-ink', 'act'],
    ['ink', 'act-weak'],
    ['flag', 'flag-weak'],
    ['danger', 'danger-weak'],
    ['good', 'good-weak'],
    ['sheet', 'danger'],
    ['sheet', 'good'],
  ])('%s is read on %s', (text, ground) => {
    expect(contrastRatio(colour(theme, text), colour(theme, ground))).toBeGreaterThanOrEqual(4.5);
  });

  // WCAG 2.2, 1.4.11: marks and the edges of controls 3:1.
  test.each([...refrigerants, 'edge'])('%s stands out from its ground', (name) => {
    for (const ground of ['ground', 'sheet'])
      expect(contrastRatio(colour(theme, name), colour(theme, ground))).toBeGreaterThanOrEqual(3);
  });

  test.each(Object.keys(VISIONS) as Vision[])('refrigerants stacked on each other differ for %s', (vision) => {
    // Twice what is just noticed (0.02 in OKLab), for marks that lie apart.
    for (const [index, one] of STACKED.entries())
      for (const other of STACKED.slice(index + 1))
        expect(
          seenDifference(vision, linearRgb(colour(theme, one)), linearRgb(colour(theme, other))),
          `${one} and ${other}`,
        ).toBeGreaterThan(0.04);
  });
});

test('every refrigerant has a colour, always the same one', () => {
  expect(refrigerantColour('R-410A')).toBe('var(--refrigerant-r-410a)');
  expect(refrigerantColour('other')).toBe('var(--refrigerant-other)');
  expect(refrigerantColour('R-1233zd(E)')).toBe('var(--refrigerant-r-1233zde)');
  expect(refrigerantColour('R-455A')).toBe(refrigerantColour('r-455a '));
  for (const rare of ['R-455A', 'R-508B', 'R-421A']) expect(refrigerants).toContain(nameOf(rare));
});
