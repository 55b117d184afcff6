// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeAll, beforeEach, expect, test, vi } from 'vitest';
import { StackedMonthsFigure } from '@/components/charts/stacked-months-figure';

const opened = vi.fn<(path: string) => void>();
vi.mock('next/navigation', () => ({ useRouter: () => ({ push: opened }) }));

const months = ['2026-09', '2026-10', '2026-11'].map((month, index) => ({
  month,
  values: { 'layer-0': index + 1 },
  total: index + 1,
  yearBefore: null,
  unfinished: false,
}));

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
  render(
    <StackedMonthsFigure
      label="Recovered mass by month"
      layers={[{ id: 'layer-0', name: 'R-22', colour: 'green' }]}
      months={months}
      wordsOf={(month) => `${month} in words`}
      recordsOf={(month) => `/records?from=${month}`}
    />,
  );
});
afterEach(cleanup);

const slider = () => screen.getByRole('slider', { name: 'Recovered mass by month' });
const press = (key: string) => fireEvent.keyDown(slider(), { key });

test('one tab stop says the month it stands on, and arrows move it', () => {
  expect(slider().tabIndex).toBe(0);
  press('ArrowLeft');
  expect(slider().getAttribute('aria-valuetext')).toBe('2026-11 in words');
  press('ArrowLeft');
  expect(slider().getAttribute('aria-valuetext')).toBe('2026-10 in words');
  press('Home');
  press('ArrowLeft');
  expect(slider().getAttribute('aria-valuenow')).toBe('1');
  press('End');
  expect(slider().getAttribute('aria-valuetext')).toBe('2026-11 in words');
});

test('Enter opens the records of the month that is read, Escape lets go of it', () => {
  press('Enter');
  expect(opened).not.toHaveBeenCalled();
  press('Home');
  expect(screen.getByRole('link', { name: 'Open the records' }).getAttribute('href')).toBe('/records?from=2026-09');
  press('Enter');
  expect(opened).toHaveBeenCalledExactlyOnceWith('/records?from=2026-09');
  press('Escape');
  expect(screen.queryByRole('link', { name: 'Open the records' })).toBeNull();
});
