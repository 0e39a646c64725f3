import { ChangeDetectionStrategy, Component, computed, effect, inject, input } from '@angular/core';
import { cardParts } from '#shared/rate-cards/tables/card-parts';
import { Words } from '../core/formats/words';
import type { PageTitle } from '../core/routing/page-title';
import { EmptyState } from '../ui/page/empty-state';
import { TitleStrategy } from '@angular/router';
import { CardStore } from './card/card-store';
import { CardForm } from './cells/card-form';
import { CardGrid } from './cells/card-grid';
import { CardList } from './cells/card-list';
import { ProfitWays } from './profit-ways';

/** One part of a rate card: its lists, grids and single figures. */
@Component({
  selector: 'app-card-part-page',
  imports: [CardForm, CardGrid, CardList, EmptyState, ProfitWays],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './card-part-page.html',
  styleUrl: './card-part-page.scss',
})
export class CardPartPage {
  private readonly words = inject(Words);
  private readonly title = inject(TitleStrategy) as PageTitle;
  protected readonly store = inject(CardStore);

  readonly partId = input.required<string>();

  private readonly part = computed(() => cardParts.find(({ id }) => id === this.partId()));
  protected readonly heading = computed(() => {
    const part = this.part();
    return part ? this.words.say(part.heading) : '';
  });
  /** What stands in the rows of another table is shown with those rows. */
  protected readonly tables = computed(() =>
    (this.part()?.tables ?? [])
      .filter((table) => table.kind !== 'list' || table.within === undefined)
      .map((table) => ({ table, heading: this.words.say(table.heading) })),
  );

  constructor() {
    effect(() => this.title.name(this.heading()));
  }
}
