import * as z from 'zod';
import { systems, type BuildUp } from '#shared/buildups/buildup';
import type { BuildUpCard } from '#shared/buildups/buildup-card';
import {
  cardItemId,
  cardItemName,
  cardNote,
  complainAt,
  factorEntry,
  figure,
  itemList,
  percentEntry,
} from '#shared/problems/card-entry-schema';
import { materialSchema, recipeSchema } from '#shared/buildups/material-schema';
import { stepSchema } from '#shared/buildups/step-schema';
import { complain } from '#shared/problems/complaints-of';
import { tripleEntry } from '#shared/units/triple-schema';

/** Mercury (fire) gilding poisons whoever does it and whoever lives with it: it is never offered, under any name it usually goes by. */
const fireGilding = /mercur|amalgam|fire[ -]?gil|quicksilver/i;

const isSafeName = (name: string): boolean => !fireGilding.test(name);

function lagsLeadOn({ steps }: BuildUp, context: z.core.$RefinementCtx): void {
  steps.forEach((step, at) =>
    step.drying.lags.forEach((lag, lagAt) => {
      if (!steps.slice(at + 1).some((later) => later.id === lag.toStepId)) {
        complainAt(context, ['steps', at, 'drying', 'lags', lagAt, 'toStepId'], complain('buildup-lag-leads-nowhere'));
      }
    }),
  );
}

/** A build-up with its steps in working order. */
export const buildUpSchema = z
  .strictObject({
    id: cardItemId,
    name: cardItemName.refine(isSafeName, complain('buildup-no-mercury')),
    system: z.enum(systems),
    steps: itemList(stepSchema, 40).min(1),
    note: cardNote,
  })
  .superRefine(lagsLeadOn) satisfies z.ZodType<BuildUp>;

const byFinish = z.strictObject({ plain: factorEntry, moulded: factorEntry, carved: factorEntry });

const layingMinutesSchema = z.strictObject({
  sheets_minutes: figure,
  lays_minutes: figure,
  patches_minutes: figure,
  ribbon_minutes_m: figure,
  onSizeFactor: factorEntry,
  transferFlatFactor: factorEntry,
  transferCarvedFactor: factorEntry,
});

function usesAreKnown(card: BuildUpCard, context: z.core.$RefinementCtx): void {
  const known = {
    material: new Set(card.materials.map(({ id }) => id)),
    recipe: new Set(card.recipes.map(({ id }) => id)),
  };
  card.buildUps.forEach(({ steps }, at) =>
    steps.forEach(({ uses }, stepAt) =>
      uses.forEach(({ of, itemId }, useAt) => {
        const path = ['buildUps', at, 'steps', stepAt, 'uses', useAt, 'itemId'];
        if (!known[of].has(itemId)) complainAt(context, path, complain('card-reference-unknown', { id: itemId }));
      }),
    ),
  );
}

function partsAreKnown(card: BuildUpCard, context: z.core.$RefinementCtx): void {
  const materials = new Set(card.materials.map(({ id }) => id));
  card.recipes.forEach(({ parts }, at) =>
    parts.forEach(({ materialId }, partAt) => {
      const path = ['recipes', at, 'parts', partAt, 'materialId'];
      if (materialId !== null && !materials.has(materialId))
        complainAt(context, path, complain('card-reference-unknown', { id: materialId }));
    }),
  );
}

/** The build-ups, materials and working times of a rate card; what a step or a recipe names has to be in the card. */
export const buildUpCardSchema = z
  .strictObject({
    buildUps: itemList(buildUpSchema, 60).min(1),
    materials: itemList(materialSchema, 100),
    recipes: itemList(recipeSchema, 40),
    buying: z.enum(['whole-packs', 'pro-rata']),
    finishFactors: byFinish,
    smoothingFactors: byFinish,
    laying: layingMinutesSchema,
    paintedOrnament_hours_dm2: tripleEntry(figure),
    consolidating_hours_m2: tripleEntry(figure),
    cleaning_hours_m2: tripleEntry(figure),
    protectingEdge_hours_m: figure,
    setUp_hours: figure,
    spread: tripleEntry(factorEntry),
    productiveShare_percent: z.number().min(10).max(100),
    workingDay_hours: z.number().min(1).max(24),
    burnished_percent: percentEntry,
    groundLimit_mm: z.number().min(0).max(10),
  })
  .superRefine((card, context) => {
    usesAreKnown(card, context);
    partsAreKnown(card, context);
  }) satisfies z.ZodType<BuildUpCard>;
