import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { LineDifference } from '#shared/estimates/line-differences';
import { sumMinor } from '#shared/money/sum-minor';
import { Formats } from '../../core/formats/formats';
import type { FigureColumn } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';
import { PriceNames } from './price-names';

/** Line by line, where two prices of an estimate differ, and what the differences come to. */
@Component({
  selector: 'app-difference-table',
  imports: [FigureTable],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <app-figure-table
      [caption]="caption()"
      [columns]="columns()"
      [rows]="lines()"
      [rowId]="rowId"
      [totals]="totals()"
    />
  `,
  styles: `
    :host {
      display: block;
      min-width: 0;
    }
  `,
})
export class DifferenceTable {
  private readonly formats = inject(Formats);
  private readonly names = inject(PriceNames);

  readonly caption = input.required<string>();
  /** What the earlier and the later price are called: “Issue A”, “the draft”. */
  readonly before = input.required<string>();
  readonly after = input.required<string>();
  readonly lines = input.required<readonly LineDifference[]>();

  protected readonly columns = computed<readonly FigureColumn<LineDifference>[]>(() => [
    { key: 'line', heading: $localize`Line`, kind: 'text', text: (line) => this.nameOf(line) },
    this.amountColumn('before_minor', this.before()),
    this.amountColumn('after_minor', this.after()),
    {
      key: 'difference',
      heading: $localize`Difference`,
      kind: 'figure',
      text: ({ before_minor, after_minor }) => this.signed((after_minor ?? 0) - (before_minor ?? 0)),
    },
  ]);
  protected readonly totals = computed(() => {
    const differences = this.lines().map(({ before_minor, after_minor }) => (after_minor ?? 0) - (before_minor ?? 0));
    return { line: $localize`Together`, difference: this.signed(sumMinor(differences)) };
  });
  protected readonly rowId = ({ lineId }: LineDifference): string => lineId;

  private amountColumn(key: 'before_minor' | 'after_minor', heading: string): FigureColumn<LineDifference> {
    return {
      key,
      heading,
      kind: 'figure',
      text: (line) => {
        const amount_minor = line[key];
        return amount_minor === null ? '–' : this.formats.amount(amount_minor);
      },
    };
  }

  private nameOf({ name, kind, member }: LineDifference): string {
    const line = name ?? this.names.kind(kind);
    return member ? `${member}, ${line}` : line;
  }

  private signed(amount_minor: number): string {
    return this.formats.signed(amount_minor, (size_minor) => this.formats.amount(size_minor));
  }
}
