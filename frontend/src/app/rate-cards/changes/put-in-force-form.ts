import { ChangeDetectionStrategy, Component, computed, effect, inject, input, output } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import * as z from 'zod';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
import { complain } from '#shared/problems/complaints-of';
import { day } from '#shared/problems/entry-schema';
import { Formats } from '../../core/formats/formats';
import { schemaForm } from '../../core/forms/schema-form';
import { NOW } from '../../core/now';
import { Confirm } from '../../ui/dialog/confirm';
import { Entry } from '../../ui/field/entry';
import { Field } from '../../ui/field/field';
import { FormComplaint } from '../../ui/field/form-complaint';
import { CardSaving } from '../card/card-saving';
import { CardStore } from '../card/card-store';
import { RateCardCalls } from '../rate-card-calls';

const dayFrom = (today: string) =>
  z.strictObject({ from: day.refine((from) => from >= today, complain('rate-card-day-past')) });

/** The day from which a draft is worked with, and the step that makes it so. */
@Component({
  selector: 'app-put-in-force-form',
  imports: [Entry, Field, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './put-in-force-form.html',
  styleUrl: './put-in-force-form.scss',
})
export class PutInForceForm {
  private readonly calls = inject(RateCardCalls);
  private readonly store = inject(CardStore);
  private readonly saving = inject(CardSaving);
  private readonly formats = inject(Formats);
  private readonly confirm = inject(Confirm);
  private readonly now = inject(NOW);

  /** What the card does to the open estimates has been shown. */
  readonly isSeen = input.required<boolean>();
  readonly done = output();
  /** The day entered, whenever it is one. */
  readonly chosen = output<string>();

  protected readonly today = dayOfInstant(this.now().getTime(), this.formats.timeZone());
  private readonly schema = dayFrom(this.today);
  protected readonly form = schemaForm(this.schema, { from: this.today });
  private readonly typed = toSignal(this.form.group.valueChanges, { initialValue: this.form.group.value });
  private readonly from = computed(() => this.schema.safeParse(this.typed()).data?.from);
  protected readonly dayName = computed(() => {
    const from = this.from();
    if (!from) return '';
    return from === this.today ? $localize`today` : this.formats.day(from);
  });

  constructor() {
    effect(() => {
      const from = this.from();
      if (from) this.chosen.emit(from);
    });
  }

  protected async put(): Promise<void> {
    if (!this.form.parsed()) return this.form.showAll();
    const isKept = await this.saving.flush();
    if (!isKept || !(await this.isSure())) return;
    const isPut = await this.form.send(async (entered) => {
      const card = this.store.summary();
      if (card) this.store.tell(await this.calls.putInForce(card, entered.from));
    });
    if (isPut) this.done.emit();
  }

  private isSure(): Promise<boolean> {
    const day = this.dayName();
    return this.confirm.ask({
      heading: $localize`Put in force from ${day}:day:?`,
      text:
        this.from() === this.today
          ? $localize`From now on new estimates are worked on this card, and it is never changed again. Estimates already begun keep their card until somebody takes the new one.`
          : $localize`From then new estimates are worked on this card; until then it can be made a draft again, afterwards it is never changed. Estimates already begun keep their card until somebody takes the new one.`,
      yes: $localize`Put in force`,
    });
  }
}
