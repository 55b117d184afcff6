import type { Page } from '@playwright/test';

/** What a loading screen cost: script bytes as they came over the wire (compressed), paint and shifts of the layout. */
export type ScreenLoad = { scriptKb: number; firstPaintMs: number; layoutShift: number };

type Probe = { shift: number; asked: number; pending: number; from: number };
declare global {
  interface Window {
    probe: Probe;
  }
}

/**
 * Put into each page before its own scripts. Counts every shift of the layout but those that answer an input within
 * half a second (Layout Instability API), and the requests for figures that are under way.
 */
const install = () => {
  window.probe = { shift: 0, asked: 0, pending: 0, from: 0 };
  new PerformanceObserver((list) => {
    for (const entry of list.getEntries()) {
      const { value, hadRecentInput } = entry as PerformanceEntry & { value: number; hadRecentInput: boolean };
      if (!hadRecentInput) window.probe.shift += value;
    }
  }).observe({ type: 'layout-shift', buffered: true });
  const plain = window.fetch;
  window.fetch = async (...args) => {
    window.probe.asked += 1;
    window.probe.pending += 1;
    try {
      return await plain(...args);
    } finally {
      window.probe.pending -= 1;
    }
  };
};

/** Nothing is asked for, nothing shown is of the scope before, and what came has been painted. */
const painted = async (askedBefore: number): Promise<number> => {
  // No function with a name of its own in here: the loader would wrap it in a helper that the browser has not.
  const began = performance.now();
  for (;;) {
    await new Promise(requestAnimationFrame);
    const { asked, pending } = window.probe;
    const busy = document.querySelectorAll('main [aria-busy="true"]').length;
    if (asked > askedBefore && pending === 0 && busy === 0) break;
    if (performance.now() - began > 30_000)
      throw new Error(`The screen did not settle: ${asked - askedBefore} asked, ${pending} pending, ${busy} busy`);
  }
  await new Promise(requestAnimationFrame);
  await new Promise((resolve) => setTimeout(resolve));
  return performance.now();
};

/** Loads a screen as somebody who comes for the first time: nothing is kept by the browser. */
export const loadScreen = async (page: Page, address: string): Promise<ScreenLoad> => {
  const network = await page.context().newCDPSession(page);
  await network.send('Network.enable');
  await network.send('Network.setCacheDisabled', { cacheDisabled: true });
  const scripts = new Set<string>();
  let bytes = 0;
  network.on('Network.responseReceived', ({ requestId, type }) => type === 'Script' && scripts.add(requestId));
  network.on('Network.loadingFinished', ({ requestId, encodedDataLength }) => {
    if (scripts.has(requestId)) bytes += encodedDataLength;
  });
  await page.addInitScript(install);
  await page.goto(address, { waitUntil: 'networkidle' });
  const { firstPaintMs, layoutShift } = await page.evaluate(() => ({
    firstPaintMs: performance.getEntriesByName('first-contentful-paint')[0]?.startTime ?? Number.NaN,
    layoutShift: window.probe.shift,
  }));
  await network.detach();
  return { scriptKb: bytes / 1000, firstPaintMs, layoutShift };
};

/** From the press of a button that changes the scope to the paint of its figures, in ms, and the shifts on the way. */
export const changeScope = async (page: Page, press: () => Promise<void>): Promise<{ ms: number; shift: number }> => {
  const before = await page.evaluate(() => {
    addEventListener('pointerdown', () => (window.probe.from = performance.now()), { once: true, capture: true });
    return { asked: window.probe.asked, shift: window.probe.shift };
  });
  await press();
  const at = await page.evaluate(painted, before.asked);
  const { from, shift } = await page.evaluate(() => window.probe);
  return { ms: at - from, shift: shift - before.shift };
};
