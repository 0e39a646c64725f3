import { bandView } from '#shared/measure/drawing/band-view';
import type { Drawing, DrawingView } from '#shared/measure/drawing/drawing';
import { faceOpenings } from '#shared/measure/drawing/face-openings';
import { flatFace } from '#shared/measure/drawing/flat-face';
import { straightLegViews, stationsElevation } from '#shared/measure/drawing/leg-views';
import { planView } from '#shared/measure/drawing/plan-view';
import { profileView } from '#shared/measure/drawing/profile-view';
import { solidViews } from '#shared/measure/drawing/solid-views';
import { turnedElevation } from '#shared/measure/drawing/turned-elevation';
import { helicoidElevation, twistedViews } from '#shared/measure/drawing/twisted-views';
import type { MouldingShape } from '#shared/measure/moulding-shape';
import type { Opening } from '#shared/measure/opening';
import type { Shape } from '#shared/measure/shape';

function mouldingViews({ profile, plan, fluting }: MouldingShape): DrawingView[] {
  const seen = planView(plan);
  return [profileView(profile, fluting), ...(seen ? [seen] : [])];
}

function viewsOf(shape: Shape): DrawingView[] {
  switch (shape.kind) {
    case 'moulding':
      return mouldingViews(shape);
    case 'turned':
      return [turnedElevation(shape)];
    case 'straight-leg':
      return straightLegViews(shape);
    case 'cabriole':
    case 'stations':
      return [stationsElevation(shape)];
    case 'twisted':
      return twistedViews(shape);
    case 'helicoid':
      return [helicoidElevation(shape)];
    case 'band':
      return [bandView(shape)];
    case 'measured':
      return [];
    case 'sphere':
    case 'ball-foot':
    case 'bun-foot':
    case 'torus':
    case 'cone':
    case 'box':
    case 'boss':
      return solidViews(shape);
    default:
      return [flatFace(shape)];
  }
}

/**
 * A member drawn to scale in mm from the numbers its surface is worked from: section and plan of a moulding, elevation of turned
 * work, legs and solids, the face of flat work, an unrolled band with its stretches; flutes, reeds and grooves as they are cut; openings of a flat face
 * dashed along its middle. The shape must be one its schema allows.
 */
export function memberDrawing(shape: Shape, openings: readonly Opening[] = []): Drawing {
  // The middle of a ring is its hole.
  if (openings.length === 0 || shape.kind === 'ring') return { views: viewsOf(shape) };
  return {
    views: viewsOf(shape).map((view) => ({ ...view, paths: [...view.paths, ...faceOpenings(view, openings)] })),
  };
}
