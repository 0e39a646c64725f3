import { randomInt } from 'node:crypto';
import { v7 as newId } from 'uuid';
import { putRateCardInForce, type WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import type { MatrixRows } from '../matrix-row';
import { cardInForce, dayAhead, draftCard, workOut } from '../sample-card';
import type { Api, TestWorkshop } from '../start-api';

const at = ({ id, version }: Pick<WholeRateCard, 'id' | 'version'>) => ({ params: { rateCardId: id }, version });
const inForce = async (workshop: TestWorkshop) => ({ params: { rateCardId: (await cardInForce(workshop)).id } });
const draft = async (workshop: TestWorkshop) => at(await draftCard(workshop));

/** Days that no other test is likely to take. */
const someDay = (workshop: TestWorkshop, api: Api): Promise<string> =>
  dayAhead(workshop, api, randomInt(400, 2_000_000));

async function seenCard(workshop: TestWorkshop, api: Api): Promise<WholeRateCard> {
  const card = await draftCard(workshop);
  await workOut(workshop, api, card.id);
  return card;
}

async function setCard(workshop: TestWorkshop, api: Api) {
  const card = await seenCard(workshop, api);
  const body = { from: await someDay(workshop, api) };
  const response = await workshop.people.owner.visitor.call(putRateCardInForce, { ...at(card), body });
  return at(response.body as WholeRateCard);
}

async function workbookOf(workshop: TestWorkshop, api: Api): Promise<Buffer> {
  const { id } = await cardInForce(workshop);
  return (await api.app.rateCards.workbooks.export(workshop.id, id)).bytes;
}

export const rateCardsRows: MatrixRows = {
  listRateCards: { prepare: () => ({ query: { limit: 100 } }) },
  readRateCard: { prepare: inForce },
  copyRateCard: {
    prepare: async (workshop) => ({
      ...(await inForce(workshop)),
      body: { id: newId(), name: `${workshop.mark} copy` },
    }),
    history: 'history-rate-card-copied',
  },
  keepRateCard: {
    prepare: async (workshop) => {
      const card = await draftCard(workshop);
      return { ...at(card), body: { name: `${workshop.mark} renamed`, content: card.content } };
    },
    history: 'history-rate-card-changed',
  },
  removeRateCard: { prepare: draft, history: 'history-rate-card-removed' },
  readCardDifferences: { prepare: draft },
  workCardEffects: { prepare: draft },
  readCardEffects: { prepare: draft },
  putRateCardInForce: {
    prepare: async (workshop, api) => ({
      ...at(await seenCard(workshop, api)),
      body: { from: await someDay(workshop, api) },
    }),
    history: 'history-rate-card-in-force',
  },
  takeRateCardBack: { prepare: setCard, history: 'history-rate-card-taken-back' },
  exportRateCard: { prepare: inForce },
  importRateCard: {
    prepare: async (workshop, api) => ({
      ...(await draft(workshop)),
      file: { name: 'rates.xlsx', bytes: await workbookOf(workshop, api) },
    }),
    history: 'history-rate-card-filled',
  },
};
