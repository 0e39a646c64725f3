import { memberDrawing } from '#shared/measure/drawing/member-drawing';
import type { Opening } from '#shared/measure/opening';
import type { Shape } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';

const face: Shape = { kind: 'rectangle', length_mm: 1000, height_mm: 300 };
const grip: Opening = { id: 'grip', count: 2, shape: { kind: 'rectangle', length_mm: 200, height_mm: 100 } };
const hole: Opening = { id: 'hole', count: 1, shape: { kind: 'circle', diameter_mm: 60 } };
const area: Opening = {
  id: 'area',
  count: 1,
  shape: { kind: 'measured', area_mm2: 900, uncertainty_mm2: 0, note: 'Foil', isTrueSurface: true },
};
const drawn = (shape: Shape, openings: readonly Opening[]) =>
  memberDrawing(shape, openings).views.flatMap(({ paths }) =>
    paths.filter(({ kind }) => kind === 'opening').map(({ data }) => data),
  );

describe('the openings of a face', () => {
  it('are drawn in a row along its middle, as far from each other as from the ends; one given as an area has no form', () => {
    // 1000 − 2 × 200 − 60 leaves 540, four times 135.
    expect(drawn(face, [grip, area, hole])).toEqual([
      'M 135 100 L 335 100 L 335 200 L 135 200 Z',
      'M 470 100 L 670 100 L 670 200 L 470 200 Z',
      'M 865 150 A 30 30 0 0 1 805 150 A 30 30 0 0 1 865 150 Z',
    ]);
  });

  it('stand one above the other where the face is tall', () => {
    expect(drawn({ kind: 'rectangle', length_mm: 200, height_mm: 600 }, [{ ...grip, count: 1 }])).toEqual([
      'M 0 250 L 200 250 L 200 350 L 0 350 Z',
    ]);
  });

  it.each([
    ['do not fit in a row', face, [{ ...grip, count: 6 }]],
    ['are too high as they stand', face, [{ ...hole, shape: { kind: 'rectangle', length_mm: 100, height_mm: 301 } }]],
    [
      'are cut in a ring, whose middle is its hole',
      { kind: 'ring', outerDiameter_mm: 900, innerDiameter_mm: 500 },
      [hole],
    ],
    ['are cut in what is not flat', shapeDefaults('sphere'), [hole]],
    ['are a pattern of hundreds', face, [{ ...hole, count: 101, shape: { kind: 'circle', diameter_mm: 1 } }]],
  ] as [string, Shape, Opening[]][])('are not drawn where they %s', (_, shape, openings) => {
    expect(drawn(shape, openings)).toEqual([]);
  });
});
