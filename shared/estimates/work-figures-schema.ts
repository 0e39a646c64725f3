import * as z from 'zod';
import { holdPoints, missedWindows } from '#shared/buildups/buildup';
import type { WorkFigures } from '#shared/estimates/figures';
import { findingSchema, reasonSchema } from '#shared/words/reason-schema';

const text = z.string();
const figure = z.number();
const triple = z.strictObject({ low: figure, likely: figure, high: figure });
const reasons = z.array(reasonSchema);
const findings = z.array(findingSchema);

const carvingRow = z.strictObject({
  kind: z.enum(['stage', 'undercutting', 'pattern', 'once', 'shaping', 'free', 'sharpening', 'recutting']),
  stageId: text,
  gradeId: text,
  hours: triple,
});

const member = z.strictObject({
  memberId: text,
  timber: text,
  developed_mm2: figure,
  girth_mm: figure.nullable(),
  run_mm: figure.nullable(),
  uncertainty_mm2: figure.nullable(),
  plan_mm2: figure,
  true_mm2: figure,
  bare_mm2: figure,
  parts: z.array(z.strictObject({ key: text, element: text, girth_mm: figure, area_mm2: figure })),
  carving_hours: triple,
  carvingRows: z.array(carvingRow),
  handsOn_hours: triple,
  reasons,
});

const band = z.strictObject({
  length_mm: figure,
  height_mm: figure,
  pieceLength_mm: figure,
  pieceHeight_mm: figure,
  lap_mm: figure,
});

const zoneLeaf = z.strictObject({
  productId: text,
  name: text,
  way: z.enum(['sheets', 'lays', 'patches']),
  netLeaves: figure,
  grossLeaves: triple,
  handled: triple,
  strips: figure.nullable(),
  cuts: figure.nullable(),
  lap_mm: figure,
  side_mm: figure,
  bands: z.array(band),
  reasons,
});

const stepKind = text as unknown as z.ZodType<WorkFigures['zones'][number]['steps'][number]['kind']>;
const zoneStep = z.strictObject({
  stepId: text,
  kind: stepKind,
  name: text,
  gradeId: text,
  coats: figure,
  hours: triple,
  reasons,
});
const layer = z.strictObject({
  stepId: text,
  name: text,
  coats: figure,
  colour: text as unknown as z.ZodType<WorkFigures['zones'][number]['layers'][number]['colour']>,
  thickness: figure,
  thickness_mm: figure.nullable(),
});

const zone = z.strictObject({
  zoneId: text,
  memberId: text,
  buildUp: text,
  finish: z.enum(['plain', 'moulded', 'carved']),
  plan_mm2: figure,
  true_mm2: figure,
  ground_mm: figure,
  hours: triple,
  steps: z.array(zoneStep),
  layers: z.array(layer),
  leaf: zoneLeaf.nullable(),
  recutting: z.strictObject({ hours: triple, reasons }).nullable().default(null),
  reasons,
});

const fit = z.strictObject({
  repeats: figure,
  halves: z.union([z.literal(1), z.literal(2)]),
  free_mm: figure,
  pitch_mm: figure,
  stretch: figure,
});

const use = z.strictObject({
  useId: text,
  memberId: text,
  ornament: text,
  quantity: figure,
  fit: fit.nullable(),
  factor: figure,
  carving: triple,
  reasons,
});

const carving = z.strictObject({
  rows: z.array(carvingRow),
  total: triple,
  sharpening: triple,
  patterns: z.array(z.strictObject({ ornamentId: text, patterns: figure, hours: triple })),
  stages: z.array(z.strictObject({ id: text, name: text })),
  reasons,
});

const leaf = z.strictObject({
  productId: text,
  name: text,
  netLeaves: figure,
  grossLeaves: triple,
  grossLeaves_p10: figure,
  grossLeaves_p90: figure,
  booklets: figure,
  coverage: z.strictObject({ grossToNet: figure, loss_percent: figure, leavesPerM2: figure, leavesPerFt2: figure }),
  mass_grams: figure,
  reasons,
});

const hold = z.enum(holdPoints);
const missed = z.enum(missedWindows);
const dryStep = z.strictObject({
  stepId: text,
  kind: stepKind,
  name: text,
  gradeId: text,
  coats: figure,
  handsOn_minutes: figure,
  betweenCoats_minutes: figure,
  latestCoat_minutes: figure.nullable(),
  opens_minutes: figure,
  closes_minutes: figure.nullable(),
  endsInWindow: z.boolean(),
  wholeWithin_minutes: figure.nullable(),
  lags: z.array(
    z.strictObject({ toStepId: text, least_minutes: figure.nullable(), finishedWithin_minutes: figure.nullable() }),
  ),
  holds: z.array(hold),
  missed: missed.nullable(),
  factor: figure,
  isClipped: z.boolean(),
  reasons,
});

const batch = z.strictObject({
  pieceId: text,
  recipeId: text,
  name: text,
  volume_litres: figure,
  parts: z.array(
    z.strictObject({
      partId: text,
      name: text,
      volume_litres: figure,
      mass_grams: figure.nullable(),
      reason: reasonSchema,
    }),
  ),
});

const dry = z.strictObject({
  elapsed_minutes: figure,
  elapsed_workingDays: figure,
  elapsed_weeks: figure,
  carving_minutes: figure,
  time: z.strictObject({ day_minutes: figure, days: figure, productiveShare_percent: figure }),
  shopMoisture_percent: figure,
  siteMoisture_percent: figure,
  lots: z.array(
    z.strictObject({
      lotId: text,
      pieceId: text,
      buildUpId: text,
      buildUp: text,
      steps: z.array(dryStep),
      handsOn_minutes: figure,
      drying_minutes: figure,
      start_minutes: figure,
      end_minutes: figure,
      waiting_minutes: figure,
    }),
  ),
  tasks: z.array(
    z.strictObject({
      lotId: text,
      stepId: text,
      coat: figure,
      portion: figure,
      start_minutes: figure,
      end_minutes: figure,
      handsOn_minutes: figure,
    }),
  ),
  holds: z
    .array(
      z.strictObject({
        ...{ lotId: text, stepId: text, hold },
        ...{ from_minutes: figure, to_minutes: figure, usual_days: figure },
      }),
    )
    .default([]),
});

/** What the bench may see. Issues made before waits and recutting were told have none of them. */
export const workFiguresSchema = z.strictObject({
  calculatorVersion: z.int(),
  tally: z.strictObject({
    members: figure,
    true_mm2: figure,
    carving_hours: triple,
    handsOn_hours: triple,
    booklets: figure,
    booklets_p10: figure,
    booklets_p90: figure,
    workingDays: figure,
    weeks: figure,
  }),
  members: z.array(member),
  zones: z.array(zone),
  uses: z.array(use),
  carving,
  grades: z.array(z.strictObject({ gradeId: text, name: text, hours: figure })),
  leaf: z.array(leaf),
  materials: z.array(
    z.strictObject({ materialId: text, name: text, unit: z.enum(['kg', 'L']), need: text, bought: text, reasons }),
  ),
  batches: z.array(batch),
  dry,
  findings,
});
