import {
  ChangeDetectionStrategy,
  Component,
  computed,
  effect,
  inject,
  input,
  output,
  signal,
  untracked,
} from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { canonicalJson } from '#shared/estimates/canonical-json';
import { measuredWorkSchema } from '#shared/estimates/measured-work-schema';
import {
  paidFor,
  paidText,
  paidUnitOf,
  type MeasuredWork,
  type WorkMeasure,
} from '#shared/estimates/price/measured-work';
import { measuringRules, type MeasuringRule } from '#shared/measure/paid-quantity';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { documentForm } from '../../core/forms/document-form';
import { RowsEditor, type ShapeEntry } from '../../measure';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { Figure } from '../../ui/figure/figure';

/** What a line takes from its measures. */
export interface Reckoned {
  readonly measured: MeasuredWork;
  readonly rule: string;
  readonly quantity: string;
  readonly unit: string;
}

const ruleNames: Readonly<Record<MeasuringRule, string>> = {
  'plain-area': $localize`length by girth, as measured`,
  'carved-each-side': $localize`carved work, counted double`,
  'narrow-girth': $localize`narrow members, girth raised to 6 or 12 in`,
  weighted: $localize`special work, so many times plain`,
};

const isRule = (text: string): text is MeasuringRule => (measuringRules as readonly string[]).includes(text);

const nothing: WorkMeasure = { count: 1, length_mm: null, girth_mm: null, area_mm2: null, sides: 1, worth: 1 };

const count: ShapeEntry = { path: 'count', label: $localize`How many`, way: 'number' };
const area: ShapeEntry = { path: 'area_mm2', label: $localize`Area measured flat`, way: 'area' };
const lengths: readonly ShapeEntry[] = [
  count,
  { path: 'length_mm', label: $localize`Length measured`, way: 'length' },
  { path: 'girth_mm', label: $localize`Girth measured`, way: 'length' },
];
const sides: ShapeEntry = {
  path: 'sides',
  label: $localize`Carved on`,
  way: 'choice',
  choices: [
    { value: 1, label: $localize`one side` },
    { value: 2, label: $localize`both sides` },
  ],
};

/** What is measured by each rule. */
const entries: Readonly<Record<MeasuringRule, readonly ShapeEntry[]>> = {
  'plain-area': lengths,
  'narrow-girth': lengths,
  'carved-each-side': [count, area, sides],
  weighted: [count, area, { path: 'worth', label: $localize`Times plain work`, way: 'number', unit: '×' }],
};

const written = (measured: MeasuredWork | null): string => (measured ? canonicalJson(measured) : '');

/** By which rule a quantity is paid, the measures it is the sum of, and what it comes to, explained; `null` goes back to a rule of the workshop's own. */
@Component({
  selector: 'app-measured-quantity',
  imports: [Entry, Field, Figure, RowsEditor],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './measured-quantity.html',
  styles: `
    :host {
      display: contents;
    }

    .whole {
      grid-column: 1 / -1;
    }
  `,
})
export class MeasuredQuantity {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);
  private last = '';

  readonly measured = input.required<MeasuredWork | null>();
  readonly changed = output<Reckoned | null>();

  protected readonly rules = measuringRules.map((value) => ({ value, label: ruleNames[value] }));
  protected readonly form = documentForm(measuredWorkSchema);
  protected readonly rule = signal<MeasuringRule | null>(null);
  protected readonly entries = computed(() => entries[this.rule() ?? 'plain-area']);
  protected readonly headings = computed(() => this.entries().map(({ label }) => label));
  protected readonly cells = computed(() => {
    const cells = this.entries();
    return () => cells;
  });
  /** What the measures come to; undefined while one of them is not whole. */
  protected readonly paid = computed(() => {
    const measured = this.form.parsed();
    const paid = measured && paidFor(measured);
    if (!paid) return undefined;
    const text = this.formats.area(paid.quantity_mm2);
    return { text, explained: { id: 'paid quantity', heading: text, reasons: paid.reasons } };
  });

  constructor() {
    effect(() => {
      const measured = this.measured();
      untracked(() => this.show(measured));
    });
    this.form.edited.pipe(takeUntilDestroyed()).subscribe(() => this.take());
  }

  protected choose(value: string): void {
    const before = this.rule();
    if (!isRule(value)) {
      this.rule.set(null);
      if (this.measured()) this.changed.emit(null);
      return;
    }
    if (before === null) this.form.reset({ rule: value, measures: [nothing], typed: {} });
    else this.form.put('rule', value);
    this.rule.set(value);
  }

  /** The next measure is mostly of the same girth, or carved and worth alike. */
  protected add(index: number): void {
    const last = this.form.value<WorkMeasure>(`measures.${index - 1}`);
    this.form.insert('measures', index, { ...nothing, ...last, count: 1, length_mm: null, area_mm2: null });
  }

  // What is being entered is not whole yet, and stays; what somebody else or an undo changed is shown.
  private show(measured: MeasuredWork | null): void {
    if (written(measured) === this.last) return;
    this.last = written(measured);
    this.rule.set(measured?.rule ?? null);
    if (measured) this.form.reset(measured);
  }

  private take(): void {
    const measured = this.form.parsed();
    const paid = measured && paidFor(measured);
    if (!paid) return;
    this.last = written(measured);
    const unit = paidUnitOf(this.formats.lengthUnit());
    this.changed.emit({ measured, rule: this.ruleText(measured), quantity: paidText(paid, unit), unit });
  }

  private ruleText({ rule, measures }: MeasuredWork): string {
    const worths = new Set(measures.map(({ worth }) => worth));
    if (rule === 'weighted' && worths.size > 1) return this.words.say('measuring-rule-weighted-each');
    return this.words.say(`measuring-rule-${rule}`, { worth: this.formats.number([...worths][0]) });
  }
}
