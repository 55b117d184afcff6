import { mkdir } from 'node:fs/promises';
import { join } from 'node:path';
import type { Browser, BrowserContext, Page } from '@playwright/test';
import { findPages } from '../support/discover';
import type { State } from './states';

export const THEMES = ['light', 'dark'] as const;
export const WIDTHS = [390, 1280, 1680] as const;

/** One picture of the gallery. */
export type Picture = { screen: string; state: string; theme: (typeof THEMES)[number]; width: number };

const GROUPS = { inside: '(app)', door: '(door)' } as const;
// How long figures, pictures and fonts get to come to rest.
const PATIENCE_MS = 15_000;

/** The screens of a state: the door for who is not signed in, all others for the rest. */
export const screensOf = (state: State): string[] => findPages(state.role ? GROUPS.inside : GROUPS.door);

/** File name of a picture. */
export const fileOf = ({ screen, state, theme, width }: Picture): string =>
  `${screen === '/' ? 'start' : screen.slice(1).replaceAll(/\W+/g, '-').replace(/-$/, '')}.${state}.${theme}.${width}.png`;

const LISTS: Record<string, string> = {
  '/records': '/api/recoveries?limit=1',
  '/imports': '/api/imports?limit=1',
  '/appliances': '/api/appliances',
  '/sites': '/api/sites',
  '/technicians': '/api/technicians',
};

const idOf = (item: Record<string, unknown>): string =>
  String(item.id ?? item.applianceId ?? item.siteId ?? item.technicianId);

/** The address of a screen with the id of the first thing that it could show, or null where the company has none. */
const addressOf = async (context: BrowserContext, address: string, screen: string): Promise<string | null> => {
  if (!screen.includes('[')) return screen;
  const list = LISTS[screen.slice(0, screen.indexOf('/', 1))];
  if (!list) return null;
  const { items = [] } = await (await context.request.get(address + list)).json();
  return items.length ? screen.replace(/\[\w+\]/, idOf(items[0])) : null;
};

/** A window as high as the page: pictures are drawn when they are seen, and what is fixed stands at its edges. */
const growToPage = async (page: Page, width: number): Promise<void> => {
  const height = await page.evaluate(() => document.documentElement.scrollHeight);
  await page.setViewportSize({ width, height: Math.max(height, page.viewportSize()?.height ?? 0) });
  await page.waitForTimeout(500);
};

/** Waits until nothing is being read or drawn; a page that never gets there is pictured as it is. */
const comeToRest = async (page: Page, width: number): Promise<void> => {
  const busy = page.getByRole('status').filter({ hasText: /^(Reading|Drawing)/ });
  const settled = () =>
    busy
      .first()
      .waitFor({ state: 'hidden', timeout: PATIENCE_MS })
      .catch(() => undefined);
  await page.waitForLoadState('networkidle', { timeout: PATIENCE_MS }).catch(() => undefined);
  await settled();
  await growToPage(page, width);
  await settled();
  await growToPage(page, width);
};

type Visit = {
  browser: Browser;
  address: string;
  folder: string;
  cookies: Awaited<ReturnType<BrowserContext['cookies']>>;
};

/** Takes the picture of one screen in one state; gives whether there was something to take. */
export const take = async ({ browser, address, folder, cookies }: Visit, picture: Picture, state: State) => {
  const context = await browser.newContext({
    colorScheme: picture.theme,
    viewport: { width: picture.width, height: picture.width < 600 ? 844 : 900 },
    locale: 'en-US',
    timezoneId: 'America/New_York',
    reducedMotion: 'reduce',
  });
  try {
    await context.addCookies(cookies);
    const path = await addressOf(context, address, picture.screen);
    if (!path) return false;
    const page = await context.newPage();
    await state.prepare?.(page);
    await page.goto(address + path, { waitUntil: 'domcontentloaded' });
    if (state.rests) await comeToRest(page, picture.width);
    else await page.waitForTimeout(1500);
    await mkdir(folder, { recursive: true });
    await page.screenshot({ path: join(folder, fileOf(picture)), fullPage: true, animations: 'disabled' });
    return true;
  } finally {
    await context.close();
  }
};
