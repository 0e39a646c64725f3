import { noEnds } from '#shared/measure/ends';
import type { Shape } from '#shared/measure/shape';
import { surfaceOf } from '#shared/measure/surface-of';

const bothEnds = { top: true, bottom: true };
const noFaces = { top: false, bottom: false, front: false, back: false, left: false, right: false };

describe('The developed surface', () => {
  // Worked by hand, or on a pocket calculator from π = 3.14159265.
  it.each<[string, Shape, number]>([
    ['a panel of 600 by 150', { kind: 'rectangle', length_mm: 600, height_mm: 150 }, 90_000],
    ['a triangle of base 200, height 90', { kind: 'triangle', base_mm: 200, height_mm: 90 }, 9000],
    ['a disc of 200', { kind: 'circle', diameter_mm: 200 }, 31_415.9265],
    ['an oval of 300 by 200', { kind: 'ellipse', length_mm: 300, height_mm: 200 }, 47_123.8898],
    ['a ring of 300 with a hole of 200', { kind: 'ring', outerDiameter_mm: 300, innerDiameter_mm: 200 }, 39_269.9082],
    [
      'a square leg of 700, 60 at the top and the foot',
      { kind: 'straight-leg', section: 'square', length_mm: 700, top_mm: 60, foot_mm: 60, ends: noEnds },
      168_000,
    ],
    [
      'the same with both ends',
      { kind: 'straight-leg', section: 'square', length_mm: 700, top_mm: 60, foot_mm: 60, ends: bothEnds },
      175_200,
    ],
    [
      'a square leg tapered so that its faces slope 3 in 4',
      // Slant 500 over a length of 400; four trapezia of mean width 400.
      { kind: 'straight-leg', section: 'square', length_mm: 400, top_mm: 700, foot_mm: 100, ends: noEnds },
      800_000,
    ],
    [
      'an octagonal leg 100 across flats',
      // The side of an octagon is its width × 0.41421356.
      { kind: 'straight-leg', section: 'octagonal', length_mm: 500, top_mm: 100, foot_mm: 100, ends: noEnds },
      165_685.4249,
    ],
    [
      'the ends of an octagonal block without a length',
      { kind: 'straight-leg', section: 'octagonal', length_mm: 0, top_mm: 100, foot_mm: 100, ends: bothEnds },
      16_568.5425,
    ],
    [
      'a round leg of 500, 60 tapering to 40',
      // Slant √(500² + 10²) = 500.0999900.
      { kind: 'straight-leg', section: 'round', length_mm: 500, top_mm: 60, foot_mm: 40, ends: noEnds },
      78_555.5223,
    ],
    ['a ball of 60', { kind: 'sphere', diameter_mm: 60 }, 11_309.7336],
    [
      'a ball foot standing on a flat, 3-4-5',
      // Cut 20 from the bottom of a ball of 100: zone 80 high, flat of radius 40.
      {
        kind: 'ball-foot',
        diameter_mm: 100,
        cutTop_mm: 0,
        cutBottom_mm: 20,
        ends: { top: false, bottom: true },
      },
      25_132.7412 + 5026.5482,
    ],
    [
      'a ball foot of 3 1/4 in cut away by 3 in and 1/4 in, whose floats come to a hair less than nothing',
      { kind: 'ball-foot', diameter_mm: 82.55, cutTop_mm: 76.2, cutBottom_mm: 6.35, ends: noEnds },
      0,
    ],
    [
      'a bun foot as high as wide is a ball foot',
      { kind: 'bun-foot', diameter_mm: 100, height_mm: 100, cutTop_mm: 0, cutBottom_mm: 20, ends: noEnds },
      25_132.7412,
    ],
    [
      'a cylinder with one end',
      {
        kind: 'cone',
        bottomDiameter_mm: 80,
        topDiameter_mm: 80,
        height_mm: 100,
        ends: { top: true, bottom: false },
      },
      25_132.7412 + 5026.5482,
    ],
    [
      'a cone up to its point, 3-4-5',
      { kind: 'cone', bottomDiameter_mm: 60, topDiameter_mm: 0, height_mm: 40, ends: noEnds },
      4712.389,
    ],
    [
      'a block with its front, back and top',
      {
        kind: 'box',
        length_mm: 200,
        depth_mm: 150,
        height_mm: 100,
        faces: { ...noFaces, front: true, back: true, top: true },
      },
      70_000,
    ],
    ['a block with nothing chosen', { kind: 'box', length_mm: 200, depth_mm: 150, height_mm: 100, faces: noFaces }, 0],
    ['half a ball as a boss', { kind: 'boss', diameter_mm: 80, height_mm: 40 }, 10_053.0965],
    [
      'a rim of two straights and two half-rounds',
      {
        kind: 'band',
        length: {
          by: 'parts',
          parts: [
            { part: 'straight', length_mm: 500 },
            { part: 'curve', radius_mm: 100, angle_degrees: 180 },
            { part: 'straight', length_mm: 500 },
            { part: 'curve', radius_mm: 100, angle_degrees: 180 },
          ],
        },
        height_mm: 50,
        closed: true,
      },
      81_415.9265,
    ],
    [
      'an area somebody gives',
      { kind: 'measured', area_mm2: 123_456, uncertainty_mm2: 5000, note: 'foil, weighed', isTrueSurface: true },
      123_456,
    ],
  ])('of %s', (_what, shape, area_mm2) => {
    expect(surfaceOf(shape).area_mm2).toBeCloseTo(area_mm2, 3);
  });

  it('explains itself, and ends with the developed surface', () => {
    const { reasons, area_mm2 } = surfaceOf({ kind: 'rectangle', length_mm: 600, height_mm: 150 });
    expect(reasons.map(({ code }) => code)).toEqual(['measure-girth', 'measure-run', 'measure-developed']);
    expect(reasons.at(-1)?.figure).toBe(area_mm2);
  });

  it('of a leg keeps its ends apart from girth by run, and lays the whole by area', () => {
    const leg: Shape = {
      kind: 'straight-leg',
      section: 'square',
      length_mm: 700,
      top_mm: 60,
      foot_mm: 60,
      ends: bothEnds,
    };
    expect(surfaceOf(leg)).toMatchObject({ girth_mm: 240, run_mm: 700, ends_mm2: 7200, laying: 'sheets' });
    expect(surfaceOf({ ...leg, ends: noEnds })).toMatchObject({ girth_mm: 240, run_mm: 700, laying: 'lays' });
  });

  it('gives the fields that are laid by courses: a panel, a rim, the chosen faces of a block', () => {
    const block: Shape = {
      kind: 'box',
      length_mm: 200,
      depth_mm: 150,
      height_mm: 100,
      faces: { ...noFaces, left: true, top: true },
    };
    expect(surfaceOf(block).courses).toEqual([
      { length_mm: 200, height_mm: 150, closed: false },
      { length_mm: 150, height_mm: 100, closed: false },
    ]);
    const rim: Shape = { kind: 'band', length: { by: 'tape', length_mm: 2000 }, height_mm: 120, closed: true };
    expect(surfaceOf(rim).courses).toEqual([{ length_mm: 2000, height_mm: 120, closed: true }]);
  });

  it('knows a surface measured in the round for the true one', () => {
    const given = {
      kind: 'measured',
      area_mm2: 1000,
      uncertainty_mm2: 100,
      note: 'strips',
      isTrueSurface: true,
    } as const;
    expect(surfaceOf(given)).toMatchObject({ isTrueSurface: true, laying: 'patches', uncertainty_mm2: 100 });
    expect(surfaceOf({ ...given, isTrueSurface: false })).toMatchObject({ isTrueSurface: false, laying: 'sheets' });
  });

  it.each<[string, Shape]>([
    ['a negative length', { kind: 'rectangle', length_mm: -1, height_mm: -1 }],
    ['a length that is no number', { kind: 'sphere', diameter_mm: NaN }],
    ['a ring inside out', { kind: 'ring', outerDiameter_mm: 5, innerDiameter_mm: 6 }],
    ['an even number of equal stations', { kind: 'cabriole', length_mm: 300, girths_mm: [100, 120, 110, 90] }],
    ['a negative girth', { kind: 'cabriole', length_mm: 300, girths_mm: [100, -120, 110] }],
  ])('refuses %s', (_what, shape) => {
    expect(() => surfaceOf(shape)).toThrow(RangeError);
  });
});
