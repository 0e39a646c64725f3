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
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import { paidFor, paidText, paidUnitOf, type MeasuredWork } from '#shared/estimates/price/measured-work';
import { measuringRules, type MeasuringRule } from '#shared/measure/paid-quantity';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { AreaField } from '../../ui/field/area-field';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { LengthField } from '../../ui/field/length-field';
import { NumberField } from '../../ui/field/number-field';
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

const nothing = {
  rule: 'own' as MeasuringRule | 'own',
  length: null,
  girth: null,
  area: null,
  sides: 1,
  worth: 1,
} as const;

/** By which rule a quantity is paid, what it is measured from, and what it comes to, explained; `null` goes back to a rule of the workshop's own. */
@Component({
  selector: 'app-measured-quantity',
  imports: [AreaField, Entry, Field, Figure, LengthField, NumberField, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './measured-quantity.html',
  styles: `
    :host,
    .measures {
      display: contents;
    }
  `,
})
export class MeasuredQuantity {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  readonly measured = input.required<MeasuredWork | null>();
  readonly changed = output<Reckoned | null>();

  protected readonly rules = measuringRules.map((value) => ({ value, label: ruleNames[value] }));
  protected readonly group = new FormGroup({
    rule: new FormControl<MeasuringRule | 'own'>('own', { nonNullable: true }),
    length: new FormControl<MeasuredWork['length']>(null),
    girth: new FormControl<MeasuredWork['girth']>(null),
    area: new FormControl<MeasuredWork['area']>(null),
    sides: new FormControl<1 | 2>(1, { nonNullable: true }),
    worth: new FormControl<number | null>(1),
  });
  protected readonly rule = signal<MeasuringRule | 'own'>('own');
  protected readonly takesLengths = computed(() => this.rule() === 'plain-area' || this.rule() === 'narrow-girth');
  protected readonly takesArea = computed(() => this.rule() === 'carved-each-side' || this.rule() === 'weighted');
  /** What the kept measures come to. */
  protected readonly paid = computed(() => {
    const measured = this.measured();
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
    this.group.valueChanges.pipe(takeUntilDestroyed()).subscribe(() => this.take());
  }

  private show(measured: MeasuredWork | null): void {
    // What is being entered is not whole yet, and stays.
    if (!measured && this.group.dirty && this.rule() !== 'own') return;
    this.group.reset(measured ?? nothing, { emitEvent: false });
    this.rule.set(this.group.getRawValue().rule);
  }

  private take(): void {
    const { rule, worth, ...measures } = this.group.getRawValue();
    this.rule.set(rule);
    if (!isRule(rule)) {
      if (this.measured()) this.changed.emit(null);
      return;
    }
    const figures = [measures.length?.mm, measures.girth?.mm, measures.area?.mm2, worth];
    if (figures.some((figure) => figure !== undefined && !((figure ?? NaN) >= 0))) return;
    this.reckon({ ...measures, rule, worth: worth ?? 1, sides: Number(measures.sides) === 2 ? 2 : 1 });
  }

  private reckon(measured: MeasuredWork): void {
    const paid = paidFor(measured);
    if (!paid) return;
    const unit = paidUnitOf(this.formats.lengthUnit());
    const worth = this.formats.number(measured.worth);
    const rule = this.words.say(`measuring-rule-${measured.rule}`, { worth });
    this.changed.emit({ measured, rule, quantity: paidText(paid, unit), unit });
  }
}
