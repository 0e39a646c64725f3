import type { Fluting } from '#shared/measure/fluting';
import { flutingFactor } from '#shared/measure/fluting-factor';
import type { Shape } from '#shared/measure/shape';
import { surfaceOf } from '#shared/measure/surface-of';

const fluting = (more: Partial<Fluting>): Fluting => ({
  cut: 'flutes',
  width_mm: 10,
  depth_mm: 5,
  between_mm: 0,
  share_percent: 100,
  ...more,
});

describe('The girth multiplier of fluting', () => {
  it.each<[string, Fluting | undefined, number]>([
    ['without fluting is 1', undefined, 1],
    ['half-round flutes side by side', fluting({}), 1.5707963],
    ['reeds likewise', fluting({ cut: 'reeds' }), 1.5707963],
    // (15.7079633 + 2) over 12.
    ['half-round flutes 10 wide with 2 between', fluting({ between_mm: 2 }), 1.4756636],
    // Half the surface: 1 + 0.2853982.
    ['on half of the surface', fluting({ share_percent: 50 }), 1.2853982],
    ['V grooves of 3-4-5', fluting({ cut: 'v-grooves', width_mm: 6, depth_mm: 4 }), 1.6666667],
    ['cuts without a depth', fluting({ depth_mm: 0 }), 1],
    ['cuts without a width or anything between', fluting({ width_mm: 0, depth_mm: 0 }), 1],
  ])('%s', (_what, cut, factor) => {
    expect(flutingFactor(cut)).toBeCloseTo(factor, 6);
  });

  it('multiplies area, girth and parts of a moulding alike, and leaves its run', () => {
    const plain: Shape = {
      kind: 'moulding',
      profile: [{ id: 'a', element: 'torus', height_mm: 40, projection_mm: 20, going: 'out' }],
      plan: { form: 'straight', sides_mm: [1000], returns_mm: [] },
      measuredAt: 'back',
      facing: 'outward',
    };
    const [before, after] = [surfaceOf(plain), surfaceOf({ ...plain, fluting: fluting({ cut: 'reeds' }) })];
    const ratios = [
      after.area_mm2 / before.area_mm2,
      (after.girth_mm ?? 0) / (before.girth_mm ?? 1),
      after.parts[0].area_mm2 / before.parts[0].area_mm2,
    ];
    ratios.forEach((ratio) => expect(ratio).toBeCloseTo(1.5707963, 6));
    expect(after.run_mm).toBe(before.run_mm);
  });

  it('leaves the ends of a leg as they are, and lays a fluted panel in lays', () => {
    const leg: Shape = {
      kind: 'straight-leg',
      section: 'square',
      length_mm: 100,
      top_mm: 40,
      foot_mm: 40,
      ends: { top: false, bottom: true },
      fluting: fluting({}),
    };
    // Four faces of 40 × 100, times π/2, and one end of 40 × 40.
    expect(surfaceOf(leg).area_mm2).toBeCloseTo(25_132.7412 + 1600, 3);
    const panel = surfaceOf({ kind: 'rectangle', length_mm: 600, height_mm: 100, fluting: fluting({}) });
    expect(panel).toMatchObject({ courses: [], laying: 'lays', finish: 'moulded' });
  });
});
