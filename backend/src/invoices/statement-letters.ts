import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import { todayIn, type InvoiceParts } from './invoice-parts';
import type { LedgerPapers } from './ledger-papers';
import type { Days, LedgerService } from './ledger-service';

interface Parts extends InvoiceParts {
  readonly ledger: LedgerService;
  readonly statements: LedgerPapers;
}

/** Mails a client their account from one day to another, the paper with it. */
export class StatementLetters {
  constructor(private readonly parts: Parts) {}

  async send(actor: Actor, clientId: string, { note, ...days }: Days & { readonly note: string }): Promise<void> {
    const { workshopId } = actor;
    const client = await this.parts.jobs.client(workshopId, clientId);
    const { name, email } = client;
    if (email === '') throw new Rejection('conflict', 'reminder-no-address', { values: { name } });
    const { currencies } = await this.parts.ledger.statement(workshopId, clientId, days);
    const paper = await this.parts.statements.statement(workshopId, clientId, days);
    const file = await this.parts.files.save(workshopId, paper);
    const today = await todayIn(this.parts, workshopId);
    await this.parts.clientLetters.post(workshopId, {
      kind: 'statement',
      client,
      values: ({ money, day }) => ({
        ...{ note, link: this.parts.clientEntrance, day: day(days.to < today ? days.to : today) },
        open: currencies.map(({ closing_minor, currency }) => money(closing_minor, currency)).join(' + '),
      }),
      enclosures: [{ fileId: file.id }],
    });
    await this.parts.audit.record(actor, {
      subject: { kind: 'client', id: clientId },
      code: 'history-statement-sent',
      values: { client: name, email },
    });
  }
}
