import {
  copyRateCard,
  exportRateCard,
  importRateCard,
  keepRateCard,
  listRateCards,
  putRateCardInForce,
  readCardDifferences,
  readRateCard,
  removeRateCard,
  takeRateCardBack,
} from '#shared/rate-cards/rate-cards-endpoints';
import { mount, type Route } from '../platform/http/mount';
import type { CardInForceService } from './card-in-force-service';
import type { CardWorkbookService } from './card-workbook-service';
import type { DraftCardService } from './draft-card-service';
import type { RateCardHead, RateCardRow } from './rate-card-service';
import { presentRateCard, presentWholeRateCard } from './rate-card-presenter';
import type { RateCardService } from './rate-card-service';

interface Parts {
  readonly cards: RateCardService;
  readonly drafts: DraftCardService;
  readonly inForce: CardInForceService;
  readonly workbooks: CardWorkbookService;
}

type Presented = (head: RateCardHead) => Promise<ReturnType<typeof presentRateCard>>;

/** A card as a list has it, with where it stands today. */
const presenterFor =
  (cards: RateCardService): Presented =>
  async (head) =>
    presentRateCard(head, await cards.cardsToday(head.workshopId));

/** What stands where somebody saw an older version: only drafts and cards whose day has not come get as far as that question. */
const presentCurrent = (row: RateCardRow) => presentWholeRateCard(row, { day: '', inForceId: null });

const readingRoutes = (cards: RateCardService): Route[] => [
  mount(listRateCards, async ({ actor, query }) => {
    const page = await cards.page(actor.workshopId, query);
    const today = await cards.cardsToday(actor.workshopId);
    return { ...page, items: page.items.map((head) => presentRateCard(head, today)) };
  }),
  mount(readRateCard, async ({ actor, params }) => {
    const row = await cards.get(actor.workshopId, params.rateCardId);
    return presentWholeRateCard(row, await cards.cardsToday(actor.workshopId));
  }),
  mount(readCardDifferences, async ({ actor, params, query }) => {
    const { against, differences } = await cards.differences(actor.workshopId, params.rateCardId, query);
    return { against: presentRateCard(against, await cards.cardsToday(actor.workshopId)), differences };
  }),
];

const dayRoutes = (inForce: CardInForceService, present: Presented): Route[] => [
  mount(
    putRateCardInForce,
    async ({ actor, params, version, body }) =>
      present(await inForce.put(actor, { id: params.rateCardId, version }, body.from)),
    presentCurrent,
  ),
  mount(
    takeRateCardBack,
    async ({ actor, params, version }) => present(await inForce.takeBack(actor, { id: params.rateCardId, version })),
    presentCurrent,
  ),
];

const draftRoutes = (drafts: DraftCardService, present: Presented): Route[] => [
  mount(copyRateCard, async ({ actor, params, body }) => present(await drafts.copy(actor, params.rateCardId, body))),
  mount(
    keepRateCard,
    async ({ actor, params, version, body }) =>
      present(await drafts.keep(actor, { id: params.rateCardId, version }, body)),
    presentCurrent,
  ),
  mount(
    removeRateCard,
    ({ actor, params, version }) => drafts.remove(actor, { id: params.rateCardId, version }),
    presentCurrent,
  ),
];

const workbookRoutes = (workbooks: CardWorkbookService, present: Presented): Route[] => [
  mount(exportRateCard, ({ actor, params }) => workbooks.export(actor.workshopId, params.rateCardId)),
  mount(
    importRateCard,
    async ({ actor, params, version, upload }) =>
      present(await workbooks.import(actor, { id: params.rateCardId, version }, upload)),
    presentCurrent,
  ),
];

export const rateCardRoutes = ({ cards, drafts, inForce, workbooks }: Parts): Route[] => {
  const present = presenterFor(cards);
  return [
    ...readingRoutes(cards),
    ...draftRoutes(drafts, present),
    ...dayRoutes(inForce, present),
    ...workbookRoutes(workbooks, present),
  ];
};
