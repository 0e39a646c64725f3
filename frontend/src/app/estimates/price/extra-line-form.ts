import {
  ChangeDetectionStrategy,
  Component,
  Injector,
  type OnInit,
  computed,
  inject,
  input,
  runInInjectionContext,
} from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import type * as z from 'zod';
import type { MeasuredWork } from '#shared/estimates/price/measured-work';
import type { ExtraLine } from '#shared/estimates/settings';
import { extraLineSchema } from '#shared/estimates/settings-schema';
import type { Entries } from '../../core/forms/schema-controls';
import { Formats } from '../../core/formats/formats';
import { DecimalField } from '../../ui/field/decimal-field';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { NumberField } from '../../ui/field/number-field';
import { PercentField } from '../../ui/field/percent-field';
import { EstimateStore } from '../estimate-store';
import { liveForm, type LiveForm } from '../settings/live-form';
import { MeasuredQuantity, type Reckoned } from './measured-quantity';
import { ExtraLinesStore } from './extra-lines-store';
import { workNames } from './extra-names';

/** The form a line takes: one control for each entry of its kind. */
type LineForm = LiveForm<z.ZodObject>;

const schemaOf = (kind: ExtraLine['kind']): z.ZodObject =>
  extraLineSchema.options.find((schema) => schema.shape.kind.value === kind) as unknown as z.ZodObject;

/** Everything one further line says, for the chosen line of the table; it saves itself. */
@Component({
  selector: 'app-extra-line-form',
  imports: [DecimalField, Entry, Field, MeasuredQuantity, NumberField, PercentField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './extra-line-form.html',
})
export class ExtraLineForm implements OnInit {
  private readonly injector = inject(Injector);
  private readonly formats = inject(Formats);
  /** Timber is sold by the dm³ of the rate card. */
  protected readonly volumeUnit = this.formats.lengthUnit() === 'in' ? $localize`dm³ (61 in³)` : $localize`dm³`;
  private readonly lines = inject(ExtraLinesStore);
  protected readonly store = inject(EstimateStore);

  readonly line = input.required<ExtraLine>();

  protected live!: LineForm;
  protected readonly works = Object.entries(workNames).map(([value, label]) => ({ value, label }));
  protected readonly grades = computed(() => this.store.card()?.money.grades ?? []);
  protected readonly taxCategories = computed(() =>
    (this.store.card()?.money.taxCategories ?? []).map(({ id, name, percent }) => ({
      id,
      label: `${name}, ${this.formats.figure('percent', Number(percent))}`,
    })),
  );
  protected readonly alternatives = computed(() => this.store.settings()?.alternatives ?? []);

  ngOnInit(): void {
    const { id, kind } = this.line();
    const part = {
      key: () => `extra form ${id}`,
      schema: schemaOf(kind),
      present: () => this.line() as unknown as Entries<z.ZodObject>,
      apply: (value: unknown) => this.lines.replace(value as ExtraLine),
    };
    this.live = runInInjectionContext(this.injector, () => liveForm(part, part.present()));
  }

  protected measured(): MeasuredWork | null {
    const line = this.line();
    return line.kind === 'paid-quantity' ? (line.measured ?? null) : null;
  }

  /** A quantity reckoned by a rule of the trade, or none: then it follows a rule of the workshop's own. */
  protected takeMeasured(reckoned: Reckoned | null): void {
    this.live.group.markAsDirty();
    this.live.group.patchValue(reckoned ?? { measured: null });
  }

  protected message(path: string): string {
    const place = this.lines.lines().findIndex(({ id }) => id === this.line().id);
    return this.live.message(path, `extras.${place}.${path}`);
  }
}
