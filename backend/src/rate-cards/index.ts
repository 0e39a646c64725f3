import type { Accounts } from '../accounts';
import type { Audit } from '../audit';
import type { Route } from '../platform/http/mount';
import type { Platform } from '../platform/platform';
import { CardEffectsRepository } from './card-effects-repository';
import { cardEffectsRoutes } from './card-effects-routes';
import { CardEffectsService, type CardEffects } from './card-effects-service';
import { CardHistory } from './card-history';
import { CardInForceService } from './card-in-force-service';
import { CardWorkbookService } from './card-workbook-service';
import { DraftCardService } from './draft-card-service';
import { RateCardRepository } from './rate-card-repository';
import { rateCardRoutes } from './rate-card-routes';
import { RateCardService } from './rate-card-service';

export type { CardEffects, TellProgress } from './card-effects-service';
export type { CardInForceService } from './card-in-force-service';
export type { CardWorkbookService } from './card-workbook-service';
export type { DraftCardService } from './draft-card-service';
export type { RateCardRow } from './rate-card-model';
export type { RateCardService } from './rate-card-service';

/** What other features and the start data may ask of this one. */
export interface RateCards {
  readonly service: RateCardService;
  readonly drafts: DraftCardService;
  readonly inForce: CardInForceService;
  readonly workbooks: CardWorkbookService;
  readonly routes: readonly Route[];
}

/** What this feature stands on, and what a later one tells it. */
export interface RateCardsParts {
  readonly accounts: Accounts;
  readonly audit: Audit;
  readonly effects: CardEffects;
}

/** Rate cards: what hours, leaf and materials cost the workshop, from which day. */
export function openRateCards(platform: Platform, { accounts, audit, effects: workOut }: RateCardsParts): RateCards {
  const { database, clock, tasks } = platform;
  const cards = new RateCardRepository(database);
  const history = new CardHistory(audit.service);
  const service = new RateCardService({ cards, workshops: accounts.workshops, audit: audit.service, clock });
  const effects = new CardEffectsRepository(database);
  const drafts = new DraftCardService({ cards, effects, history, clock, workshops: accounts.workshops });
  const inForce = new CardInForceService({
    ...{ cards, effects, history, clock },
    today: (workshopId) => service.today(workshopId),
  });
  const effectsService = new CardEffectsService({ cards, effects, tasks, clock, workOut });
  const workbooks = new CardWorkbookService({ cards, drafts, workshops: accounts.workshops });
  const routes = [
    ...rateCardRoutes({ cards: service, drafts, inForce, workbooks }),
    ...cardEffectsRoutes(effectsService),
  ];
  return { service, drafts, inForce, workbooks, routes };
}
