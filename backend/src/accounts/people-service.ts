import type { Actor } from '#shared/actor/actor';
import type { Role } from '#shared/actor/role';
import { Rejection } from '#shared/problems/rejection';
import type { WordCode } from '#shared/words/word-code';
import type { AuditService } from '../audit';
import type { Clock } from '../platform/clock/clock';
import type { SessionList } from '../platform/session/session-list';
import type { AccountRepository } from './account-repository';
import type { MembershipRow, PersonRow } from './membership-model';
import type { MembershipRepository } from './membership-repository';

interface Parts {
  readonly accounts: AccountRepository;
  readonly memberships: MembershipRepository;
  readonly sessions: SessionList;
  readonly audit: AuditService;
  readonly clock: Clock;
}

/** Which membership is changed, from which version. */
export interface At {
  readonly id: string;
  readonly version: number;
}

type Change = Partial<Pick<MembershipRow, 'roles' | 'disabledAt'>>;

const isOwnerNow = ({ roles, disabledAt }: Pick<MembershipRow, 'roles' | 'disabledAt'>): boolean =>
  roles.includes('owner') && !disabledAt;

/** The people of a workshop: what they do there, and whether they may still come in. */
export class PeopleService {
  constructor(private readonly parts: Parts) {}

  list(workshopId: string): Promise<PersonRow[]> {
    return this.parts.memberships.people(workshopId);
  }

  async changeRoles(actor: Actor, at: At, roles: readonly Role[]): Promise<PersonRow> {
    return this.change(actor, at, { change: { roles }, code: 'history-roles-changed' });
  }

  /** Ending access ends the person's sessions in this workshop at once. */
  async changeAccess(actor: Actor, at: At, isDisabled: boolean): Promise<PersonRow> {
    const code = isDisabled ? 'history-access-ended' : 'history-access-restored';
    const person = await this.change(actor, at, {
      change: { disabledAt: isDisabled ? this.parts.clock.now() : null },
      code,
    });
    if (isDisabled) await this.parts.sessions.endMembership(at.id);
    return person;
  }

  async changeOwnName(accountId: string, name: string): Promise<void> {
    await this.parts.accounts.setName(accountId, name);
  }

  private async change(actor: Actor, at: At, { change, code }: { change: Change; code: WordCode }): Promise<PersonRow> {
    const { memberships, accounts, audit } = this.parts;
    const before = await this.keepingAnOwner(actor.workshopId, at.id, change);
    const { name, email } = await accounts.get(before.accountId);
    if (before.version !== at.version)
      throw new Rejection('stale', 'problem-stale', { detail: { ...before, name, email } });
    const after = await memberships.change(actor.workshopId, at, change);
    await audit.record(actor, {
      subject: { kind: 'person', id: at.id },
      code,
      values: { name },
      before: { roles: before.roles },
      after: { roles: after.roles },
    });
    return { ...after, name, email };
  }

  /** Refuses a change after which the workshop would have no owner. */
  private async keepingAnOwner(workshopId: string, id: string, change: Change): Promise<MembershipRow> {
    const all = await this.parts.memberships.lockAll(workshopId);
    const before = all.find((one) => one.id === id);
    if (!before) throw new Rejection('not-found', 'problem-not-found');
    const after = all.map((one) => (one.id === id ? { ...one, ...change } : one));
    if (!after.some(isOwnerNow)) throw new Rejection('conflict', 'last-owner');
    return before;
  }
}
