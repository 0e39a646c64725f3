import { currencyDigits } from '#shared/money/currency-digits';
import { Rejection } from '#shared/problems/rejection';
import { formatsFor } from '#shared/units/formats-for';
import type { ValueFormats } from '#shared/words/say';
import type { Identities, Identity, SignedIn } from '../platform/session/session-control';
import type { AccountRepository } from './account-repository';
import type { LoginThrottleService } from './login-throttle-service';
import type { MembershipRepository } from './membership-repository';
import { fitsPassword } from './password-hash';
import type { SessionFacts } from './session-presenter';
import type { WorkshopRepository } from './workshop-repository';

interface Parts {
  readonly accounts: AccountRepository;
  readonly memberships: MembershipRepository;
  readonly workshops: WorkshopRepository;
  readonly throttle: LoginThrottleService;
}

/** Who somebody is: at sign-in by their password, afterwards by what the session remembers. */
export class IdentityService implements Identities {
  constructor(private readonly parts: Parts) {}

  async load(identity: Identity): Promise<SignedIn | undefined> {
    const account = await this.parts.accounts.find(identity.accountId);
    if (!account) return undefined;
    const person = { accountId: account.id, email: account.email, name: account.name };
    if (identity.membershipId === undefined) return { person, actor: undefined };
    const membership = await this.parts.memberships.ofIdentity(identity.accountId, identity.membershipId);
    if (!membership) return undefined;
    const { workshopId, roles } = membership;
    return {
      person,
      actor: { accountId: account.id, membershipId: membership.id, workshopId, name: account.name, roles },
    };
  }

  async formatsOf(workshopId: string): Promise<ValueFormats> {
    const { locale, currency, lengthUnit } = await this.parts.workshops.get(workshopId);
    return formatsFor({ locale, currency, lengthUnit, digits: currencyDigits(currency) });
  }

  /** Takes as long for an unknown address as for a wrong password, and says no more of either. */
  async verify({
    email,
    password,
    address,
  }: {
    email: string;
    password: string;
    address: string;
  }): Promise<Identity | undefined> {
    await this.parts.throttle.begin(email, address);
    const account = await this.parts.accounts.byEmail(email);
    if (!(await fitsPassword(password, account?.passwordHash)) || !account) return undefined;
    await this.parts.throttle.succeeded(email, address);
    return this.identityOf(account.id);
  }

  /** The identity of a person, in the workshop they belonged to first unless another is named. */
  async identityOf(accountId: string, workshopId?: string): Promise<Identity> {
    const memberships = await this.parts.memberships.ofPerson(accountId);
    const chosen = memberships.find((one) => one.workshopId === workshopId) ?? memberships[0];
    return chosen ? { accountId, membershipId: chosen.id } : { accountId };
  }

  /** The identity of a person in another of their workshops; refused as not found if it is not theirs. */
  async entering(accountId: string, membershipId: string): Promise<Identity> {
    if (!(await this.parts.memberships.ofIdentity(accountId, membershipId)))
      throw new Rejection('not-found', 'problem-not-found');
    return { accountId, membershipId };
  }

  async facts({ accountId, membershipId }: Identity): Promise<SessionFacts> {
    const memberships = await this.parts.memberships.ofPerson(accountId);
    const membership = memberships.find(({ id }) => id === membershipId);
    return {
      account: await this.parts.accounts.get(accountId),
      memberships,
      membershipId,
      workshop: membership && (await this.parts.workshops.get(membership.workshopId)),
    };
  }
}
