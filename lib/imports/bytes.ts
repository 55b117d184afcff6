import type { OpenFile } from './rows';

/** The first `size` bytes of a file, fewer when it is shorter. */
export const firstBytes = async (open: OpenFile, size: number): Promise<Uint8Array> => {
  const pieces: Uint8Array[] = [];
  let length = 0;
  for await (const chunk of open()) {
    pieces.push(chunk);
    length += chunk.length;
    if (length >= size) break;
  }
  return Buffer.concat(pieces).subarray(0, size);
};

const MAGIC: readonly (readonly [name: string, bytes: readonly number[]])[] = [
  ['a PNG picture', [0x89, 0x50, 0x4e, 0x47]],
  ['a JPEG picture', [0xff, 0xd8, 0xff]],
  ['a GIF picture', [0x47, 0x49, 0x46, 0x38]],
  ['a PDF', [0x25, 0x50, 0x44, 0x46]],
  ['a compressed file', [0x1f, 0x8b]],
  ['an old Excel file (.xls)', [0xd0, 0xcf, 0x11, 0xe0]],
];
const ZIP = [0x50, 0x4b, 0x03, 0x04];

const startsWith = (bytes: Uint8Array, magic: readonly number[]) => magic.every((byte, i) => bytes[i] === byte);

/** Whether the bytes begin as a zip archive does, which every .xlsx file is. */
export const isZip = (bytes: Uint8Array): boolean => startsWith(bytes, ZIP);

/** What kind of foreign file the bytes begin as, or null. */
export const foreignKind = (bytes: Uint8Array): string | null =>
  MAGIC.find(([, magic]) => startsWith(bytes, magic))?.[0] ?? null;

/** Share of bytes that no text has: control characters other than tab, line ends and form feed. */
export const controlShare = (bytes: Uint8Array): number => {
  let controls = 0;
  for (const byte of bytes) if (byte < 9 || (byte > 13 && byte < 32)) controls += 1;
  return bytes.length ? controls / bytes.length : 0;
};
