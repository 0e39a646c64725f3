import { listRateCards, readRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { mount, type Route } from '../platform/http/mount';
import { presentRateCard, presentWholeRateCard } from './rate-card-presenter';
import type { RateCardService } from './rate-card-service';

export const rateCardRoutes = (cards: RateCardService): Route[] => [
  mount(listRateCards, async ({ actor, query }) => {
    const page = await cards.page(actor.workshopId, query);
    const today = await cards.cardsToday(actor.workshopId);
    return { ...page, items: page.items.map((head) => presentRateCard(head, today)) };
  }),
  mount(readRateCard, async ({ actor, params }) => {
    const row = await cards.get(actor.workshopId, params.rateCardId);
    return presentWholeRateCard(row, await cards.cardsToday(actor.workshopId));
  }),
];
