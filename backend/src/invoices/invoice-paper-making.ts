import { join } from 'node:path';
import type { FrozenInvoice } from '#shared/invoices/invoice';
import { threadFile } from '../platform/threads/thread-file';
import { ThreadQueue } from '../platform/threads/thread-queue';
import type { InvoicePaperParts } from './paper/invoice-paper';
import type { StatementOnPaper } from './paper/statement-paper';

/** What is asked of the thread that sets invoices and statements. */
export type InvoicePaperQuestion =
  | { readonly kind: 'invoice'; readonly invoice: FrozenInvoice; readonly parts: InvoicePaperParts }
  | { readonly kind: 'statement'; readonly statement: StatementOnPaper };

/** Sets invoices and statements in a thread of its own, one after the other, so that everybody else is answered meanwhile. */
export class InvoicePaperMaking {
  private readonly thread = new ThreadQueue<InvoicePaperQuestion, Uint8Array>(() =>
    threadFile(join(__dirname, 'invoice-paper-worker.ts')),
  );

  invoice(invoice: FrozenInvoice, parts: InvoicePaperParts): Promise<Buffer> {
    return this.set({ kind: 'invoice', invoice, parts });
  }

  statement(statement: StatementOnPaper): Promise<Buffer> {
    return this.set({ kind: 'statement', statement });
  }

  /** What comes out of a thread is a plain array of bytes. */
  private async set(question: InvoicePaperQuestion): Promise<Buffer> {
    return Buffer.from(await this.thread.ask(question));
  }
}
