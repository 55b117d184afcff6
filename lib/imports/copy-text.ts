/** Text that PostgreSQL can keep: no NUL, no half of a surrogate pair. */
export const storable = (text: string): string => text.toWellFormed().replaceAll('\0', '\uFFFD');

const ESCAPES: Record<string, string> = { '\\': '\\\\', '\t': '\\t', '\n': '\\n', '\r': '\\r' };

/** One value in COPY's text format (PostgreSQL 15, COPY, "Text Format"). */
export const copyValue = (value: string | number | null): string =>
  value === null ? '\\N' : storable(String(value)).replace(/[\\\t\n\r]/g, (character) => ESCAPES[character] ?? '');

/** A line of COPY's text format. */
export const copyLine = (values: readonly (string | number | null)[]): string =>
  `${values.map(copyValue).join('\t')}\n`;

/** JSON for a jsonb column, which refuses the escapes of NUL and of half surrogates. */
export const copyJson = (value: unknown): string =>
  JSON.stringify(value, (_key, inner: unknown) => (typeof inner === 'string' ? storable(inner) : inner));
