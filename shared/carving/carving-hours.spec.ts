import fc from 'fast-check';
import { carvingHours } from '#shared/carving/carving-hours';
import type { CarvedUse, RecutZone } from '#shared/carving/carving-work';
import type { OrnamentUse } from '#shared/carving/ornament-use';
import { startCarving } from '#shared/carving/start-carving';
import { reliefs } from '#shared/measure/relief';
import { en } from '#shared/words/en';
import { say } from '#shared/words/say';

const run = (run_mm: number, runs = 1) =>
  ({ way: 'run', run_mm, runs, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null }) as const;
const pieces = (count: number) => ({ way: 'pieces', count }) as const;
const area = (area_mm2: number) => ({ way: 'area', area_mm2 }) as const;

let made = 0;
const use = (ornamentId: string, extent: OrnamentUse['extent'], changed: Partial<OrnamentUse> = {}): OrnamentUse => ({
  id: `use ${(made += 1)}`,
  ornamentId,
  extent,
  size_mm: null,
  relief: startCarving.ornaments.find(({ id }) => id === ornamentId)?.relief ?? 'middle',
  isUndercut: false,
  plan: 'straight',
  isMirrored: false,
  joinsLearning: false,
  hasOwnPattern: false,
  zoneId: null,
  ...changed,
});

const carved = (one: OrnamentUse, timberId = 'lime', members = 1): CarvedUse => ({ use: one, members, timberId });
const worked = (uses: readonly CarvedUse[], recut: readonly RecutZone[] = []) =>
  carvingHours({ uses, recut }, startCarving);
const likely = (one: CarvedUse): number => worked([one]).uses[0]?.carving.likely ?? 0;
const kind = (result: ReturnType<typeof worked>, of: string): number =>
  result.rows.filter((row) => row.kind === of).reduce((sum, row) => sum + row.hours.likely, 0);

describe('carvingHours', () => {
  it.each([
    ['a single rosette takes its first-unit hours', carved(use('rosette', pieces(1))), 1.8],
    ['oak takes half as long again', carved(use('rosette', pieces(1)), 'oak'), 2.7],
    ['higher relief than its own goes by the ratio', carved(use('rosette', pieces(1), { relief: 'high' })), 2.43],
    ['a shell at its own high relief is as timed', carved(use('shell', pieces(1))), 5],
    ['a shell in middle relief is less', carved(use('shell', pieces(1), { relief: 'middle' })), 3.703704],
    ['undercutting adds a fifth', carved(use('rosette', pieces(1), { isUndercut: true })), 2.16],
    ['a quick sweep adds a quarter', carved(use('rosette', pieces(1), { plan: 'quick-sweep' })), 2.25],
    ['half as large again is 1.76 times the work', carved(use('rosette', pieces(1), { size_mm: 90 })), 3.175413],
    ['four rosettes are learnt on', carved(use('rosette', pieces(4))), 6.556687],
    ['so are two on each of two members', carved(use('rosette', pieces(2)), 'lime', 2), 6.556687],
    ['twenty rosettes stop learning at the sixteenth', carved(use('rosette', pieces(20))), 28.126733],
    ['95 eggs on 2,860 mm learn up to the sixty-fourth', carved(use('egg-and-dart', run(2860))), 18.775903],
    ['fluting goes by length, without learning', carved(use('fluting', run(1200, 24))), 23.04],
    ['diaper goes by area, without learning or size', carved(use('diaper', area(45_000), { size_mm: 300 })), 4.05],
    ['shaping a leg in walnut', carved(use('leg-from-block', pieces(4)), 'walnut'), 21.6],
    [
      'a moulding circular on plan is worked at the blank’s own factor',
      carved(use('plain-moulding', run(1000), { plan: 'quick-sweep' })),
      1.2,
    ],
    ['a small bird is scaled by its size', carved(use('figure-in-the-round', pieces(1), { size_mm: 150 })), 18.946461],
    ['free carving by true surface', carved(use('free-carving', area(120_000), { relief: 'high' })), 15.6],
    ['a clay model is the same whatever the timber', carved(use('clay-model', pieces(1)), 'oak'), 6],
    ['no pieces take no time', carved(use('husk', run(0))), 0],
  ])('%s', (_sentence, one, hours) => {
    expect(likely(one)).toBeCloseTo(hours, 5);
  });

  it('says why', () => {
    const word = say(en, { locale: 'en-GB', write: (unit, figure) => `${Math.round(figure * 10) / 10} ${unit}` });
    const [result] = worked([
      carved(use('egg-and-dart', run(2860), { relief: 'high', isUndercut: true, plan: 'flat-sweep' }), 'oak'),
    ]).uses;
    const told = result?.reasons.map(
      ({ code, values, figure }) => `${word(code, values)}: ${Math.round(Number(figure) * 1000) / 1000}`,
    );
    expect(told).toEqual([
      'first Egg and dart, at 30 mm: 0.3',
      'size 30 mm, against 30 mm: 1',
      'timber, Oak (white): 1.5',
      'relief, high for middle: 1.35',
      'undercut: 1.2',
      'curved on plan, swept: 1.1',
      'whole repeats, 2860 mm at 30.1 mm: 95',
      'each after learning over 95 pieces, 92 percent for the unit: 0.659',
      'hours, 33.5 hours to 75.3 hours: 50.188',
    ]);
  });

  it('counts a curve over the whole estimate and shares it by pieces', () => {
    const apart = worked([carved(use('rosette', pieces(3))), carved(use('rosette', pieces(1)))]);
    expect(apart.uses[0]?.carving.likely).toBeCloseTo((6.556687 * 3) / 4, 5);
    expect(apart.uses[1]?.carving.likely).toBeCloseTo(6.556687 / 4, 5);
  });

  it.each([
    ['another size', { size_mm: 61 }],
    ['another relief', { relief: 'low' }],
    ['undercut', { isUndercut: true }],
    ['another plan', { plan: 'flat-sweep' }],
    ['the other hand', { isMirrored: true }],
  ] as const)('starts a curve anew for %s', (_what, changed) => {
    const both = worked([carved(use('rosette', pieces(2))), carved(use('rosette', pieces(2), changed))]);
    expect(both.uses.map(({ learnt }) => learnt)).toEqual([1.92, 1.92]);
  });

  it('starts a curve anew in another timber, and joins the other hand when it is marked', () => {
    const timbers = worked([carved(use('rosette', pieces(2))), carved(use('rosette', pieces(2)), 'oak')]);
    expect(timbers.uses.map(({ learnt }) => learnt)).toEqual([1.92, 1.92]);
    const joined = worked([
      carved(use('rosette', pieces(2))),
      carved(use('rosette', pieces(2), { isMirrored: true, joinsLearning: true })),
    ]);
    expect(joined.uses[0]?.learnt).toBeCloseTo(3.6426037 / 2, 6);
  });

  it('takes the reference size and the same size written out for one', () => {
    const same = worked([carved(use('rosette', pieces(2))), carved(use('rosette', pieces(2), { size_mm: 60 }))]);
    expect(same.uses[0]?.learnt).toBeCloseTo(3.6426037 / 2, 6);
  });

  it('divides repeated work into stages and grades', () => {
    const result = worked([carved(use('rosette', pieces(1)))]);
    const shares = result.rows
      .filter((row) => row.kind === 'stage')
      .map((row) => [row.stageId, row.gradeId, row.hours.likely]);
    expect(shares.map(([stage, grade]) => `${stage} ${grade}`)).toEqual([
      'marking-out carver',
      'blank improver',
      'setting-in carver',
      'grounding improver',
      'bosting carver',
      'modelling master-carver',
      'detail master-carver',
      'cleaning-up carver',
    ]);
    expect(shares[4]?.[2]).toBeCloseTo(0.396, 12);
    expect(kind(result, 'stage')).toBeCloseTo(1.8, 12);
  });

  it('gives the undercut share a stage of its own', () => {
    const result = worked([carved(use('rosette', pieces(1), { isUndercut: true }))]);
    expect(kind(result, 'undercutting')).toBeCloseTo(0.36, 12);
    expect(kind(result, 'stage')).toBeCloseTo(1.8, 12);
  });

  it('says of a clay model that it is one, not at which size', () => {
    const [first] = worked([carved(use('clay-model', pieces(1)))]).uses[0]?.reasons ?? [];
    expect(first).toMatchObject({ code: 'carving-each', values: { ornament: 'Clay model' }, figure: 6 });
  });

  it('adds sharpening once, to carving and not to patterns, models or recutting', () => {
    const result = worked(
      [
        carved(use('rosette', pieces(1), { zoneId: 'top' })),
        carved(use('leg-from-block', pieces(2))),
        carved(use('clay-model', pieces(1))),
      ],
      [{ zoneId: 'top', manner: 'plain', planArea_mm2: 1e6 }],
    );
    expect(result.sharpening.likely).toBeCloseTo(0.1 * (1.8 + 9), 12);
    expect(kind(result, 'pattern')).toBeCloseTo(1.5, 12);
    expect(kind(result, 'once')).toBeCloseTo(6, 12);
    expect(kind(result, 'recutting')).toBeCloseTo(0.27, 12);
    expect(result.total.likely).toBeCloseTo(1.8 + 9 + 1.08 + 1.5 + 6 + 0.27, 12);
  });

  it('draws one pattern for each ornament, and one more for each use that differs', () => {
    const three = [carved(use('rosette', pieces(2))), carved(use('rosette', pieces(1), { size_mm: 90 }))];
    expect(worked(three).patterns).toMatchObject([{ ornamentId: 'rosette', patterns: 1 }]);
    const differing = [
      ...three,
      carved(use('rosette', pieces(1), { hasOwnPattern: true })),
      carved(use('mask', pieces(1))),
    ];
    expect(worked(differing).patterns).toMatchObject([
      { ornamentId: 'rosette', patterns: 2, hours: { low: 2, likely: 3, high: 6 } },
      { ornamentId: 'mask', patterns: 1 },
    ]);
  });

  it.each([
    ['a share of the zone’s ornament', 'top', 'plain', 0.15 * 6.556687],
    ['a larger share in the French manner', 'top', 'french', 0.35 * 6.556687],
    ['by area where nothing is carved', 'back', 'plain', 4],
    ['more by area in the French manner', 'back', 'french', 10],
  ] as const)('recuts in gesso: %s', (_sentence, zoneId, manner, hours) => {
    const uses = [
      carved(use('rosette', pieces(4), { zoneId: 'top' })),
      carved(use('leg-from-block', pieces(4), { zoneId: 'back' })),
    ];
    const [recut] = worked(uses, [{ zoneId, manner, planArea_mm2: 500_000 }]).recut;
    expect(recut?.hours.likely).toBeCloseTo(hours, 5);
  });

  it('tells what each ornament brings with it, sharpening and recutting included', () => {
    const result = worked(
      [carved(use('rosette', pieces(1), { zoneId: 'top' })), carved(use('mask', pieces(1)))],
      [{ zoneId: 'top', manner: 'plain', planArea_mm2: 1e6 }],
    );
    const sum = (ornamentId: string) =>
      result.ornaments
        .find((one) => one.ornamentId === ornamentId)
        ?.grades.reduce((total, { hours }) => total + hours.likely, 0);
    expect(sum('rosette')).toBeCloseTo(1.8 * 1.25, 12);
    expect(sum('mask')).toBeCloseTo(22, 12);
  });

  it.each([
    ['an ornament the card does not have', carved(use('gone', pieces(1))), 'missing carving-ornament-unknown'],
    ['a timber the card does not have', carved(use('rosette', pieces(1)), 'ebony'), 'missing carving-timber-unknown'],
    ['an area of rosettes', carved(use('rosette', area(100))), 'refuse carving-extent-unfit'],
    ['pieces of fluting', carved(use('fluting', pieces(3))), 'refuse carving-extent-unfit'],
    ['a run of diaper', carved(use('diaper', run(300))), 'refuse carving-extent-unfit'],
    ['more than twice the reference', carved(use('rosette', pieces(1), { size_mm: 130 })), 'warn carving-size-outside'],
    ['repeats stretched out of shape', carved(use('guilloche', run(220))), 'warn carving-stretch-outside'],
    [
      'mitre leaves that fill the run',
      carved(use('guilloche', { ...run(80), mitreLeaf_mm: 40, mitreLeaves: 2 })),
      'refuse carving-run-too-short',
    ],
    ['dust wherever wood is cut', carved(use('rosette', pieces(1))), 'caution carving-wood-dust'],
  ])('tells of %s', (_what, one, finding) => {
    expect(worked([one]).findings.map((told) => `${told.kind} ${told.code}`)).toContain(finding);
  });

  it('says nothing of dust where nothing is carved', () => {
    expect(worked([carved(use('clay-model', pieces(1)))]).findings).toEqual([]);
    expect(worked([])).toMatchObject({ total: { low: 0, likely: 0, high: 0 }, findings: [], rows: [] });
  });

  const anyUse = fc
    .record({
      ornamentId: fc.constantFrom('rosette', 'shell', 'egg-and-dart', 'husk'),
      count: fc.integer({ min: 0, max: 120 }),
      relief: fc.constantFrom(...reliefs),
      isUndercut: fc.boolean(),
      members: fc.integer({ min: 1, max: 6 }),
      timberId: fc.constantFrom('lime', 'oak'),
      zoneId: fc.constantFrom('top', 'back', null),
    })
    .map(({ ornamentId, count, members, timberId, ...changed }) =>
      carved(use(ornamentId, pieces(count), changed), timberId, members),
    );

  it('adds up: stages, grades, ornaments and rows all come to the same, in order low, likely, high', () => {
    const recut: RecutZone[] = [{ zoneId: 'top', manner: 'french', planArea_mm2: 2e5 }];
    fc.assert(
      fc.property(fc.array(anyUse, { minLength: 1, maxLength: 8 }), (uses) => {
        const result = worked(uses, recut);
        const sum = (rows: readonly { hours: { likely: number } }[]) =>
          rows.reduce((total, row) => total + row.hours.likely, 0);
        expect(sum(result.grades)).toBeCloseTo(result.total.likely, 6);
        expect(sum(result.rows)).toBeCloseTo(result.total.likely, 6);
        const byOrnament = result.ornaments.reduce((total, one) => total + sum(one.grades), 0);
        const recutByArea = result.recut.filter(({ reasons }) => reasons[0]?.code === 'carving-recut-area');
        expect(byOrnament + sum(result.patterns) + sum(recutByArea)).toBeCloseTo(result.total.likely, 6);
        expect(result.total.low).toBeLessThanOrEqual(result.total.likely);
        expect(result.total.likely).toBeLessThanOrEqual(result.total.high);
      }),
    );
  });

  it('never takes longer together than apart, nor less time for one use more', () => {
    fc.assert(
      fc.property(fc.array(anyUse, { minLength: 1, maxLength: 6 }), anyUse, (uses, more) => {
        const carvedIn = (all: readonly CarvedUse[]) =>
          worked(all).uses.reduce((sum, { carving }) => sum + carving.likely, 0);
        const together = carvedIn([...uses, more]);
        expect(together).toBeLessThanOrEqual(carvedIn(uses) + carvedIn([more]) + 1e-6);
        expect(together).toBeGreaterThanOrEqual(carvedIn(uses) - 1e-6);
      }),
    );
  });
});
