import { InjectionToken } from '@angular/core';
import type { Catalogue } from '#shared/words/word-code';

/** The words of the person's language, loaded by `main.ts` before the application itself. */
export const CATALOGUE = new InjectionToken<Catalogue>('CATALOGUE');
