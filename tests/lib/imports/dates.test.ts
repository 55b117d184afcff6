import { describe, expect, test } from 'vitest';
import { csvOf, readFile, refusedCodes, takenRows } from '@/tests/support/read-recovery-file';

const withDates = (...dates: string[]) => csvOf(dates.map((recovered_at) => ({ recovered_at })));
const daysOf = async (...dates: string[]) =>
  takenRows(await readFile(withDates(...dates))).map(({ recoveredOn }) => recoveredOn);

describe('dates', () => {
  test('one day beyond twelve decides the order of the whole column', async () => {
    expect(await daysOf('03/04/2015', '13/04/2015')).toEqual(['2015-04-03', '2015-04-13']);
    expect(await daysOf('03/04/2015', '04/13/2015')).toEqual(['2015-03-04', '2015-04-13']);
  });

  test('points, hyphens and named months are read', async () => {
    expect(await daysOf('13.4.2015', '3-4-2015', '5-Jan-2015', 'January 6, 2015', '2015/01/07', '20150108')).toEqual([
      ...['2015-04-13', '2015-04-03', '2015-01-05', '2015-01-06', '2015-01-07', '2015-01-08'],
    ]);
  });

  test('two-digit years lie between 1980 and today, where only one century fits', async () => {
    expect(await daysOf('1/31/99', '2/28/15')).toEqual(['1999-01-31', '2015-02-28']);
  });

  test('an order that stays open is asked, and nothing is taken', async () => {
    const file = await readFile(withDates('03/04/2015', '05/06/2015'));
    expect(file.plan.reading.questions).toMatchObject([
      {
        about: 'dateOrder',
        header: 'recovered_at',
        choices: [
          { value: 'dmy', label: 'Day, month, year: “03/04/2015” is April 3, 2015' },
          { value: 'mdy', label: 'Month, day, year: “03/04/2015” is March 4, 2015' },
        ],
      },
    ]);
    expect(refusedCodes(file)).toEqual([
      [2, ['not_decided']],
      [3, ['not_decided']],
    ]);
  });

  test('the same number for day and month leaves nothing to ask', async () => {
    expect(await daysOf('03/03/2015', '05/05/2015')).toEqual(['2015-03-03', '2015-05-05']);
  });

  test('dates that contradict each other are asked too; the answer refuses the others', async () => {
    const file = withDates('13/04/2015', '04/13/2015');
    expect((await readFile(file)).plan.reading.questions).toHaveLength(1);
    const told = await readFile(file, { dateOrders: { recovered_at: 'dmy' } });
    expect(told.plan.reading.questions).toEqual([]);
    expect(refusedCodes(told)).toEqual([[3, ['not_a_date']]]);
  });

  test('what was said for the same headers before answers an open column, and yields to proof', async () => {
    const before = { dateOrders: { recovered_at: 'dmy' as const } };
    const open = await readFile(withDates('03/04/2015'), {}, before);
    expect(takenRows(open)[0]?.recoveredOn).toBe('2015-04-03');
    const proof = await readFile(withDates('03/04/2015', '03/14/2015'), {}, before);
    expect(takenRows(proof)[0]?.recoveredOn).toBe('2015-03-04');
  });

  test('a time of day gives an instant in the company’s zone', async () => {
    const [plain, afternoon, utc, skipped] = takenRows(
      await readFile(withDates('2015-07-01T11:06:00', '7/31/2015 1:06 PM', '2015-07-01T02:30:00Z', '2015-03-08 02:30')),
    );
    expect(plain?.recoveredAt).toBe('2015-07-01T11:06:00-04:00');
    expect(afternoon?.recoveredAt).toBe('2015-07-31T13:06:00-04:00');
    // 02:30 UTC is still the evening before in New York.
    expect(utc).toMatchObject({ recoveredOn: '2015-06-30', recoveredAt: '2015-06-30T22:30:00-04:00' });
    // That hour did not exist: clocks went from 2:00 to 3:00 (15 USC 260a).
    expect(skipped?.recoveredAt).toBe('2015-03-08T03:30:00-04:00');
  });

  test.each([
    ['2015-02-29', 'not_a_date'],
    ['2015-13-01', 'not_a_date'],
    ['2015-01-13T25:00', 'not_a_date'],
    ['42005', 'not_a_date'],
    ['yesterday', 'not_a_date'],
    ['', 'missing'],
    ['n/a', 'missing'],
    ['2026-12-02', 'date_in_future'],
    ['1979-12-31', 'date_too_early'],
  ])('“%s” is refused: %s', async (recovered_at, code) => {
    expect(refusedCodes(await readFile(csvOf([{ recovered_at }, {}])))).toEqual([[2, [code]]]);
  });

  test('today is taken', async () => {
    expect(await daysOf('2026-12-01', '2026-12-01T23:59')).toEqual(['2026-12-01', '2026-12-01']);
  });
});
