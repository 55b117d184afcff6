import type { Page, Route } from '@playwright/test';
import type { Role } from '@/lib/vocabulary';

/** In which state a screen is pictured: who looks, and what becomes of the figures that the page asks for. */
export type State = {
  name: string;
  role: Role | 'newcomer' | null;
  prepare?: (page: Page) => Promise<unknown>;
  /** Whether the page can come to rest, or waits for ever. */
  rests: boolean;
};

// Sign-in answers as ever; only figures are held back.
const FIGURES = /\/api\/(?!auth|health)/;

const onFigures = (handle: (route: Route) => Promise<void>) => (page: Page) =>
  page.route(FIGURES, (route) => (route.request().method() === 'GET' ? handle(route) : route.continue()));

const refuse = (route: Route) =>
  route.fulfill({
    status: 503,
    contentType: 'application/problem+json',
    body: JSON.stringify({
      type: 'about:blank',
      title: 'Service Unavailable',
      status: 503,
      detail: 'Try again later.',
    }),
  });

/** Every state that a screen can be in. */
export const STATES: readonly State[] = [
  { name: 'full', role: 'owner', rests: true },
  { name: 'empty', role: 'newcomer', rests: true },
  { name: 'loading', role: 'owner', rests: false, prepare: onFigures(() => new Promise(() => undefined)) },
  { name: 'failed', role: 'owner', rests: true, prepare: onFigures(refuse) },
  { name: 'no-right', role: 'technician', rests: true },
  { name: 'signed-out', role: null, rests: true },
  { name: 'print', role: 'owner', rests: true, prepare: (page) => page.emulateMedia({ media: 'print' }) },
];
