import { v7 as newId } from 'uuid';
import { copyRateCard, listRateCards, readRateCard, workCardEffects } from '#shared/rate-cards/rate-cards-endpoints';
import type { WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import type { CardEffectsAnswer } from '#shared/rate-cards/card-effects-schema';
import type { RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import { addDays } from '#shared/calendar/add-days';
import type { Api, TestWorkshop } from './start-api';

/** The rate card the workshop works with today. */
export async function cardInForce(workshop: TestWorkshop): Promise<RateCardSummary> {
  const response = await workshop.people.owner.visitor.call(listRateCards);
  const card = (response.body as { items: RateCardSummary[] }).items.find(({ state }) => state === 'in-force');
  if (!card) throw new Error('no card is in force');
  return card;
}

/** A new draft, as a copy of the card in force. */
export async function draftCard(workshop: TestWorkshop, name = `${workshop.mark} rates`): Promise<WholeRateCard> {
  const from = await cardInForce(workshop);
  const { visitor } = workshop.people.owner;
  const id = newId();
  await visitor.call(copyRateCard, { params: { rateCardId: from.id }, body: { id, name } });
  return wholeCard(workshop, id);
}

export async function wholeCard(workshop: TestWorkshop, rateCardId: string): Promise<WholeRateCard> {
  const response = await workshop.people.owner.visitor.call(readRateCard, { params: { rateCardId } });
  return response.body as WholeRateCard;
}

/** Has the effects of a card worked out, as one does before it is put in force. */
export async function workOut(workshop: TestWorkshop, api: Api, rateCardId: string): Promise<CardEffectsAnswer> {
  const asked = await workshop.people.owner.visitor.call(workCardEffects, { params: { rateCardId } });
  await api.platform.tasks.runDue();
  return asked.body as CardEffectsAnswer;
}

/** The day it is in the workshop, and so many days later. */
export const dayAhead = async (workshop: TestWorkshop, api: Api, days: number): Promise<string> =>
  addDays(await api.app.rateCards.service.today(workshop.id), days);
