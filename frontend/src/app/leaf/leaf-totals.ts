import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { LeafCoverage } from '#shared/leaf/leaf-coverage';
import type { LeafPurchase } from '#shared/leaf/leaf-purchase';
import type { Triple } from '#shared/units/triple';
import type { Reason } from '#shared/words/reason';
import { Formats } from '../core/formats/formats';
import type { Explained } from '../ui/figure/explained';
import { smallScreen } from '../ui/screen/small-screen';
import type { FigureColumn } from '../ui/table/figure-column';
import { FigureTable } from '../ui/table/figure-table';

/** All leaf of one product; what is bought and what it costs only where the reader may know. */
export interface LeafOfProduct {
  readonly productId: string;
  readonly name: string;
  readonly netLeaves: number;
  readonly grossLeaves: Triple;
  readonly grossLeaves_p10: number;
  readonly grossLeaves_p90: number;
  readonly booklets: number;
  readonly coverage: LeafCoverage;
  readonly mass_grams: number;
  readonly reasons: readonly Reason[];
  readonly purchase: LeafPurchase | null;
  readonly cost_minor: number | null;
}

type Column = FigureColumn<LeafOfProduct>;

function singly(booklets: number): string[] {
  if (booklets === 0) return [];
  return [booklets === 1 ? $localize`a single booklet` : $localize`${booklets}:booklets: single booklets`];
}

/** The leaf of a whole estimate, product by product: leaves, booklets, packs, how it covers, how much metal it is. */
@Component({
  selector: 'app-leaf-totals',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      i18n-caption
      caption="Leaf of the whole job"
      [columns]="columns()"
      [rows]="products()"
      [rowId]="idOf"
    />
  `,
})
export class LeafTotals {
  private readonly formats = inject(Formats);
  private readonly isSmall = smallScreen();

  readonly products = input.required<readonly LeafOfProduct[]>();

  private readonly isInches = computed(() => this.formats.lengthUnit() === 'in');

  protected readonly idOf = (product: LeafOfProduct) => product.productId;
  protected readonly columns = computed<readonly Column[]>(() => [
    { key: 'name', heading: $localize`Leaf`, kind: 'text', text: ({ name }) => name, minor: (row) => this.minor(row) },
    {
      key: 'leaves',
      heading: $localize`Leaves`,
      kind: 'figure',
      text: ({ grossLeaves }) => this.formats.number(grossLeaves.likely, 1, 1),
      minor: (row) => this.range(row),
      explained: (row) => this.explained(row),
    },
    {
      key: 'booklets',
      heading: $localize`Booklets`,
      kind: 'figure',
      text: ({ booklets }) => this.formats.number(booklets, 0),
    },
    ...(this.isSmall() ? [] : this.coverage()),
    ...this.cost(),
  ]);

  private coverage(): Column[] {
    return [
      {
        key: 'gross',
        heading: $localize`Leaf ÷ surface`,
        kind: 'figure',
        text: ({ coverage }) => this.formats.number(coverage.grossToNet, 2, 2),
        minor: ({ coverage }) => $localize`${this.formats.percent(coverage.loss_percent, 0)}:loss: lost, lapped`,
      },
      {
        key: 'each',
        heading: this.isInches() ? $localize`Leaves per ft²` : $localize`Leaves per m²`,
        kind: 'figure',
        text: ({ coverage }) => this.leavesPer(coverage, this.isInches()),
        minor: ({ coverage }) => this.perArea(coverage, !this.isInches()),
      },
      {
        key: 'metal',
        heading: $localize`Metal`,
        kind: 'figure',
        text: ({ mass_grams }) => this.formats.figure('grams', mass_grams),
      },
    ];
  }

  private leavesPer({ leavesPerFt2, leavesPerM2 }: LeafCoverage, isFoot: boolean): string {
    return isFoot ? this.formats.number(leavesPerFt2, 1) : this.formats.number(leavesPerM2, 0);
  }

  private perArea(coverage: LeafCoverage, isFoot: boolean): string {
    const leaves = this.leavesPer(coverage, isFoot);
    return isFoot ? $localize`${leaves}:leaves: per ft²` : $localize`${leaves}:leaves: per m²`;
  }

  private cost(): Column[] {
    if (!this.products().some(({ cost_minor }) => cost_minor !== null)) return [];
    const text = ({ cost_minor }: LeafOfProduct) => (cost_minor === null ? '' : this.formats.money(cost_minor));
    return [{ key: 'cost', heading: $localize`Cost`, kind: 'figure', text }];
  }

  private range({ grossLeaves_p10, grossLeaves_p90 }: LeafOfProduct): string {
    const [low, high] = [grossLeaves_p10, grossLeaves_p90].map((leaves) => this.formats.number(leaves, 0));
    return $localize`${low}:low: to ${high}:high:`;
  }

  /** What is bought; on a phone with what its columns leave out. */
  private minor(row: LeafOfProduct): string {
    const { coverage, mass_grams } = row;
    const figures = [
      $localize`${this.formats.number(coverage.grossToNet, 2, 2)}:ratio: times the surface`,
      this.perArea(coverage, this.isInches()),
      this.formats.figure('grams', mass_grams),
    ];
    return [this.bought(row), ...(this.isSmall() ? figures : [])].filter(Boolean).join(' · ');
  }

  /** “1 pack of 20, 16 single booklets”. */
  private bought({ purchase }: LeafOfProduct): string {
    if (!purchase) return '';
    const packs = purchase.packs.map(({ booklets, count }) =>
      count === 1
        ? $localize`a pack of ${booklets}:booklets:`
        : $localize`${count}:count: packs of ${booklets}:booklets:`,
    );
    return [...packs, ...singly(purchase.singles)].join(', ');
  }

  private explained({ productId, grossLeaves, reasons }: LeafOfProduct): Explained {
    return { id: `leaf ${productId}`, heading: this.formats.figure('leaves', grossLeaves.likely), reasons };
  }
}
