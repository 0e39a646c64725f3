import { DOCUMENT, Injectable, effect, inject, signal } from '@angular/core';

export const themeChoices = ['system', 'light', 'dark'] as const;
export type ThemeChoice = (typeof themeChoices)[number];

const storageKey = 'bolewright-theme';

/** Light, dark, or as the device has it: the one thing kept in the browser, since it says nothing about anybody. */
@Injectable({ providedIn: 'root' })
export class Theme {
  private readonly document = inject(DOCUMENT);
  private readonly chosen = signal<ThemeChoice>(this.kept());

  readonly choice = this.chosen.asReadonly();

  constructor() {
    effect(() => this.apply(this.chosen()));
  }

  choose(choice: ThemeChoice): void {
    this.chosen.set(choice);
  }

  private kept(): ThemeChoice {
    const kept = this.document.defaultView?.localStorage.getItem(storageKey);
    return themeChoices.find((choice) => choice === kept) ?? 'system';
  }

  private apply(choice: ThemeChoice): void {
    const storage = this.document.defaultView?.localStorage;
    if (choice === 'system') {
      storage?.removeItem(storageKey);
      this.document.documentElement.removeAttribute('data-theme');
    } else {
      storage?.setItem(storageKey, choice);
      this.document.documentElement.setAttribute('data-theme', choice);
    }
  }
}
