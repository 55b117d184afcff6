import iconv from 'iconv-lite';
import type { Encoding } from './layout';
import type { OpenFile } from './rows';

// A line end or a letter of two units whose other half is still to come.
const HALF = /[\r\ud800-\udbff]$/;

/** One kind of line end, no zero characters and no halves of letters: neither can be kept in a database. */
const plain = (text: string): string => text.replace(/\r\n?/g, '\n').replaceAll('\0', '').toWellFormed();

/**
 * The file's text in pieces, without byte order mark and with `\n` as its only line end. Bytes may come in pieces of
 * any size: letters and line ends cut in two are put together.
 */
export async function* decodeText(open: OpenFile, encoding: Encoding): AsyncGenerator<string, void, void> {
  const decoder = iconv.getDecoder(encoding, { stripBOM: true });
  let held = '';
  for await (const chunk of open()) {
    const text = held + decoder.write(Buffer.from(chunk.buffer, chunk.byteOffset, chunk.byteLength));
    held = HALF.test(text) ? text.slice(-1) : '';
    const piece = plain(held ? text.slice(0, -1) : text);
    if (piece) yield piece;
  }
  const rest = plain(held + (decoder.end() ?? ''));
  if (rest) yield rest;
}
