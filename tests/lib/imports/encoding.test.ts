import iconv from 'iconv-lite';
import { describe, expect, test } from 'vitest';
import { csvOf, readFile, refusedCodes, takenRows } from '@/tests/support/read-recovery-file';

const text = csvOf([{ technician: 'José Peña' }, { site: 'Café “Zoë” – 5 €' }]);

describe('letters', () => {
  test.each([
    ['UTF-8', iconv.encode(text, 'utf-8'), 'utf-8'],
    ['UTF-8 with a mark', iconv.encode(text, 'utf-8', { addBOM: true }), 'utf-8'],
    ['UTF-16, low byte first, with a mark', iconv.encode(text, 'utf-16le', { addBOM: true }), 'utf-16le'],
    ['UTF-16, low byte first, without a mark', iconv.encode(text, 'utf-16le'), 'utf-16le'],
    ['UTF-16, high byte first, with a mark', iconv.encode(text, 'utf-16be', { addBOM: true }), 'utf-16be'],
    ['UTF-16, high byte first, without a mark', iconv.encode(text, 'utf-16be'), 'utf-16be'],
    ['Windows-1252', iconv.encode(text, 'windows-1252'), 'windows-1252'],
  ])('%s is recognised', async (_name, bytes, encoding) => {
    const file = await readFile(bytes);
    expect(file.plan.reading.encoding?.value).toBe(encoding);
    const [first, second] = takenRows(file);
    expect(first?.technician).toBe('José Peña');
    expect(second?.site).toBe('Café “Zoë” – 5 €');
  });

  test('one letter spelled in two ways is one name', async () => {
    const rows = takenRows(
      await readFile(csvOf([{ technician: 'Jose\u0301  Pe\u00f1a ' }, { technician: 'José Peña' }])),
    );
    expect(new Set(rows.map((row) => row.technician)).size).toBe(1);
  });

  test('a letter lost before the file came refuses its row only', async () => {
    const bytes = Buffer.concat([
      iconv.encode(csvOf([{ technician: 'José' }, { technician: 'Peña' }]), 'utf-8'),
      Buffer.from('T-3,2015-01-13,Jos'),
      Buffer.from([0xe9]),
      Buffer.from(',S1,A1,R-22,8.2,4.4,lb\r\n'),
    ]);
    const file = await readFile(bytes);
    expect(file.plan.reading.encoding?.value).toBe('utf-8');
    expect(refusedCodes(file)).toEqual([[4, ['damaged_text']]]);
  });

  test('the person knows better than the evidence', async () => {
    const file = await readFile(iconv.encode(text, 'windows-1252'), { encoding: 'utf-8' });
    expect(file.plan.reading.encoding).toEqual({ value: 'utf-8', evidence: 'You said so.' });
    expect(refusedCodes(file)).toHaveLength(2);
  });
});
