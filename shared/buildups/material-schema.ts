import * as z from 'zod';
import type { Material, Recipe } from '#shared/buildups/buildup-card';
import {
  cardItemId,
  cardItemName,
  decimalEntry,
  itemList,
  positiveDecimalEntry,
} from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';

const packSchema = z.strictObject({ id: cardItemId, size: positiveDecimalEntry, price: decimalEntry });

/** A material with its packs. */
export const materialSchema = z.strictObject({
  id: cardItemId,
  name: cardItemName,
  unit: z.enum(['kg', 'L']),
  pricePerUnit: decimalEntry,
  packs: itemList(packSchema, 8),
  bulk_kg_L: z.number().gt(0).max(20).nullable(),
}) satisfies z.ZodType<Material>;

const partSchema = z
  .strictObject({
    id: cardItemId,
    name: cardItemName,
    role: z.enum(['glue', 'water', 'other']),
    materialId: cardItemId.nullable(),
    parts: z.number().gt(0).max(1000),
  })
  .refine(({ role, materialId }) => (role === 'water') === (materialId === null), {
    ...complain('buildup-part-material'),
    path: ['materialId'],
  });

/** A recipe by volume. */
export const recipeSchema = z.strictObject({
  id: cardItemId,
  name: cardItemName,
  parts: itemList(partSchema, 8).min(1),
}) satisfies z.ZodType<Recipe>;
