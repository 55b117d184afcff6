import { firstBytes } from './bytes';
import type { Encoding } from './layout';
import type { OpenFile } from './rows';
import { countText } from './text';

export type Evidenced<Value> = { value: Value; evidence: string };

const SAMPLE = 64 * 1024;

const byMark = (bytes: Uint8Array): Encoding | null => {
  if (bytes[0] === 0xef && bytes[1] === 0xbb && bytes[2] === 0xbf) return 'utf-8';
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return 'utf-16le';
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return 'utf-16be';
  return null;
};

/**
 * UTF-16 without a mark: Latin text has a zero in every second byte, on the even places when the high byte comes
 * first. Null when the zeros show no such order.
 */
export const utf16ByZeros = (bytes: Uint8Array): 'utf-16le' | 'utf-16be' | null => {
  const zeros = [0, 0];
  bytes.forEach((byte, i) => {
    if (byte === 0) zeros[i % 2] = (zeros[i % 2] ?? 0) + 1;
  });
  const [even = 0, odd = 0] = zeros;
  const pairs = Math.floor(bytes.length / 2);
  if (odd > pairs * 0.7 && even < pairs * 0.1) return 'utf-16le';
  if (even > pairs * 0.7 && odd < pairs * 0.1) return 'utf-16be';
  return null;
};

/** Letters beyond ASCII in the file read as UTF-8, and places where that reading breaks; stops at nothing. */
const countUtf8 = async (open: OpenFile): Promise<{ letters: number; broken: number }> => {
  const decoder = new TextDecoder('utf-8');
  const count = { letters: 0, broken: 0 };
  const add = (text: string) => {
    const foreign = text.match(/[\u0080-\uffff]/g)?.length ?? 0;
    const broken = foreign ? (text.match(/\ufffd/g)?.length ?? 0) : 0;
    count.letters += foreign - broken;
    count.broken += broken;
  };
  for await (const chunk of open()) add(decoder.decode(chunk, { stream: true }));
  add(decoder.decode());
  return count;
};

/**
 * How the file's letters are encoded, and why. A byte order mark decides; then zeros that show UTF-16; then whether the
 * whole file is valid UTF-8. What is not is Windows-1252, unless most letters beyond ASCII do read as UTF-8: then the
 * file is a damaged UTF-8 one, and the rows with lost letters are refused later.
 */
export const detectEncoding = async (open: OpenFile): Promise<Evidenced<Encoding>> => {
  const head = await firstBytes(open, SAMPLE);
  const marked = byMark(head);
  if (marked) return { value: marked, evidence: 'The file begins with the byte order mark of this encoding.' };
  const wide = utf16ByZeros(head);
  if (wide) return { value: wide, evidence: 'Every second byte is zero, as in UTF-16.' };
  const { letters, broken } = await countUtf8(open);
  if (broken === 0) {
    const evidence = letters ? 'The whole file is valid UTF-8.' : 'The file has only plain letters (ASCII).';
    return { value: 'utf-8', evidence };
  }
  if (letters > broken)
    return { value: 'utf-8', evidence: `Nearly all of it is valid UTF-8; ${countText(broken)} letters are damaged.` };
  return { value: 'windows-1252', evidence: `${countText(broken)} bytes are no valid UTF-8, but are letters here.` };
};
