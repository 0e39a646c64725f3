import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { PriceCost, PriceLines as Lines } from '#shared/estimates/price/price';
import { Formats } from '../../core/formats/formats';
import { FigureTable } from '../../ui/table/figure-table';
import { lineColumns } from './line-columns';
import { lineRows, type LineRow } from './line-rows';
import { PriceNames } from './price-names';
import { PriceSums } from './price-sums';
import { smallScreen } from '../../ui/screen/small-screen';

/** The lines of a price by member or by kind of work, with the cost side for those who may see it, and what they come to. */
@Component({
  selector: 'app-price-lines',
  imports: [FigureTable, PriceSums],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      i18n-caption
      caption="Lines of the price"
      [columns]="columns()"
      [rows]="rows()"
      [rowId]="rowId"
      [isHead]="isHead()"
    />
    <app-price-sums [price]="price()" [taxName]="taxName()" />
  `,
  styles: `
    :host {
      display: grid;
      gap: 8px;
      min-width: 0;
    }
  `,
})
export class PriceLines {
  private readonly formats = inject(Formats);
  private readonly names = inject(PriceNames);
  private readonly isSmall = smallScreen();

  readonly price = input.required<Lines>();
  readonly cost = input<PriceCost>();
  readonly memberNames = input.required<ReadonlyMap<string, string>>();
  readonly presentation = input.required<'members' | 'kinds'>();
  /** Only what each section comes to. */
  readonly sumsOnly = input(false);
  readonly taxName = input<(taxCategoryId: string) => string>(() => '');

  protected readonly columns = computed(() =>
    lineColumns(this.formats, { withCost: this.cost() !== undefined, isSmall: this.isSmall() }),
  );
  protected readonly rows = computed(() => this.allRows().filter(({ isHead }) => isHead || !this.sumsOnly()));
  private readonly allRows = computed(() =>
    lineRows(
      {
        lines: this.price().lines,
        costs: this.cost()?.lines,
        memberName: this.names.memberOf(this.memberNames()),
        memberOrder: [...this.memberNames().keys()],
        kindName: (kind) => this.names.kind(kind),
      },
      this.presentation(),
    ),
  );
  protected readonly rowId = ({ id }: LineRow): string => id;
  /** Sums that stand alone are plain lines. */
  protected readonly isHead = computed(() => (this.sumsOnly() ? undefined : ({ isHead }: LineRow): boolean => isHead));
}
