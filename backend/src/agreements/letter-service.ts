import { filledLetter, paragraphsOf, type FilledLetter, type LetterValues } from '#shared/agreements/filled-letter';
import type { LetterText } from '#shared/agreements/letter-complaints';
import type { LetterKind } from '#shared/agreements/letter-kinds';
import { isRated } from '#shared/money/is-rated';
import type { Accounts, WorkshopSettingsRow } from '../accounts';
import type { ClientRow } from '../jobs';
import { words } from '../platform/http/words';
import type { Enclosure, Letter } from '../platform/mail/letter';
import type { GivenUpLetter, Mailbox } from '../platform/mail/mailbox';
import { letterFigures, type LetterFigures } from './letter-figures';
import { letterHtml } from './letter-html';
import { refuseFaulty, type LetterTemplateService } from './letter-template-service';

interface Parts {
  readonly templates: LetterTemplateService;
  readonly accounts: Pick<Accounts, 'workshops' | 'people'>;
  readonly mailbox: Mailbox;
}

/** A letter to a client, in the workshop's words; `values` stand in place of the placeholders of its kind. */
export interface ClientLetter {
  readonly kind: LetterKind;
  readonly client: Pick<ClientRow, 'name' | 'contact' | 'email'>;
  readonly values: (figures: LetterFigures) => LetterValues;
  readonly enclosures?: readonly Enclosure[];
}

/** What the workshop itself is told by mail. */
export interface Notice {
  readonly kind: 'question' | 'accepted' | 'declined';
  readonly values: (figures: LetterFigures) => LetterValues;
  readonly replyTo?: string;
  readonly enclosures?: readonly Enclosure[];
}

const greeted = ({ name, contact }: ClientLetter['client']): string => (contact.trim() === '' ? name : contact);

/** Letters to clients in each workshop's words, notices to the workshop, and what became of those that could not be delivered. */
export class LetterService {
  constructor(private readonly parts: Parts) {}

  /** Writes a letter to a client into the running transaction; nothing is sent where no address is kept. */
  async post(workshopId: string, { kind, client, values, enclosures }: ClientLetter): Promise<void> {
    if (client.email === '') return;
    const workshop = await this.parts.accounts.workshops.get(workshopId);
    const template = await this.parts.templates.get(workshopId, kind);
    const own = { client: greeted(client), workshop: workshop.name, ...values(letterFigures(workshop)) };
    await this.parts.mailbox.post(workshopId, {
      ...this.fill(workshop, template, own),
      to: { name: client.name, email: client.email },
      from: workshop.name,
      ...(workshop.email === '' ? {} : { replyTo: workshop.email }),
      ...(enclosures ? { enclosures } : {}),
    });
  }

  /** Tells the workshop, at its own address or else its owners. */
  async notify(workshopId: string, { kind, values, ...more }: Notice): Promise<void> {
    const workshop = await this.parts.accounts.workshops.get(workshopId);
    const own = values(letterFigures(workshop));
    const subject = words(`notice-${kind}-subject`, own);
    const text = words(`notice-${kind}-text`, own);
    const html = letterHtml(workshop, { subject, body: paragraphsOf(text) });
    for (const to of await this.readers(workshop))
      await this.parts.mailbox.post(workshopId, { to, subject, text, html, ...more });
  }

  /** A letter with these words as it would leave, filled with examples. */
  async preview(workshopId: string, kind: LetterKind, text: LetterText): Promise<FilledLetter> {
    refuseFaulty(kind, text);
    const workshop = await this.parts.accounts.workshops.get(workshopId);
    return this.fill(workshop, text, exampleValues(workshop, kind));
  }

  givenUp(workshopId: string): Promise<GivenUpLetter[]> {
    return this.parts.mailbox.givenUp(workshopId);
  }

  sendAgain(workshopId: string, letterId: string): Promise<void> {
    return this.parts.mailbox.sendAgain(workshopId, letterId);
  }

  private fill(workshop: WorkshopSettingsRow, text: LetterText, values: LetterValues): FilledLetter {
    const { html, ...plain } = filledLetter(text, values);
    return { ...plain, html: letterHtml(workshop, { subject: plain.subject, body: html }) };
  }

  private async readers({ id, name, email }: WorkshopSettingsRow): Promise<Letter['to'][]> {
    if (email !== '') return [{ name, email }];
    const people = await this.parts.accounts.people.list(id);
    return people.filter(({ roles, disabledAt }) => roles.includes('owner') && !disabledAt);
  }
}

/** Letters about what a client is to accept, or has accepted. */
const offering: readonly LetterKind[] = ['estimate', 'variation', 'accepted'];

/** What a preview is filled with; it names nobody. */
function exampleValues(workshop: WorkshopSettingsRow, kind: LetterKind): LetterValues {
  const { money, total, day } = letterFigures(workshop);
  const grossMinor = 1_284_000;
  const taxMinor = isRated(workshop.defaultTaxCategory) ? 214_000 : 0;
  return {
    client: words('example-client'),
    workshop: workshop.name,
    job: words('example-job'),
    link: 'https://example.org/client#…',
    number: words('paper-number-letter', { number: '2026-014-1', letter: 'A' }),
    total: offering.includes(kind)
      ? total({ grossMinor, taxMinor }, workshop.currency)
      : money(grossMinor, workshop.currency),
    open: money(642_000, workshop.currency),
    day: day('2026-09-30'),
    note: words('example-note'),
    text: words('example-text'),
  };
}
