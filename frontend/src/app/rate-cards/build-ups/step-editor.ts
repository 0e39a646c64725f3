import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import { MatButton } from '@angular/material/button';
import type { BuildUpStep } from '#shared/buildups/buildup';
import { referenceClimate } from '#shared/drying/climate';
import type { CardColumn } from '#shared/rate-cards/tables/card-table';
import { fieldsOf, type CellPath } from '#shared/rate-cards/tables/cell-path';
import { lagColumns, stepColumns, useColumns } from '#shared/rate-cards/tables/step-columns';
import { valueAt } from '#shared/rate-cards/tables/value-at';
import { Formats } from '../../core/formats/formats';
import { FormComplaint } from '../../ui/field/form-complaint';
import { CardStore } from '../card/card-store';
import { CardEntry } from '../cells/card-entry';
import { newRow } from '../cells/new-row';
import { withRow, withoutRow } from '../cells/with-rows';

/** Entries that belong together, under their heading. */
interface Group {
  readonly heading: string;
  readonly fields: readonly string[];
}

const groups: readonly Group[] = [
  { heading: $localize`What is done`, fields: ['name', 'kind', 'colour', 'areaPart', 'optional', 'note'] },
  {
    heading: $localize`Coats`,
    fields: ['coats.plain', 'coats.moulded', 'coats.carved', 'coats.recut', 'coats.frenchRecut', 'groundPerCoat_mm'],
  },
  { heading: $localize`Time`, fields: ['gradeId', 'work.way', 'work.hours_m2', 'work.factors', 'work.part'] },
  {
    heading: $localize`Drying`,
    fields: [
      ...['drying.model', 'drying.betweenCoats_minutes.low', 'drying.betweenCoats_minutes.likely'],
      ...['drying.betweenCoats_minutes.high', 'drying.latestCoat_minutes', 'drying.wholeWithin_minutes'],
      ...['drying.beforeNext_minutes.low', 'drying.beforeNext_minutes.likely', 'drying.beforeNext_minutes.high'],
      ...['drying.window_minutes', 'drying.endsInWindow', 'drying.missed'],
    ],
  },
  { heading: $localize`Before it begins, and with care`, fields: ['holds', 'cautions'] },
];

const columnsOf = (fields: readonly string[]): CardColumn[] =>
  fields.flatMap((field) => stepColumns.find((column) => column.field === field) ?? []);

/** One step of a build-up: what is done, in how many coats, how long it takes, how it dries, what it uses and what it waits for. */
@Component({
  selector: 'app-step-editor',
  imports: [CardEntry, FormComplaint, MatButton],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './step-editor.html',
  styleUrl: './step-editor.scss',
})
export class StepEditor {
  private readonly store = inject(CardStore);
  private readonly formats = inject(Formats);

  /** The way to the step, and to the same one in the card the draft was copied from. */
  readonly path = input.required<CellPath>();
  readonly modelPath = input<CellPath>();

  protected readonly isEditable = this.store.isEditable;
  private readonly step = computed(() => valueAt(this.store.content(), this.path()) as BuildUpStep | undefined);
  /** Times of drying are those of one air; another scales them. */
  private readonly dryingHeading = computed(() => {
    const temperature = this.formats.figure('celsius', referenceClimate.temperature_celsius);
    const humidity = this.formats.figure('percent', referenceClimate.humidity_percent);
    return $localize`Drying, at ${temperature}:temperature: and ${humidity}:humidity: relative humidity`;
  });
  protected readonly groups = computed(() =>
    groups.map(({ heading, fields }) => ({
      heading: fields.includes('drying.model') ? this.dryingHeading() : heading,
      entries: this.entries(columnsOf(fields), this.path(), this.modelPath()),
    })),
  );
  protected readonly uses = computed(() => this.rowsIn(['uses'], useColumns, this.step()?.uses.length ?? 0));
  protected readonly lags = computed(() =>
    this.rowsIn(['drying', 'lags'], lagColumns, this.step()?.drying.lags.length ?? 0),
  );
  protected readonly complaints = computed(() => this.store.remarks().ofList(this.path()));
  /** Nothing can be waited for where no step comes after. */
  protected readonly isLast = computed(() => {
    const steps = valueAt(this.store.content(), this.path().slice(0, -1)) as readonly unknown[] | undefined;
    return Number(this.path().at(-1)) >= (steps?.length ?? 0) - 1;
  });

  protected addUse(): void {
    this.add('uses', ['uses']);
  }

  /** A new wait leads to the step that comes next. */
  protected addLag(): void {
    const steps = valueAt(this.store.content(), this.path().slice(0, -1)) as readonly BuildUpStep[] | undefined;
    const next = steps?.[Number(this.path().at(-1)) + 1];
    this.add('lags', ['drying', 'lags'], { toStepId: next?.id ?? '' });
  }

  protected remove(list: CellPath, at: number): void {
    const content = this.store.content();
    if (!content) return;
    this.store.settle([...this.path(), ...list]);
    this.store.enterContent(withoutRow(content, [...this.path(), ...list], at));
  }

  private add(tableId: string, list: CellPath, more: object = {}): void {
    const content = this.store.content();
    const row = content && newRow(tableId, content);
    if (!content || !row) return;
    const at = (valueAt(content, [...this.path(), ...list]) as readonly unknown[]).length;
    this.store.enterContent(withRow(content, [...this.path(), ...list], { at, row: { ...row, ...more } }));
  }

  private rowsIn(list: CellPath, columns: readonly CardColumn[], count: number) {
    return Array.from({ length: count }, (_, at) => ({
      at,
      entries: this.entries(columns, [...this.path(), ...list, at], this.below([...list, at])),
    }));
  }

  private below(rest: CellPath): CellPath | undefined {
    const model = this.modelPath();
    return model && [...model, ...rest];
  }

  /** What means something as the step stands: hours a square metre only where time goes by the area, and so on. */
  private entries(columns: readonly CardColumn[], path: CellPath, modelPath: CellPath | undefined) {
    return columns
      .map((column) => ({
        column,
        path: [...path, ...fieldsOf(column.field)],
        modelPath: modelPath ? [...modelPath, ...fieldsOf(column.field)] : [],
      }))
      .filter((entry) => entry.column.empty !== 'absent' || valueAt(this.store.content(), entry.path) !== undefined);
  }
}
