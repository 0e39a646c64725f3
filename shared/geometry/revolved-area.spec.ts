import { revolvedArea } from '#shared/geometry/revolved-area';

describe('A curve turned about its axis', () => {
  it('a level line makes a cylinder: radius 2, length 3', () => {
    expect(revolvedArea({ radiusAt: () => 2, slopeAt: () => 0 }, [0, 3], 2)).toBeCloseTo(37.69911184, 7);
  });

  it('a sloping one makes a frustum: radii 6 and 3, height 4', () => {
    const side = { radiusAt: (z: number) => 6 - 0.75 * z, slopeAt: () => -0.75 };
    expect(revolvedArea(side, [0, 4], 2)).toBeCloseTo(141.3716694, 6);
  });
});
