import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { Formats } from '../../core/formats/formats';
import { EmptyState } from '../../ui/page/empty-state';
import { FindingList } from '../../ui/page/finding-list';
import { smallScreen } from '../../ui/screen/small-screen';
import { FigureTable } from '../../ui/table/figure-table';
import { EstimateStore } from '../estimate-store';
import { AlternativeActions } from './alternative-actions';
import { AlternativeCards } from './alternative-cards';
import { AlternativeColumns } from './alternative-columns';
import { AlternativeForm } from './alternative-form';
import { type AlternativeRow, alternativeRows } from './alternative-rows';
import { AlternativeSections } from './alternative-sections';
import { AlternativeTotals } from './alternative-totals';

/** Other ways of doing part of the work beside the base, each with its own leaf, hours, days and price and what they are more or less. */
@Component({
  selector: 'app-alternatives-part',
  imports: [AlternativeCards, AlternativeForm, AlternativeSections, EmptyState, FigureTable, FindingList, MatButton],
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
  private readonly actions = inject(AlternativeActions);
  protected readonly isSmall = smallScreen();
  protected readonly store = inject(EstimateStore);
  protected readonly worked = inject(AlternativeTotals);

  protected readonly chosen = signal<string | undefined>(undefined);
  protected readonly alternatives = computed(() => this.store.settings()?.alternatives ?? []);
  protected readonly columns = new AlternativeColumns(inject(Formats), {
    base: this.worked.base,
    groups: computed(() => this.alternatives().map(({ group }) => group)),
    seesPrices: this.store.seesPrices,
    unknown: '…',
  });
  protected readonly rows = computed(() =>
    alternativeRows(this.alternatives(), this.worked.base(), this.worked.totals()),
  );
  /** The chosen one, as a list of one, so that another one is another form. */
  protected readonly chosenOnes = computed(() => this.alternatives().filter(({ id }) => id === this.chosen()));
  /** What is to be put right before they are offered. */
  protected readonly findings = computed(() => {
    const ids = new Set(this.alternatives().map(({ id }) => id));
    return (this.store.figures()?.findings ?? []).filter(({ about }) => about !== undefined && ids.has(about));
  });
  protected readonly rowId = ({ id }: AlternativeRow): string => id;

  protected add(): void {
    this.chosen.set(this.actions.add());
  }

  /** Every place shows the estimate with it, until the base is taken again. */
  protected turnFigures(id: string): void {
    this.store.choose(this.store.choice().includes(id) ? [] : [id]);
  }
}
