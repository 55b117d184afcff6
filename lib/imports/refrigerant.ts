import { cleanText, listWords } from './text';

const PREFIX = /^(?:refrigerant|hcfc|hfc|hfo|cfc|hc|r)(?=\d)/;

const fold = (text: string): string =>
  cleanText(text)
    .toLowerCase()
    .replace(/[\s_.-]+/g, '')
    .replace(PREFIX, '');

const keysOf = new WeakMap<ReadonlySet<string>, Map<string, string>>();

/** Designations by their folded text; two that fold to one are left out, since a cell could mean either. */
const catalogueKeys = (catalogue: ReadonlySet<string>): Map<string, string> => {
  const known = keysOf.get(catalogue);
  if (known) return known;
  const keys = new Map<string, string>();
  const doubled = new Set<string>();
  for (const designation of catalogue) {
    const key = fold(designation);
    if (keys.has(key)) doubled.add(key);
    keys.set(key, designation);
  }
  for (const key of doubled) keys.delete(key);
  keysOf.set(catalogue, keys);
  return keys;
};

/** The catalogue's designation for what a cell says (`R410A`, `410a`, `r 410 a`, `HFC-134a`), or null. */
export const refrigerantOf = (text: string, catalogue: ReadonlySet<string>): string | null =>
  catalogue.has(text) ? text : (catalogueKeys(catalogue).get(fold(text)) ?? null);

/** Why a refrigerant is refused, naming what may have been meant where the number begins like one in the catalogue. */
export const refrigerantSentence = (text: string, catalogue: ReadonlySet<string>): string => {
  const digits = /\d{2,}/.exec(text)?.[0];
  const near = digits ? [...catalogue].filter((d) => d.startsWith(`R-${digits}`)) : [];
  const hint = near.length ? ` Was ${listWords(near, 'or')} meant?` : '';
  return `“${text}” is no refrigerant of the catalogue.${hint}`;
};
