import { ChangeDetectionStrategy, Component, computed, inject } from '@angular/core';
import { minorOf } from '#shared/money/minor-of';
import { Formats } from '../../core/formats/formats';
import { laidAs, type LeafOfProduct, LeafTotals } from '../../leaf';
import { EmptyState } from '../../ui/page/empty-state';
import { smallScreen } from '../../ui/screen/small-screen';
import type { FigureColumn } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import { MemberSelection } from '../members/member-selection';
import { RestorationForm } from './restoration-form';

/** One zone of any member. */
interface ZoneOfJob {
  readonly zoneId: string;
  readonly memberId: string;
  readonly member: string;
  readonly zone: string;
  readonly buildUp: string;
  readonly laid: string;
  readonly area: string;
  readonly leaves: string;
  readonly hours: string;
  readonly recutting: string;
}

const figureColumns: readonly FigureColumn<ZoneOfJob>[] = [
  { key: 'buildUp', heading: $localize`Build-up`, kind: 'text', text: ({ buildUp }) => buildUp },
  { key: 'area', heading: $localize`True surface`, kind: 'figure', text: ({ area }) => area },
  { key: 'leaves', heading: $localize`Leaves`, kind: 'figure', text: ({ leaves }) => leaves },
  {
    key: 'hours',
    heading: $localize`Hands on, h`.replaceAll(' ', '\u00a0'),
    kind: 'figure',
    text: ({ hours }) => hours,
  },
  {
    key: 'recutting',
    heading: $localize`Recut, h`.replaceAll(' ', '\u00a0'),
    kind: 'figure',
    text: ({ recutting }) => recutting,
  },
];

/** The gilding of the whole job: leaf by product, and every zone. */
@Component({
  selector: 'app-whole-gilding',
  imports: [EmptyState, FigureTable, LeafTotals, RestorationForm],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    @if (rows().length > 0) {
      <header>
        <h2 i18n>Gilding of the whole job</h2>
      </header>
      <app-restoration-form />
      @if (products().length > 0) {
        <h3 i18n>Leaf</h3>
        <app-leaf-totals [products]="products()" />
      }
      <h3 i18n>Every zone</h3>
      <app-figure-table
        i18n-caption
        caption="Every zone"
        selectable
        [columns]="columns()"
        [rows]="rows()"
        [rowId]="idOf"
        [totals]="totals()"
        (chosenChange)="open($event)"
      />
    } @else {
      <app-empty-state
        icon="leaf"
        i18n-heading
        heading="Nothing is gilt yet"
        i18n-text
        text="Choose a member and give its zones their build-ups: leaf, hours, materials and drying follow from them."
      />
    }
  `,
  styleUrl: '../places/member-content.scss',
})
export class WholeGilding {
  private readonly formats = inject(Formats);
  private readonly store = inject(EstimateStore);
  private readonly selection = inject(MemberSelection);
  private readonly isSmall = smallScreen();

  protected readonly products = computed<readonly LeafOfProduct[]>(() => {
    const purchases = this.store.costed()?.cost.purchases ?? [];
    return (this.store.figures()?.leaf ?? []).map((leaf) => {
      const bought = purchases.find(({ head, itemId }) => head === 'leaf' && itemId === leaf.productId);
      const cost_minor = bought ? minorOf(bought.cost, this.formats.currencyDigits()) : null;
      return { ...leaf, purchase: bought?.leaf ?? null, cost_minor };
    });
  });
  protected readonly rows = computed<readonly ZoneOfJob[]>(() => {
    const figures = this.store.figures()?.zones ?? [];
    return this.store.members().flatMap((member) =>
      member.zones.flatMap((zone) => {
        const worked = figures.find(({ zoneId }) => zoneId === zone.id);
        if (!worked) return [];
        return [
          {
            ...{ zoneId: zone.id, memberId: member.id, member: member.name, zone: zone.name, buildUp: worked.buildUp },
            laid: worked.leaf ? laidAs(worked.leaf) : '',
            area: this.formats.area(worked.true_mm2),
            leaves: worked.leaf ? this.formats.number(worked.leaf.grossLeaves.likely, 1, 1) : '',
            hours: this.formats.number(worked.hours.likely, 1, 1),
            recutting: worked.recutting ? this.formats.number(worked.recutting.hours.likely, 1, 1) : '',
          },
        ];
      }),
    );
  });
  protected readonly idOf = ({ zoneId }: ZoneOfJob): string => zoneId;
  protected readonly totals = computed(() => {
    const { tally, zones } = this.store.figures() ?? {};
    const recut = zones?.reduce((sum, { recutting }) => sum + (recutting?.hours.likely ?? 0), 0) ?? 0;
    return {
      zone: $localize`Together`,
      hours: this.formats.number(tally?.handsOn_hours.likely ?? 0, 1, 1),
      recutting: recut > 0 ? this.formats.number(recut, 1, 1) : '',
    };
  });
  protected readonly columns = computed<readonly FigureColumn<ZoneOfJob>[]>(() => {
    const isRecut = this.rows().some(({ recutting }) => recutting !== '');
    const [buildUp, area, leaves, hours, recutting] = figureColumns;
    if (this.isSmall()) return [this.zone, leaves, hours];
    return [this.zone, buildUp, area, leaves, hours, ...(isRecut ? [recutting] : [])];
  });
  private readonly zone: FigureColumn<ZoneOfJob> = {
    key: 'zone',
    heading: $localize`Zone`,
    kind: 'text',
    text: ({ member, zone }) => `${member}, ${zone}`,
    minor: (row) => (this.isSmall() ? this.small(row) : row.laid),
  };

  protected open(zoneId: string | undefined): void {
    const row = this.rows().find((one) => one.zoneId === zoneId);
    if (row) this.selection.select(row.memberId);
  }
  /** What the columns of a phone leave out. */
  private small({ buildUp, laid, area, recutting }: ZoneOfJob): string {
    const recut = recutting && $localize`${recutting}:hours: h of recutting`;
    return [buildUp, laid, area, recut].filter(Boolean).join(' · ');
  }
}
