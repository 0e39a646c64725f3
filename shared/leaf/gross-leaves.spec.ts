import fc from 'fast-check';
import { grossLeaves } from '#shared/leaf/gross-leaves';

const losses = (breakage_percent: number, faulting_percent: number, second_percent: number) => ({
  breakage_percent,
  faulting_percent,
  second_percent,
});

describe('grossLeaves', () => {
  it.each([
    ['without losses what is laid is what is drawn', losses(0, 0, 0), 100],
    ['a fifth broken needs a quarter more', losses(20, 0, 0), 125],
    ['faulting patches a tenth', losses(0, 10, 0), 110],
    ['a full second laying doubles the leaf and leaves nothing to fault', losses(0, 50, 100), 200],
    ['faulting patches only what is not laid twice', losses(0, 20, 50), 160],
    ['all three together', losses(20, 20, 50), 200],
    ['lays of a burnished moulding', losses(5, 12, 5), 122.526],
  ])('%s', (_sentence, point, expected) => {
    expect(grossLeaves(100, point)).toBeCloseTo(expected, 3);
  });

  it('refuses breakage above nine tenths', () => {
    expect(() => grossLeaves(1, losses(90.1, 0, 0))).toThrow(RangeError);
  });

  it('more of any loss never takes less leaf', () => {
    const share = fc.double({ min: 0, max: 100, noNaN: true });
    const breakage = fc.double({ min: 0, max: 90, noNaN: true });
    fc.assert(
      fc.property(fc.tuple(breakage, share, share), fc.tuple(breakage, share, share), (one, other) => {
        const worse = one.map((figure, index) => Math.max(figure, other[index] ?? 0)) as [number, number, number];
        expect(grossLeaves(10, losses(...worse))).toBeGreaterThanOrEqual(grossLeaves(10, losses(...one)) - 1e-9);
      }),
    );
  });
});
