import { Injectable, computed, inject } from '@angular/core';
import { isDay } from '#shared/calendar/day';
import { say } from '#shared/words/say';
import type { WordCode, WordValues } from '#shared/words/word-code';
import { CATALOGUE } from './catalogue';
import { Formats } from './formats';

/** Words the codes that calculators, complaints and the server use, with figures as the workshop writes them. */
@Injectable({ providedIn: 'root' })
export class Words {
  private readonly catalogue = inject(CATALOGUE);
  private readonly formats = inject(Formats);
  private readonly worded = computed(() => say(this.catalogue, this.formats.values()));

  say(code: WordCode, values: WordValues = {}): string {
    return this.worded()(code, this.readable(values));
  }

  /** Days travel as they are kept, and are read as the workshop writes them. */
  private readable(values: WordValues): WordValues {
    const read = (value: WordValues[string]) =>
      typeof value === 'string' && isDay(value) ? this.formats.day(value) : value;
    return Object.fromEntries(Object.entries(values).map(([name, value]) => [name, read(value)]));
  }
}
