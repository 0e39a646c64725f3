import { profileCurve } from '#shared/measure/profile-curve';
import type { ProfileElement } from '#shared/measure/profile-element';
import { classicalMembers } from '#shared/measure/profile-element';
import { profileGirth } from '#shared/measure/profile-girth';

const girthOf = (...profile: ProfileElement[]) => profileGirth(profileCurve(profile));
const member = (element: (typeof classicalMembers)[number], height_mm: number, projection_mm: number) =>
  ({ id: element, element, height_mm, projection_mm, going: 'out' }) as const;

describe('The girth of a profile', () => {
  // Ellipses of semi-axes 10 and 5 (perimeter 48.442241) and 10 and 1 (40.639742), exact integrals.
  it.each<[string, ProfileElement, number]>([
    ['a fillet is its face', member('fillet', 8, 3), 8],
    ['an ovolo as high as it projects is a quarter-circle', member('ovolo', 20, 20), 31.4159265],
    ['an ovolo of 10 by 5 is a quarter-ellipse', member('ovolo', 10, 5), 12.11056],
    ['a cavetto of 1 by 10 is one lying down', member('cavetto', 1, 10), 10.1599355],
    ['a cyma of 20 by 10 is two half-size quarter-ellipses', member('cyma-recta', 20, 10), 24.2211205],
    ['a cyma reversa of the same box is as long', member('cyma-reversa', 20, 10), 24.2211205],
    ['a torus twice as high as it projects is a half-round', member('torus', 20, 10), 31.4159265],
    ['a flat bead of 20 by 5 is half an ellipse', member('bead', 20, 5), 24.2211205],
    ['an astragal of 2 by 10 likewise', member('astragal', 2, 10), 20.319871],
    ['a scotia of 30, however it leans, is as long as a half-round', member('scotia', 30, 12), 47.1238898],
    ['a drawn line of 3 and 4', { id: 'l', element: 'line', across_mm: -3, up_mm: 4 }, 5],
    ['a drawn half-round over 20', { id: 'a', element: 'arc', across_mm: 0, up_mm: 20, bow_mm: 10 }, 31.4159265],
    ['the same hollow', { id: 'a', element: 'arc', across_mm: 0, up_mm: 20, bow_mm: -10 }, 31.4159265],
  ])('%s', (_what, element, girth_mm) => {
    expect(girthOf(element).girth_mm).toBeCloseTo(girth_mm, 6);
  });

  it('ends every member at the corner of its box, the half-rounds where they began', () => {
    for (const element of classicalMembers) {
      const [{ end }] = profileCurve([member(element, 30, 12)]);
      const isHalfRound = ['bead', 'astragal', 'torus'].includes(element);
      expect(end.x).toBeCloseTo(isHalfRound ? 0 : 12, 9);
      expect(end.y).toBeCloseTo(30, 9);
    }
  });

  it('joins each stroke to the one before', () => {
    const pieces = profileCurve(
      classicalMembers.map((element, index) => ({
        ...member(element, 30, 12),
        going: index % 2 === 0 ? ('out' as const) : ('in' as const),
      })),
    );
    const strokes = pieces.flatMap((piece) =>
      piece.uncounted
        ? [...piece.strokes, piece.uncounted].sort((a, b) => a.from.y - b.from.y || a.to.y - b.to.y)
        : piece.strokes,
    );
    strokes.slice(1).forEach((stroke, index) => {
      expect(stroke.from.x).toBeCloseTo(strokes[index].to.x, 9);
      expect(stroke.from.y).toBeCloseTo(strokes[index].to.y, 9);
    });
  });

  // The centroid of a quarter-circle's arc lies 2r/π from its centre.
  it.each<[string, ProfileElement, number]>([
    ['an ovolo bulges: 2r/π out', member('ovolo', 20, 20), 12.7323954],
    ['a cavetto hollows: r − 2r/π out', member('cavetto', 20, 20), 7.2676046],
    ['an ovolo going in bulges just as far', { ...member('ovolo', 20, 20), going: 'in' }, -7.2676046],
    ['a cyma lies half out', member('cyma-recta', 20, 20), 10],
    ['a half-round 2r/π out', member('torus', 20, 10), 6.3661977],
    ['a scotia’s half-circle 2r/π in', member('scotia', 20, 0), -6.3661977],
    ['a fillet at its step', member('fillet', 8, 3), 3],
  ])('%s', (_what, element, centroid_mm) => {
    expect(girthOf(element).centroid_mm).toBeCloseTo(centroid_mm, 6);
  });

  it('reaches from its least to its greatest projection', () => {
    expect(girthOf(member('scotia', 20, 0))).toMatchObject({ back_mm: -10, front_mm: 0 });
    expect(girthOf(member('torus', 20, 10), member('fillet', 5, 3))).toMatchObject({ back_mm: 0, front_mm: 10 });
  });

  it('of nothing is nothing', () => {
    expect(girthOf()).toEqual({ elements: [], girth_mm: 0, centroid_mm: 0, back_mm: 0, front_mm: 0 });
  });
});
