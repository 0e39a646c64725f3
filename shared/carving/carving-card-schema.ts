import * as z from 'zod';
import { type CarvingCard, type CarvingStage, learningModels } from '#shared/carving/carving-card';
import { carvingItemKinds, ornamentWays } from '#shared/carving/ornament';
import { planCurves } from '#shared/carving/plan-curve';
import { least_mm } from '#shared/measure/length-schema';
import { reliefs } from '#shared/measure/relief';
import {
  cardItemId,
  cardItemName,
  factorEntry,
  figure,
  itemList,
  percentEntry,
} from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { tripleEntry } from '#shared/units/triple-schema';

const hours = tripleEntry(z.number().min(0).max(10_000));
const reference_mm = z.number().min(least_mm).max(100_000);
const shrinkage = z.number().min(0).max(0.02);

const ornamentSchema = z.strictObject({
  id: cardItemId,
  name: cardItemName,
  way: z.enum(ornamentWays),
  reference_mm,
  relief: z.enum(reliefs),
  hours,
  patternHours: hours,
  isRunning: z.boolean(),
});

const itemSchema = z.strictObject({
  id: cardItemId,
  name: cardItemName,
  kind: z.enum(carvingItemKinds),
  way: z.enum(ornamentWays),
  reference_mm: reference_mm.nullable(),
  hours,
  gradeId: cardItemId,
});

const timberSchema = z.strictObject({
  id: cardItemId,
  name: cardItemName,
  factor: factorEntry,
  radialCoefficient: shrinkage,
  tangentialCoefficient: shrinkage,
  density_kgm3: z.number().min(50).max(1500).nullable(),
  sideHardness_newtons: z.number().gt(0).max(100_000).nullable(),
});

const stageSchema = z.strictObject({
  id: cardItemId,
  name: cardItemName,
  share_hundredths: z.int().min(0).max(10_000),
  gradeId: cardItemId,
});

const comeToAll = (stages: readonly CarvingStage[]): boolean =>
  stages.reduce((sum, stage) => sum + stage.share_hundredths, 0) === 10_000;

const plateau = z.int().min(1).max(100_000);

const learningSchema = z.strictObject({
  model: z.enum(learningModels),
  rate_percent: z.number().min(50).max(100),
  plateauPieces: plateau,
  plateauRunning: plateau,
});

const recuttingRate = z.strictObject({ share_percent: percentEntry, hours_per_m2: figure });

const byPlan = z.record(z.enum(planCurves), factorEntry);

const listsApart = (card: {
  readonly ornaments: readonly { id: string }[];
  readonly items: readonly { id: string }[];
}) => !card.items.some((item) => card.ornaments.some((ornament) => ornament.id === item.id));

/** The carving part of a rate card; stages come to exactly 100 %, and an id stands in one list only. */
export const carvingCardSchema = z
  .strictObject({
    ornaments: itemList(ornamentSchema, 200),
    items: itemList(itemSchema, 100),
    timbers: itemList(timberSchema, 60),
    reliefFactors: z.record(z.enum(reliefs), factorEntry),
    undercut_percent: z.number().min(0).max(300),
    planFactors: byPlan,
    blankPlanFactors: byPlan,
    sizeExponent: z.number().min(0).max(3),
    learning: learningSchema,
    stretchTolerance_percent: percentEntry,
    stages: itemList(stageSchema, 20).refine(comeToAll, complain('carving-stages-not-whole')),
    undercuttingGradeId: cardItemId,
    patternGradeId: cardItemId,
    sharpening_percent: percentEntry,
    recutting: z.strictObject({
      plain: recuttingRate,
      french: recuttingRate,
      gradeId: cardItemId,
    }),
  })
  .refine(listsApart, { ...complain('entry-twice'), path: ['items'] }) satisfies z.ZodType<CarvingCard>;
