import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { alternativeTally, type AlternativeTotal } from '#shared/estimates/alternative-total';
import type { PricedFigures } from '#shared/estimates/figures';
import type { Alternative } from '#shared/estimates/settings';
import { Formats } from '../../core/formats/formats';
import { smallScreen } from '../../ui/screen/small-screen';
import { FigureTable } from '../../ui/table/figure-table';
import { AlternativeCards } from '../price/alternative-cards';
import { AlternativeColumns } from '../price/alternative-columns';
import { type AlternativeRow, alternativeRows } from '../price/alternative-rows';
import { AlternativeSections } from '../price/alternative-sections';

/** The alternatives of an issue beside its base, as they were frozen: what each takes and comes to, and the sections it changes. */
@Component({
  selector: 'app-frozen-alternatives',
  imports: [AlternativeCards, AlternativeSections, FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (offered().length > 0) {
      <section class="part">
        <h3 i18n>Alternatives</h3>
        @if (isSmall()) {
          <app-alternative-cards [columns]="columns.figures()" [rows]="rows()" />
        } @else {
          <app-figure-table
            i18n-caption
            caption="Alternatives"
            [columns]="columns.all()"
            [rows]="rows()"
            [rowId]="rowId"
          />
        }
        @for (one of offered(); track one.id) {
          <app-alternative-sections [name]="one.name" [sections]="one.sections" />
        }
      </section>
    }
  `,
  styles: `
    .part {
      display: grid;
      gap: 16px;
      min-width: 0;
    }
  `,
})
export class FrozenAlternatives {
  protected readonly isSmall = smallScreen();

  readonly alternatives = input.required<readonly Alternative[]>();
  readonly totals = input.required<readonly AlternativeTotal[]>();
  readonly base = input.required<Pick<PricedFigures, 'price' | 'tally'>>();

  private readonly byId = computed(() => new Map(this.totals().map((total) => [total.id, total])));
  /** One with nothing in it was not offered. */
  protected readonly offered = computed(() =>
    this.alternatives()
      .filter(({ id }) => this.byId().has(id))
      .map((one) => ({ ...one, sections: this.byId().get(one.id)?.sections })),
  );
  private readonly baseTotal = computed(() => ({
    gross_minor: this.base().price.gross_minor,
    tally: alternativeTally(this.base()),
  }));
  protected readonly columns = new AlternativeColumns(inject(Formats), {
    base: this.baseTotal,
    groups: computed(() => this.offered().map(({ group }) => group)),
    seesPrices: signal(true),
    unknown: '–',
  });
  protected readonly rows = computed(() => alternativeRows(this.offered(), this.baseTotal(), this.byId()));
  protected readonly rowId = ({ id }: AlternativeRow): string => id;
}
