// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeAll, beforeEach, expect, test, vi } from 'vitest';
import type { Figure } from '@/analytics/figures/figure';
import { toStacks } from '@/analytics/monthly-trends/series';
import { EVERY_RECORD } from '@/analytics/scope-address';
import { StackedMonthsFigure } from '@/components/charts/stacked-months-figure';
import { monthsModel } from '@/components/trends/months-model';
import { trendsOf } from '../support/trends';

const opened = vi.fn<(figure: Figure) => void>();
vi.mock('@/components/figures/figure-page', () => ({
  useFigurePage: () => ({ hrefOf: ({ scope }: Figure) => `?open.month=${scope.from}`, open: opened }),
}));

const scope = { ...EVERY_RECORD, from: '2026-09', unit: 'kg' as const };
const model = monthsModel(
  toStacks(
    trendsOf([
      ['2026-09', 'R-22', 1],
      ['2026-10', 'R-22', 2],
      ['2026-11', 'R-22', 3],
    ]),
  ),
  'refrigerant',
  scope,
  {},
);
const words = (month: string) => model.months.find((one) => one.month === month)?.words;

beforeAll(() => {
  // jsdom measures nothing.
  vi.stubGlobal(
    'ResizeObserver',
    class {
      observe() {}
      unobserve() {}
      disconnect() {}
    },
  );
  vi.stubGlobal('matchMedia', () => ({ matches: false, addEventListener() {}, removeEventListener() {} }));
});
beforeEach(() => {
  opened.mockClear();
  render(<StackedMonthsFigure model={model} />);
});
afterEach(cleanup);

const slider = () => screen.getByRole('slider', { name: 'Recovered mass by month' });
const press = (key: string) => fireEvent.keyDown(slider(), { key });

test('one tab stop says the month it stands on, and arrows move it', () => {
  expect(slider().tabIndex).toBe(0);
  press('ArrowLeft');
  expect(slider().getAttribute('aria-valuetext')).toBe(words('2026-11'));
  press('ArrowLeft');
  expect(slider().getAttribute('aria-valuetext')).toBe(words('2026-10'));
  press('Home');
  press('ArrowLeft');
  expect(slider().getAttribute('aria-valuenow')).toBe('1');
  press('End');
  expect(slider().getAttribute('aria-valuetext')).toBe(words('2026-11'));
});

test('Enter opens the records of the month that is read, Escape lets go of it', () => {
  press('Enter');
  expect(opened).not.toHaveBeenCalled();
  press('Home');
  expect(screen.getByRole('link', { name: 'Open the records' }).getAttribute('href')).toBe('?open.month=2026-09');
  press('Enter');
  expect(opened).toHaveBeenCalledExactlyOnceWith({
    measure: 'recoveredMass',
    scope: expect.objectContaining({ from: '2026-09', to: '2026-09' }),
  });
  press('Escape');
  expect(screen.queryByRole('link', { name: 'Open the records' })).toBeNull();
});

test('what a pointer brought up stays when it leaves, and goes by Escape wherever the keyboard stands', () => {
  press('Home');
  fireEvent.pointerLeave(slider(), { pointerType: 'mouse' });
  expect(screen.getByRole('link', { name: 'Open the records' })).toBeTruthy();
  fireEvent.keyDown(document.body, { key: 'Escape' });
  expect(screen.queryByRole('link', { name: 'Open the records' })).toBeNull();
});
