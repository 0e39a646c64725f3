import { ChangeDetectionStrategy, Component, computed, inject, input, output, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { CardSide } from '#shared/rate-cards/merged-values';
import type { WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { CardStore } from './card-store';
import { OverlapWriting } from './overlap-writing';

/** Somebody else kept the same lines of this draft meanwhile: both sides of each, and whose is to stand. */
@Component({
  selector: 'app-card-conflict',
  imports: [MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'alert' },
  templateUrl: './card-conflict.html',
  styleUrl: './card-conflict.scss',
})
export class CardConflict {
  private readonly store = inject(CardStore);
  private readonly writing = inject(OverlapWriting);

  readonly theirs = input.required<WholeRateCard>();
  readonly settled = output<(key: string) => CardSide>();

  protected readonly chosen = signal<ReadonlyMap<string, CardSide>>(new Map());
  protected readonly lines = computed(() => {
    const theirs = this.theirs();
    const merged = (sideOf: (key: string) => CardSide) => this.store.mergedWith(theirs, sideOf);
    const mine = merged(() => 'mine');
    return (mine?.overlaps ?? []).map((key) => {
      const other = merged((one) => (one === key ? 'theirs' : 'mine'));
      return this.writing.line(key, { mine: mine!.entries, theirs: other!.entries });
    });
  });
  protected readonly isWhole = computed(() => this.lines().every(({ key }) => this.chosen().has(key)));

  protected choose(key: string, side: CardSide): void {
    this.chosen.update((chosen) => new Map(chosen).set(key, side));
  }

  protected all(side: CardSide): void {
    this.chosen.set(new Map(this.lines().map(({ key }) => [key, side])));
  }

  protected settle(): void {
    const chosen = this.chosen();
    this.settled.emit((key) => chosen.get(key) ?? 'mine');
  }
}
