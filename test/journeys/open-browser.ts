import { chromium, type Browser } from 'playwright-core';

/** What keeps Chromium to itself: it asks nobody but us. */
const quiet = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** The browser of journeys and benchmarks, without a window. */
export const openBrowser = (): Promise<Browser> =>
  chromium.launch({ executablePath: '/usr/bin/chromium-headless-shell', args: quiet });
