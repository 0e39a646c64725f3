import type { NewWorkshop } from '#shared/accounts/workshop-schema';
import type { Mailbox } from '../platform/mail/mailbox';
import type { Identity, Person } from '../platform/session/session-control';
import type { Tasks } from '../platform/tasks/tasks';
import type { IdentityService } from './identity-service';
import type { Letters } from './letters';
import type { MailedLinks } from './mailed-links';
import type { NewcomerService } from './newcomer-service';
import type { AccountRepository } from './account-repository';
import type { WorkshopService } from './workshop-service';

const requestKind = 'foundation-request';
const life_minutes = 60;

/** What somebody wrote who wants to found a workshop. */
export interface Foundation {
  readonly name: string;
  readonly email: string;
  readonly workshop: NewWorkshop;
}

interface Parts {
  readonly accounts: AccountRepository;
  readonly newcomers: NewcomerService;
  readonly identities: IdentityService;
  readonly workshops: WorkshopService;
  readonly links: MailedLinks;
  readonly letters: Letters;
  readonly mailbox: Mailbox;
  readonly tasks: Tasks;
}

/** Founding a workshop: first the e-mail address is proved, so that nobody learns who is known here. */
export class FoundationService {
  constructor(private readonly parts: Parts) {
    parts.tasks.register<Foundation>(requestKind, (foundation) => this.mailLink(foundation));
  }

  async ask(foundation: Foundation): Promise<void> {
    await this.parts.tasks.add({ workshopId: null, kind: requestKind, content: foundation });
  }

  async byLink(token: string, entry: { password: string; address: string }): Promise<Identity> {
    const { name, email, workshop } = await this.parts.links.use<Foundation>('foundation', token);
    const account = await this.parts.newcomers.welcome({ name, email, ...entry }, workshop.name);
    return this.another({ accountId: account.id, email, name: account.name }, workshop);
  }

  /** Founds another workshop for somebody known. */
  async another(person: Person, workshop: NewWorkshop): Promise<Identity> {
    const workshopId = await this.parts.workshops.found(person, workshop);
    return this.parts.identities.identityOf(person.accountId, workshopId);
  }

  private async mailLink(foundation: Foundation): Promise<void> {
    const { email, name, workshop } = foundation;
    const token = await this.parts.links.make({
      purpose: 'foundation',
      about: email,
      content: foundation,
      life_minutes,
    });
    if (!token) return;
    const known = await this.parts.accounts.byEmail(email);
    const to = { name: known?.name ?? name, email };
    await this.parts.mailbox.post(
      null,
      this.parts.letters.foundation(to, { token, workshop: workshop.name, isKnown: Boolean(known) }),
    );
  }
}
