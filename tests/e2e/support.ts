import { test as base, type ConsoleMessage, expect, type Locator, type Page } from '@playwright/test';
import type { Role } from '../../lib/vocabulary';
import { signInByRequest } from './sign-in';

export { expect };

type SignIn = { role: string; email: string; password: string };

/** The demo's people, as `npm start` prints them. */
const SIGN_INS: SignIn[] = JSON.parse(process.env.E2E_SIGN_INS ?? '[]');

/** A role of the demo company, somebody in both demo companies, or the manager of a company without a record. */
export type Who = Role | 'two firms' | 'newcomer';

/** How somebody signs in. */
export const signInOf = (role: Who): SignIn => {
  const found = SIGN_INS.find((one) => one.role === role);
  if (!found) throw new Error(`The demo has no ${role}: run the browser tests by npm test -- e2e.`);
  return found;
};

/** What a browser says that it should not: errors of scripts, of the content policy, of React. */
const watch = (page: Page): string[] => {
  const faults: string[] = [];
  page.on('pageerror', (error) => faults.push(`${page.url()}: ${error.message}`));
  page.on('console', (message: ConsoleMessage) => {
    if (message.type() === 'error' || message.type() === 'warning') faults.push(`${page.url()}: ${message.text()}`);
  });
  return faults;
};

type State = Awaited<ReturnType<typeof signInByRequest>>;
type Options = { role: Who | null; faults: string[] };

/**
 * A test whose browser is signed in as `role` from the start (`test.use({ role })`), and which fails when the browser's
 * console has anything to complain about. A test that expects a refusal empties `faults` itself.
 */
export const test = base.extend<Options, { stateOf: (role: Who) => Promise<State> }>({
  role: [null, { option: true }],
  stateOf: [
    async ({ playwright }, use) => {
      const kept = new Map<string, Promise<State>>();
      await use((role) => {
        const state = kept.get(role) ?? signInByRequest(playwright, signInOf(role));
        kept.set(role, state);
        return state;
      });
    },
    { scope: 'worker' },
  ],
  storageState: async ({ role, stateOf }, use) => {
    await use(role ? await stateOf(role) : undefined);
  },
  faults: [
    async ({ page }, use) => {
      const faults = watch(page);
      await use(faults);
      expect(faults, 'the browser’s console').toEqual([]);
    },
    { auto: true },
  ],
});

/** A table by its name, which stands on the part that scrolls around it. */
export const tableOf = (page: Page, name: string | RegExp): Locator =>
  page.getByRole('group', { name }).getByRole('table');
