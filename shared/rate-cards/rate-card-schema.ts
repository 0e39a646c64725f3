import * as z from 'zod';
import { buildUpCardSchema } from '#shared/buildups/buildup-card-schema';
import { carvingCardSchema } from '#shared/carving/carving-card-schema';
import { dryingCardSchema } from '#shared/drying/drying-card-schema';
import { leafCardSchema } from '#shared/leaf/leaf-card-schema';
import { measureCardSchema } from '#shared/measure/measure-card-schema';
import { complainAt } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { cardReferences } from '#shared/rate-cards/card-references';
import { moneyCardSchema } from '#shared/rate-cards/money-card-schema';
import type { RateCard } from '#shared/rate-cards/rate-card';

function referencesAreKnown(card: RateCard, context: z.core.$RefinementCtx): void {
  const known = {
    grade: new Set(card.money.grades.map(({ id }) => id)),
    leaf: new Set(card.leaf.products.map(({ id }) => id)),
    timber: new Set(card.carving.timbers.map(({ id }) => id)),
  };
  for (const { kind, path, itemId } of cardReferences(card)) {
    if (!known[kind].has(itemId)) complainAt(context, [...path], complain(`card-${kind}-unknown`));
  }
}

/** A whole rate card: strict, ids once in each list, and every grade, leaf, timber, material and recipe it names is in it. */
export const rateCardSchema = z
  .strictObject({
    measure: measureCardSchema,
    carving: carvingCardSchema,
    leaf: leafCardSchema,
    buildUps: buildUpCardSchema,
    drying: dryingCardSchema,
    money: moneyCardSchema,
  })
  .superRefine(referencesAreKnown) satisfies z.ZodType<RateCard>;
