import { buildUpsUsed } from '#shared/estimates/buildups-used';
import type { ZoneFigures } from '#shared/estimates/figures';

const layer = (stepId: string, coats: number, thickness = coats) => ({
  ...{ stepId, coats, thickness, name: stepId, thickness_mm: null },
  colour: stepId === '' ? ('wood' as const) : ('gesso' as const),
});

const zone = (zoneId: string, buildUp: string, layers: ReturnType<typeof layer>[]): ZoneFigures => ({
  ...{ zoneId, buildUp, layers, memberId: 'member', finish: 'plain', plan_mm2: 0, true_mm2: 0, ground_mm: 0 },
  ...{ hours: { low: 0, likely: 0, high: 0 }, steps: [], leaf: null, recutting: null, reasons: [] },
});

describe('the build-ups of an estimate', () => {
  it('are named once, with the fewest and most coats any zone gets', () => {
    const [water] = buildUpsUsed([
      zone('flat', 'Water', [layer('', 0), layer('gesso', 8)]),
      zone('carved', 'Water', [layer('', 0), layer('gesso', 4)]),
    ]);
    expect(water.zoneIds).toEqual(['flat', 'carved']);
    expect(water.layers.map(({ stepId, coats }) => [stepId, ...coats])).toEqual([
      ['', 0, 0],
      ['gesso', 4, 8],
    ]);
  });

  it('have a layer only some zones get where it stands there', () => {
    const [oil] = buildUpsUsed([
      zone('one', 'Oil', [layer('', 0), layer('gesso', 5), layer('leaf', 1)]),
      zone('other', 'Oil', [layer('', 0), layer('gesso', 5), layer('sealer', 3), layer('leaf', 1), layer('tone', 1)]),
    ]);
    expect(oil.layers.map(({ stepId }) => stepId)).toEqual(['', 'gesso', 'sealer', 'leaf', 'tone']);
  });

  it('leave out what stays bare wood', () => {
    expect(buildUpsUsed([zone('bare', 'Bare', [layer('', 0)])])).toEqual([]);
  });
});
