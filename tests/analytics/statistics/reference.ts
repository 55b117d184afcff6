import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { z } from 'zod';

const caseSchema = z.looseObject({ name: z.string(), kind: z.string().default('') });
export type ReferenceCase = z.infer<typeof caseSchema>;
const fileSchema = z.object({ topic: z.string(), cases: z.array(caseSchema).min(1) });

/** How far a figure may stand from its reference: either bound is enough. `printed` ones are rounded in their source. */
export type Tolerance = { relative?: number; absolute?: number; printed?: boolean };

export type Checks = Record<string, (entry: ReferenceCase, compare: Compare) => void>;
export type Compare = (actual: unknown, expected: unknown, tolerance?: Tolerance) => void;

export const readReference = (topic: string) =>
  fileSchema.parse(
    JSON.parse(readFileSync(new URL(`../../fixtures/reference/${topic}.json`, import.meta.url), 'utf8')),
  );

/** Doubles that JSON cannot carry are written as text. */
const asNumber = (value: unknown): unknown => (value === 'Infinity' || value === '-Infinity' ? Number(value) : value);

/** Counts what was compared, and how far the worst figure stood off. */
export const comparison = (standard: Tolerance) => {
  const seen = { figures: 0, worstRelative: 0, worstAbsolute: 0, worstAt: '' };

  const compareNumber = (actual: unknown, expected: number, at: string, tolerance: Tolerance) => {
    if (typeof actual !== 'number' || Number.isNaN(actual)) expect.fail(`${at}: expected ${expected}, got ${actual}`);
    seen.figures += 1;
    if (actual === expected) return;
    const distance = Math.abs(actual - expected);
    const relative = distance / Math.abs(expected);
    const near = distance <= (tolerance.absolute ?? 0) || relative <= (tolerance.relative ?? 0);
    if (!near) expect.fail(`${at}: expected ${expected}, got ${actual}, off by ${distance}`);
    // Figures printed in a source are rounded there; they say nothing about how exact ours are.
    if (tolerance.printed) return;
    seen.worstAbsolute = Math.max(seen.worstAbsolute, distance);
    // About zero only the absolute bound speaks.
    if (Math.abs(expected) <= (tolerance.absolute ?? 0) || relative <= seen.worstRelative) return;
    seen.worstRelative = relative;
    seen.worstAt = at;
  };

  const compareList = (actual: unknown, expected: unknown[], at: string, tolerance: Tolerance) => {
    if (!Array.isArray(actual) || actual.length !== expected.length) {
      expect.fail(`${at}: expected ${expected.length} figures, got ${JSON.stringify(actual)}`);
    }
    expected.forEach((value, index) => {
      compareAt(actual[index], value, `${at}[${index}]`, tolerance);
    });
  };

  const compareNamed = (actual: unknown, expected: object, at: string, tolerance: Tolerance) => {
    const figures = z.record(z.string(), z.unknown()).parse(actual, { error: () => `${at}: no figures were made` });
    for (const [name, value] of Object.entries(expected)) {
      if (!(name in figures)) expect.fail(`${at}.${name}: this reference figure was not checked`);
      compareAt(figures[name], value, `${at}.${name}`, tolerance);
    }
  };

  const compareAt = (actual: unknown, raw: unknown, at: string, tolerance: Tolerance = standard): void => {
    const expected = asNumber(raw);
    if (typeof expected === 'number') compareNumber(actual, expected, at, tolerance);
    else if (Array.isArray(expected)) compareList(actual, expected, at, tolerance);
    else if (expected !== null && typeof expected === 'object') compareNamed(actual, expected, at, tolerance);
    else {
      seen.figures += 1;
      expect(actual, at).toEqual(expected);
    }
  };

  return { seen, compareAt };
};

/**
 * One test for each case of a reference file, and one that all were checked. A case whose kind has no check fails, as
 * does any figure of a case that its check leaves out.
 */
export const checkReference = (topic: string, standard: Tolerance, checks: Checks): void => {
  const { cases } = readReference(topic);
  const { seen, compareAt } = comparison(standard);
  let checked = 0;

  test.each(cases.map((entry) => [entry.kind ? `${entry.kind}: ${entry.name}` : entry.name, entry] as const))(
    '%s',
    (_, entry) => {
      const check = checks[entry.kind] ?? checks[entry.name] ?? expect.fail(`No check for the kind "${entry.kind}"`);
      const before = seen.figures;
      check(entry, (actual, expected, tolerance) => compareAt(actual, expected, entry.name, tolerance));
      expect(seen.figures, 'figures compared').toBeGreaterThan(before);
      checked += 1;
    },
  );

  test(`every case of ${topic} was checked`, () => {
    const { figures, worstAbsolute, worstRelative, worstAt } = seen;
    const worst = `off by at most ${worstAbsolute.toExponential(1)}, ${worstRelative.toExponential(1)} relative ${worstAt}`;
    console.log(`${topic}: ${checked} of ${cases.length} cases, ${figures} figures checked, ${worst}`);
    expect(checked).toBe(cases.length);
  });
};
