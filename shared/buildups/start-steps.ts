import type { BuildUpStep, CautionName, ClimateModel, Coats, MaterialUse, StepDrying } from '#shared/buildups/buildup';
import type { Triple } from '#shared/units/triple';

type Only<T, K extends keyof T> = Pick<T, K> & Partial<Omit<T, K>>;

const triple = (low: number, likely: number, high: number): Triple => ({ low, likely, high });
const same = (minutes: number): Triple => triple(minutes, minutes, minutes);
const hour = 60;
const day = 24 * hour;

/** The same number of coats on every surface. */
const everywhere = (coats: number): Coats => ({
  plain: coats,
  moulded: coats,
  carved: coats,
  recut: coats,
  frenchRecut: coats,
});

/** Drying that asks for nothing but what is given, in minutes at 20 °C and 50 % RH. */
const dries = (model: ClimateModel, rest: Partial<StepDrying> = {}): StepDrying => ({
  model,
  betweenCoats_minutes: same(0),
  latestCoat_minutes: null,
  beforeNext_minutes: same(0),
  window_minutes: null,
  endsInWindow: false,
  wholeWithin_minutes: null,
  lags: [],
  missed: null,
  ...rest,
});

const step = (given: Only<BuildUpStep, 'id' | 'kind' | 'name'>): BuildUpStep => ({
  coats: everywhere(1),
  areaPart: 'all',
  work: { way: 'waiting' },
  gradeId: 'gilder',
  uses: [],
  drying: dries('water'),
  groundPerCoat_mm: 0,
  cautions: [],
  holds: [],
  optional: false,
  colour: 'none',
  note: 'House.',
  ...given,
});

const hoursPer_m2 = (hours_m2: number) => ({ way: 'area', hours_m2, factors: 'finish' }) as const;

const covers = (itemId: string, coverage_m2_L: number, of: MaterialUse['of'] = 'material'): MaterialUse => ({
  of,
  itemId,
  way: 'coverage',
  coverage_m2_L,
  loss_percent: 15,
  share: 1,
});

const gessoSize = (itemId: string): MaterialUse => ({
  of: 'recipe',
  itemId,
  way: 'litres',
  litres_m2: 0.15,
  loss_percent: 25,
  share: 0.5,
});

const shellacCautions: readonly CautionName[] = ['solvents', 'spirit-near-heat'];
const oilCautions: readonly CautionName[] = ['solvents', 'oily-rags'];

/** Shellac, whatever it seals: published recoating 30 to 60 minutes. */
const shellacDrying = dries('spirit', {
  betweenCoats_minutes: triple(30, 45, 60),
  beforeNext_minutes: triple(30, 45, 60),
});
const shellacNote = 'Recoats in 30 to 60 minutes (suppliers); hours and coverage house.';

/** A size coat, waiting for what is to be approved first. */
const sizeCoat = (holds: BuildUpStep['holds'] = ['carving-approved', 'top-dry-fitted']): BuildUpStep =>
  step({
    id: 'size-coat',
    kind: 'size-coat',
    name: 'Size coat',
    work: hoursPer_m2(0.25),
    uses: [covers('size-6', 10, 'recipe')],
    drying: dries('water', { beforeNext_minutes: triple(8 * hour, 12 * hour, 24 * hour) }),
    cautions: ['glue-allergy', 'glue-heat'],
    holds,
    colour: 'size',
    note: 'Size coat 4 : 1 to 10 : 1 water to dry glue by volume, never above 55 °C (Rivers & Umney 2003, pp. 648–650); hours and drying house.',
  });

/** Gesso in coats by surface; half of them bound with 10 : 1, the rest with 12 : 1. */
const gesso = (coats: Coats): BuildUpStep =>
  step({
    id: 'gesso',
    kind: 'gesso',
    name: 'Gesso',
    coats,
    work: hoursPer_m2(0.45),
    uses: [
      { of: 'material', itemId: 'whiting', way: 'grams', grams_m2: 200, loss_percent: 25, share: 1 },
      gessoSize('size-10'),
      gessoSize('size-12'),
    ],
    drying: dries('water', {
      betweenCoats_minutes: triple(0.3 * hour, 0.5 * hour, hour),
      latestCoat_minutes: 18 * hour,
      beforeNext_minutes: same(day),
      wholeWithin_minutes: 2 * day,
      missed: 'strip-ground',
    }),
    groundPerCoat_mm: 0.12,
    cautions: ['whiting-dust', 'glue-allergy', 'glue-heat'],
    colour: 'gesso',
    note: 'Eight coats on flats, fewer on carving (Colyton House; 8–10 at Versailles, 2021; 7–9 in TSN-2001.7-20); size 10 : 1 to 15 : 1 (Rivers & Umney, pp. 648–650); times house.',
  });

const waterGesso = gesso({ plain: 8, moulded: 6, carved: 4, recut: 8, frenchRecut: 11 });
const oilGesso = gesso({ plain: 5, moulded: 5, carved: 5, recut: 8, frenchRecut: 11 });

const recut = step({
  id: 'recut',
  kind: 'recut',
  name: 'Recut in gesso',
  work: { way: 'recutting' },
  gradeId: 'carver',
  cautions: ['whiting-dust', 'silica'],
  note: 'Hours come with the carving.',
});

const smooth = step({
  id: 'smooth',
  kind: 'smooth',
  name: 'Smooth',
  work: { way: 'area', hours_m2: 2, factors: 'smoothing' },
  cautions: ['whiting-dust', 'silica'],
});

const boleCoverage = (itemId: string): MaterialUse[] => [covers(itemId, 10), covers('size-15', 10, 'recipe')];
const boleNote = 'Two to six coats of bole in all; hours, coverage and drying house.';

const yellowBole = step({
  id: 'yellow-bole',
  kind: 'bole',
  name: 'Yellow bole',
  work: hoursPer_m2(0.35),
  uses: boleCoverage('yellow-bole'),
  drying: dries('water', { betweenCoats_minutes: same(hour), beforeNext_minutes: same(hour) }),
  cautions: ['glue-allergy'],
  holds: ['sample-approved'],
  colour: 'yellow-bole',
  note: boleNote,
});

/** Red bole in so many coats, an hour between them and four before laying. */
const redBole = (coats: number): BuildUpStep =>
  step({
    id: 'red-bole',
    kind: 'bole',
    name: 'Red bole',
    coats: everywhere(coats),
    work: hoursPer_m2(0.35),
    uses: boleCoverage('red-bole'),
    drying: dries('water', { betweenCoats_minutes: same(hour), beforeNext_minutes: same(4 * hour) }),
    cautions: ['glue-allergy'],
    colour: 'red-bole',
    note: boleNote,
  });

const polishBole = step({
  id: 'polish-bole',
  kind: 'polish-bole',
  name: 'Polish bole',
  work: hoursPer_m2(0.6),
  cautions: ['silica'],
});

const layingNote = 'Minutes by the leaf or piece are house values; leaves come from the leaf worked out.';

/** Wet and lay in water; burnishing, where it follows, is finished within 24 h of the start of laying. */
const layInWater = (burnishId: string | null): BuildUpStep =>
  step({
    id: 'lay',
    kind: 'lay',
    name: 'Wet and lay',
    work: { way: 'laying', part: 'first' },
    drying: dries('water', {
      lags: burnishId === null ? [] : [{ toStepId: burnishId, least_minutes: null, finishedWithin_minutes: day }],
      missed: burnishId === null ? null : 'revive-or-relay',
    }),
    colour: 'leaf',
    note: layingNote,
  });

const layOnSize = step({
  id: 'lay',
  kind: 'lay',
  name: 'Lay',
  work: { way: 'laying', part: 'first' },
  drying: dries('oil'),
  colour: 'leaf',
  note: layingNote,
});

const fault = step({
  id: 'fault',
  kind: 'fault',
  name: 'Fault',
  work: { way: 'laying', part: 'faulting' },
  note: layingNote,
});

const secondLaying = step({
  id: 'second-laying',
  kind: 'second-laying',
  name: 'Second laying',
  work: { way: 'laying', part: 'second' },
  drying: dries('water', { beforeNext_minutes: triple(2 * hour, 4 * hour, 5 * hour) }),
  note: 'Burnishing from about 1 h in dry summer air to 5 h or next day (Cennini, ch. CXXXVII; suppliers); minutes house.',
});

/** Burnishing, 2.5 h/m² of a zone or of its burnished part. */
const burnish = (areaPart: BuildUpStep['areaPart'], drying: Partial<StepDrying> = {}): BuildUpStep =>
  step({
    id: 'burnish',
    kind: 'burnish',
    name: areaPart === 'burnished' ? 'Burnish the highs' : 'Burnish',
    areaPart,
    work: hoursPer_m2(2.5),
    drying: dries('spirit', drying),
  });

/** Matte size on a zone or on its matte part, dry in an hour. */
const matteSize = (areaPart: BuildUpStep['areaPart']): BuildUpStep =>
  step({
    id: 'matte-size',
    kind: 'matte-size',
    name: 'Matte size',
    areaPart,
    work: hoursPer_m2(0.3),
    uses: [covers('size-20', 10, 'recipe')],
    drying: dries('water', { beforeNext_minutes: same(hour) }),
    cautions: ['glue-allergy', 'glue-heat'],
    colour: 'size',
  });

const protectEdge = step({
  id: 'protect-edge',
  kind: 'protect-edge',
  name: 'Protect the edge',
  work: { way: 'edge' },
});

const tone = step({
  id: 'tone',
  kind: 'tone',
  name: 'Tone',
  work: hoursPer_m2(1.5),
  uses: [covers('glaze-medium', 12)],
  drying: dries('water', { beforeNext_minutes: same(hour) }),
  colour: 'tone',
});

/** A seal of shellac, with what is different about it. */
const seal = (id: string, rest: Partial<BuildUpStep> = {}): BuildUpStep =>
  step({
    id,
    kind: 'seal',
    name: 'Seal',
    work: hoursPer_m2(0.3),
    uses: [covers('shellac', 12)],
    drying: shellacDrying,
    cautions: shellacCautions,
    colour: 'shellac',
    note: `Silver, composition and gold under 22 carat are sealed (Eytzinger). ${shellacNote}`,
    ...rest,
  });

const sealWhereNeeded = seal('seal', { name: 'Seal where needed', optional: true });

const sealer = step({
  id: 'sealer',
  kind: 'sealer',
  name: 'Sealer',
  coats: everywhere(3),
  work: hoursPer_m2(0.3),
  uses: [covers('shellac', 12)],
  drying: shellacDrying,
  cautions: shellacCautions,
  holds: ['sample-approved'],
  colour: 'shellac',
  note: shellacNote,
});

const colouredGround = step({
  id: 'coloured-ground',
  kind: 'coloured-ground',
  name: 'Coloured ground',
  work: hoursPer_m2(0.4),
  gradeId: 'finisher',
  uses: [covers('paint', 10)],
  drying: dries('oil', { beforeNext_minutes: same(day) }),
  cautions: oilCautions,
  optional: true,
  colour: 'coloured-ground',
});

/** What an oil or water-borne size is: hours until it takes leaf, hours it stays open, and what the makers say. */
export interface SizeKind {
  readonly name: string;
  readonly materialId: string;
  readonly model: ClimateModel;
  readonly tack_minutes: Triple;
  readonly window_minutes: number;
  readonly solventVarnishAfter_minutes: number | null;
  readonly note: string;
}

const coverageNote = 'Coverage 175 sq ft a US quart, 17.18 m² a litre (Golden Leaf Products).';

export const sizeKinds = {
  quick: {
    name: 'Quick oil size',
    materialId: 'oil-size',
    model: 'oil',
    tack_minutes: triple(hour, 2 * hour, 3 * hour),
    window_minutes: 2 * hour,
    solventVarnishAfter_minutes: null,
    note: `Tack in 1 to 3 h, open about as long as it takes to tack (Picture Framing Magazine, July 2019). ${coverageNote}`,
  },
  threeHour: {
    name: '3-hour oil size',
    materialId: 'oil-size',
    model: 'oil',
    tack_minutes: same(3 * hour),
    window_minutes: 3 * hour,
    solventVarnishAfter_minutes: null,
    note: `Half and half with quick size: 3 h and 3 h (Golden Leaf Products, instructions). ${coverageNote}`,
  },
  twelveHour: {
    name: '12-hour oil size',
    materialId: 'oil-size',
    model: 'oil',
    tack_minutes: same(12 * hour),
    window_minutes: 10 * hour,
    solventVarnishAfter_minutes: 14 * day,
    note: `Tack about 12 h, window 10 to 12 h (Golden Leaf Products, instructions); two weeks before a solvent varnish, house. ${coverageNote}`,
  },
  waterBorne: {
    name: 'Water-borne size',
    materialId: 'water-borne-size',
    model: 'water',
    tack_minutes: triple(15, 20, 30),
    window_minutes: 36 * hour,
    solventVarnishAfter_minutes: null,
    note: 'Tack in 15 to 30 min and stays open (Picture Framing Magazine, July 2019); 36 h and coverage house.',
  },
} satisfies Record<string, SizeKind>;

/** A size that takes leaf by its tack, and the least time before the seal named where it is slow. */
const oilSize = (size: SizeKind, sealId: string): BuildUpStep =>
  step({
    id: 'size',
    kind: 'oil-size',
    name: size.name,
    work: hoursPer_m2(0.35),
    uses: [covers(size.materialId, 17.18)],
    drying: dries(size.model, {
      beforeNext_minutes: size.tack_minutes,
      window_minutes: size.window_minutes,
      endsInWindow: true,
      lags:
        size.solventVarnishAfter_minutes === null
          ? []
          : [{ toStepId: sealId, least_minutes: size.solventVarnishAfter_minutes, finishedWithin_minutes: null }],
      missed: 'new-size',
    }),
    cautions: size.model === 'oil' ? oilCautions : [],
    colour: 'oil-size',
    note: size.note,
  });

const skewOff = step({ id: 'skew-off', kind: 'skew-off', name: 'Skew off', work: hoursPer_m2(0.4) });

/** Two days of rest after laying on size; null leaves what follows open, else it starts within so many minutes more. */
const leave = (window_minutes: number | null = null): BuildUpStep =>
  step({
    id: 'leave',
    kind: 'leave',
    name: 'Leave 48 hours',
    drying: dries('oil', {
      beforeNext_minutes: same(2 * day),
      window_minutes,
      missed: window_minutes === null ? null : 'tarnished',
    }),
    note: 'After laying on oil size leave 48 h (Rivers & Umney 2003, p. 665).',
  });

const isolate = step({
  id: 'isolate',
  kind: 'isolate',
  name: 'Isolating coat',
  work: hoursPer_m2(0.3),
  gradeId: 'finisher',
  uses: [covers('shellac', 12)],
  drying: shellacDrying,
  cautions: shellacCautions,
  holds: ['sample-approved'],
  colour: 'shellac',
  note: shellacNote,
});

const transferDrawing = step({
  id: 'transfer',
  kind: 'transfer-drawing',
  name: 'Transfer the drawing',
  work: { way: 'area', hours_m2: 2, factors: 'none' },
  gradeId: 'finisher',
});

const glaze = step({
  id: 'glaze',
  kind: 'glaze',
  name: 'Transparent glaze',
  coats: everywhere(3),
  work: hoursPer_m2(1.2),
  gradeId: 'finisher',
  uses: [covers('glaze-medium', 12)],
  drying: dries('oil', {
    betweenCoats_minutes: triple(day, day, 3 * day),
    beforeNext_minutes: triple(day, day, 3 * day),
  }),
  cautions: oilCautions,
  colour: 'glaze',
  note: 'Glaze with alkyd medium is touch dry in 1 to 3 days (suppliers); an oil glaze takes 72 h, house.',
});

/** Varnish in so many coats, a day for each. */
const varnish = (coats: number, optional = false): BuildUpStep =>
  step({
    id: 'varnish',
    kind: 'varnish',
    name: 'Varnish',
    coats: everywhere(coats),
    work: hoursPer_m2(0.35),
    gradeId: 'finisher',
    uses: [covers('varnish', 12)],
    drying: dries('oil', { betweenCoats_minutes: same(day), beforeNext_minutes: same(day) }),
    cautions: [...oilCautions, 'isocyanates'],
    optional,
    colour: 'varnish',
  });

/** Paint in so many coats of one name, with its drying in minutes. */
const paint = (given: {
  id: string;
  name: string;
  coats: number;
  model: ClimateModel;
  drying_minutes: number;
}): BuildUpStep =>
  step({
    id: given.id,
    kind: 'paint',
    name: given.name,
    coats: everywhere(given.coats),
    work: hoursPer_m2(0.4),
    gradeId: 'finisher',
    uses: [covers('paint', 10)],
    drying: dries(given.model, {
      betweenCoats_minutes: same(given.drying_minutes),
      beforeNext_minutes: same(given.drying_minutes),
    }),
    cautions: given.model === 'oil' ? oilCautions : [],
    colour: 'paint',
  });

const clean = step({
  id: 'clean',
  kind: 'clean',
  name: 'Clean',
  work: { way: 'cleaning' },
  gradeId: 'finisher',
  cautions: ['lead', 'solvents'],
});

const consolidate = step({
  id: 'consolidate',
  kind: 'consolidate',
  name: 'Consolidate old ground',
  work: { way: 'consolidating' },
  uses: [covers('size-15', 10, 'recipe')],
  drying: dries('water', { beforeNext_minutes: same(12 * hour) }),
  cautions: ['lead', 'glue-allergy', 'glue-heat'],
});

/** Every step the start build-ups are put together from. */
export const startSteps = {
  everywhere,
  dries,
  sizeCoat,
  gesso,
  waterGesso,
  oilGesso,
  recut,
  smooth,
  yellowBole,
  redBole,
  polishBole,
  layInWater,
  layOnSize,
  fault,
  secondLaying,
  burnish,
  matteSize,
  protectEdge,
  tone,
  seal,
  sealWhereNeeded,
  sealer,
  colouredGround,
  oilSize,
  skewOff,
  leave,
  isolate,
  transferDrawing,
  glaze,
  varnish,
  paint,
  clean,
  consolidate,
};
