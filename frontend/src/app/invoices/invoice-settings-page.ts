import { ChangeDetectionStrategy, Component, computed, effect, inject, resource, signal } from '@angular/core';
import { ReactiveFormsModule } from '@angular/forms';
import { MatButton } from '@angular/material/button';
import type * as z from 'zod';
import { invoiceNumber } from '#shared/invoices/invoice-settings';
import {
  invoiceSettingsSchema,
  keptInvoiceSettingsSchema,
  type KeptInvoiceSettings,
} from '#shared/invoices/invoice-settings-schema';
import { holdWhileDirty } from '../core/forms/hold-while-dirty';
import { schemaForm } from '../core/forms/schema-form';
import { Notices } from '../core/problems/notices';
import { ProblemError } from '../core/problems/problem-error';
import { TwoSides } from '../jobs';
import { Entry } from '../ui/field/entry';
import { Field } from '../ui/field/field';
import { FormComplaint } from '../ui/field/form-complaint';
import { NumberField } from '../ui/field/number-field';
import { EmptyState } from '../ui/page/empty-state';
import { Skeleton } from '../ui/page/skeleton';
import { InvoiceCalls } from './invoice-calls';
import { settingsDifferences } from './settings-differences';
import { beginningEntry, settingsForm } from './settings-form-schema';
import { workshopToday } from './workshop-today';

/** How the workshop invoices: who it says it is, where money goes, when it falls due, its numbers and its wording. */
@Component({
  selector: 'app-invoice-settings-page',
  imports: [
    ...[EmptyState, Entry, Field, FormComplaint, MatButton, NumberField, ReactiveFormsModule, Skeleton, TwoSides],
  ],
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './invoice-settings-page.html',
  styleUrl: './invoice-settings-page.scss',
})
export class InvoiceSettingsPage {
  private readonly calls = inject(InvoiceCalls);
  private readonly notices = inject(Notices);
  private readonly today = workshopToday();

  protected readonly reading = resource({ loader: ({ abortSignal }) => this.calls.settings(abortSignal) });
  protected readonly settings = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  protected readonly problem = computed(() => this.reading.error()?.message ?? '');
  protected readonly form = schemaForm(settingsForm, beginningEntry);
  /** What somebody else kept while this form was open. */
  private readonly meanwhile = signal<KeptInvoiceSettings | undefined>(undefined);
  protected readonly differences = computed(() => settingsDifferences(this.form.parsed(), this.meanwhile()));
  /** The next numbers as they would be written. */
  protected readonly examples = computed(() => {
    const { invoicePrefix, creditNotePrefix } = this.form.parsed() ?? this.settings() ?? beginningEntry;
    const year = Number(this.today().slice(0, 4));
    return [invoiceNumber(invoicePrefix, year, 1), invoiceNumber(creditNotePrefix, year, 1)] as const;
  });

  constructor() {
    holdWhileDirty(this.form);
    effect(() => {
      const settings = this.settings();
      if (settings) this.show(settings);
    });
  }

  protected async keep(over?: KeptInvoiceSettings): Promise<void> {
    const version = (over ?? this.settings())?.version ?? 0;
    this.meanwhile.set(undefined);
    await this.form.send(async (entered) => {
      const body = invoiceSettingsSchema.parse(fromForm(entered));
      const kept = await this.calls.keepSettings(version, body).catch((error: unknown) => this.refused(error));
      this.reading.set(kept);
      this.notices.say($localize`How we invoice is kept.`);
    });
  }

  protected async keepMine(): Promise<void> {
    await this.keep(this.meanwhile());
  }

  protected takeTheirs(): void {
    const theirs = this.meanwhile();
    this.meanwhile.set(undefined);
    if (theirs) this.reading.set(theirs);
  }

  private show({ begins, version: _version, ...settings }: KeptInvoiceSettings): void {
    this.form.reset({ ...settings, begins: begins ?? beginningEntry.begins });
  }

  private refused(error: unknown): never {
    const read =
      error instanceof ProblemError && error.isStale
        ? keptInvoiceSettingsSchema.safeParse(error.problem.current)
        : undefined;
    if (read?.success) this.meanwhile.set(read.data);
    throw error;
  }
}

/** Whoever had no numbers before leaves all three empty. */
function fromForm({ begins, ...settings }: z.output<typeof settingsForm>) {
  const { year, invoice, creditNote } = begins;
  const isNone = year === null && invoice === null && creditNote === null;
  return { ...settings, begins: isNone ? null : { year, invoice: invoice ?? 1, creditNote: creditNote ?? 1 } };
}
