const END = 0x06054b50;
const ENTRY = 0x02014b50;

/**
 * Bytes that a zip archive says it unpacks to, from its central directory (APPNOTE.TXT 4.3.12); null when it has none.
 * Read before unpacking, so that a small file can't blow up.
 */
export const unpackedSize = (zip: Buffer): number | null => {
  const from = Math.max(0, zip.length - 65_557);
  let end = zip.length - 22;
  while (end >= from && zip.readUInt32LE(end) !== END) end -= 1;
  if (end < from) return null;
  let at = zip.readUInt32LE(end + 16);
  let total = 0;
  while (at + 46 <= end && zip.readUInt32LE(at) === ENTRY) {
    total += zip.readUInt32LE(at + 24);
    at += 46 + zip.readUInt16LE(at + 28) + zip.readUInt16LE(at + 30) + zip.readUInt16LE(at + 32);
  }
  return total;
};
