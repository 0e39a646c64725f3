import { isSelfCrossing } from '#shared/geometry/self-crossing';
import type { FlatShape } from '#shared/measure/flat-shape';
import type { Fluting } from '#shared/measure/fluting';
import type { LegShape } from '#shared/measure/leg-shape';
import { mouldingComplaints } from '#shared/measure/moulding-complaints';
import { profileComplaints } from '#shared/measure/profile-complaints';
import { profileCurve } from '#shared/measure/profile-curve';
import { profileGirth } from '#shared/measure/profile-girth';
import type { Shape } from '#shared/measure/shape';
import type { SolidShape } from '#shared/measure/solid-shape';
import type { TurnedShape } from '#shared/measure/turned-shape';
import type { Complaint } from '#shared/problems/complaint';
import type { WordCode, WordValues } from '#shared/words/word-code';

type Complaints = readonly Complaint[];

const complaintWhen = (
  isWrong: boolean,
  path: Complaint['path'],
  [code, values = {}]: readonly [WordCode, WordValues?],
): Complaints => (isWrong ? [{ path, code, values }] : []);

const flatComplaints = (shape: FlatShape): Complaints => {
  if (shape.kind === 'ring') {
    const isInsideOut = shape.innerDiameter_mm > 0 && shape.innerDiameter_mm >= shape.outerDiameter_mm;
    return complaintWhen(isInsideOut, ['innerDiameter_mm'], ['shape-ring-inside-out']);
  }
  if (shape.kind !== 'polygon') return [];
  const crosses = isSelfCrossing(shape.points.map(({ x_mm, y_mm }) => ({ x: x_mm, y: y_mm })));
  return complaintWhen(crosses, ['points'], ['shape-crosses-itself']);
};

function turnedComplaints({ profile, radius_mm }: TurnedShape): Complaints {
  const own = profileComplaints(profile);
  if (own.length > 0) return own;
  const { back_mm } = profileGirth(profileCurve(profile, radius_mm));
  return complaintWhen(back_mm < -1e-9 * (1 + radius_mm), ['radius_mm'], ['shape-turned-past-axis']);
}

function legComplaints(shape: LegShape): Complaints {
  switch (shape.kind) {
    case 'cabriole':
      return complaintWhen(shape.girths_mm.length % 2 === 0, ['girths_mm'], ['shape-girths-even']);
    case 'stations':
      return shape.stations.flatMap(({ at_mm }, index) =>
        complaintWhen(
          index > 0 && at_mm <= shape.stations[index - 1].at_mm,
          ['stations', index, 'at_mm'],
          ['shape-stations-order'],
        ),
      );
    case 'twisted': {
      const isDeep = shape.section.outline === 'lobed' && shape.section.depth_mm / 2 > shape.section.radius_mm;
      return complaintWhen(isDeep, ['section', 'depth_mm'], ['shape-lobes-too-deep']);
    }
    case 'helicoid':
      return complaintWhen(shape.coreRadius_mm > shape.radius_mm, ['coreRadius_mm'], ['shape-core-too-wide']);
    default:
      return [];
  }
}

function solidComplaints(shape: SolidShape): Complaints {
  if (shape.kind === 'torus')
    return complaintWhen(
      shape.sectionDiameter_mm > shape.centreDiameter_mm,
      ['sectionDiameter_mm'],
      ['shape-torus-too-thick'],
    );
  if (shape.kind !== 'ball-foot' && shape.kind !== 'bun-foot') return [];
  const height_mm = shape.kind === 'ball-foot' ? shape.diameter_mm : shape.height_mm;
  const isGone = shape.cutTop_mm + shape.cutBottom_mm > height_mm * (1 + 1e-12);
  return complaintWhen(isGone, ['cutBottom_mm'], ['shape-cut-away', { height_mm }]);
}

// An arc deeper than a half-round has no width at the face to measure; a V is kept to what a tool can cut.
function flutingComplaints({ cut, width_mm, depth_mm }: Fluting): Complaints {
  const limit_mm = cut === 'v-grooves' ? 5 * width_mm : width_mm / 2;
  return complaintWhen(
    depth_mm > limit_mm * (1 + 1e-9),
    ['fluting', 'depth_mm'],
    ['shape-fluting-too-deep', { limit_mm }],
  );
}

function ownComplaints(shape: Shape): Complaints {
  switch (shape.kind) {
    case 'rectangle':
    case 'triangle':
    case 'circle':
    case 'ellipse':
    case 'ring':
    case 'polygon':
      return flatComplaints(shape);
    case 'moulding':
      return mouldingComplaints(shape);
    case 'turned':
      return turnedComplaints(shape);
    case 'straight-leg':
    case 'cabriole':
    case 'stations':
    case 'twisted':
    case 'helicoid':
      return legComplaints(shape);
    case 'band':
    case 'measured':
      return [];
    default:
      return solidComplaints(shape);
  }
}

/**
 * What makes a shape impossible beyond its single figures (crossing corners, a plan too tight for its profile …), each with the
 * path of its field within the shape; lengths in mm, single figures taken as already checked. Empty when it can exist.
 */
export const shapeComplaints = (shape: Shape): Complaints => [
  ...ownComplaints(shape),
  ...('fluting' in shape && shape.fluting ? flutingComplaints(shape.fluting) : []),
];
