import { writeFileSync } from 'node:fs';
import { type Browser, chromium, type Page } from '@playwright/test';
import { hashPassword } from '@/lib/auth/passwords';
import { addMember, createCompany } from '@/lib/auth/provision';
import type { Bench } from '@/lib/launch/bench';
import { CHROMIUM, CHROMIUM_FLAGS } from '@/lib/launch/chromium';
import { machine, quantile, tenth } from './machine';
import { fillCompany } from './many-records';
import { changeScope, loadScreen, type ScreenLoad } from './screen-probe';

const RECORDS = 100_000;
const CHANGES = 30;
const LOADS = 3;
const SCREENS = ['/trends', '/technicians', '/sites', '/appliances', '/flags', '/records'];
const PASSWORD = 'a bench and a gauge';

const signIn = async (browser: Browser, address: string, email: string) => {
  const context = await browser.newContext({ viewport: { width: 1280, height: 900 }, locale: 'en-US' });
  const page = await context.newPage();
  await page.goto(`${address}/sign-in`);
  await page.getByLabel('E-mail').fill(email);
  await page.getByLabel('Password').fill(PASSWORD);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
  await page.close();
  return context;
};

/** One technician after the other, each a scope that this browser has not asked for yet. */
const changeTechnicians = async (page: Page) => {
  const changes = [];
  for (let n = 1; n <= CHANGES; n++) {
    await page.getByRole('button', { name: 'all technicians', exact: true }).click();
    await page.getByPlaceholder('Find a technician').fill(`Technician ${n}`);
    await page
      .getByRole('option', { name: new RegExp(`^Technician ${n}\\b`) })
      .first()
      .click();
    const show = page.getByRole('button', { name: 'Show', exact: true });
    changes.push(await changeScope(page, () => show.click()));
    await page.getByRole('button', { name: 'Clear', exact: true }).first().click();
  }
  return changes;
};

/** What a person waits for in a browser: script, first paint and shifts of each screen, and a change of scope on Trends. */
export const run = async ({ database, served }: Bench): Promise<void> => {
  const companyId = await createCompany(`bench pages`);
  const email = 'bench@pages.example';
  await addMember(companyId, { email, name: 'Bench', role: 'owner', passwordHash: await hashPassword(PASSWORD) });
  await fillCompany(database.urls.admin, companyId, RECORDS);
  const browser = await chromium.launch({ executablePath: CHROMIUM, args: CHROMIUM_FLAGS });
  const context = await signIn(browser, served.address, email);
  const screens = [];
  for (const screen of SCREENS) {
    const loads: ScreenLoad[] = [];
    for (let n = 0; n <= LOADS; n++) {
      const page = await context.newPage();
      const load = await loadScreen(page, `${served.address}${screen}`);
      // The first load of a screen warms the server.
      if (n > 0) loads.push(load);
      await page.close();
    }
    const worst = (of: 'scriptKb' | 'layoutShift') => Math.max(...loads.map((load) => load[of]));
    screens.push({
      screen,
      scriptKb: tenth(worst('scriptKb')),
      firstPaintMs: tenth(
        quantile(
          loads.map(({ firstPaintMs }) => firstPaintMs),
          0.5,
        ),
      ),
      layoutShift: Math.round(worst('layoutShift') * 1e4) / 1e4,
    });
  }
  for (const { screen, scriptKb, firstPaintMs, layoutShift } of screens)
    console.log(`${screen}: ${scriptKb} kB of script, first paint ${firstPaintMs} ms, layout shift ${layoutShift}`);
  const page = await context.newPage();
  await loadScreen(page, `${served.address}/trends`);
  const changes = await changeTechnicians(page);
  await browser.close();
  const times = changes.map(({ ms }) => ms);
  const scopeChange = {
    changes: CHANGES,
    medianMs: tenth(quantile(times, 0.5)),
    p95Ms: tenth(quantile(times, 0.95)),
    layoutShift: Math.round(Math.max(...changes.map(({ shift }) => shift)) * 1e4) / 1e4,
  };
  console.log(`change of scope on /trends: ${JSON.stringify(scopeChange)}`);
  const result = { measuredOn: new Date().toISOString(), machine: machine(), records: RECORDS, screens, scopeChange };
  writeFileSync('tests/bench/pages.json', `${JSON.stringify(result, null, 2)}\n`);
};
