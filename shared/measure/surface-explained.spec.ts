import { noEnds } from '#shared/measure/ends';
import type { Shape } from '#shared/measure/shape';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { shapeKinds } from '#shared/measure/shape';
import { surfaceOf } from '#shared/measure/surface-of';
import { en } from '#shared/words/en';
import { say } from '#shared/words/say';

const rounded = (figure: number): number => Math.round(figure * 100) / 100;
const word = say(en, { locale: 'en-GB', write: (_unit, figure) => String(rounded(figure)) });

const told = (shape: Shape) =>
  surfaceOf(shape)
    .reasons.slice(0, -1)
    .map(({ code, values, figure }) => `${word(code, values)}: ${rounded(Number(figure))}`);

// Numbers worked by hand, in mm and mm², with π = 3.14159265.
describe('The explanation of a surface', () => {
  it.each<[string, Shape, string[]]>([
    ['a triangle', { kind: 'triangle', base_mm: 200, height_mm: 90 }, ['Base times half the height, 200 × 45: 9000']],
    ['a disc', { kind: 'circle', diameter_mm: 20 }, ['Circle, π × the radius squared: π × 10 × 10: 314.16']],
    [
      'an oval',
      { kind: 'ellipse', length_mm: 30, height_mm: 20 },
      ['Oval, π × half its length × half its height: π × 15 × 10: 471.24'],
    ],
    [
      'a face drawn by its corners: a house of 200 by 100 under a gable of 50',
      shapeDefaults('polygon'),
      // Along the foot 0; up the gable and down 100 × 125 twice.
      ['Below the sides that run one way, each its length along × its mean height: 25000'],
    ],
    [
      'a face whose sides run back over others: a square of 100 with a notch of 50 in its foot',
      {
        kind: 'polygon',
        points: [
          { x_mm: 0, y_mm: 0 },
          { x_mm: 50, y_mm: 50 },
          { x_mm: 100, y_mm: 0 },
          { x_mm: 100, y_mm: 100 },
          { x_mm: 0, y_mm: 100 },
        ],
      },
      [
        'Below the sides that run one way, each its length along × its mean height: 10000',
        'Less what lies below the sides that run back: 2500',
      ],
    ],
    ['a ball', { kind: 'sphere', diameter_mm: 60 }, ['Ball, π × the diameter squared: π × 60 × 60: 11309.73']],
    [
      'a ball foot',
      { kind: 'ball-foot', diameter_mm: 100, cutTop_mm: 0, cutBottom_mm: 20, ends: noEnds },
      ['As on a ball, π × the diameter × the height that is kept: π × 100 × 80: 25132.74'],
    ],
    [
      'a block',
      {
        kind: 'box',
        length_mm: 200,
        depth_mm: 150,
        height_mm: 100,
        faces: { top: true, bottom: false, front: true, back: false, left: false, right: true },
      },
      ['Top, 200 × 150: 30000', 'Front, 200 × 100: 20000', 'Right side, 150 × 100: 15000'],
    ],
    [
      'a boss',
      { kind: 'boss', diameter_mm: 80, height_mm: 20 },
      [
        'Circle, π × the radius squared: π × 40 × 40: 5026.55',
        'Its rise adds π × the height squared: π × 20 × 20: 1256.64',
      ],
    ],
  ])('of %s gives its steps', (_what, shape, steps) => {
    expect(told(shape)).toEqual(steps);
  });

  it('of a bun foot says by how much it differs from a ball', () => {
    const { reasons, area_mm2 } = surfaceOf({ ...shapeDefaults('bun-foot') });
    expect(reasons.map(({ code }) => code)).toEqual(['measure-ball-zone', 'measure-spheroid', 'measure-developed']);
    // 100 across and 58 kept: π × 100 × 58 = 18,221.24.
    expect(Number(reasons[0]?.figure)).toBeCloseTo(18_221.24, 2);
    expect(18_221.2374 * Number(reasons[1]?.figure)).toBeCloseTo(area_mm2, 2);
  });

  it('of twisted work multiplies the girth of the straight section, and once', () => {
    const { reasons, area_mm2 } = surfaceOf({
      kind: 'twisted',
      section: { outline: 'square', across_mm: 50 },
      length_mm: 300,
      turns: 2,
      hand: 'right',
    });
    const [straight, twist, run] = reasons.map(({ figure }) => Number(figure));
    expect(straight).toBeCloseTo(200, 6);
    expect(run).toBe(300);
    expect(200 * twist * 300).toBeCloseTo(area_mm2, 4);
  });

  it('of a helicoid multiplies one turn by its turns', () => {
    const [turn, turns] = surfaceOf(shapeDefaults('helicoid')).reasons;
    expect(turns).toMatchObject({ code: 'measure-turns', figure: 4, unit: 'factor' });
    expect(Number(turn?.figure) * 4).toBeCloseTo(surfaceOf(shapeDefaults('helicoid')).area_mm2, 6);
  });

  it.each(shapeKinds)('of a %s has steps before what they come to', (kind) => {
    expect(surfaceOf(shapeDefaults(kind)).reasons.length).toBeGreaterThan(1);
  });
});
