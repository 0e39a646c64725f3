import type { Page } from 'playwright-core';

/** How wide the page is, and whether it is light or dark. */
export interface Screen {
  readonly width: number;
  readonly height: number;
  readonly dark?: boolean;
  /** By fingers instead of a mouse. */
  readonly touch?: boolean;
}

export const desk: Screen = { width: 1440, height: 900 };
export const phone: Screen = { width: 360, height: 780 };

/** The four everything is looked at on: the narrowest that must do (WCAG 1.4.10) and a desk, in both themes. */
export const screens: readonly (readonly [string, Screen])[] = [
  ['at a desk by day', { width: 1280, height: 800 }],
  ['at a desk by night', { width: 1280, height: 800, dark: true }],
  ['on a small phone by day', { width: 320, height: 640 }],
  ['on a small phone by night', { width: 320, height: 640, dark: true }],
];

/** Turns the open page to another screen, as somebody does who narrows their window or darkens their room. */
export async function turnTo(page: Page, { width, height, dark = false }: Screen): Promise<void> {
  await page.setViewportSize({ width, height });
  await page.emulateMedia({ colorScheme: dark ? 'dark' : 'light', reducedMotion: 'reduce' });
  await page.waitForTimeout(120);
}
