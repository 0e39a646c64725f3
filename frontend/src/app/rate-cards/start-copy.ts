import { Injectable, inject } from '@angular/core';
import { Router } from '@angular/router';
import { newId } from '../core/new-id';
import { NOW } from '../core/now';
import { Formats } from '../core/formats/formats';
import { RateCardCalls } from './rate-card-calls';

/** Begins a draft from a card and opens it. */
@Injectable({ providedIn: 'root' })
export class StartCopy {
  private readonly calls = inject(RateCardCalls);
  private readonly router = inject(Router);
  private readonly formats = inject(Formats);
  private readonly now = inject(NOW);

  async of(cardId: string): Promise<void> {
    const id = newId();
    await this.calls.copy(cardId, { id, name: await this.freeName() });
    await this.router.navigate(['/rates', id]);
  }

  /** After the day; a second of the same day is numbered. */
  private async freeName(): Promise<string> {
    const day = this.formats.dayOf(this.now());
    const { items } = await this.calls.list(undefined, new AbortController().signal);
    const taken = new Set(items.map(({ name }) => name));
    const names = Array.from({ length: taken.size + 1 }, (_, place) =>
      place === 0 ? $localize`Rates of ${day}:day:` : $localize`Rates of ${day}:day:, ${place + 1}:number:`,
    );
    return names.find((name) => !taken.has(name)) ?? names[0];
  }
}
