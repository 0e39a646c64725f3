import { readCardEffects, workCardEffects } from '#shared/rate-cards/rate-cards-endpoints';
import { mount, type Route } from '../platform/http/mount';
import { presentCardEffects } from './card-effects-presenter';
import type { CardEffectsService } from './card-effects-service';

export const cardEffectsRoutes = (effects: CardEffectsService): Route[] => [
  mount(readCardEffects, async ({ actor, params }) =>
    presentCardEffects(await effects.known(actor.workshopId, params.rateCardId)),
  ),
  mount(workCardEffects, async ({ actor, params }) =>
    presentCardEffects(await effects.begin(actor.workshopId, params.rateCardId)),
  ),
];
