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

/** What takes a fifth of its work off it, where nobody takes the time: scripts that run once are not worth making fast. */
export const unhurried = ['--js-flags=--no-opt --no-maglev', '--in-process-gpu'];

/** The browser of journeys and benchmarks, without a window. */
export const openBrowser = (further: readonly string[] = []): Promise<Browser> =>
  chromium.launch({ executablePath: '/usr/bin/chromium-headless-shell', args: [...quiet, ...further] });
