import { writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import { chromium } from '@playwright/test';
import config from '@/playwright.config';
import { indexPage } from './index-page';
import { type Picture, screensOf, THEMES, take, WIDTHS } from './pictures';
import { STATES, type State } from './states';

type SignIn = { role: string; email: string; password: string };

/** What narrows the gallery: parts of screens' addresses, states, themes, widths. Nothing given is all. */
export type Wanted = { screen?: string[]; state?: string[]; theme?: string[]; width?: string[] };

const wants = (list: string[] | undefined, value: string) => !list?.length || list.includes(value);

const picturesOf = (state: State, wanted: Wanted): Picture[] =>
  screensOf(state)
    .filter((screen) => !wanted.screen?.length || wanted.screen.some((part) => screen.includes(part)))
    .flatMap((screen) =>
      THEMES.filter((theme) => wants(wanted.theme, theme)).flatMap((theme) =>
        WIDTHS.filter((width) => wants(wanted.width, String(width))).map((width) => ({
          screen,
          state: state.name,
          theme,
          width,
        })),
      ),
    );

/** Pictures of every screen × state × theme × width into `folder`, with a page that shows them all. Gives how many. */
export const makeGallery = async (address: string, signIns: SignIn[], folder: string, wanted: Wanted) => {
  const browser = await chromium.launch(config.use?.launchOptions);
  const taken: Picture[] = [];
  try {
    for (const state of STATES.filter(({ name }) => wants(wanted.state, name))) {
      const signIn = signIns.find(({ role }) => role === state.role);
      const cookies = signIn ? await cookiesOf(browser, address, signIn) : [];
      for (const picture of picturesOf(state, wanted))
        if (await take({ browser, address, folder, cookies }, picture, state)) taken.push(picture);
    }
  } finally {
    await browser.close();
  }
  await writeFile(join(folder, 'index.html'), indexPage(taken));
  return taken.length;
};

const cookiesOf = async (browser: Awaited<ReturnType<typeof chromium.launch>>, address: string, signIn: SignIn) => {
  const context = await browser.newContext({ baseURL: address });
  const { csrfToken } = await (await context.request.get('/api/auth/csrf')).json();
  await context.request.post('/api/auth/callback/credentials', {
    form: { csrfToken, email: signIn.email, password: signIn.password, json: 'true', callbackUrl: address },
  });
  const cookies = await context.cookies();
  await context.close();
  return cookies;
};
