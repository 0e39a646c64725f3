import type { Page } from 'playwright-core';
import { expectInTime } from './expect-in-time';

const go = (path: string): string =>
  `history.pushState(null, '', ${JSON.stringify(path)}); dispatchEvent(new PopStateEvent('popstate', { state: null }));`;

/** Goes to another page of the application that is open already, as somebody who goes back and forth; that it opens anew is tried elsewhere. */
export async function moveTo(page: Page, path: string): Promise<void> {
  const { pathname, search } = new URL(page.url());
  if (pathname + search === path) return;
  await page.evaluate(go(path));
  // The router writes down there which move it was, when the page is there.
  await expectInTime(() => page.evaluate<boolean>('Boolean(history.state?.navigationId)'), true);
}
