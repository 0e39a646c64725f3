import fc from 'fast-check';
import type { ZonedMember, MemberZone } from '#shared/measure/zoned-member';
import { netAreas } from '#shared/measure/net-areas';
import { reliefs } from '#shared/measure/relief';
import type { Shape } from '#shared/measure/shape';
import { startMeasure } from '#shared/measure/start-measure';
import { surfaceOf } from '#shared/measure/surface-of';

const panel: Shape = { kind: 'rectangle', length_mm: 500, height_mm: 200 };
const moulding: Shape = {
  kind: 'moulding',
  profile: [
    { id: 'top', element: 'fillet', height_mm: 20, projection_mm: 0, going: 'out' },
    { id: 'slope', element: 'line', across_mm: 0, up_mm: 60 },
    { id: 'foot', element: 'fillet', height_mm: 20, projection_mm: 0, going: 'out' },
  ],
  plan: { form: 'straight', sides_mm: [1000], returns_mm: [] },
  measuredAt: 'back',
  facing: 'outward',
};

const share = (share_percent: number, more: Partial<MemberZone> = {}): MemberZone => ({
  id: `zone-${share_percent}`,
  take: { way: 'share', share_percent },
  relief: 'flat',
  ...more,
});
const parts = (...keys: string[]): MemberZone => ({
  id: keys.join(),
  take: { way: 'parts', parts: keys },
  relief: 'flat',
});
const member = (shape: Shape, zones: readonly MemberZone[], more: Partial<ZonedMember> = {}): ZonedMember => ({
  surface: surfaceOf(shape),
  openings: [],
  count: 1,
  zones,
  ...more,
});
/** A square hole of 100. */
const hole = { id: 'hole', shape: { kind: 'rectangle', length_mm: 100, height_mm: 100 } as const, count: 1 };
const work = (given: ZonedMember) => netAreas(given, startMeasure);
const codesOf = (given: ZonedMember) => work(given).findings.map(({ kind, code }) => `${kind} ${code}`);

describe('The net area of a zone', () => {
  // A panel of 100,000 mm², worked by hand.
  it.each<[string, ZonedMember, number, number]>([
    ['the whole of a flat panel', member(panel, [share(100)]), 100_000, 100_000],
    ['of four alike', member(panel, [share(100)], { count: 4 }), 400_000, 400_000],
    ['a quarter of it', member(panel, [share(25)]), 25_000, 25_000],
    ['in low relief', member(panel, [share(100, { relief: 'low' })]), 100_000, 115_000],
    ['in middle relief', member(panel, [share(100, { relief: 'middle' })]), 100_000, 135_000],
    ['in high relief', member(panel, [share(100, { relief: 'high' })]), 100_000, 170_000],
    ['pierced', member(panel, [share(100, { relief: 'pierced' })]), 100_000, 200_000],
    ['in the round, on an enclosing form', member(panel, [share(100, { relief: 'in-the-round' })]), 100_000, 160_000],
    [
      'in the round, measured as it is',
      member({ kind: 'measured', area_mm2: 100_000, uncertainty_mm2: 0, note: 'foil', isTrueSurface: true }, [
        share(100, { relief: 'in-the-round' }),
      ]),
      100_000,
      100_000,
    ],
    ['with a hole', member(panel, [share(100)], { openings: [hole] }), 90_000, 90_000],
    [
      'with three holes, four alike, half of it in low relief',
      member(panel, [share(50, { relief: 'low' })], { openings: [{ ...hole, count: 3 }], count: 4 }),
      140_000,
      161_000,
    ],
    [
      'pierced with a hole: nothing is deducted',
      member(panel, [share(100, { relief: 'pierced' })], { openings: [hole] }),
      100_000,
      200_000,
    ],
    ['two parts of a moulding', member(moulding, [parts('top', 'foot')]), 40_000, 40_000],
    ['of nothing is nothing', member({ ...panel, height_mm: 0 }, [share(100)]), 0, 0],
  ])('%s', (_what, given, plan_mm2, net_mm2) => {
    const [zone] = work(given).zones;
    expect(zone.plan_mm2).toBeCloseTo(plan_mm2, 6);
    expect(zone.net_mm2).toBeCloseTo(net_mm2, 6);
    expect(zone.planEach_mm2).toBeCloseTo(plan_mm2 / given.count, 6);
    expect(zone.netEach_mm2).toBeCloseTo(net_mm2 / given.count, 6);
  });

  it('gives the girth of the parts it takes', () => {
    expect(work(member(moulding, [parts('top', 'slope')])).zones[0]).toMatchObject({ girth_mm: 80, share: 0.8 });
  });

  it('names the house value it used', () => {
    const houses = (given: ZonedMember) => work(given).zones[0].reasons.flatMap(({ house }) => house ?? []);
    expect(houses(member(panel, [share(100, { relief: 'high' })]))).toEqual(['measure.reliefFactors.high']);
  });

  it('says what is left bare', () => {
    const areas = work(member(panel, [share(60), share(15)], { count: 2 }));
    expect(areas.bare_mm2).toBeCloseTo(50_000, 6);
    expect(areas.findings).toEqual([
      { kind: 'note', code: 'measure-bare', values: { bare_mm2: expect.closeTo(50_000, 6) as number } },
    ]);
  });

  it.each<[string, ZonedMember, string[]]>([
    ['all of it taken is nothing to tell', member(panel, [share(40), share(60)]), []],
    ['thirds make a whole', member(panel, [share(100 / 3), share(100 / 3), share(100 / 3)]), []],
    ['more than all of it is refused', member(panel, [share(60), share(41)]), ['refuse measure-shares-over']],
    [
      'a part beside too great a share is refused',
      member(moulding, [parts('slope'), share(50)]),
      ['refuse measure-shares-over'],
    ],
    [
      'openings above the face are refused',
      member(panel, [share(100)], { openings: [{ ...hole, count: 11 }] }),
      ['refuse measure-openings-too-large'],
    ],
    ['openings as large as the face are not', member(panel, [share(100)], { openings: [{ ...hole, count: 10 }] }), []],
    ['parts without one chosen are asked for', member(moulding, [parts(), share(100)]), ['missing measure-parts-none']],
    [
      'a part that is not there is refused',
      member(moulding, [parts('top', 'lost'), share(80)]),
      ['refuse measure-part-unknown'],
    ],
    [
      'a part taken twice is refused',
      member(moulding, [parts('top', 'slope'), parts('top')]),
      ['refuse measure-part-twice'],
    ],
    [
      'pierced work with openings says that they stay',
      member(panel, [share(100, { relief: 'pierced' })], { openings: [hole] }),
      ['note measure-pierced-openings'],
    ],
  ])('%s', (_what, given, codes) => {
    expect(codesOf(given)).toEqual(codes);
  });

  it('never grows with an opening, nor shrinks with relief', () => {
    const percent = fc.double({ min: 0, max: 100, noNaN: true });
    const side = fc.double({ min: 0, max: 200, noNaN: true });
    fc.assert(
      fc.property(percent, side, fc.constantFrom(...reliefs), (share_percent, side_mm, relief) => {
        const opening = { ...hole, shape: { kind: 'circle', diameter_mm: side_mm } as const };
        const plain = work(member(panel, [share(share_percent)])).zones[0];
        const cut = work(member(panel, [share(share_percent, { relief })], { openings: [opening] })).zones[0];
        expect(cut.plan_mm2).toBeLessThanOrEqual(plain.plan_mm2);
        expect(cut.net_mm2).toBeGreaterThanOrEqual(cut.plan_mm2);
      }),
    );
  });

  it('adds up: zones and what stays bare are the whole', () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: 0, max: 25, noNaN: true }), { maxLength: 4 }), (shares) => {
        const zones = shares.map((share_percent, index) => share(share_percent, { id: `z${index}` }));
        const areas = work(member(panel, zones, { count: 3, openings: [hole] }));
        const sum = areas.zones.reduce((total, zone) => total + zone.plan_mm2, areas.bare_mm2);
        expect(sum).toBeCloseTo(270_000, 3);
        expect(areas.plan_mm2).toBeCloseTo(270_000, 6);
      }),
    );
  });
});
