import { parentPort } from 'node:worker_threads';
import type { InvoicePaperQuestion } from './invoice-paper-making';
import { invoicePaper } from './paper/invoice-paper';
import { statementPaper } from './paper/statement-paper';

/** Bytes arrive in a thread as a plain array. */
const pictureOf = (logo: Uint8Array | null): Buffer | null => logo && Buffer.from(logo);

function made(question: InvoicePaperQuestion): Promise<Buffer> {
  if (question.kind === 'statement')
    return statementPaper({ ...question.statement, logo: pictureOf(question.statement.logo) });
  return invoicePaper(question.invoice, { ...question.parts, logo: pictureOf(question.parts.logo) });
}

/** Sets invoices and statements away from the thread that answers requests. */
parentPort?.on('message', (question: InvoicePaperQuestion) => {
  made(question).then(
    (answer) => parentPort?.postMessage({ answer }),
    (error: unknown) => parentPort?.postMessage({ error: String((error as Error).stack ?? error) }),
  );
});
