import type { Provider, Signal } from '@angular/core';
import { Formats } from './formats';
import { SHOWN_CURRENCY } from './shown-currency';
import { Words } from './words';

/** Providers of a page that is written in a currency of its own throughout: amounts, signs, explanations, entries. */
export const shownIn = (currency: () => Signal<string | undefined>): Provider[] => [
  { provide: SHOWN_CURRENCY, useFactory: currency },
  Formats,
  Words,
];
