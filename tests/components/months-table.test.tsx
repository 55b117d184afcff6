// @vitest-environment jsdom
import { cleanup, render, screen, within } from '@testing-library/react';
import { afterEach, expect, test } from 'vitest';
import { toStacks } from '@/analytics/monthly-trends/series';
import { EVERY_RECORD } from '@/analytics/scope-address';
import { ModelTable } from '@/components/charts/model-table';
import { monthsModel } from '@/components/trends/months-model';
import { trendsOf } from '../support/trends';

afterEach(cleanup);

const scope = { ...EVERY_RECORD, from: '2025-11', branch: ['East'], unit: 'lb' as const };
const stacks = toStacks(
  trendsOf(
    [
      // 1 lb = 0.45359237 kg.
      ['2025-11', 'R-410A', 45.359],
      ['2026-11', 'R-410A', 90.718],
      ['2026-11', 'R-22', 4.536],
      ['2026-12', 'R-22', 1],
    ],
    { partialMonth: '2026-12' },
  ),
);

const rows = () => {
  render(<ModelTable model={monthsModel(stacks, 'refrigerant', scope, {})} label="Recovered mass by month" />);
  return within(screen.getByRole('table'))
    .getAllByRole('row')
    .map((row) => [...row.children].map((cell) => cell.textContent?.replaceAll('\u2011', '-')));
};

test('the newest month comes first, units stand in the headers, the running month says so', () => {
  const [head, running, november, october] = rows();
  expect(head).toEqual([
    'Month',
    'R-410A, lb',
    'R-22, lb',
    'All, lb',
    'Against the year before',
    'Recoveries',
    'Median yield',
  ]);
  expect(running?.slice(0, 4)).toEqual(['Dec 2026so far', '–', '2.2', '2.2']);
  expect(november?.slice(0, 5)).toEqual(['Nov 2026', '200.0', '10.0', '210.0', '+110%']);
  expect(october).toEqual(['Oct 2026', '–', '–', '0.0', '—', '0', '—']);
});

test('a running month is not compared with a whole one', () => {
  const running = rows()[1];
  expect(running?.[4]).toBe('—');
});

test('a figure leads to its own records and to no others', () => {
  rows();
  const link = screen.getByRole('link', { name: '10.0' });
  const address = new URL(link.getAttribute('href') ?? '', 'http://tarebook.test');
  expect(Object.fromEntries(address.searchParams)).toEqual({
    open: 'recoveredMass',
    'open.month': '2026-11',
    'open.branch': 'East',
    'open.refrigerant': 'R-22',
  });
});
