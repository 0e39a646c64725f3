import * as z from 'zod';
import {
  cautionNames,
  climateModels,
  holdPoints,
  layerColours,
  missedWindows,
  stepKinds,
  type BuildUpStep,
} from '#shared/buildups/buildup';
import { cardItemId, cardItemName, cardNote, factorEntry, figure, lossEntry } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { tripleEntry } from '#shared/units/triple-schema';

const coats = z.int().min(0).max(30);

export const coatsSchema = z.strictObject({
  plain: coats,
  moulded: coats,
  carved: coats,
  recut: coats,
  frenchRecut: coats,
});

export const stepWorkSchema = z.discriminatedUnion('way', [
  z.strictObject({ way: z.literal('area'), hours_m2: figure, factors: z.enum(['finish', 'smoothing', 'none']) }),
  z.strictObject({ way: z.literal('laying'), part: z.enum(['first', 'faulting', 'second']) }),
  z.strictObject({ way: z.enum(['consolidating', 'cleaning', 'recutting', 'edge', 'waiting']) }),
]);

const takenOf = {
  of: z.enum(['material', 'recipe']),
  itemId: cardItemId,
  loss_percent: lossEntry,
  share: z.number().gt(0).max(1),
};

export const materialUseSchema = z.discriminatedUnion('way', [
  z.strictObject({ way: z.literal('grams'), grams_m2: figure, ...takenOf }),
  z.strictObject({ way: z.literal('coverage'), coverage_m2_L: factorEntry, ...takenOf }),
  z.strictObject({ way: z.literal('litres'), litres_m2: figure, ...takenOf }),
]);

/** Drying times: up to a year, in minutes. */
const minutes = z.number().min(0).max(525_600);
const window = minutes.nullable();

export const stepLagSchema = z.strictObject({
  toStepId: cardItemId,
  least_minutes: window,
  finishedWithin_minutes: window,
});

const stepDrying = z.strictObject({
  model: z.enum(climateModels),
  betweenCoats_minutes: tripleEntry(minutes),
  latestCoat_minutes: window,
  beforeNext_minutes: tripleEntry(minutes),
  window_minutes: window,
  endsInWindow: z.boolean(),
  wholeWithin_minutes: window,
  lags: z.array(stepLagSchema).max(8),
  missed: z.enum(missedWindows).nullable(),
});

export const stepDryingSchema = stepDrying.refine(
  ({ latestCoat_minutes, betweenCoats_minutes }) =>
    latestCoat_minutes === null || latestCoat_minutes >= betweenCoats_minutes.likely,
  { ...complain('buildup-window-closed'), path: ['latestCoat_minutes'] },
);

/** One step of a build-up as the rate card keeps it. */
export const stepSchema = z.strictObject({
  id: cardItemId,
  kind: z.enum(stepKinds),
  name: cardItemName,
  coats: coatsSchema,
  areaPart: z.enum(['all', 'burnished', 'matte']),
  work: stepWorkSchema,
  gradeId: cardItemId,
  uses: z.array(materialUseSchema).max(8),
  drying: stepDryingSchema,
  groundPerCoat_mm: z.number().min(0).max(5),
  cautions: z.array(z.enum(cautionNames)).max(cautionNames.length),
  holds: z.array(z.enum(holdPoints)).max(holdPoints.length),
  optional: z.boolean(),
  colour: z.enum(layerColours),
  note: cardNote,
}) satisfies z.ZodType<BuildUpStep>;
