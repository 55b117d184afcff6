import { readFileSync } from 'node:fs';
import { beforeAll, describe, expect, test } from 'vitest';
import { type ReadFile, readFile, refusedCodes } from '@/tests/support/read-recovery-file';

const fixture = (name: string) => readFileSync(new URL(`../../fixtures/sample-company/${name}`, import.meta.url));

/** What a row says, without how it was typed; refused rows by line and codes. */
const meaning = ({ rows }: ReadFile, leave: readonly string[] = []) =>
  rows.map((parsed) => {
    if (!parsed.ok) return { line: parsed.line, codes: parsed.reasons.map(({ code }) => code) };
    const { entered, massUnit, ...row } = parsed.row;
    return { ...row, ...Object.fromEntries(leave.map((field) => [field, null])) };
  });

let plain: ReadFile;
beforeAll(async () => {
  plain = await readFile(fixture('nasty/plain.csv'));
});

describe('the same 400 rows in the shapes that offices send', () => {
  test('plain.csv is read without a question', () => {
    expect(plain.plan.reading.questions).toEqual([]);
    expect(plain.plan.rowsTotal).toBe(400);
    // Line 82 says 0.82 lb where the scale says 8.2; line 318 has a negative mass and the end below the start.
    expect(refusedCodes(plain)).toEqual([
      [82, ['weights_disagree']],
      [318, ['negative_mass', 'end_below_start']],
    ]);
  });

  test.each([
    ['bom-semicolon-decimal-comma.csv', 'utf-8', ';'],
    ['utf16-tab.txt', 'utf-16le', '\t'],
    ['pounds-ounces.csv', 'utf-8', ','],
  ])('%s says the same as plain.csv', async (name, encoding, delimiter) => {
    const file = await readFile(fixture(`nasty/${name}`));
    expect(file.plan.reading.questions).toEqual([]);
    expect(file.plan.reading.encoding?.value).toBe(encoding);
    expect(file.plan.reading.delimiter?.value).toBe(delimiter);
    expect(meaning(file)).toEqual(meaning(plain));
  });

  test.each([
    ['day-month-year.csv', 'dmy'],
    ['month-day-year.csv', 'mdy'],
  ])('%s says the same but for the time of day', async (name, order) => {
    const file = await readFile(fixture(`nasty/${name}`));
    expect(file.plan.reading.questions).toEqual([]);
    expect(file.plan.reading.columns.find((c) => c.field === 'recovered_at')?.dateOrder?.value).toBe(order);
    expect(meaning(file, ['recoveredAt'])).toEqual(meaning(plain, ['recoveredAt']));
  });

  test('windows-1252-names.csv says the same but for its letters', async () => {
    const file = await readFile(fixture('nasty/windows-1252-names.csv'));
    expect(file.plan.reading.encoding?.value).toBe('windows-1252');
    expect(meaning(file, ['technician'])).toEqual(meaning(plain, ['technician']));
    const names = new Set(file.rows.map((parsed) => (parsed.ok ? parsed.row.technician : '')));
    expect(names).toContain('Mörgan Gomez');
    expect([...names].join('')).not.toContain('\ufffd');
  });

  test('entered cells stay as they were typed', async () => {
    const file = await readFile(fixture('nasty/pounds-ounces.csv'));
    const [first] = file.rows;
    expect(first?.ok && first.row.entered).toMatchObject({ nameplate_charge: '8-3.2', mass_unit: 'lb-oz' });
  });
});

describe('ten years of records', () => {
  test('all are taken but the 15 whose own figures contradict each other', async () => {
    const file = await readFile(fixture('recoveries.csv'));
    expect(file.plan.rowsTotal).toBe(4053);
    // Counted apart from this code, by a script: ten rows where end less start is not the recovered mass, five below zero.
    const refused = refusedCodes(file);
    expect(refused.filter(([, codes]) => codes.join() === 'weights_disagree')).toHaveLength(10);
    expect(refused.filter(([, codes]) => codes.includes('negative_mass'))).toHaveLength(5);
    expect(refused).toHaveLength(15);
  });

  test('a refused row names both numbers', async () => {
    const refused = plain.rows.find(({ line }) => line === 82);
    expect(refused?.ok === false && refused.reasons[0]?.message).toBe(
      'By the weights 8.2 lb were recovered, by the recovered mass 0.82 lb.',
    );
  });
});
