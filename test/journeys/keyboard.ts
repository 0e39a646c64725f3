import type { Page } from 'playwright-core';

interface Stop {
  readonly name: string;
  readonly isShown: boolean;
}

/** What has the focus: how it is called, and whether it can be seen to have it (WCAG 2.4.7, 2.4.11). */
const stop = `(() => {
  const one = document.activeElement;
  const frame = one.closest('app-field, label')?.querySelector('.frame, .box');
  const styles = [getComputedStyle(one), getComputedStyle(one, '::after'), ...(frame ? [getComputedStyle(frame)] : [])];
  const hasMark = styles.some(({ outlineStyle }) => outlineStyle !== 'none');
  const { top, bottom, left, right } = one.getBoundingClientRect();
  const isOnScreen = bottom > 0 && right > 0 && top < innerHeight && left < innerWidth;
  const name = one.labels?.[0]?.innerText ?? one.ariaLabel ?? one.innerText ?? '';
  const isWholePage = one === document.body || one.id === 'main';
  return { name: name.trim().replace(/\\s+/g, ' '), isShown: isWholePage || (isOnScreen && hasMark) };
})()`;

/** Somebody who has no mouse. */
export class Keyboard {
  /** What had the focus and could not be seen to have it. */
  readonly unseen: string[] = [];

  constructor(private readonly page: Page) {}

  /** Tabs until something of that name has the focus. */
  async to(name: RegExp): Promise<void> {
    const passed: string[] = [];
    for (let press = 0; press < 90; press++) {
      await this.page.keyboard.press('Tab');
      const at = await this.page.evaluate<Stop>(stop);
      if (!at.isShown) this.unseen.push(at.name);
      if (name.test(at.name)) return;
      passed.push(at.name);
    }
    throw new Error(`the keyboard does not reach ${String(name)}, only: ${passed.join(' · ')}`);
  }

  async follow(name: RegExp): Promise<void> {
    await this.to(name);
    await this.page.keyboard.press('Enter');
  }

  async enter(name: RegExp, text: string): Promise<void> {
    await this.to(name);
    await this.page.keyboard.press('Control+a');
    await this.page.keyboard.type(text);
  }
}
