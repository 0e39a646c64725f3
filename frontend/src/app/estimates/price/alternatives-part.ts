import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Alternative } from '#shared/estimates/settings';
import { Formats } from '../../core/formats/formats';
import { EmptyState } from '../../ui/page/empty-state';
import type { FigureColumn } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import { AlternativeActions } from './alternative-actions';
import { AlternativeForm } from './alternative-form';
import { AlternativeTotals } from './alternative-totals';
import { smallScreen } from '../../ui/screen/small-screen';

/** Other ways of doing part of the work, each with its own total and what it is more or less than the base. */
@Component({
  selector: 'app-alternatives-part',
  imports: [AlternativeForm, EmptyState, FigureTable, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  providers: [AlternativeActions, AlternativeTotals],
  templateUrl: './alternatives-part.html',
  styles: `
    :host {
      display: grid;
      gap: 20px;
      min-width: 0;
    }

    .head {
      display: flex;
      flex-wrap: wrap;
      gap: 8px 16px;
      align-items: center;
      justify-content: space-between;
    }
  `,
})
export class AlternativesPart {
  private readonly formats = inject(Formats);
  private readonly actions = inject(AlternativeActions);
  private readonly isSmall = smallScreen();
  protected readonly store = inject(EstimateStore);
  protected readonly worked = inject(AlternativeTotals);

  protected readonly chosen = signal<string | undefined>(undefined);
  protected readonly alternatives = computed(() => this.store.settings()?.alternatives ?? []);
  /** The chosen one, as a list of one, so that another one is another form. */
  protected readonly chosenOnes = computed(() => this.alternatives().filter(({ id }) => id === this.chosen()));
  private readonly hasGroups = computed(() => this.alternatives().some(({ group }) => group !== ''));
  protected readonly columns = computed<readonly FigureColumn<Alternative>[]>(() => [
    { key: 'name', heading: $localize`Alternative`, kind: 'text', text: ({ name }) => name, minor: ({ note }) => note },
    ...(this.isSmall() || !this.hasGroups() ? [] : [this.groupColumn()]),
    ...(this.store.seesPrices() ? this.moneyColumns() : []),
  ]);
  protected readonly rowId = ({ id }: Alternative): string => id;

  protected add(): void {
    this.chosen.set(this.actions.add());
  }

  /** Every place shows the estimate with it, until the base is taken again. */
  protected turnFigures(id: string): void {
    this.store.choose(this.store.choice().includes(id) ? [] : [id]);
  }

  private groupColumn(): FigureColumn<Alternative> {
    return { key: 'group', heading: $localize`Group`, kind: 'text', text: ({ group }) => group };
  }

  private moneyColumns(): FigureColumn<Alternative>[] {
    const sign = this.formats.currencySign();
    const of = (id: string) => this.worked.totals().get(id);
    return [
      {
        key: 'gross',
        heading: $localize`Gross, ${sign}:sign:`,
        kind: 'figure',
        text: ({ id }) => this.written(of(id)?.gross_minor),
      },
      {
        key: 'difference',
        heading: $localize`To the base`,
        kind: 'figure',
        text: ({ id }) => this.difference(of(id)?.difference_minor),
      },
    ];
  }

  private written(amount_minor: number | undefined): string {
    return amount_minor === undefined ? '…' : this.formats.amount(amount_minor);
  }

  private difference(amount_minor: number | undefined): string {
    if (amount_minor === undefined) return '…';
    return this.formats.signed(amount_minor, (size_minor) => this.formats.amount(size_minor));
  }
}
