import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { toSignal } from '@angular/core/rxjs-interop';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import * as z from 'zod';
import { dayOfInstant } from '#shared/calendar/day-of-instant';
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

const daySchema = z.strictObject({ from: day });

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

  protected readonly today = dayOfInstant(this.now().getTime(), this.formats.timeZone());
  protected readonly form = schemaForm(daySchema, { from: this.today });
  private readonly typed = toSignal(this.form.group.valueChanges, { initialValue: this.form.group.value });
  protected readonly dayName = computed(() => {
    const from = this.form.parsed()?.from ?? this.typed().from;
    if (!from || !daySchema.safeParse({ from }).success) return '';
    return from === this.today ? $localize`today` : this.formats.day(from);
  });

  protected async put(): Promise<void> {
    const from = this.form.parsed()?.from;
    const isKept = await this.saving.flush();
    if (!from || !isKept || !(await this.isSure())) return;
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
      text: $localize`From then new estimates are worked on this card, and it is never changed again. Estimates already begun keep their card until somebody takes the new one.`,
      yes: $localize`Put in force`,
    });
  }
}
