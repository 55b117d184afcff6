import fc from 'fast-check';
import iconv from 'iconv-lite';
import { describe, expect, test } from 'vitest';
import { massToKg } from '@/lib/units';
import { csvOf, openBytes, readFile, takenRows } from '@/tests/support/read-recovery-file';

const ENCODINGS = ['utf-8', 'utf-16le', 'utf-16be', 'windows-1252'] as const;
const DELIMITERS = [',', ';', '\t'] as const;

const pad = (number: number) => String(number).padStart(2, '0');
const DATES = {
  iso: (y: number, m: number, d: number) => `${y}-${pad(m)}-${pad(d)}`,
  dmy: (y: number, m: number, d: number) => `${pad(d)}/${pad(m)}/${y}`,
  mdy: (y: number, m: number, d: number) => `${m}/${d}/${y}`,
  dotted: (y: number, m: number, d: number) => `${d}.${m}.${y}`,
};

/** Hundredths of a unit, so that every number has an exact text. */
const written = (hundredths: number, unit: string, mark: string): string => {
  if (unit !== 'lb-oz') return `${Math.floor(hundredths / 100)}${mark}${pad(hundredths % 100)}`;
  return `${Math.floor(hundredths / 1600)}-${Math.floor((hundredths % 1600) / 100)}${mark}${pad(hundredths % 100)}`;
};

const record = fc.record({
  year: fc.integer({ min: 1980, max: 2025 }),
  month: fc.integer({ min: 1, max: 12 }),
  day: fc.integer({ min: 1, max: 28 }),
  nameplate: fc.integer({ min: 1, max: 500_000 }),
  recovered: fc.integer({ min: 0, max: 500_000 }),
  technician: fc.constantFrom('Uma Walsh', 'José Peña', 'O’Neil, "Red"', 'Zoë; jr.', 'Line\nbreak'),
});
const shape = fc.record({
  encoding: fc.constantFrom(...ENCODINGS),
  bom: fc.boolean(),
  delimiter: fc.constantFrom(...DELIMITERS),
  mark: fc.constantFrom('.', ','),
  dates: fc.constantFrom(...(Object.keys(DATES) as (keyof typeof DATES)[])),
  unit: fc.constantFrom('lb', 'oz', 'lb-oz', 'kg', 'g' as const),
});

describe('any record in any shape', () => {
  test('reads back to the same kilograms and days, or asks', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(record, { minLength: 1, maxLength: 12 }), shape, async (records, how) => {
        const rows = records.map((r) => ({
          technician: r.technician,
          recovered_at: DATES[how.dates](r.year, r.month, r.day),
          nameplate_charge: written(r.nameplate, how.unit, how.mark),
          recovered_mass: written(r.recovered, how.unit, how.mark),
          mass_unit: how.unit,
        }));
        const bytes = iconv.encode(csvOf(rows, [], how.delimiter), how.encoding, { addBOM: how.bom });
        const file = await readFile(bytes);
        const dated = how.dates !== 'iso' && records.every(({ day }) => day <= 12);
        expect(file.plan.reading.questions.length > 0).toBe(dated && records.some(({ day, month }) => day !== month));
        if (file.plan.reading.questions.length) return;
        expect(takenRows(file)).toMatchObject(
          records.map((r) => ({
            technician: r.technician.replace('\n', ' '),
            recoveredOn: DATES.iso(r.year, r.month, r.day),
            nameplateChargeKg: massToKg(written(r.nameplate, how.unit, '.'), how.unit),
            recoveredMassKg: massToKg(written(r.recovered, how.unit, '.'), how.unit),
          })),
        );
      }),
      { numRuns: 150 },
    );
  });
});

describe('bytes in any pieces', () => {
  const text = csvOf(
    Array.from({ length: 40 }, (_, i) => ({
      technician: `José “Pepe” 😀 ${i}`,
      notes: i % 3 ? `say ""${i}"",\r\nand\rmore` : '"',
    })),
  );

  test.each(ENCODINGS.slice(0, 3))('%s', async (encoding) => {
    const bytes = iconv.encode(text, encoding, { addBOM: true });
    const whole = await readFile(bytes);
    expect(whole.rows).toHaveLength(40);
    expect(takenRows(whole)[1]?.technician).toBe('José “Pepe” 😀 1');
    await fc.assert(
      fc.asyncProperty(fc.integer({ min: 1, max: 300 }), async (size) => {
        const pieces = await readFile(openBytes(bytes, size));
        expect(pieces).toEqual(whole);
      }),
      { numRuns: 15 },
    );
  });
});
