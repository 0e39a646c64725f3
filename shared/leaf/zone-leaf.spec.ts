import fc from 'fast-check';
import { startLeaf } from '#shared/leaf/start-leaf';
import { zoneLeaf } from '#shared/leaf/zone-leaf';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';
import { finishes, reliefs } from '#shared/measure/relief';
import type { Shape } from '#shared/measure/shape';
import { startMeasure } from '#shared/measure/start-measure';
import type { Surface } from '#shared/measure/surface';
import { surfaceOf } from '#shared/measure/surface-of';
import { en } from '#shared/words/en';
import { say } from '#shared/words/say';

// A top edge: an ovolo of 47.1 mm girth over a fillet of 12 mm, run 2,860 mm.
const edge: Surface = {
  area_mm2: 59.1 * 2860,
  girth_mm: 59.1,
  run_mm: 2860,
  closedRun: false,
  sides_mm: [2860],
  parts: [
    { key: 'ovolo', element: 'ovolo', girth_mm: 47.1, area_mm2: 47.1 * 2860 },
    { key: 'fillet', element: 'fillet', girth_mm: 12, area_mm2: 12 * 2860 },
  ],
  courses: [],
  laying: 'lays',
  finish: 'moulded',
  isTrueSurface: false,
  reasons: [],
};

const field: Surface = {
  ...edge,
  area_mm2: 782 * 392,
  girth_mm: undefined,
  run_mm: undefined,
  sides_mm: [],
  parts: [],
  courses: [{ length_mm: 782, height_mm: 392, closed: false }],
  laying: 'sheets',
  finish: 'plain',
};

const usual: ZoneLeafInput = {
  zoneId: 'zone',
  productId: 'gold-23-5-loose',
  ground: { system: 'water', finish: 'water-burnished', isSealed: false },
  surface: edge,
  partKeys: ['ovolo'],
  share: 1,
  openings_mm2: 0,
  members: 1,
  relief: 'middle',
  reliefFactor: 1.35,
  finish: 'carved',
  burnishedShare: 0.4,
  way: null,
  strips: null,
  cuts: null,
  pieceCost: 0.44,
};

const laid = (changed: Partial<ZoneLeafInput> = {}) => zoneLeaf({ ...usual, ...changed }, startLeaf);
const codes = (changed: Partial<ZoneLeafInput>) => laid(changed).findings.map(({ kind, code }) => `${kind} ${code}`);

describe('zoneLeaf', () => {
  it('takes 41.9 leaves for an ovolo of egg and dart, 40 to 46', () => {
    const ovolo = laid();
    expect(ovolo.netLeaves).toBeCloseTo(34.2, 9);
    expect(ovolo.trueArea_mm2).toBeCloseTo(181_853.1, 6);
    expect(ovolo.grossLeaves.likely).toBeCloseTo(41.904, 3);
    expect(ovolo.grossLeaves.low).toBeCloseTo(38.078, 3);
    expect(ovolo.grossLeaves.high).toBeCloseTo(48.9699, 4);
    expect(ovolo.grossLeaves_p10).toBeCloseTo(40.1, 1);
    expect(ovolo.grossLeaves_p90).toBeCloseTo(46.17, 1);
    expect(ovolo.handled.likely).toBeCloseTo(125.712, 3);
  });

  it('says why', () => {
    const word = say(en, { locale: 'en-GB', write: (unit, figure) => `${Math.round(figure * 10) / 10} ${unit}` });
    const told = laid().reasons.map(
      ({ code, values, figure }) => `${word(code, values)}: ${Math.round(Number(figure) * 100) / 100}`,
    );
    expect(told).toEqual([
      'pieces along, 2860 mm in steps of 76.8 mm: 38',
      'lays across, 47.1 mm in steps of 23.5 mm: 2',
      '3 strips a leaf: 25.33',
      'relief, middle: 1.35',
      'net, for 181853.1 mm2 of true surface: 34.2',
      'second laying: 5',
      'faulting of the rest: 12',
      'breakage: 0.95',
      'leaves, 40.1 to 46.2 where all losses go well or badly at once: 41.9',
    ]);
  });

  it('names the house value behind each loss', () => {
    expect(laid().reasons.flatMap(({ house }) => house ?? [])).toEqual([
      'measure.reliefFactors',
      'leaf.secondLaying_percent.water-burnished.lays',
      'leaf.losses.lays.faulting_percent',
      'leaf.losses.lays.breakage_percent',
    ]);
  });

  it('lays the matte fillet nearly twice over', () => {
    const fillet = laid({
      partKeys: ['fillet'],
      relief: 'flat',
      reliefFactor: 1,
      ground: { ...usual.ground, finish: 'water-matte' },
    });
    expect(fillet.netLeaves).toBeCloseTo(6.333, 3);
    expect(fillet.grossLeaves.likely).toBeCloseTo(13.333, 3);
    expect(fillet.reasons.find(({ code }) => code === 'leaf-strips')?.values).toEqual({ strips: 6 });
  });

  it('lays the burnished and the matte part of a zone again, each to its own extent', () => {
    const parted = laid({
      way: 'patches',
      ground: { ...usual.ground, finish: 'water-burnished-and-matte' },
      burnishedShare: 0.4,
    });
    // 40 % at 10 and 60 % at 100: 4 + 60.
    expect(parted.losses.second_percent.likely).toBeCloseTo(64, 9);
    expect(parted.losses.second_percent.low).toBeCloseTo(0.4 * 5 + 0.6 * 80, 9);
    expect(parted.losses.second_percent.high).toBeCloseTo(0.4 * 25 + 0.6 * 100, 9);
    const word = say(en, { locale: 'en-GB', write: (unit, figure) => `${Math.round(figure * 10) / 10} ${unit}` });
    const told = parted.reasons
      .filter(({ code }) => code.startsWith('leaf-second'))
      .map(({ code, values, figure, house }) => [word(code, values), Math.round(Number(figure)), house]);
    expect(told).toEqual([
      ['second laying of the burnished 40 percent', 10, 'leaf.secondLaying_percent.water-burnished-and-matte.patches'],
      ['second laying of the matte 60 percent', 100, 'leaf.secondLaying_percent.water-matte.patches'],
      ['second laying of the whole, each by its share', 64, undefined],
    ]);
  });

  it('takes five leaves for 40 plaques of 30 by 20 mm: four by two from a leaf', () => {
    const plaque = { ...field, area_mm2: 600, courses: [{ length_mm: 30, height_mm: 20, closed: false }] };
    const plain = { surface: plaque, partKeys: null, relief: 'flat', reliefFactor: 1, finish: 'plain' } as const;
    expect(laid({ ...plain, members: 40 })).toMatchObject({ way: 'lays', netLeaves: 5 });
    // One by itself is a strip of a quarter leaf.
    expect(laid({ ...plain, members: 1 })).toMatchObject({ way: 'lays', netLeaves: 0.25 });
  });

  it('says of a field less than a leaf wide that it is one strip', () => {
    const strip = { ...field, area_mm2: 780 * 30, courses: [{ length_mm: 780, height_mm: 30, closed: false }] };
    const plain = { surface: strip, partKeys: null, relief: 'flat', reliefFactor: 1, finish: 'plain' } as const;
    const [told] = laid({ ...plain, way: 'sheets' }).reasons;
    // Ten leaves along, two strips of 30 mm from a leaf of 80.
    expect(told).toMatchObject({
      code: 'leaf-narrow-strip',
      values: { strip_mm: 30, along: 10, strips: 2, length_mm: 780, height_mm: 30 },
      figure: 5,
    });
  });

  it('patches a carved field, and keeps the way somebody chose', () => {
    const carved = { surface: field, partKeys: null, relief: 'high', reliefFactor: 1.7 } as const;
    // 782 × 392 = 306,544 mm² in squares of 80 − 2 × 3.2 = 73.6 mm, 5416.96 mm²: 56.59, × 1.7.
    expect(laid(carved).way).toBe('patches');
    expect(laid(carved).netLeaves).toBeCloseTo(96.202, 2);
    expect(laid({ ...carved, way: 'sheets' })).toMatchObject({ way: 'sheets', netLeaves: 50 * 1.7 });
  });

  it('counts a share on the whole moulding and splits it', () => {
    const plain = { partKeys: null, relief: 'flat', reliefFactor: 1, strips: 3 } as const;
    const whole = laid(plain).netLeaves;
    expect(whole).toBeCloseTo(38, 9);
    expect(laid({ ...plain, share: 0.25 }).netLeaves).toBeCloseTo(whole / 4, 9);
    expect(laid({ ...plain, share: 0.25 }).netLeaves + laid({ ...plain, share: 0.75 }).netLeaves).toBeCloseTo(whole, 9);
  });

  it('counts one member and multiplies', () => {
    expect(laid({ members: 7 }).grossLeaves.likely).toBeCloseTo(7 * laid().grossLeaves.likely, 9);
    expect(laid({ members: 7 }).trueArea_mm2).toBeCloseTo(7 * laid().trueArea_mm2, 6);
  });

  it('leaves out openings', () => {
    const half = laid({
      surface: field,
      partKeys: null,
      openings_mm2: (782 * 392) / 2,
      relief: 'flat',
      finish: 'plain',
      reliefFactor: 1,
    });
    expect(half.netLeaves).toBeCloseTo(25, 9);
    expect(half.planArea_mm2).toBeCloseTo((782 * 392) / 2, 6);
  });

  it('runs outer parts of a curved moulding at their own length', () => {
    const curved = { ...edge, parts: [{ key: 'outer', element: 'fillet', girth_mm: 12, area_mm2: 12 * 3200 }] };
    const outer = laid({ surface: curved, partKeys: ['outer'], relief: 'flat', reliefFactor: 1 });
    expect(outer.laying).toMatchObject({ way: 'lays', run_mm: 3200 });
  });

  it('lays in patches when asked', () => {
    const patched = laid({ way: 'patches', cuts: 2 });
    expect(patched.netLeaves).toBeCloseTo(33.5711, 4);
    expect(patched.handled.likely).toBeCloseTo(patched.grossLeaves.likely, 9);
  });

  it('lays lays on a single narrow field', () => {
    const band = { ...field, area_mm2: 771.2 * 40, courses: [{ length_mm: 771.2, height_mm: 40, closed: false }] };
    const narrow = laid({ surface: band, partKeys: null, way: 'lays', strips: 2, relief: 'flat', reliefFactor: 1 });
    expect(narrow.netLeaves).toBeCloseTo(5, 9);
  });

  describe('on small flat faces', () => {
    const face = (shape: Shape, members: number, changed: Partial<ZoneLeafInput> = {}) => {
      const plain = { relief: 'flat', reliefFactor: 1, finish: 'plain', partKeys: null } as const;
      return laid({ ...plain, surface: surfaceOf(shape), members, ...changed });
    };
    const disc = (diameter_mm: number): Shape => ({ kind: 'circle', diameter_mm });

    it('cuts four discs of 39 mm from a leaf of 80, nine of 26, a piece to lay each', () => {
      expect(face(disc(39), 12)).toMatchObject({
        way: 'lays',
        netLeaves: 3,
        laying: { small: { across: 2, along: 2 } },
      });
      expect(face(disc(26), 18).netLeaves).toBeCloseTo(2, 9);
      expect(face(disc(39), 12).handled.likely).toBeCloseTo(4 * face(disc(39), 12).grossLeaves.likely, 9);
    });

    it('cuts ovals, triangles and drawn faces by the rectangle round them', () => {
      expect(face({ kind: 'ellipse', length_mm: 38, height_mm: 25 }, 12).netLeaves).toBeCloseTo(2, 9);
      expect(face({ kind: 'triangle', base_mm: 25, height_mm: 38 }, 12).netLeaves).toBeCloseTo(2, 9);
      const lozenge = [
        { x_mm: -19, y_mm: 0 },
        { x_mm: 0, y_mm: -12 },
        { x_mm: 19, y_mm: 0 },
        { x_mm: 0, y_mm: 12 },
      ];
      expect(face({ kind: 'polygon', points: lozenge }, 12).netLeaves).toBeCloseTo(2, 9);
    });

    it('counts by area what has none like it, is half a leaf wide, or is laid as somebody chose', () => {
      const byArea = (diameter_mm: number) => (Math.PI / 4) * (diameter_mm / 78) ** 2;
      expect(face(disc(39), 1).way).toBe('sheets');
      expect(face(disc(39), 1).netLeaves).toBeCloseTo(byArea(39), 9);
      expect(face(disc(40), 12).netLeaves).toBeCloseTo(12 * byArea(40), 9);
      expect(face(disc(39), 12, { way: 'sheets' }).netLeaves).toBeCloseTo(12 * byArea(39), 9);
    });

    it('never lays less leaf than a disc has surface', () => {
      const size = fc.double({ min: 1, max: 90, noNaN: true });
      fc.assert(
        fc.property(size, fc.integer({ min: 1, max: 60 }), (diameter_mm, members) => {
          const zone = face(disc(diameter_mm), members);
          expect(zone.netLeaves * 6400).toBeGreaterThanOrEqual(zone.trueArea_mm2 * (1 - 2e-6));
        }),
      );
    });
  });

  it('takes nothing for nothing', () => {
    const none = laid({ surface: { ...edge, area_mm2: 0, girth_mm: 0, run_mm: 0 }, partKeys: null });
    expect(none.grossLeaves).toEqual({ low: 0, likely: 0, high: 0 });
    expect(laid({ members: 0 }).grossLeaves.likely).toBe(0);
  });

  it.each([
    ['a leaf the card does not have', { productId: 'gone' }, 'missing leaf-unknown'],
    ['a part that is no longer in the shape', { partKeys: ['cyma'] }, 'missing leaf-parts-unknown'],
    ['strips narrower than two laps', { productId: 'gold-23-5-loose', strips: 13 }, 'refuse leaf-strips-too-narrow'],
    ['cuts smaller than two laps', { way: 'patches', cuts: 13 }, 'refuse leaf-cuts-too-small'],
  ] as const)('tells of %s', (_what, changed, finding) => {
    expect(codes(changed)).toContain(finding);
  });

  it('counts in patches, and says so, where a shape has nothing to lay along', () => {
    const round = { ...field, courses: [] };
    const told = laid({ surface: round, partKeys: null, way: 'lays' });
    expect(told.laying?.way).toBe('patches');
    expect(told.findings.map(({ code }) => code)).toContain('leaf-lays-need-run');
  });

  it('refuses laps that leave nothing of a leaf', () => {
    const card = { ...startLeaf, laps_mm: { ...startLeaf.laps_mm, lays: 40 } };
    expect(zoneLeaf(usual, card)).toMatchObject({
      laying: null,
      netLeaves: 0,
      findings: [{ kind: 'refuse', code: 'leaf-lap-too-wide' }],
    });
  });

  it('counts ribbon in rolls and hands its metres on', () => {
    const [first] = startLeaf.products;
    const ribbon = {
      ...first,
      id: 'ribbon',
      form: 'ribbon',
      side_mm: 50,
      ribbon_mm: 20_000,
      leavesPerBooklet: 1,
    } as const;
    const card = { ...startLeaf, products: [ribbon] };
    const fillet = {
      ...usual,
      productId: 'ribbon',
      surface: { ...field, area_mm2: 4000 * 50, courses: [{ length_mm: 4000, height_mm: 50, closed: false }] },
    };
    const rolled = zoneLeaf({ ...fillet, partKeys: null, relief: 'flat', reliefFactor: 1 }, card);
    expect(rolled.netLeaves).toBeCloseTo(0.2, 9);
    expect(rolled.handled.likely).toBeCloseTo(rolled.grossLeaves.likely * 20, 9);
    expect(rolled.way).toBe('sheets');
  });

  const ways = fc.constantFrom('sheets' as const, 'lays' as const, 'patches' as const);
  const length = fc.double({ min: 1, max: 3000, noNaN: true });

  it('as proposed never lays less leaf than there is true surface, however small, narrow or carved', () => {
    const side = fc.oneof(length, fc.double({ min: 1, max: 45, noNaN: true }));
    fc.assert(
      fc.property(
        side,
        side,
        fc.integer({ min: 1, max: 60 }),
        fc.constantFrom(...reliefs),
        fc.constantFrom(...finishes),
        (length_mm, height_mm, members, relief, finish) => {
          const surface = {
            ...field,
            area_mm2: length_mm * height_mm,
            courses: [{ length_mm, height_mm, closed: false }],
          };
          const reliefFactor = startMeasure.reliefFactors[relief];
          const zone = laid({ surface, partKeys: null, members, relief, finish, reliefFactor });
          expect(zone.trueArea_mm2).toBeCloseTo(length_mm * height_mm * members * reliefFactor, 3);
          expect(zone.netLeaves * 6400).toBeGreaterThanOrEqual(zone.trueArea_mm2 * (1 - 2e-6));
        },
      ),
    );
  });

  it('never lays less leaf than there is true surface, and never draws less than it lays', () => {
    fc.assert(
      fc.property(
        length,
        length,
        ways,
        fc.double({ min: 0.01, max: 1, noNaN: true }),
        (girth_mm, run_mm, way, share) => {
          const surface = { ...edge, girth_mm, run_mm, area_mm2: girth_mm * run_mm * 1.02 };
          const zone = laid({ surface, partKeys: null, way, share });
          expect(zone.netLeaves * 6400).toBeGreaterThanOrEqual(zone.trueArea_mm2 * (1 - 2e-6));
          expect(zone.grossLeaves.low).toBeGreaterThanOrEqual(zone.netLeaves);
          expect(zone.grossLeaves_p10).toBeGreaterThanOrEqual(zone.grossLeaves.low - 1e-9);
          expect(zone.grossLeaves_p90).toBeLessThanOrEqual(zone.grossLeaves.high + 1e-9);
        },
      ),
    );
  });
});
