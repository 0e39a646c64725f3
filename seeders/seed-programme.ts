import type { Actor } from '#shared/actor/actor';
import { programme } from '#shared/programme/programme';
import type { App } from '../backend/src/app';
import { demonstrationShop } from './demonstration-shop';

/** Enters what the workshop has to work with, each at the bench who signs in by their own membership. */
export async function seedShop({ accounts, programme: feature, rateCards }: App, actor: Actor): Promise<void> {
  const today = await rateCards.service.today(actor.workshopId);
  const people = await accounts.people.list(actor.workshopId);
  const memberships = new Map(people.map(({ name, id }) => [name, id]));
  await feature.shops.keep(actor, 0, demonstrationShop(today, memberships));
}

/** Working days kept in hand before the day that is offered. */
const inHand_days = 5;

/** Plans an estimate from today on around whatever is promised already, and keeps the first plan that is found. */
export async function seedPlan({ programme: feature }: App, actor: Actor, estimateId: string): Promise<void> {
  const { programmes } = feature;
  const { inputs } = await programmes.read(actor.workshopId, estimateId);
  const entered = await programmes.keep(actor, { id: estimateId, version: 0 }, { ...inputs, inHand_days });
  const plan = programme(entered.request, { limit: { nodes: 1 } });
  await programmes.keepPlan(actor, { id: estimateId, version: entered.version }, plan);
}
