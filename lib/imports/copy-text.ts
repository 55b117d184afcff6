/** Text that PostgreSQL can keep: no NUL, no half of a surrogate pair. */
export const storable = (text: string): string => text.toWellFormed().replaceAll('\0', '\uFFFD');

const ESCAPES: Record<string, string> = { '\\': '\\\\', '\t': '\\t', '\n': '\\n', '\r': '\\r' };
/** Most values have none of these, and an import writes millions of values. */
const NEEDS_CARE = /[\\\t\n\r\0\uD800-\uDFFF]/;

/** One value in COPY's text format (PostgreSQL 15, COPY, "Text Format"). */
export const copyValue = (value: string | number | null): string => {
  if (value === null) return '\\N';
  const text = String(value);
  if (!NEEDS_CARE.test(text)) return text;
  return storable(text).replace(/[\\\t\n\r]/g, (character) => ESCAPES[character] ?? '');
};

/** A line of COPY's text format. */
export const copyLine = (values: readonly (string | number | null)[]): string =>
  `${values.map(copyValue).join('\t')}\n`;

/** How JSON writes a NUL and half surrogates; a jsonb column refuses both. */
const REFUSED_BY_JSONB = /\\u(?:0000|d[89a-f])/;

/** JSON for a jsonb column. */
export const copyJson = (value: unknown): string => {
  const json = JSON.stringify(value);
  if (!REFUSED_BY_JSONB.test(json)) return json;
  return JSON.stringify(value, (_key, inner: unknown) => (typeof inner === 'string' ? storable(inner) : inner));
};
