import type { Accounts } from '../accounts';
import type { Audit } from '../audit';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import { RateCardRepository } from './rate-card-repository';
import { rateCardRoutes } from './rate-card-routes';
import { RateCardService } from './rate-card-service';

export type { RateCardRow } from './rate-card-model';
export type { RateCardService } from './rate-card-service';

export interface RateCards {
  readonly service: RateCardService;
  readonly routes: readonly Route[];
}

/** Rate cards: what hours, leaf and materials cost the workshop. */
export function openRateCards({ database, clock }: Platform, accounts: Accounts, audit: Audit): RateCards {
  const service = new RateCardService({
    cards: new RateCardRepository(database),
    workshops: accounts.workshops,
    audit: audit.service,
    clock,
  });
  return { service, routes: rateCardRoutes(service) };
}
