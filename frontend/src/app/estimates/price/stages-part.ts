import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { Stage } from '#shared/estimates/settings';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { newId } from '../../core/new-id';
import type { EditedCell, PastedCells } from '../../ui/table/figure-column';
import { FigureTable } from '../../ui/table/figure-table';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';
import { PlanOfPayment } from './plan-of-payment';
import { readStages, stageEntriesOf, type StageEntry } from './stage-entries';
import type { StageRow } from './stage-rows';
import { StageTermsForm } from './stage-terms-form';
import { TakenAwayNote } from './taken-away-note';

const key = 'stage parts';
const noTerms = { deposit_percent: 0, retention_percent: 0 };

/** How the contract is paid: deposit, stages that come to 100 %, retention; every payment to the last cent. */
@Component({
  selector: 'app-stages-part',
  imports: [FigureTable, MatButton, StageTermsForm, TakenAwayNote],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './stages-part.html',
  styles: `
    :host {
      display: grid;
      gap: 20px;
      min-width: 0;
    }

    .missing {
      padding: 6px 12px;
      border-left: 3px solid var(--wrong);
      color: var(--wrong);
    }
  `,
})
export class StagesPart {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);
  private readonly unfinished = inject(UnfinishedEntries);
  protected readonly plan = inject(PlanOfPayment);
  protected readonly store = inject(EstimateStore);

  protected readonly chosen = signal<string | undefined>(undefined);
  /** What a variation takes away; 0 where something is to be paid. */
  protected readonly takenAway_minor = computed(() => Math.min(0, this.store.priced()?.price.gross_minor ?? 0));
  protected readonly tax_minor = computed(() => this.store.priced()?.price.tax_minor ?? 0);
  /** As typed, while they do not come to 100 %; else as they are kept. */
  private readonly entries = computed<readonly StageEntry[]>(() => {
    const kept = stageEntriesOf(this.store.settings()?.stages?.parts ?? [], this.formats.locale());
    return this.unfinished.ids().has(key) ? (this.unfinished.of<readonly StageEntry[]>(key) ?? kept) : kept;
  });
  private readonly read = computed(() => readStages(this.entries(), this.formats.locale()));
  protected readonly missing = computed(() => this.read().missing_percent);
  protected readonly missingText = computed(() => {
    const missing = Number(this.missing() ?? 0);
    const percent = this.formats.figure('percent', Math.abs(missing));
    return missing > 0 ? $localize`${percent}:percent: is missing` : $localize`${percent}:percent: is too much`;
  });
  protected readonly columns = computed(() => this.plan.columns((cell) => this.remark(cell), this.store.mayEdit()));
  private readonly payments = computed(() => (this.read().stages ? this.store.priced()?.stages : undefined));
  protected readonly rows = computed(() =>
    this.plan.rows(this.entries(), this.payments(), this.store.settings()?.stages ?? noTerms),
  );
  protected readonly totals = computed(() => {
    const gross_minor = this.store.priced()?.price.gross_minor;
    const paid_minor = gross_minor === undefined ? '' : this.formats.amount(gross_minor);
    return { name: $localize`Total`, paid_minor };
  });
  protected readonly chosenStage = computed(() => this.entries().find(({ id }) => id === this.chosen()));
  protected readonly rowId = ({ id }: StageRow): string => id;

  protected type({ rowId, key: cell, text }: EditedCell): void {
    if (rowId === 'whole') return this.keep([{ id: newId(), name: text, share: '100' }]);
    this.keep(this.entries().map((entry) => (entry.id === rowId ? { ...entry, [cell]: text } : entry)));
  }

  /** Cells of a spreadsheet fill the stages from here down; what is beyond the last makes further stages. */
  protected paste({ rowId, keys, lines }: PastedCells): void {
    const entries = [...this.entries()];
    const at = entries.findIndex(({ id }) => id === rowId);
    if (at < 0 && rowId !== 'whole') return;
    lines.forEach((texts, down) => {
      const place = Math.max(0, at) + down;
      const cells = Object.fromEntries(texts.map((text, across) => [keys.at(across) ?? '', text]));
      const { id, name, share } = entries.at(place) ?? { id: newId(), name: $localize`Stage`, share: '' };
      entries[place] = { id, name: cells['name'] ?? name, share: cells['share'] ?? share };
    });
    this.keep(entries);
  }

  /** A further stage takes what is missing. */
  protected add(): void {
    const missing = Math.max(0, Number(this.missing() ?? (this.entries().length === 0 ? 100 : 0)));
    const id = newId();
    this.keep([...this.entries(), { id, name: $localize`Stage`, share: this.formats.typed(missing) }]);
    this.chosen.set(id);
  }

  protected remove(id: string): void {
    this.keep(this.entries().filter((entry) => entry.id !== id));
  }

  /** The plan of payment the rate card has. */
  protected takeFromCard(): void {
    const terms = this.store.card()?.money.terms;
    if (!terms) return;
    this.unfinished.forget(key);
    const parts = terms.stages.map(({ name, percent }): Stage => ({ id: newId(), name, percent: Number(percent) }));
    const [deposit_percent, retention_percent] = [Number(terms.deposit_percent), Number(terms.retention_percent)];
    this.store.changeSettings({ stages: { deposit_percent, parts, retention_percent } });
  }

  private keep(entries: readonly StageEntry[]): void {
    const { stages: parts } = readStages(entries, this.formats.locale());
    const stages = this.store.settings()?.stages;
    if (parts && stages) {
      this.unfinished.forget(key);
      this.store.changeSettings({ stages: { ...stages, parts } });
    } else this.unfinished.put(key, entries);
  }

  private remark(cell: string): string {
    const remark = this.read().remarks.get(cell);
    return remark ? this.words.say(remark.code, remark.values) : '';
  }
}
