import AxeBuilder from '@axe-core/playwright';
import type { Page } from '@playwright/test';
import { findPages } from '../support/discover';
import { expect, test } from './support';

/** WCAG 2.2, levels A and AA, as axe-core names them. */
const WCAG = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

const findFaults = async (page: Page): Promise<string[]> => {
  const { violations } = await new AxeBuilder({ page }).withTags(WCAG).analyze();
  return violations.map(
    ({ id, help, nodes }) => `${id}: ${help} (${nodes.map(({ target }) => target.join(' ')).join(', ')})`,
  );
};

/** Where the ids of pages about one thing come from. */
const LISTS: Record<string, { list: string; idOf: string }> = {
  '/records': { list: '/api/recoveries?limit=1', idOf: 'id' },
  '/imports': { list: '/api/imports?limit=1', idOf: 'id' },
  '/sites': { list: '/api/sites', idOf: 'siteId' },
  '/technicians': { list: '/api/technicians', idOf: 'technicianId' },
  '/appliances': { list: '/api/appliances', idOf: 'applianceId' },
};

/** The address of a page, ids taken from the demo company. Of the hundreds of sites and appliances a month's are enough. */
const addressOf = async (page: Page, path: string): Promise<string> => {
  if (path === '/sites' || path === '/appliances') {
    const { lastMonth } = await (await page.request.get('/api/scope-options')).json();
    return `${path}?from=${lastMonth}&to=${lastMonth}`;
  }
  if (!path.includes('[')) return path;
  const { list, idOf } = LISTS[path.slice(0, path.indexOf('/', 1))] ?? { list: '', idOf: 'id' };
  const { items } = await (await page.request.get(list)).json();
  return path.replace(/\[\w+\]/, items[0][idOf]);
};

/** Goes to a page and waits until its figures are there. */
const open = async (page: Page, path: string): Promise<void> => {
  await page.goto(await addressOf(page, path));
  await expect(page.getByRole('heading', { level: 1 })).toBeVisible();
  // Places held for what is still being read or drawn, and figures that are about to be replaced.
  await expect(page.getByRole('status').filter({ hasText: /^(Reading|Drawing)/ })).toHaveCount(0);
  await expect(page.locator('[aria-busy=true]')).toHaveCount(0);
};

// A long table takes axe-core a while.
test.describe.configure({ timeout: 120_000 });

const INSIDE = findPages('(app)');

test('the pages of the application are found on disk', () => {
  expect(INSIDE).toContain('/trends');
  expect(INSIDE.length).toBeGreaterThanOrEqual(6);
});

for (const scheme of ['light', 'dark'] as const) {
  test.describe(`in ${scheme}`, () => {
    test.use({ colorScheme: scheme });

    test('the door has no barrier', async ({ page }) => {
      await open(page, '/sign-in');
      expect(await findFaults(page)).toEqual([]);
    });

    test.describe('signed in', () => {
      test.use({ role: 'owner' });
      for (const path of INSIDE)
        test(`${path} has no barrier`, async ({ page }) => {
          await open(page, path);
          expect(await findFaults(page)).toEqual([]);
        });
    });
  });
}

test.describe('on the narrowest phone', () => {
  // 320 CSS pixels is what WCAG 2.2, 1.4.10 Reflow, asks a page to fit into without scrolling in two directions.
  test.use({ role: 'owner', viewport: { width: 320, height: 640 } });
  for (const path of INSIDE)
    test(`${path} does not scroll sideways`, async ({ page }) => {
      await open(page, path);
      const overflow = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      expect(overflow).toBeLessThanOrEqual(0);
      expect(await findFaults(page)).toEqual([]);
    });
});
