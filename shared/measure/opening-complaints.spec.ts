import type { Opening } from '#shared/measure/opening';
import { openingComplaints } from '#shared/measure/opening-complaints';
import type { Shape } from '#shared/measure/shape';

const panel: Shape = { kind: 'rectangle', length_mm: 200, height_mm: 150 };
const slot = (length_mm: number, height_mm: number, count = 1): Opening => ({
  id: 'slot',
  shape: { kind: 'rectangle', length_mm, height_mm },
  count,
});
const block: Shape = {
  kind: 'box',
  length_mm: 300,
  depth_mm: 100,
  height_mm: 150,
  faces: { top: true, bottom: false, front: true, back: false, left: true, right: true },
};
const disc = (diameter_mm: number): Opening => ({ id: 'disc', shape: { kind: 'circle', diameter_mm }, count: 1 });
const given = (area_mm2: number): Opening => ({
  id: 'given',
  shape: { kind: 'measured', area_mm2, uncertainty_mm2: 0, note: 'traced', isTrueSurface: false },
  count: 1,
});

describe('Openings of a member', () => {
  it.each<[string, Shape, Opening[], string[]]>([
    ['none is no matter', panel, [], []],
    ['some that fit', panel, [slot(50, 20, 4), disc(60)], []],
    ['one along the diagonal, 250', panel, [slot(240, 10)], []],
    ['one longer than the diagonal', panel, [slot(260, 10)], ['openings.0.shape.length_mm: measure-opening-too-long']],
    [
      'one wider than the face is high',
      panel,
      [slot(160, 155)],
      ['openings.0.shape.length_mm: measure-opening-too-wide'],
    ],
    [
      'a slot as long as the face and wider than it',
      { kind: 'rectangle', length_mm: 860, height_mm: 150 },
      [slot(400, 180)],
      ['openings.0.shape.length_mm: measure-opening-too-wide'],
    ],
    ['one in the larger face of a block', block, [slot(250, 140)], []],
    ['one in no face of a block', block, [slot(250, 151)], ['openings.0.shape.length_mm: measure-opening-too-wide']],
    ['together as large as the face', panel, [given(30_000)], []],
    [
      'together larger than the face',
      panel,
      [given(29_000), slot(50, 21)],
      ['openings.1.shape.length_mm: measure-openings-too-large'],
    ],
    [
      'a disc wider than the disc it is in',
      { kind: 'circle', diameter_mm: 100 },
      [disc(40), disc(101)],
      [
        'openings.1.shape.diameter_mm: measure-opening-too-long',
        'openings.1.shape.diameter_mm: measure-openings-too-large',
      ],
    ],
    ['one in a turned surface is asked for its area alone', { kind: 'sphere', diameter_mm: 60 }, [slot(100, 10)], []],
  ])('%s', (_what, shape, openings, expected) => {
    const complaints = openingComplaints(shape, openings);
    expect(complaints.map(({ path, code }) => `${path.join('.')}: ${code}`)).toEqual(expected);
  });
});
