import type { LayingWay } from '#shared/leaf/leaf-card';
import { proposedWay } from '#shared/leaf/proposed-way';
import type { Relief, SurfaceFinish } from '#shared/measure/relief';
import type { Shape } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { surfaceOf } from '#shared/measure/surface-of';

const leaf_mm = 80;
const proposed = (shape: Shape, relief: Relief = 'flat', finish: SurfaceFinish = 'plain', members = 1) =>
  proposedWay({ surface: surfaceOf(shape), partKeys: null, relief, finish, members }, leaf_mm);

const panel = (length_mm: number, height_mm: number): Shape => ({ kind: 'rectangle', length_mm, height_mm });
const moulding = shapeDefaults('moulding');
const disc = (diameter_mm: number): Shape => ({ kind: 'circle', diameter_mm });
const rim = (height_mm: number): Shape => ({
  kind: 'band',
  length: { by: 'tape', length_mm: 2000 },
  height_mm,
  closed: true,
});

// Common practice, no source.
describe('proposedWay', () => {
  it.each<[string, LayingWay, LayingWay]>([
    ['a broad plain panel in sheets', proposed(panel(900, 400)), 'sheets'],
    ['the same panel carved in low relief in patches', proposed(panel(900, 400), 'low'), 'patches'],
    ['carved in high relief in patches', proposed(panel(900, 400), 'high', 'carved'), 'patches'],
    ['with ornament on a flat ground in patches', proposed(panel(900, 400), 'flat', 'carved'), 'patches'],
    ['a panel two leaves wide still in sheets', proposed(panel(900, 160)), 'sheets'],
    ['a strip narrower than that in lays', proposed(panel(900, 159)), 'lays'],
    ['however it is turned', proposed(panel(20, 900)), 'lays'],
    ['a narrow strip carved in patches', proposed(panel(900, 20), 'middle'), 'patches'],
    ['a moulding in lays', proposed(moulding, 'flat', 'moulded'), 'lays'],
    ['and carved too', proposed(moulding, 'middle', 'carved'), 'lays'],
    ['but pierced in patches', proposed(moulding, 'pierced', 'carved'), 'patches'],
    ['a plain leg in lays', proposed(shapeDefaults('straight-leg')), 'lays'],
    ['a carved one in patches', proposed(shapeDefaults('straight-leg'), 'middle', 'carved'), 'patches'],
    ['a low rim in lays', proposed(rim(60)), 'lays'],
    ['a high rim in sheets', proposed(rim(400)), 'sheets'],
    ['a ball in patches', proposed(shapeDefaults('sphere')), 'patches'],
    ['a disc below half a leaf, one of six, in lays', proposed(disc(39), 'flat', 'plain', 6), 'lays'],
    ['one by itself in sheets', proposed(disc(39)), 'sheets'],
    ['half a leaf wide in sheets', proposed(disc(40), 'flat', 'plain', 6), 'sheets'],
    ['carved in patches', proposed(disc(39), 'low', 'carved', 6), 'patches'],
    ['a carved face drawn by its corners in patches', proposed(shapeDefaults('polygon'), 'low'), 'patches'],
  ])('%s', (_sentence, way, expected) => {
    expect(way).toBe(expected);
  });
});
