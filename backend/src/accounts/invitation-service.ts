import { v7 as newId } from 'uuid';
import type { InvitationReading, NewInvitation } from '#shared/accounts/people-schema';
import type { Actor } from '#shared/actor/actor';
import { Rejection } from '#shared/problems/rejection';
import type { AuditService } from '../audit';
import type { Clock } from '../platform/clock/clock';
import type { Mailbox } from '../platform/mail/mailbox';
import type { Identity } from '../platform/session/session-control';
import type { AccountRepository } from './account-repository';
import type { InvitationRow } from './invitation-model';
import type { InvitationRepository } from './invitation-repository';
import type { Letters } from './letters';
import { hashOfToken, newToken } from './new-token';
import type { MembershipRepository } from './membership-repository';
import type { NewcomerService } from './newcomer-service';
import type { WorkshopService } from './workshop-service';

const life_milliseconds = 3 * 24 * 3_600_000;

interface Parts {
  readonly invitations: InvitationRepository;
  readonly accounts: AccountRepository;
  readonly memberships: MembershipRepository;
  readonly newcomers: NewcomerService;
  readonly workshops: WorkshopService;
  readonly letters: Letters;
  readonly mailbox: Mailbox;
  readonly audit: AuditService;
  readonly clock: Clock;
}

/** What somebody enters who accepts an invitation. */
export interface Acceptance {
  readonly token: string;
  readonly name: string;
  readonly password: string;
  readonly address: string;
}

/** Inviting people into a workshop by mail. */
export class InvitationService {
  constructor(private readonly parts: Parts) {}

  open(workshopId: string): Promise<InvitationRow[]> {
    return this.parts.invitations.open(workshopId, this.parts.clock.now());
  }

  async invite(actor: Actor, wanted: NewInvitation): Promise<InvitationRow> {
    const { invitations, letters, mailbox, workshops, clock } = this.parts;
    await this.refuseMember(actor.workshopId, wanted.email);
    const { token, tokenHash } = newToken();
    const createdAt = clock.now();
    const endsAt = new Date(createdAt.getTime() + life_milliseconds);
    const row = await invitations.insert(actor.workshopId, {
      id: newId(),
      ...wanted,
      tokenHash,
      acceptedAt: null,
      createdAt,
      endsAt,
    });
    const { name } = await workshops.get(actor.workshopId);
    await mailbox.post(actor.workshopId, letters.invitation(wanted, { token, workshop: name, by: actor.name }));
    await this.record(actor, row, 'history-person-invited');
    return row;
  }

  async withdraw(actor: Actor, id: string): Promise<void> {
    const row = await this.parts.invitations.lock(actor.workshopId, id);
    if (row.acceptedAt) throw new Rejection('not-found', 'problem-not-found');
    await this.parts.invitations.remove(actor.workshopId, id);
    await this.record(actor, row, 'history-invitation-withdrawn');
  }

  async read(token: string): Promise<InvitationReading> {
    const row = await this.valid(token);
    const { name: workshopName } = await this.parts.workshops.get(row.workshopId);
    const isKnown = Boolean(await this.parts.accounts.byEmail(row.email));
    return { workshopName, name: row.name, email: row.email, isKnown };
  }

  async accept({ token, name, password, address }: Acceptance): Promise<Identity> {
    const row = await this.valid(token);
    const { name: workshopName } = await this.parts.workshops.get(row.workshopId);
    const account = await this.parts.newcomers.welcome({ name, email: row.email, password, address }, workshopName);
    await this.refuseMember(row.workshopId, row.email);
    const joining = { accountId: account.id, name: account.name, roles: row.roles };
    const membershipId = await this.parts.workshops.join(row.workshopId, joining);
    await this.parts.invitations.write(row.workshopId, row.id, { acceptedAt: this.parts.clock.now() });
    const by = { workshopId: row.workshopId, accountId: account.id, name: account.name };
    const subject = { kind: 'person', id: membershipId };
    await this.parts.audit.record(by, {
      subject,
      code: 'history-person-joined',
      values: { name: account.name },
      after: { roles: row.roles },
    });
    return { accountId: account.id, membershipId };
  }

  private async valid(token: string): Promise<InvitationRow> {
    const row = await this.parts.invitations.lockByToken(hashOfToken(token));
    if (!row || row.acceptedAt || row.endsAt <= this.parts.clock.now()) throw new Rejection('gone', 'problem-gone');
    return row;
  }

  private async refuseMember(workshopId: string, email: string): Promise<void> {
    const account = await this.parts.accounts.byEmail(email);
    if (account && (await this.parts.memberships.byAccount(workshopId, account.id)))
      throw new Rejection('conflict', 'already-member');
  }

  private record(
    actor: Actor,
    row: InvitationRow,
    code: 'history-person-invited' | 'history-invitation-withdrawn',
  ): Promise<void> {
    return this.parts.audit.record(actor, {
      subject: { kind: 'invitation', id: row.id },
      code,
      values: { name: row.name },
    });
  }
}
