import * as z from 'zod';
import type { CostFigures, Figures, PricedFigures, WorkFigures } from '#shared/estimates/figures';
import { workFiguresSchema } from '#shared/estimates/work-figures-schema';
import { findingSchema, reasonSchema } from '#shared/words/reason-schema';

/** Closed schemas of worked figures for each audience: what is not named here does not leave the server. */

const text = z.string();
const figure = z.number();
const minor = z.int();
const reasons = z.array(reasonSchema);
const findings = z.array(findingSchema);

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
  booklets: percentiles.nullable().default(null),
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
