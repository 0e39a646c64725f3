import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import type { Figures } from '#shared/estimates/figures';
import type { PriceLine } from '#shared/estimates/price/price';
import type { WorkKind } from '#shared/estimates/price/work-kind';
import { startCard } from '#shared/rate-cards/start-card';
import { demonstrationDraft } from '../../seeders/demonstration-draft';
import { pierTableJob } from '../../seeders/pier-table/pier-table-job';

/**
 * The bead along the apron of the demonstration's pier table, estimated by itself and worked through by hand, as one would in a notebook. Every
 * figure below is arithmetic of its own on the numbers of the start card (house values, no source); nothing of the calculators is called for it.
 *
 * What is known: a half-round bead 12 mm high and 6 mm proud, in three straight lengths of 1244.6, 355.6 and 355.6 mm (49, 14 and 14 inches), of
 * lime, carved with bead and reel at 24 mm to the repeat in middle relief, water gilt and burnished in 23½ carat leaf of 80 mm, relief of the
 * surface low.
 */

function workedByTheProgram(): Figures {
  const job = pierTableJob();
  const whole = demonstrationDraft(job, startCard);
  const bead = whole.members.filter(({ name }) => name === 'Bead along the apron');
  const draft = { ...whole, members: bead, settings: { ...whole.settings, extras: [], alternatives: [] } };
  return estimateFigures(prepareEstimate({ draft, choice: [], card: startCard, currency: 'EUR' }), null);
}

const figures = workedByTheProgram();
const [member] = figures.members;
const [zone] = figures.zones;
const lineOf = (kind: WorkKind): PriceLine | undefined => figures.price.lines.find((line) => line.kind === kind);
const costOf = (kind: WorkKind) => figures.cost.price.lines.find((line) => line.lineId.endsWith(`/${kind}`));
const hoursOf = (gradeId: string) => figures.grades.find((grade) => grade.gradeId === gradeId)?.hours;
const stepHours = (stepId: string) => zone?.steps.find((step) => step.stepId === stepId)?.hours.likely;

/** Euros to cents, half up. */
const cents = (euros: number): number => Math.round(euros * 100);

// Surface -------------------------------------------------------------------------------------------------------------------------------

/** Half a circle of 6 mm radius: 3.14159 × 6 = 18.850 mm. */
const girth_mm = 3.141592653589793 * 6;
/** 1244.6 + 355.6 + 355.6 = 1955.8 mm, straight, nothing added at mitres. */
const run_mm = 1955.8;
/** 18.850 × 1955.8 = 36,866 mm² = 0.036866 m². */
const plan_m2 = (girth_mm * run_mm) / 1e6;
/** Low relief has 1.15 of its plan: 0.042396 m². */
const true_m2 = plan_m2 * 1.15;

describe('The bead along the apron by hand: its surface', () => {
  it('is 36,866 mm² on plan and 42,396 mm² true', () => {
    expect(member?.girth_mm).toBeCloseTo(18.85, 3);
    expect(member?.run_mm).toBeCloseTo(1955.8, 9);
    expect(zone?.plan_mm2).toBeCloseTo(plan_m2 * 1e6, 6);
    expect(zone?.true_mm2).toBeCloseTo(true_m2 * 1e6, 6);
    expect(Math.round(plan_m2 * 1e6)).toBe(36_866);
    expect(Math.round(true_m2 * 1e6)).toBe(42_396);
  });
});

// Leaf ----------------------------------------------------------------------------------------------------------------------------------

/**
 * Laid in strips of a leaf of 80 mm lapped by 3.2 mm. Along: (1955.8 − 3.2) ÷ 76.8 = 25.42, so 26 pieces to a lay. Across a girth of 18.85 mm:
 *   2 strips to a leaf, 40 mm wide:    15.65 ÷ 36.80 = 0.43, 1 lay,  26 pieces, 13 leaves
 *   3 strips, 26.67 mm:                15.65 ÷ 23.47 = 0.67, 1 lay,  26 pieces, 8.67 leaves
 *   4 strips, 20 mm:                   15.65 ÷ 16.80 = 0.93, 1 lay,  26 pieces, 6.5 leaves
 *   5 strips, 16 mm:                   15.65 ÷ 12.80 = 1.22, 2 lays, 52 pieces, 10.4 leaves
 * A leaf costs 52 ÷ 25 = 2.08 and a strip 0.8 min ÷ 60 × 33 = 0.44 to lay: four strips are cheapest, 6.5 × 2.08 + 26 × 0.44 = 24.96.
 */
const leavesFlat = 26 / 4;
/** In low relief 6.5 × 1.15 = 7.475 leaves. */
const netLeaves = leavesFlat * 1.15;
/** 5 % laid again, 12 % of the other 95 % faulted, 5 % broken: 7.475 × (1 + 0.05 + 0.12 × 0.95) ÷ 0.95 = 9.1588 leaves. */
const grossLeaves = (netLeaves * (1 + 0.05 + 0.12 * 0.95)) / 0.95;
/** Each of them in four strips: 36.635 strips. */
const strips = grossLeaves * 4;

describe('The bead along the apron by hand: its leaf', () => {
  it('takes 26 pieces in one lay of four strips to a leaf', () => {
    expect(zone?.leaf).toMatchObject({ way: 'lays', strips: 4 });
    const chosen = figures.cost.strips[0]?.options.find((option) => option.strips === 4);
    expect(chosen).toMatchObject({ laysAcross: 1, piecesAlong: 26, pieces: 26, leaves: 6.5, cost: 24.96 });
  });

  it('takes 7.475 leaves net, 9.159 with its losses, and one booklet', () => {
    expect(zone?.leaf?.netLeaves).toBeCloseTo(7.475, 9);
    expect(zone?.leaf?.grossLeaves.likely).toBeCloseTo(grossLeaves, 9);
    expect(grossLeaves).toBeCloseTo(9.1588, 4);
    expect(figures.tally.booklets).toBe(1);
  });
});

/**
 * Beside it, the scrolls of the front apron, which are patched: 1244.6 × 152.4 = 189,677 mm², less an oval opening of 140 × 90,
 * 0.785398 × 12,600 = 9,896 mm², leaves 179,781 mm². The scrolls take 60 % of it, 107,869 mm², in high relief 1.70 times that: 183,377 mm².
 */
const scrolls_mm2 = (1244.6 * 152.4 - 0.7853981633974483 * 140 * 90) * 0.6 * 1.7;
/** A leaf cut two by two loses a lap of 3.2 mm at each cut: a square of 80 − 6.4 = 73.6 mm, 5,416.96 mm². 183,377 ÷ 5,416.96 = 33.852. */
const scrollsNet = scrolls_mm2 / 5416.96;
/**
 * 40 % of them is burnished and 10 % of that laid again; the matte 60 % is laid twice over: 4 + 60 = 64 %. 18 % of the other 36 % is faulted
 * and 8 % broken: 33.852 × (1 + 0.64 + 0.0648) ÷ 0.92 = 62.730 leaves, at 3.6 minutes each 3.7638 h.
 */
const scrollsGross = (scrollsNet * (1 + 0.64 + 0.0648)) / 0.92;

describe('The scrolls of the front apron by hand: their leaf', () => {
  const draft = demonstrationDraft(pierTableJob(), startCard);
  const apron = draft.members.filter(({ name }) => name === 'Front apron');
  const worked = estimateFigures(
    prepareEstimate({ draft: { ...draft, members: apron }, choice: [], card: startCard, currency: 'EUR' }),
    null,
  );
  const scrolls = worked.zones.find(({ zoneId }) => zoneId === apron[0]?.zones[0]?.id);

  it('is laid in patches, since they are carved in high relief', () => {
    expect(scrolls?.leaf).toMatchObject({ way: 'patches', cuts: 2 });
    expect(scrolls?.true_mm2).toBeCloseTo(scrolls_mm2, 6);
    expect(Math.round(scrolls_mm2)).toBe(183_377);
  });

  it('takes 33.852 leaves net and 62.730 with what is laid twice, faulted and broken', () => {
    expect(scrolls?.leaf?.netLeaves).toBeCloseTo(scrollsNet, 9);
    expect(scrollsNet).toBeCloseTo(33.8523, 4);
    expect(scrolls?.leaf?.grossLeaves.likely).toBeCloseTo(scrollsGross, 9);
    expect(scrollsGross).toBeCloseTo(62.7298, 3);
  });

  it('keeps a gilder for 3.764 h of laying', () => {
    const laid = scrolls?.steps.filter(({ stepId }) => ['lay', 'fault', 'second-laying'].includes(stepId)) ?? [];
    const hours = laid.reduce((sum, step) => sum + step.hours.likely, 0);
    expect(hours).toBeCloseTo((scrollsGross * 3.6) / 60, 9);
    expect(hours).toBeCloseTo(3.7638, 3);
  });
});

// Carving -------------------------------------------------------------------------------------------------------------------------------

/** 1244.6 ÷ 24 = 51.86, so 52 repeats; 355.6 ÷ 24 = 14.82, so 15 on each of the two short lengths: 52 + 15 + 15 = 82. */
const repeats = 82;
/** A repeat of 24 mm instead of 25 takes (24 ÷ 25)^1.4 = 0.94445 of the time. */
const sizeFactor = 0.96 ** 1.4;
/**
 * Each doubling leaves 92 %: the n-th repeat takes 0.92^(log2 n) of the first, down to the 64th with 0.92^6 = 0.60636, and all after it the
 * same. The first 64 come to 43.789 first repeats, the last 18 to 18 × 0.60636 = 10.914: 54.704 together.
 */
const firstSixtyFour = Array.from({ length: 64 }, (_, before) => 0.92 ** Math.log2(before + 1)).reduce(
  (sum, one) => sum + one,
  0,
);
const learnt = firstSixtyFour + (repeats - 64) * 0.92 ** 6;
/** 0.10 h × 0.94445 × 54.704 = 5.1665 h. */
const carving_hours = 0.1 * sizeFactor * learnt;
/** Sharpening adds 10 %, the pattern 1.5 h of the carver's once. Modelling 22 and detail 13 % are the master's, blank 10 and grounding 12 % the improver's. */
const master_hours = carving_hours * 0.35 * 1.1;
const improver_hours = carving_hours * 0.22 * 1.1;
const carver_hours = carving_hours * 0.43 * 1.1 + 1.5;

describe('The bead along the apron by hand: its carving', () => {
  it('is 82 repeats, which take 5.167 h after what is learnt on them', () => {
    expect(figures.uses.map((use) => use.quantity)).toEqual([52, 30]);
    expect(learnt).toBeCloseTo(54.704, 3);
    expect(carving_hours).toBeCloseTo(5.1665, 4);
    expect(member?.carving_hours.likely).toBeCloseTo(carving_hours, 9);
  });

  it('comes to 7.183 h with pattern and sharpening, 3.944 of them the carver’s', () => {
    expect(figures.tally.carving_hours.likely).toBeCloseTo(carving_hours * 1.1 + 1.5, 9);
    expect(figures.tally.carving_hours.likely).toBeCloseTo(7.1832, 4);
    expect(hoursOf('master-carver')).toBeCloseTo(master_hours, 9);
    expect(hoursOf('improver')).toBeCloseTo(improver_hours, 9);
    expect(hoursOf('carver')).toBeCloseTo(carver_hours, 9);
    expect(carver_hours).toBeCloseTo(3.9438, 4);
  });
});

// Ground and gilding --------------------------------------------------------------------------------------------------------------------

/** Hours per m² on carving: coats × rate × 1.8, smoothing × 3. */
const ground_hours_m2 = {
  'size-coat': 0.25 * 1.8, // 0.45
  gesso: 4 * 0.45 * 1.8, // 3.24
  smooth: 2 * 3, // 6.00
  'yellow-bole': 0.35 * 1.8, // 0.63
  'red-bole': 3 * 0.35 * 1.8, // 1.89
  'polish-bole': 0.6 * 1.8, // 1.08
};
/** 13.29 h/m² on 0.036866 m² is 0.490 h, and six steps to set up at 0.4 h: 2.890 h. */
const ground_hours = 13.29 * plan_m2 + 6 * 0.4;
/** 36.635 strips at 0.8 min are 0.4885 h; burnishing 2.5 × 1.8 × 0.036866 = 0.1659 h; lay, fault, lay again and burnish are set up: 2.254 h. */
const laying_hours = (strips * 0.8) / 60;
const gilding_hours = laying_hours + 2.5 * 1.8 * plan_m2 + 4 * 0.4;
/** Toning 1.5 × 1.8 × 0.036866 = 0.0995 h, set up once: 0.4995 h. */
const finishing_hours = 1.5 * 1.8 * plan_m2 + 0.4;

describe('The bead along the apron by hand: its ground and gilding', () => {
  it.each(Object.entries(ground_hours_m2))('works %s by the square metre', (stepId, hours_m2) => {
    expect(stepHours(stepId)).toBeCloseTo(hours_m2 * plan_m2, 9);
  });

  it('lays, burnishes and tones by pieces and by the metre', () => {
    const laid = ['lay', 'fault', 'second-laying'].map((stepId) => stepHours(stepId) ?? 0);
    expect(laid.reduce((sum, hours) => sum + hours, 0)).toBeCloseTo(laying_hours, 9);
    expect(stepHours('burnish')).toBeCloseTo(4.5 * plan_m2, 9);
    expect(stepHours('tone')).toBeCloseTo(2.7 * plan_m2, 9);
  });

  it('keeps a gilder for 5.644 h, set-up included', () => {
    expect(hoursOf('gilder')).toBeCloseTo(ground_hours + gilding_hours + finishing_hours, 9);
    expect(ground_hours + gilding_hours + finishing_hours).toBeCloseTo(5.6439, 4);
  });
});

// Materials -----------------------------------------------------------------------------------------------------------------------------

/** Whiting: 0.042396 m² × 4 coats × 0.2 kg ÷ 0.75 kept = 0.0452 kg. */
const whiting_kg = (true_m2 * 4 * 0.2) / 0.75;
/** Red bole: 0.042396 m² × 3 coats ÷ 10 m² a litre ÷ 0.85 kept = 0.0150 L. */
const redBole_litres = (true_m2 * 3) / 10 / 0.85;

describe('The bead along the apron by hand: its materials', () => {
  it('takes 45 g of whiting and 15 ml of red bole', () => {
    const needOf = (id: string) => Number(figures.materials.find((bought) => bought.materialId === id)?.need);
    expect(needOf('whiting')).toBeCloseTo(whiting_kg, 5);
    expect(needOf('red-bole')).toBeCloseTo(redBole_litres, 5);
    expect(whiting_kg).toBeCloseTo(0.0452, 4);
    expect(redBole_litres).toBeCloseTo(0.015, 4);
  });

  it('buys the smallest pack of each: glue 24, whiting 3.20, boles 9.50 each, glaze medium 10, leaf 52', () => {
    const cost = Object.fromEntries(figures.cost.purchases.map((bought) => [bought.itemId, Number(bought.cost)]));
    expect(cost).toEqual({
      ...{ 'gold-23-5-loose': 52, 'rabbit-skin-glue': 24, whiting: 3.2 },
      ...{ 'yellow-bole': 9.5, 'red-bole': 9.5, 'glaze-medium': 10 },
    });
  });
});

// Money ---------------------------------------------------------------------------------------------------------------------------------

/**
 * A line: labour and 4 % consumables on it and its goods are the direct cost; 14.50 overhead on each hour; 8 % contingency on the direct
 * cost; the sum ÷ 0.82 leaves a margin of 18 %.
 */
function priceOfLine(labour: number, goods: number, hours: number): number {
  const direct = labour * 1.04 + goods;
  return cents((direct + hours * 14.5 + direct * 0.08) / 0.82);
}

/** 3.9438 × 31 + 1.9891 × 38 + 1.2503 × 22 = 225.35; direct 234.36, overhead 104.16, contingency 18.75: 357.27 ÷ 0.82 = 435.69. */
const carvingPrice = priceOfLine(
  carver_hours * 31 + master_hours * 38 + improver_hours * 22,
  0,
  carving_hours * 1.1 + 1.5,
);
/** 2.8900 × 33 = 95.37, glue, whiting and boles 46.20: direct 145.38, overhead 41.90, contingency 11.63: 198.92 ÷ 0.82 = 242.58. */
const groundPrice = priceOfLine(ground_hours * 33, 46.2, ground_hours);
/** 2.2544 × 33 = 74.39, leaf 52: direct 129.37, overhead 32.69, contingency 10.35: 172.41 ÷ 0.82 = 210.25. */
const gildingPrice = priceOfLine(gilding_hours * 33, 52, gilding_hours);
/** 0.4995 × 33 = 16.48, glaze medium 10: direct 27.14, overhead 7.24, contingency 2.17: 36.56 ÷ 0.82 = 44.58. */
const finishingPrice = priceOfLine(finishing_hours * 33, 10, finishing_hours);

describe('The bead along the apron by hand: its price', () => {
  it.each([
    ['carving', carvingPrice, 435.69],
    ['ground', groundPrice, 242.58],
    ['gilding', gildingPrice, 210.25],
    ['finishing', finishingPrice, 44.58],
  ] as const)('%s comes to %d cents', (kind, byHand, euros) => {
    expect(byHand).toBe(cents(euros));
    expect(lineOf(kind)?.price_minor).toBe(byHand);
  });

  it('has direct cost, overhead and contingency as worked for the ground', () => {
    expect(costOf('ground')).toMatchObject({ direct_minor: 14_538, overhead_minor: 4_190, contingency_minor: 1_163 });
  });

  it('is 933.10 net; 20 % tax on it is 186.62, together 1,119.72', () => {
    // 435.69 + 242.58 + 210.25 + 44.58 = 933.10.
    expect(figures.price.net_minor).toBe(93_310);
    expect(figures.price.tax_minor).toBe(18_662);
    expect(figures.price.gross_minor).toBe(111_972);
  });

  it('is paid with 30 % before, 40, 40 and 20 % on the way, 5 % kept back until the end', () => {
    // Deposit 335.92 (335.916); retention 55.99 (55.986); stages end at 447.89 (447.888), 895.78 (895.776) and 1,119.72.
    expect(figures.stages.deposit_minor).toBe(33_592);
    expect(figures.stages.stages.map((stage) => stage.work_minor)).toEqual([44_789, 44_789, 22_394]);
    // Half of 55.99 is 27.995: the larger half is given back first.
    expect(figures.stages.releases_minor).toEqual([2_800, 2_799]);
  });
});
