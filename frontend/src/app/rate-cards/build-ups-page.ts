import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButton } from '@angular/material/button';
import { buildUpsPart } from '#shared/rate-cards/tables/build-ups-part';
import type { CardList as CardListTable } from '#shared/rate-cards/tables/card-table';
import { fieldsOf, type CellPath } from '#shared/rate-cards/tables/cell-path';
import { listRows } from '#shared/rate-cards/tables/list-rows';
import { stepColumns } from '#shared/rate-cards/tables/step-columns';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { Words } from '../core/formats/words';
import { BuildUpStrip } from './build-ups/build-up-strip';
import { StepEditor } from './build-ups/step-editor';
import { CardStore } from './card/card-store';
import { CardEntry } from './cells/card-entry';
import { CardForm } from './cells/card-form';
import { CardGrid } from './cells/card-grid';
import { CardList } from './cells/card-list';
import { copiedRow, newRow } from './cells/new-row';
import { withRow, withRowMoved, withoutRow } from './cells/with-rows';

const place: CellPath = ['buildUps', 'buildUps'];
const listOf = (id: string): CardListTable =>
  buildUpsPart.tables.find((table): table is CardListTable => table.kind === 'list' && table.id === id)!;
const [buildUpTable, stepTable] = [listOf('build-ups'), listOf('steps')];

/** What is seen of each step at once; all of it stands in the editor of the chosen one. */
const overview = ['name', 'kind', 'coats.plain', 'coats.moulded', 'coats.carved', 'gradeId', 'colour'];

/** The build-ups of a card: their steps with the layers they make, drawn as they are entered, and the times of all work. */
@Component({
  selector: 'app-build-ups-page',
  imports: [BuildUpStrip, CardEntry, CardForm, CardGrid, CardList, MatButton, StepEditor],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './build-ups-page.html',
  styleUrl: './build-ups-page.scss',
})
export class BuildUpsPage {
  private readonly store = inject(CardStore);
  private readonly words = inject(Words);

  protected readonly stepTable = stepTable;
  protected readonly overviewColumns = stepColumns.filter(({ field }) => overview.includes(field));
  protected readonly isEditable = this.store.isEditable;
  private readonly buildUps = computed(() => this.store.content()?.buildUps.buildUps ?? []);
  protected readonly list = computed(() =>
    this.buildUps().map(({ id, name }, at) => ({
      id,
      name,
      at,
      toLookAt: this.store.remarks().countBelow([...place, at]),
    })),
  );
  protected readonly chosenId = signal<string | undefined>(undefined);
  protected readonly chosen = computed(() => {
    const buildUps = this.buildUps();
    return buildUps.find(({ id }) => id === this.chosenId()) ?? buildUps.at(0);
  });
  private readonly at = computed(() => this.buildUps().findIndex(({ id }) => id === this.chosen()?.id));
  protected readonly path = computed<CellPath>(() => [...place, this.at()]);
  protected readonly isFirst = computed(() => this.at() === 0);
  protected readonly isLast = computed(() => this.at() === this.buildUps().length - 1);
  protected readonly particulars = computed(() => {
    const modelPath = this.modelPathOf([this.chosen()?.id ?? '']);
    return buildUpTable.columns.map((column) => ({
      column,
      path: [...this.path(), ...fieldsOf(column.field)],
      modelPath: modelPath ? [...modelPath, ...fieldsOf(column.field)] : [],
    }));
  });
  /** Grids and single figures of the part, below. */
  protected readonly times = buildUpsPart.tables.flatMap((table) =>
    table.kind === 'list' ? [] : [{ table, heading: this.words.say(table.heading) }],
  );

  /** The same build-up or step in the card the draft was copied from. */
  protected modelPathOf(ids: readonly string[]): CellPath | undefined {
    const table = ids.length === 1 ? buildUpTable : stepTable;
    return listRows(table, this.store.model()).find((row) => row.ids.join('/') === ids.join('/'))?.path;
  }

  protected stepIds(path: CellPath): readonly string[] {
    const stepId = valueAt(this.store.content(), [...path, 'id']);
    return [this.chosen()?.id ?? '', String(stepId)];
  }

  protected add(): void {
    const content = this.store.content();
    const row = content && newRow('build-ups', content);
    if (row) this.put(row);
  }

  protected duplicate(): void {
    const row = this.chosen();
    if (row) this.put(copiedRow({ ...row, name: $localize`${row.name}:name:, copy` }));
  }

  protected remove(): void {
    const content = this.store.content();
    if (!content) return;
    this.store.settle(place);
    this.store.enterContent(withoutRow(content, place, this.at()));
  }

  protected move(by: 1 | -1): void {
    const content = this.store.content();
    if (!content) return;
    this.store.settle(place);
    this.chosenId.set(this.chosen()?.id);
    this.store.enterContent(withRowMoved(content, place, { from: this.at(), to: this.at() + by }));
  }

  private put(row: object): void {
    const content = this.store.content();
    if (!content) return;
    this.store.settle(place);
    this.store.enterContent(withRow(content, place, { at: this.at() + 1, row }));
    this.chosenId.set((row as { readonly id: string }).id);
  }
}
