import * as fc from 'fast-check';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Draft } from '#shared/estimates/draft';
import { estimateFigures, prepareEstimate, type PreparedEstimate } from '#shared/estimates/estimate-figures';
import { estimateWork } from '#shared/estimates/estimate-work';
import type { Figures } from '#shared/estimates/figures';
import type { Member, MemberOrnament, Zone } from '#shared/estimates/member';
import { draftForSpecs, memberForSpecs, ornamentForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import { riskOf } from '#shared/estimates/risk/risk-of';
import type { ExtraLine } from '#shared/estimates/settings';
import { reliefs } from '#shared/measure/relief';
import type { Shape } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { startCard } from '#shared/rate-cards/start-card';

const card = startCard;
const prepared = (draft: Draft, choice: readonly string[] = []): PreparedEstimate =>
  prepareEstimate({ draft, choice, card, currency: 'EUR' });
const figuresOf = (draft: Draft, choice: readonly string[] = []): Figures =>
  estimateFigures(prepared(draft, choice), null);

const likelyHours = ({ grades }: Figures): number => grades.reduce((sum, grade) => sum + grade.hours, 0);
const sumOf = (figures: readonly number[]): number => figures.reduce((sum, figure) => sum + figure, 0);

const lengths = fc.integer({ min: 30, max: 900 });
const kinds = [
  'rectangle',
  'moulding',
  'turned',
  'straight-leg',
  'cabriole',
  'twisted',
  'ball-foot',
  'torus',
  'boss',
  'band',
  'ellipse',
] as const;

const anyShape: fc.Arbitrary<Shape> = fc.oneof(
  fc.constantFrom(...kinds).map((kind) => shapeDefaults(kind)),
  fc.record({ kind: fc.constant('rectangle' as const), length_mm: lengths, height_mm: lengths }),
  fc.record({
    kind: fc.constant('measured' as const),
    area_mm2: fc.integer({ min: 1_000, max: 400_000 }),
    uncertainty_mm2: fc.constant(0),
    note: fc.constant('Foil'),
    isTrueSurface: fc.boolean(),
  }),
);

const leafBuildUps = ['water-burnished', 'water-matte', 'water-burnished-and-matte', 'oil-3-hour'] as const;
const anyFinish = fc.oneof(
  fc.record({
    buildUpId: fc.constantFrom(...leafBuildUps),
    leafId: fc.constantFrom('gold-23-5-loose', 'gold-22-loose'),
  }),
  fc.record({ buildUpId: fc.constantFrom('white-glazes', 'paint', 'toned-back'), leafId: fc.constant(null) }),
);

const anyZone: fc.Arbitrary<Zone> = fc
  .record({
    share_percent: fc.integer({ min: 5, max: 40 }),
    finish: anyFinish,
    relief: fc.constantFrom(...reliefs),
    recutting: fc.constantFrom(null, 'plain' as const),
  })
  .map(({ share_percent, finish, ...rest }) =>
    zoneEntryForSpecs({ ...rest, ...finish, take: { way: 'share', share_percent } }),
  );

const anyOrnament: fc.Arbitrary<MemberOrnament> = fc.oneof(
  fc
    .record({
      ornamentId: fc.constantFrom('rosette', 'acanthus-leaf', 'shell', 'leg-from-block'),
      count: fc.integer({ min: 1, max: 9 }),
      isUndercut: fc.boolean(),
    })
    .map(({ count, ...rest }) => ornamentForSpecs({ ...rest, extent: { way: 'pieces', count } })),
  fc
    .record({ ornamentId: fc.constantFrom('egg-and-dart', 'bead-and-reel', 'fluting'), run_mm: lengths })
    .map(({ ornamentId, run_mm }) =>
      ornamentForSpecs({
        ornamentId,
        extent: { way: 'run', run_mm, runs: 2, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null },
      }),
    ),
  fc
    .integer({ min: 100, max: 90_000 })
    .map((area_mm2) => ornamentForSpecs({ ornamentId: 'diaper', extent: { way: 'area', area_mm2 } })),
);

const anyMember: fc.Arbitrary<Member> = fc
  .record({
    count: fc.integer({ min: 1, max: 4 }),
    timberId: fc.constantFrom('lime', 'oak'),
    shape: anyShape,
    zones: fc.array(anyZone, { maxLength: 2 }),
    ornaments: fc.array(anyOrnament, { maxLength: 3 }),
  })
  .map((given) => memberForSpecs(given));

/** Gives everything an id of its own; ornaments stand in the first zone. */
const named = (members: readonly Member[]): Member[] =>
  members.map((member, place) => {
    const zones = member.zones.map((zone, at) => ({ ...zone, id: `zone ${place}.${at}` }));
    const zoneId = zones[0]?.id ?? null;
    const ornaments = member.ornaments.map((use, at) => ({ ...use, id: `ornament ${place}.${at}`, zoneId }));
    return { ...member, id: `member ${place}`, place, zones, ornaments };
  });

const anyExtras: fc.Arbitrary<ExtraLine[]> = fc
  .array(
    fc.oneof(
      fc.record({
        kind: fc.constant('labour' as const),
        gradeId: fc.constantFrom('carver', 'improver'),
        hours: fc.integer({ min: 1, max: 40 }).map((quarters) => quarters / 4),
        work: fc.constantFrom('making' as const, 'packing' as const),
      }),
      fc.record({ kind: fc.constant('bought-in' as const), cost: fc.constantFrom('12.345', '180.00') }),
      fc.record({
        kind: fc.constant('insurance' as const),
        percent: fc.constantFrom('0.4', '1.25'),
        value: fc.constant(null),
      }),
    ),
    { maxLength: 3 },
  )
  .map((lines) =>
    lines.map((line, place): ExtraLine => ({
      ...{ id: `extra ${place}`, name: 'Extra', memberId: null, alternativeId: null },
      taxCategoryId: place === 1 ? 'reduced' : 'standard',
      ...line,
    })),
  );

const anyDraft: fc.Arbitrary<Draft> = fc
  .record({ members: fc.array(anyMember, { minLength: 1, maxLength: 5 }), extras: anyExtras })
  .map(({ members, extras }) => draftForSpecs(named(members), { extras }));

const few = { numRuns: 60 };

/** Every length of a shape twice as long, every area four times as large. */
function doubled<T>(value: T, key = ''): T {
  if (Array.isArray(value)) return value.map((inner: unknown) => doubled(inner, key)) as T;
  if (typeof value === 'number')
    return (key.endsWith('_mm2') ? value * 4 : key.endsWith('_mm') ? value * 2 : value) as T;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([name, inner]) => [name, doubled(inner, name)])) as T;
}

describe('Laws of a whole estimate', () => {
  it('doubling every length of every member multiplies its areas by four', () => {
    fc.assert(
      fc.property(anyDraft, (draft) => {
        const large = {
          ...draft,
          members: draft.members.map((member) => ({ ...member, shape: doubled(member.shape) })),
        };
        const [before, after] = [figuresOf(draft), figuresOf(large)];
        before.members.forEach((member, place) => {
          for (const area of ['developed_mm2', 'plan_mm2', 'true_mm2', 'bare_mm2'] as const)
            expect(after.members[place]?.[area]).toBeCloseTo(4 * member[area], 3);
        });
        before.zones.forEach((zone, place) => {
          expect(after.zones[place]?.plan_mm2).toBeCloseTo(4 * zone.plan_mm2, 3);
          expect(after.zones[place]?.true_mm2).toBeCloseTo(4 * zone.true_mm2, 3);
        });
      }),
      few,
    );
  });

  it('one member more never lowers hours, leaf, direct cost or price', () => {
    fc.assert(
      fc.property(anyDraft, anyMember, (draft, more) => {
        const larger = { ...draft, members: named([...draft.members, more]) };
        const [before, after] = [figuresOf(draft), figuresOf(larger)];
        expect(likelyHours(after)).toBeGreaterThanOrEqual(likelyHours(before) - 1e-9);
        expect(after.tally.booklets).toBeGreaterThanOrEqual(before.tally.booklets);
        expect(after.cost.price.direct_minor).toBeGreaterThanOrEqual(before.cost.price.direct_minor);
        // Every line is rounded by itself, and what is bought for the whole job is shared out anew.
        const rounding_minor = after.price.lines.length;
        expect(after.price.net_minor).toBeGreaterThanOrEqual(before.price.net_minor - rounding_minor);
      }),
      few,
    );
  });

  it('the order of members changes no total', () => {
    fc.assert(
      fc.property(anyDraft, (draft) => {
        const [before, after] = [figuresOf(draft), figuresOf({ ...draft, members: draft.members.toReversed() })];
        expect(likelyHours(after)).toBeCloseTo(likelyHours(before), 9);
        expect(after.tally.true_mm2).toBeCloseTo(before.tally.true_mm2, 4);
        expect(after.tally.booklets).toBe(before.tally.booklets);
        // A pattern is charged where its ornament stands first, and hours enter money with six decimals on each line: at most a cent.
        for (const sum of ['direct_minor', 'overhead_minor'] as const)
          expect(Math.abs(after.cost.price[sum] - before.cost.price[sum])).toBeLessThanOrEqual(1);
        expect(after.materials).toEqual(before.materials);
      }),
      few,
    );
  });

  it('a zone cut into two equal shares takes the same surface and the same net leaf', () => {
    fc.assert(
      fc.property(anyMember, anyZone, (member, zone) => {
        const share_percent = zone.take.way === 'share' ? zone.take.share_percent : 100;
        const half = { ...zone, take: { way: 'share' as const, share_percent: share_percent / 2 } };
        const [whole, halves] = [[zone], [half, half]].map((zones) =>
          figuresOf(draftForSpecs(named([{ ...member, zones, ornaments: [] }]))),
        );
        const areaOf = (figures: Figures | undefined, area: 'plan_mm2' | 'true_mm2') =>
          sumOf((figures?.zones ?? []).map((each) => each[area]));
        expect(areaOf(halves, 'plan_mm2')).toBeCloseTo(areaOf(whole, 'plan_mm2'), 4);
        expect(areaOf(halves, 'true_mm2')).toBeCloseTo(areaOf(whole, 'true_mm2'), 4);
        expect(sumOf((halves?.leaf ?? []).map((leaf) => leaf.netLeaves))).toBeCloseTo(
          sumOf((whole?.leaf ?? []).map((leaf) => leaf.netLeaves)),
          9,
        );
      }),
      few,
    );
  });

  it('hours that are paid are carving, hands-on work and set-up, and nothing besides', () => {
    fc.assert(
      fc.property(anyDraft, (draft) => {
        const work = estimateWork(draft, card);
        const handsOn = sumOf(work.zones.map((zone) => zone.handsOn.hours.likely));
        const setUp = sumOf(work.lots.map((lot) => lot.setUp_hours));
        const paid = sumOf(work.labour.map((entry) => entry.hours));
        expect(paid).toBeCloseTo(work.carving.total.likely + handsOn + setUp, 9);
        for (const { gradeId, hours } of work.carving.grades) {
          const carved = work.labour.filter((entry) => entry.kind === 'carving' && entry.gradeId === gradeId);
          expect(sumOf(carved.map((entry) => entry.hours))).toBeCloseTo(hours.likely, 9);
        }
      }),
      few,
    );
  });

  it('lines sum to the net price, heads and lines of cost to the cost, net and tax to the gross price', () => {
    fc.assert(
      fc.property(anyDraft, (draft) => {
        const { price, cost } = figuresOf(draft);
        expect(sumOf(price.lines.map((line) => line.price_minor))).toBe(price.subtotal_minor);
        expect(price.net_minor).toBe(price.subtotal_minor - price.discount_minor);
        expect(sumOf(price.taxes.map((tax) => tax.net_minor))).toBe(price.net_minor);
        expect(price.gross_minor).toBe(price.net_minor + sumOf(price.taxes.map((tax) => tax.tax_minor)));
        expect(sumOf(cost.price.heads.map((head) => head.cost_minor))).toBe(cost.price.direct_minor);
        expect(sumOf(cost.price.lines.map((line) => line.cost_minor))).toBe(cost.price.cost_minor);
      }),
      few,
    );
  });

  it('stages, deposit and retention come to the gross price, to the cent', () => {
    fc.assert(
      fc.property(anyDraft, (draft) => {
        const { price, stages } = figuresOf(draft);
        const paid = [
          stages.deposit_minor,
          ...stages.stages.map((stage) => stage.paid_minor),
          ...stages.releases_minor,
        ];
        expect(sumOf(paid)).toBe(price.gross_minor);
      }),
      few,
    );
  });

  it('risk with everything at its likely value is the direct cost and the hours of the price', () => {
    fc.assert(
      fc.property(anyDraft, (draft) => {
        // Insurance of the price itself depends on contingency, which is what the trials are made for; they insure the price without it.
        const extras = draft.settings.extras.filter((extra) => extra.kind !== 'insurance');
        const estimate = prepared({ ...draft, settings: { ...draft.settings, extras } });
        const { cost } = estimateFigures(estimate, null);
        const risk = riskOf(estimate.risk);
        expect(Math.abs(risk.direct_minor.atLikely - cost.price.direct_minor)).toBeLessThanOrEqual(1);
        expect(risk.hours.atLikely).toBeCloseTo(cost.price.hours, 4);
      }),
      { numRuns: 25 },
    );
  });

  it('an alternative taken and left again leaves the figures as they were, and one that changes nothing changes none', () => {
    fc.assert(
      fc.property(anyDraft, anyZone, (draft, zone) => {
        const [first, ...others] = draft.members;
        const other = { ...zone, id: 'other', alternativeId: 'alternative' };
        const offered = {
          ...draft,
          members: first ? [{ ...first, zones: [...first.zones, other] }, ...others] : [],
          settings: {
            ...draft.settings,
            alternatives: [
              {
                id: 'alternative',
                name: 'Other',
                group: '',
                note: '',
                replaces: first?.zones.map(({ id }) => id) ?? [],
              },
              { id: 'idle', name: 'Idle', group: '', note: '', replaces: [] },
            ],
          },
        };
        // That there is nothing in it is said, and changes no figure.
        const withoutIdle = ({ findings, ...figures }: Figures) => ({
          ...figures,
          findings: findings.filter(({ code }) => code !== 'alternative-empty'),
        });
        const base = canonicalJson(figuresOf(draft));
        expect(figuresOf(offered, ['alternative']).zones.map(({ zoneId }) => zoneId)).toContain('other');
        expect(canonicalJson(withoutIdle(figuresOf(offered)))).toBe(base);
        expect(canonicalJson(withoutIdle(figuresOf(offered, ['idle'])))).toBe(base);
      }),
      few,
    );
  });

  it('a draft that went through JSON gives the same figures to the last digit', () => {
    fc.assert(
      fc.property(anyDraft, (draft) => {
        const copy = JSON.parse(JSON.stringify(draft)) as Draft;
        expect(canonicalJson(figuresOf(copy))).toBe(canonicalJson(figuresOf(draft)));
      }),
      few,
    );
  });
});
