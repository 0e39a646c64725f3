import { meshArea, type Face, type Vertex } from '#shared/geometry/mesh-area';

const cube: Vertex[] = [0, 1, 2, 3, 4, 5, 6, 7].map((corner) => [
  (corner & 1) * 20,
  ((corner >> 1) & 1) * 20,
  (corner >> 2) * 20,
]);
const sides: Face[] = [
  [0, 1, 3],
  [0, 3, 2],
  [4, 6, 7],
  [4, 7, 5],
  [0, 4, 5],
  [0, 5, 1],
  [2, 3, 7],
  [2, 7, 6],
  [0, 2, 6],
  [0, 6, 4],
  [1, 5, 7],
  [1, 7, 3],
];

describe('The area of a mesh', () => {
  it('of a cube of 20 is six faces of 400', () => {
    expect(meshArea(cube, sides)).toBeCloseTo(2400, 9);
  });

  it('of no faces is nothing, and a flat face adds nothing', () => {
    expect(meshArea(cube, [])).toBe(0);
    expect(meshArea(cube, [[0, 0, 1]])).toBe(0);
  });

  it('refuses a face that names a vertex there is not', () => {
    expect(() => meshArea(cube, [[0, 1, 8]])).toThrow(RangeError);
  });
});
