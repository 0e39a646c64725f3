import { ChangeDetectionStrategy, Component, computed, inject, input, output } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import * as z from 'zod';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { decimalPercentEntry } from '#shared/problems/card-entry-schema';
import { Formats } from '../core/formats/formats';
import { schemaForm } from '../core/forms/schema-form';
import { DecimalField } from '../ui/field/decimal-field';
import { focusFirst } from '../ui/field/focus-first';
import { FormComplaint } from '../ui/field/form-complaint';

const valuationSchema = z.strictObject({ to_percent: decimalPercentEntry });

/** How much of the work is done: what lies between what is invoiced already and that is drafted as an invoice. */
@Component({
  selector: 'app-valuation-form',
  imports: [DecimalField, FormComplaint, MatButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  template: `
    <form class="fields sheet" [formGroup]="form.group" (ngSubmit)="send()">
      <app-decimal-field
        i18n-label
        label="So much of the work is done"
        unit="%"
        [hint]="hint()"
        formControlName="to_percent"
        [complaint]="form.message('to_percent')"
      />
      <app-form-complaint class="whole" [texts]="form.general()" />
      <div class="actions">
        <button matButton="filled" type="submit" [disabled]="isBusy() || !isFurther()" i18n>Draft the invoice</button>
        <button matButton type="button" (click)="closed.emit()" i18n>Leave it</button>
      </div>
    </form>
  `,
})
export class ValuationForm {
  private readonly formats = inject(Formats);

  /** The work nothing claims yet: what is done is counted from where it begins. */
  readonly claim = input.required<StageClaim>();
  readonly isBusy = input(false);
  readonly valued = output<StageClaim>();
  readonly closed = output();

  protected readonly form = schemaForm(valuationSchema, { to_percent: '' });
  private readonly from_percent = computed(() => {
    const claim = this.claim();
    return claim.of === 'work' ? claim.from_percent : '0';
  });
  protected readonly hint = computed(
    () =>
      $localize`Of the whole of it. Invoiced up to ${this.formats.percent(Number(this.from_percent()), 6)}:done: so far.`,
  );
  protected readonly isFurther = computed(
    () => Number(this.form.parsed()?.to_percent ?? Number.NaN) > Number(this.from_percent()),
  );

  constructor() {
    focusFirst();
  }

  protected async send(): Promise<void> {
    await this.form.send(({ to_percent }) => {
      this.valued.emit({ of: 'work', from_percent: this.from_percent(), to_percent });
      return Promise.resolve();
    });
  }
}
