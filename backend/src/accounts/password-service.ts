import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../platform/clock/clock';
import type { Log } from '../platform/log/log';
import type { Mailbox } from '../platform/mail/mailbox';
import type { Person } from '../platform/session/session-control';
import type { SessionList } from '../platform/session/session-list';
import type { Tasks } from '../platform/tasks/tasks';
import type { AccountRepository } from './account-repository';
import type { Letters } from './letters';
import type { LoginThrottleService } from './login-throttle-service';
import type { MailedLinks } from './mailed-links';
import type { MembershipRepository } from './membership-repository';
import { fitsPassword, hashPassword } from './password-hash';
import { refuseWeakPassword } from './password-policy';

const requestKind = 'password-reset-request';
const life_minutes = 10;

interface Parts {
  readonly accounts: AccountRepository;
  readonly memberships: MembershipRepository;
  readonly links: MailedLinks;
  readonly sessions: SessionList;
  readonly mailbox: Mailbox;
  readonly letters: Letters;
  readonly tasks: Tasks;
  readonly throttle: LoginThrottleService;
  readonly clock: Clock;
  readonly log: Log;
}

/** Passwords: changing one's own, and a new one by mail. */
export class PasswordService {
  constructor(private readonly parts: Parts) {
    parts.tasks.register<{ email: string }>(requestKind, ({ email }) => this.mailLink(email));
  }

  /** Sets a new password for somebody who knows the current one; wrong ones count like wrong sign-ins. */
  async change(person: Person, entry: { current: string; password: string; address: string }): Promise<void> {
    const { accounts, throttle } = this.parts;
    await throttle.begin(person.email, entry.address);
    const account = await accounts.get(person.accountId);
    if (!(await fitsPassword(entry.current, account.passwordHash)))
      throw new Rejection('not-allowed', 'password-wrong');
    await throttle.succeeded(person.email, entry.address);
    await this.set(person, entry.password);
  }

  /** Does the same for every address: whether it is known is found out later, when nobody waits for the answer. */
  async askForReset(email: string): Promise<void> {
    await this.parts.tasks.add({ workshopId: null, kind: requestKind, content: { email } });
  }

  async resetByLink(token: string, password: string): Promise<void> {
    const { accountId } = await this.parts.links.use<{ accountId: string }>('reset', token);
    const account = await this.parts.accounts.get(accountId);
    await this.set({ accountId, email: account.email, name: account.name }, password);
  }

  private async set(person: Person, password: string): Promise<void> {
    const memberships = await this.parts.memberships.ofPerson(person.accountId);
    refuseWeakPassword(password, [person.email, person.name, ...memberships.map(({ workshopName }) => workshopName)]);
    await this.parts.accounts.setPassword(person.accountId, await hashPassword(password));
    await this.parts.sessions.endOthers(person.accountId);
    await this.parts.links.end('reset', person.email);
    this.parts.log.info({ accountId: person.accountId }, 'password changed, sessions ended');
  }

  private async mailLink(email: string): Promise<void> {
    const account = await this.parts.accounts.byEmail(email);
    if (!account) return;
    const token = await this.parts.links.make({
      purpose: 'reset',
      about: email,
      content: { accountId: account.id },
      life_minutes,
    });
    if (token) await this.parts.mailbox.post(null, this.parts.letters.reset(account, token));
  }
}
