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
    const day = this.formats.dayOf(this.now());
    await this.calls.copy(cardId, { id, name: $localize`Rates of ${day}:day:` });
    await this.router.navigate(['/rates', id]);
  }
}
