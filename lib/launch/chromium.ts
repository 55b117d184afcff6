/** Debian's browser, which Playwright is pointed at. */
export const CHROMIUM = '/usr/bin/chromium';

/** Flags with which it runs as root, without a screen and without calling home. */
export const CHROMIUM_FLAGS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];
