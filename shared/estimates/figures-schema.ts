import * as z from 'zod';
import { holdPoints, missedWindows } from '#shared/buildups/buildup';
import type { CostFigures, Figures, PricedFigures, WorkFigures } from '#shared/estimates/figures';
import type { WordCode } from '#shared/words/word-code';
import type { Finding } from '#shared/words/finding';
import type { FigureUnit } from '#shared/words/reason';

/** Closed schemas of worked figures for each audience: what is not named here does not leave the server. */

const text = z.string();
const figure = z.number();
const minor = z.int();
const triple = z.strictObject({ low: figure, likely: figure, high: figure });
const values = z.record(text, z.union([text, figure]));
const code = text as unknown as z.ZodType<WordCode>;

export const reasonSchema = z.strictObject({
  code,
  values,
  figure: z.union([figure, text]),
  unit: text as unknown as z.ZodType<FigureUnit>,
  house: text.optional(),
});
const reasons = z.array(reasonSchema);

export const findingSchema = z.strictObject({
  kind: z.enum(['refuse', 'missing', 'warn', 'caution', 'note'] satisfies Finding['kind'][]),
  code,
  values,
  about: text.optional(),
});
const findings = z.array(findingSchema);

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
  handsOn_hours: triple,
  reasons,
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

const carvingRow = z.strictObject({
  kind: z.enum(['stage', 'undercutting', 'pattern', 'once', 'shaping', 'free', 'sharpening', 'recutting']),
  stageId: text,
  gradeId: text,
  hours: triple,
});

const carving = z.strictObject({
  rows: z.array(carvingRow),
  total: triple,
  sharpening: triple,
  patterns: z.array(z.strictObject({ ornamentId: text, patterns: figure, hours: triple })),
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

const dry = z.strictObject({
  elapsed_minutes: figure,
  elapsed_workingDays: figure,
  elapsed_weeks: figure,
  carving_minutes: figure,
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
});

/** What the bench may see. */
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
  dry,
  findings,
});

const taxCode = text as unknown as z.ZodType<PricedFigures['price']['taxes'][number]['tax']['code']>;
const workKind = text as unknown as z.ZodType<PricedFigures['price']['lines'][number]['kind']>;
const priceLine = z.strictObject({
  id: text,
  memberId: text.nullable(),
  kind: workKind,
  name: text.nullable(),
  taxCategoryId: text,
  price_minor: minor,
});

const priceLines = z.strictObject({
  lines: z.array(priceLine),
  subtotal_minor: minor,
  discount_minor: minor,
  net_minor: minor,
  taxes: z.array(
    z.strictObject({
      taxCategoryId: text,
      tax: z.strictObject({ code: taxCode, percent: text }),
      net_minor: minor,
      tax_minor: minor,
    }),
  ),
  tax_minor: minor,
  gross_minor: minor,
  reasons,
});

const stages = z.strictObject({
  deposit_minor: minor,
  stages: z.array(
    z.strictObject({ work_minor: minor, recovered_minor: minor, retained_minor: minor, paid_minor: minor }),
  ),
  releases_minor: z.tuple([minor, minor]),
});

/** What the office may see. */
export const pricedFiguresSchema = z.strictObject({ ...workFiguresSchema.shape, price: priceLines, stages });

const lineCost = z.strictObject({
  lineId: text,
  hours: figure,
  direct_minor: minor,
  overhead_minor: minor,
  contingency_minor: minor,
  cost_minor: minor,
  reasons,
});

const costHead = z.strictObject({
  head: text as unknown as z.ZodType<CostFigures['price']['heads'][number]['head']>,
  itemId: text.nullable(),
  name: text,
  hours: figure,
  cost_minor: minor,
});

const priceCost = z.strictObject({
  heads: z.array(costHead),
  lines: z.array(lineCost),
  hours: figure,
  direct_minor: minor,
  overhead_minor: minor,
  contingency_minor: minor,
  cost_minor: minor,
  priced_minor: minor,
  margin_percent: figure,
  markUp_percent: figure,
  profit_minor: minor,
  marginLeft_percent: figure.nullable(),
  markUpLeft_percent: figure.nullable(),
  reasons,
});

const purchase = z.strictObject({
  booklets: figure,
  packs: z.array(z.strictObject({ booklets: figure, count: figure })),
  singles: figure,
  price: text,
});

const percentiles = z.strictObject({ atLikely: figure, p10: figure, p50: figure, p80: figure, p90: figure });
const risk = z.strictObject({
  generator: z.literal('xoshiro128**'),
  trials: figure,
  seed: figure,
  hours: percentiles,
  direct_minor: percentiles,
  leaf: z.array(z.strictObject({ productId: text, leaves: percentiles, booklets: percentiles })),
  atPercentile_minor: minor,
  contingency_minor: minor,
  reasons,
});

const strip = z.strictObject({
  strips: figure,
  strip_mm: figure,
  laysAcross: figure,
  piecesAlong: figure,
  leaves: figure,
  pieces: figure,
  cost: figure,
});

const cost = z.strictObject({
  price: priceCost,
  purchases: z.array(
    z.strictObject({
      head: z.enum(['leaf', 'materials']),
      itemId: text,
      name: text,
      cost: text,
      leaf: purchase.nullable(),
    }),
  ),
  strips: z.array(z.strictObject({ zoneId: text, options: z.array(strip) })),
  risk: risk.nullable(),
  findings,
});

/** What owner and estimator see. */
export const figuresSchema = z.strictObject({ ...pricedFiguresSchema.shape, cost });

/** The schemas describe the calculators' own types; a field one of them lacks is an error here. */
type Frozen<T> = T extends object ? { readonly [Key in keyof T]: Frozen<T[Key]> } : T;
type Same<A, B> = [Frozen<A>] extends [Frozen<B>]
  ? [Frozen<B>] extends [Frozen<A>]
    ? true
    : 'a field too many'
  : 'a field too few';
export const figuresAreDescribed: {
  readonly work: Same<z.infer<typeof workFiguresSchema>, WorkFigures>;
  readonly priced: Same<z.infer<typeof pricedFiguresSchema>, PricedFigures>;
  readonly whole: Same<z.infer<typeof figuresSchema>, Figures>;
} = { work: true, priced: true, whole: true };
