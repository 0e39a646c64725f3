import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { cardDifferences } from '#shared/rate-cards/card-differences';
import type { WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { CardStore } from './card-store';
import { DifferenceList } from '../changes/difference-list';

/** Somebody else kept this draft meanwhile: what differs, and which side is to stand. */
@Component({
  selector: 'app-card-conflict',
  imports: [DifferenceList, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'alert' },
  template: `
    <h2 i18n>Somebody else changed this draft meanwhile</h2>
    <p i18n>Before each arrow stands what is kept now, after it what was entered here.</p>
    @if (content(); as mine) {
      <app-difference-list [differences]="differences()" [before]="theirs().content" [after]="mine" />
    }
    <div class="actions">
      <button matButton="outlined" type="button" (click)="mine.emit()" i18n>Keep mine</button>
      <button matButton type="button" (click)="taken.emit()" i18n>Take what is kept now</button>
    </div>
  `,
  styles: `
    :host {
      display: grid;
      gap: 12px;
      padding: 16px;
      border-left: 3px solid var(--warn);
      background: var(--tint);
    }
  `,
})
export class CardConflict {
  private readonly store = inject(CardStore);

  readonly theirs = input.required<WholeRateCard>();
  readonly mine = output();
  readonly taken = output();

  protected readonly content = this.store.content;
  protected readonly differences = computed(() => {
    const mine = this.content();
    return mine ? cardDifferences(this.theirs().content, mine) : [];
  });
}
