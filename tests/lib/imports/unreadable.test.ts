import { deflateSync } from 'node:zlib';
import { describe, expect, test } from 'vitest';
import { sniffFile } from '@/lib/imports/read-file';
import { csvOf, readFile } from '@/tests/support/read-recovery-file';

const PNG = Buffer.concat([
  Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a, 0, 0, 0, 13]),
  deflateSync(Buffer.alloc(4_096, 7)),
]);
const random = Buffer.from(Array.from({ length: 2_000 }, (_, i) => (i * 7919 + (i >> 3)) % 256));

describe('what is no table is refused with a sentence', () => {
  test.each([
    ['an empty file', Buffer.alloc(0), 'is empty'],
    ['white space', Buffer.from(' \r\n\r\n  '), 'is empty'],
    ['a picture', PNG, 'is a PNG picture'],
    ['a PDF', Buffer.from('%PDF-1.7\n%âãÏÓ'), 'is a PDF'],
    ['an old Excel file', Buffer.from([0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1]), '.xls'],
    ['other bytes', random, 'is not a text file'],
    ['a zip that is no workbook', Buffer.from([0x50, 0x4b, 0x03, 0x04, 1, 2, 3]), 'cut off'],
    ['a line without columns', Buffer.from('hello\nworld\n'), 'has no columns'],
    ['a header alone', Buffer.from(csvOf([])), 'no rows below'],
    ['data without a header', Buffer.from('T-1,2015-01-13,Uma\nT-2,2015-01-14,Uma\n'), 'must name the columns'],
  ])('%s', async (_name, bytes, sentence) => {
    await expect(readFile(bytes)).rejects.toMatchObject({ status: 422, message: expect.stringContaining(sentence) });
  });

  test('the check at the upload refuses the same bytes and lets good ones pass', () => {
    expect(() => sniffFile(PNG, 'a.csv')).toThrow('is a PNG picture');
    expect(() => sniffFile(new Uint8Array(), 'a.csv')).toThrow('is empty');
    expect(() => sniffFile(random, 'a.csv')).toThrow('is not a text file');
    expect(() => sniffFile(Buffer.from(csvOf([{}])), 'a.csv')).not.toThrow();
    expect(() => sniffFile(Buffer.from(csvOf([{}]), 'utf16le'), 'a.csv')).not.toThrow();
  });

  test('missing columns that no other column could be are named', async () => {
    await expect(readFile('record_ref,technician,site\nT-1,Uma,S1\n')).rejects.toMatchObject({
      status: 422,
      message: 'No column holds date of the recovery, appliance, refrigerant, nameplate charge and recovered mass.',
    });
  });
});
