import { ChangeDetectionStrategy, Component, booleanAttribute, computed, inject, input } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton, MatIconButton } from '@angular/material/button';
import type { InvoiceContent } from '#shared/invoices/invoice';
import type { DocumentAllowanceOrCharge } from '#shared/invoices/invoice-lines';
import type { MinorUnits } from '#shared/money/decimal';
import { isRated } from '#shared/money/is-rated';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Session } from '../core/session/session';
import { AmountField } from '../ui/field/amount-field';
import { DecimalField } from '../ui/field/decimal-field';
import { EntryAt } from '../ui/field/entry-at';
import { Icon } from '../ui/icon/icon';
import { taxCodeChoices } from '../core/formats/tax-code-names';
import { firstTax } from './first-tax';

/** What comes off or on, of a line or of the whole: a fixed amount, or a share of what it is taken from. */
@Component({
  selector: 'app-allowance-rows',
  imports: [AmountField, DecimalField, EntryAt, Icon, MatButton, MatIconButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './allowance-rows.html',
  styleUrl: './allowance-rows.scss',
})
export class AllowanceRows {
  private readonly session = inject(Session);

  readonly form = input.required<AnyDocumentForm>();
  readonly path = input.required<string>();
  readonly currency = input.required<string>();
  /** What a share is taken of. */
  readonly base_minor = input.required<MinorUnits>();
  /** Of the whole document: each says under which tax it falls. */
  readonly withTax = input(false, { transform: booleanAttribute });

  protected readonly directions = [
    { value: 'false', label: $localize`Less` },
    { value: 'true', label: $localize`Plus` },
  ];
  protected readonly taxCodes = taxCodeChoices;
  protected readonly rows = computed(() => {
    const entered = this.form().value<readonly DocumentAllowanceOrCharge[]>(this.path()) ?? [];
    return this.form()
      .items(this.path())
      .map((control, place) => ({
        control,
        path: `${this.path()}.${place}`,
        way: entered[place]?.amount.way ?? 'fixed',
        isCharge: entered[place]?.charge ?? false,
        isRated: isRated(entered[place]?.tax?.code ?? 'S'),
      }));
  });

  protected add(): void {
    const fresh = { charge: false, reason: '', reasonCode: null, amount: { way: 'fixed', amount_minor: null } };
    const tax = this.form().value<InvoiceContent['lines']>('lines')?.at(0)?.tax ?? firstTax(this.session);
    this.form().insert(this.path(), this.rows().length, this.withTax() ? { ...fresh, tax: { ...tax } } : fresh);
  }

  protected remove(place: number): void {
    this.form().remove(this.path(), place);
  }

  protected turn(path: string, isCharge: boolean): void {
    this.form().control<boolean>(`${path}.charge`).setValue(isCharge);
  }

  protected choose(path: string, way: string): void {
    const share = { way: 'percent', base_minor: Math.max(0, this.base_minor()), percent: '' };
    this.form().put(`${path}.amount`, way === 'percent' ? share : { way: 'fixed', amount_minor: null });
  }
}
