import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { STANDINGS } from '@/lib/glossary/term';
import { GLOSSARY, says, TERMS } from '@/lib/glossary/terms';

const terms = GLOSSARY.flatMap((part) => part.terms);

/** Terms that the screens use: `<Term id="…">`, and `term: '…'` of a column or row. */
const usedTerms = (): string[] =>
  readdirSync('components', { recursive: true, encoding: 'utf8' })
    .filter((file) => /\.tsx?$/.test(file))
    .flatMap((file) => [
      ...readFileSync(join('components', file), 'utf8').matchAll(/<Term\s[^>]*id="([^"]+)"|\bterm: '([^']+)'/g),
    ])
    .map(([, inMarkup, inData]) => inMarkup ?? inData ?? '');

test('every term has an address of its own', () => {
  expect(new Set(terms.map(({ id }) => id)).size).toBe(terms.length);
  for (const { id } of terms) expect(id).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
});

test.each(terms)('$name has a meaning and a source', ({ meaning, source }) => {
  expect(meaning).toMatch(/^[A-Z].{20,}[.]$/s);
  expect(STANDINGS).toContain(source.standing);
  expect(source.text.length).toBeGreaterThan(5);
  // A rule is named by its paragraph or section.
  if (source.standing === 'rule') expect(source.text).toMatch(/\b(CFR|USC)\b/);
});

test('every term that a screen uses is in the glossary', () => {
  const used = usedTerms();
  expect(used.length).toBeGreaterThan(10);
  expect(used.filter((id) => !TERMS.has(id))).toEqual([]);
});

test('words are found by their other names and whatever their letters’ case', () => {
  const found = (text: string) => terms.filter((term) => says(term, text)).map(({ id }) => id);
  expect(found('TARE')).toContain('tare-weight');
  expect(found('CO2e')).toContain('co2-equivalent');
  expect(found('no such word at all')).toEqual([]);
  expect(found(' ')).toHaveLength(terms.length);
});
