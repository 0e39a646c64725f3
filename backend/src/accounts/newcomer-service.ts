import { v7 as newId } from 'uuid';
import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../platform/clock/clock';
import type { AccountRow } from './account-model';
import type { AccountRepository } from './account-repository';
import type { LoginThrottleService } from './login-throttle-service';
import { fitsPassword, hashPassword } from './password-hash';
import { refuseWeakPassword } from './password-policy';

interface Newcomer {
  readonly name: string;
  readonly email: string;
  readonly password: string;
  readonly address: string;
}

interface Parts {
  readonly accounts: AccountRepository;
  readonly throttle: LoginThrottleService;
  readonly clock: Clock;
}

/** Somebody who comes by a mailed link: the link proves the address, the password whether they are who is known under it. */
export class NewcomerService {
  constructor(private readonly parts: Parts) {}

  /** The account of the address: the known one if the password fits it, else a new one with this password. */
  async welcome(newcomer: Newcomer, workshopName: string): Promise<AccountRow> {
    const known = await this.parts.accounts.byEmail(newcomer.email);
    if (known) return this.recognise(known, newcomer);
    refuseWeakPassword(newcomer.password, [newcomer.email, newcomer.name, workshopName]);
    const { name, email, password } = newcomer;
    return this.parts.accounts.insert({
      id: newId(),
      name,
      email,
      passwordHash: await hashPassword(password),
      createdAt: this.parts.clock.now(),
    });
  }

  private async recognise(known: AccountRow, { password, address }: Newcomer): Promise<AccountRow> {
    await this.parts.throttle.begin(known.email, address);
    if (!(await fitsPassword(password, known.passwordHash))) throw new Rejection('not-allowed', 'password-wrong');
    await this.parts.throttle.succeeded(known.email, address);
    return known;
  }
}
