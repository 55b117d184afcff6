import { describe, expect, test } from 'vitest';
import { answerTo, tellAnswer, tellField, tellShape, tellUnit } from '@/components/imports/tell';
import type { Question, Reading } from '@/lib/imports/contract';
import { profileFile } from '@/lib/imports/read-file';
import { CONTEXT, csvOf, openBytes, readFile } from '@/tests/support/read-recovery-file';

const readingOf = async (text: string): Promise<Reading> =>
  (await profileFile(openBytes(Buffer.from(text)), {}, null, CONTEXT)).reading;

describe('what a person tells about a file', () => {
  test('a column given to another field leaves its former one', async () => {
    const reading = await readingOf(csvOf([{ Crew: 'Uma' }]));
    const mapping = tellField({}, reading, 'technician', 'notes');
    expect(mapping.columns).toEqual({ technician: null, notes: 'technician' });
    expect(tellField(mapping, reading, 'Crew', 'technician').columns).toEqual({
      notes: 'technician',
      technician: 'Crew',
    });
    expect(tellField({}, reading, 'technician', null).columns).toEqual({ technician: null });
  });

  test('answering every question leaves none open', async () => {
    const text = csvOf(
      [{ Crew: 'Uma', recovered_at: '03/04/2015', recovered_mass: '1,234', final_vacuum: '10' }],
      ['technician', 'mass_unit'],
    );
    const reading = await readingOf(text);
    expect(reading.questions.map(({ about }) => about).sort()).toEqual([
      ...['columns', 'dateOrder', 'decimalMark', 'massUnit', 'vacuumUnit'],
    ]);
    const firstChoice = ({ choices }: Question) => choices[0]?.value ?? '';
    const mapping = reading.questions.reduce(
      (told, question) => tellAnswer(told, reading, question, firstChoice(question)),
      {},
    );
    for (const question of reading.questions) expect(answerTo(mapping, question)).toBe(firstChoice(question));
    const file = await readFile(text, mapping);
    expect(file.plan.reading.questions).toEqual([]);
    expect(file.rows.map(({ ok }) => ok)).toEqual([true]);
  });

  test('an empty choice takes back what was told', () => {
    expect(tellUnit({ massUnit: 'kg' }, 'massUnit', '')).toEqual({});
    expect(tellShape({ delimiter: ';', encoding: 'utf-8' }, 'delimiter', '')).toEqual({ encoding: 'utf-8' });
    expect(tellShape({}, 'encoding', 'morse')).toEqual({});
  });
});
