import { Injectable, computed, inject, resource, signal } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { Subject, debounceTime } from 'rxjs';
import type { InvoiceContent } from '#shared/invoices/invoice';
import { invoiceSchema, type Invoice } from '#shared/invoices/invoice-schema';
import { ProblemError } from '../core/problems/problem-error';
import { Saving } from '../core/saving/saving';
import { InvoiceCalls } from './invoice-calls';

const afterTheLastKey_ms = 700;
const triedAgain_ms = 5000;

/** One invoice or credit note. A draft keeps itself as it is written, always on the version it was read in. */
@Injectable()
export class InvoiceStore {
  private readonly calls = inject(InvoiceCalls);
  private readonly saving = inject(Saving);
  private readonly invoiceId = signal<string | undefined>(undefined);
  private readonly entered = new Subject<void>();
  private waiting: InvoiceContent | undefined;
  private keeping: Promise<boolean> | undefined;

  private readonly reading = resource({
    params: () => this.invoiceId(),
    loader: ({ params, abortSignal }) => this.calls.read(params, abortSignal),
  });
  readonly invoice = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  readonly problem = computed(() => this.reading.error()?.message ?? '');

  private readonly others = signal<Invoice | undefined>(undefined);
  /** What somebody else made of the draft meanwhile; nothing is kept until it is said whose is to stand. */
  readonly meanwhile = this.others.asReadonly();
  private readonly refused = signal<ProblemError | undefined>(undefined);
  /** Why the server did not take what was entered last. */
  readonly refusal = this.refused.asReadonly();

  constructor() {
    this.entered.pipe(debounceTime(afterTheLastKey_ms), takeUntilDestroyed()).subscribe(() => void this.flush());
    this.saving.reset();
  }

  open(invoiceId: string): void {
    this.invoiceId.set(invoiceId);
  }

  reload(): void {
    this.reading.reload();
  }

  /** The invoice as the server has it now. */
  put(invoice: Invoice): void {
    this.reading.set(invoice);
  }

  /** Something was entered; it is kept once the typing rests. */
  change(content: InvoiceContent): void {
    this.waiting = content;
    this.refused.set(undefined);
    this.saving.expect(1);
    this.entered.next();
  }

  /** Something was entered that cannot be kept as it stands. */
  hold(): void {
    this.waiting = undefined;
    this.saving.expect(1);
  }

  /** What waits is not wanted any more. */
  forget(): void {
    this.waiting = undefined;
    this.saving.reset();
  }

  /** Keeps at once what waits; whether all of it is kept now. */
  async flush(): Promise<boolean> {
    await this.keeping;
    if (this.others()) return false;
    if (this.waiting === undefined) return !this.saving.hasUnsent();
    this.keeping = this.keep(this.waiting);
    const isKept = await this.keeping;
    return isKept && this.waiting !== undefined ? this.flush() : isKept;
  }

  /** What was entered here is to stand over what was kept meanwhile. */
  async keepMine(content: InvoiceContent): Promise<void> {
    const theirs = this.others();
    if (!theirs) return;
    this.put(theirs);
    this.others.set(undefined);
    this.waiting = content;
    await this.flush();
  }

  /** What was kept meanwhile is to stand. */
  takeTheirs(): Invoice | undefined {
    const theirs = this.others();
    this.others.set(undefined);
    this.waiting = undefined;
    this.saving.reset();
    if (theirs) this.put(theirs);
    return theirs;
  }

  private async keep(content: InvoiceContent): Promise<boolean> {
    const seen = this.invoice();
    if (!seen) return false;
    this.waiting = undefined;
    this.saving.begin();
    try {
      this.put(await this.calls.keep(seen, content));
      this.saving.kept();
      this.saving.expect(this.waiting === undefined ? 0 : 1);
      return true;
    } catch (error) {
      this.waiting ??= content;
      this.fail(error);
      return false;
    } finally {
      this.keeping = undefined;
    }
  }

  private fail(error: unknown): void {
    this.saving.fail();
    if (!(error instanceof ProblemError)) throw error;
    const current = error.isStale ? invoiceSchema.safeParse(error.problem.current) : undefined;
    if (current?.success) this.others.set(current.data);
    else if (error.isPassing) this.tryAgain();
    else this.refused.set(error);
  }

  private tryAgain(): void {
    this.saving.wait();
    setTimeout(() => this.entered.next(), triedAgain_ms);
  }
}
