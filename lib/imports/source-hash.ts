import { createHash } from 'node:crypto';
import type { Stated } from './record-columns';
import type { RecoveryRow } from './rows';

/**
 * Fingerprint of what a row states: the same row again, in whatever spelling, units of writing or order of columns,
 * has the same one. Numbers are compared as numbers: `8.20` states what `8.2` does.
 */
export const sourceHash = (row: RecoveryRow, { columns, names }: Stated): string => {
  const hash = createHash('sha256');
  const state = (key: string, value: string | null) => hash.update(`${key}\u0001${value ?? '\u0000'}\u0002`);
  for (const { column, value, type } of columns) state(column, plain(value(row), type));
  for (const { name, value } of names) state(name, value(row));
  for (const header of Object.keys(row.extra).sort()) state(`extra ${header}`, row.extra[header] ?? null);
  return hash.digest('base64url');
};

const plain = (value: string | null, type: string) =>
  value !== null && (type.startsWith('numeric') || type === 'float8') && value.includes('.')
    ? value.replace(/\.?0+$/, '')
    : value;
