import { ChangeDetectionStrategy, Component, computed, inject, input, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton, MatIconButton } from '@angular/material/button';
import type { InvoiceContent } from '#shared/invoices/invoice';
import type { MinorUnits } from '#shared/money/decimal';
import { isRated } from '#shared/money/is-rated';
import type { TaxCode } from '#shared/money/tax-codes';
import type { AnyDocumentForm } from '../core/forms/document-form';
import { Formats } from '../core/formats/formats';
import { DecimalField } from '../ui/field/decimal-field';
import { EntryAt } from '../ui/field/entry-at';
import { Icon } from '../ui/icon/icon';
import { AllowanceRows } from './allowance-rows';
import { taxCodeChoices, taxCodeNames } from '../core/formats/tax-code-names';
import { unitChoices } from './unit-choices';

/** One line of a draft: what, how much of it, at which price, under which tax; its amount follows. */
@Component({
  selector: 'app-draft-line',
  imports: [AllowanceRows, DecimalField, EntryAt, Icon, MatButton, MatIconButton, ReactiveFormsModule],
  changeDetection: ChangeDetectionStrategy.OnPush,
  host: { role: 'group', '[attr.aria-label]': 'name()' },
  templateUrl: './draft-line.html',
  styleUrl: './draft-line.scss',
})
export class DraftLine {
  protected readonly formats = inject(Formats);

  readonly form = input.required<AnyDocumentForm>();
  readonly place = input.required<number>();
  readonly last = input.required<boolean>();
  readonly currency = input.required<string>();
  readonly net_minor = input<MinorUnits>();
  /** Amounts follow a contract: only words are entered. */
  readonly isFixed = input(false);

  protected readonly units = unitChoices;
  protected readonly taxCodes = taxCodeChoices;
  protected readonly taxNames = taxCodeNames;
  private readonly wantsWords = signal(false);
  private readonly wantsAllowance = signal(false);
  private readonly wantsBase = signal(false);
  protected readonly path = computed(() => `lines.${this.place()}`);
  private readonly line = computed(() => this.form().value<InvoiceContent['lines'][number]>(this.path()));
  protected readonly name = computed(() => this.line()?.name || $localize`Line ${this.place() + 1}:place:`);
  protected readonly deeds = computed(() => ({
    up: $localize`Move up: ${this.name()}:line:`,
    down: $localize`Move down: ${this.name()}:line:`,
    remove: $localize`Remove: ${this.name()}:line:`,
  }));
  protected readonly showsWords = computed(() => this.wantsWords() || Boolean(this.line()?.description));
  protected readonly showsAllowances = computed(
    () => this.wantsAllowance() || (this.line()?.allowancesCharges.length ?? 0) > 0,
  );
  /** A price may be for more than one of what is counted (BT-149): 410.00 for 2. */
  protected readonly showsBase = computed(() => this.wantsBase() || (this.line()?.baseQuantity ?? '1') !== '1');
  protected readonly priceLabel = computed(() => (this.showsBase() ? $localize`Price` : $localize`Price of one`));
  protected readonly isRated = computed(() => isRated(this.line()?.tax.code ?? 'S'));
  /** What stays as the contract has it, in a line of words. */
  protected readonly fixed = computed(() => {
    const line = this.line();
    if (!line) return '';
    const rate = isRated(line.tax.code) ? ` ${this.formats.figure('percent', Number(line.tax.percent))}` : '';
    return $localize`Tax: ${taxCodeNames[line.tax.code]}:category:${rate}:rate:`;
  });
  protected readonly amount = computed(() => {
    const net_minor = this.net_minor();
    return net_minor === undefined ? '' : this.formats.moneyIn(this.currency(), net_minor);
  });

  protected openWords(): void {
    this.wantsWords.set(true);
  }

  protected openBase(): void {
    this.wantsBase.set(true);
  }

  protected openAllowances(): void {
    this.wantsAllowance.set(true);
  }

  /** What charges no tax has no rate. */
  protected follow(): void {
    if (!isRated(this.form().control<TaxCode>(`${this.path()}.tax.code`).value))
      this.form().control(`${this.path()}.tax.percent`).setValue('0');
  }

  protected remove(): void {
    this.form().remove('lines', this.place());
  }

  protected move(by: number): void {
    this.form().move('lines', this.place(), this.place() + by);
  }
}
