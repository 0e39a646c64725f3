import { flutedSurface } from '#shared/measure/fluted-surface';
import { because, madeSurface } from '#shared/measure/made-surface';
import type { MouldingShape } from '#shared/measure/moulding-shape';
import { planRun, sidesAt, type PlanRun } from '#shared/measure/plan-run';
import { profileCurve } from '#shared/measure/profile-curve';
import { profileGirth, type ElementGirth } from '#shared/measure/profile-girth';
import type { Surface, SurfacePart } from '#shared/measure/surface';

const total = (figures: readonly number[]) => figures.reduce((sum, figure) => sum + figure, 0);

// Each element runs at its own centroid: girth × run there, from its moment, so that the parts add up to the whole exactly.
function partOf(run: PlanRun, edge_mm: number): (element: ElementGirth) => SurfacePart {
  const base_mm = total(run.sides.map(({ length_mm }) => length_mm));
  const perOffset = total(run.sides.map((side) => side.perOffset));
  return ({ id, element, girth_mm, moment_mm2 }) => ({
    key: id,
    element,
    girth_mm,
    area_mm2: base_mm * girth_mm + perOffset * (moment_mm2 - edge_mm * girth_mm),
  });
}

/**
 * The surface of a moulding in mm and mm²: girth × run, the run taken at the centroid of the profile's curve (Pappus and Guldin;
 * on a plan measured at the back or front edge, see `planRun`).
 */
export function mouldingSurface(shape: MouldingShape): Surface {
  const profile = profileGirth(profileCurve(shape.profile));
  const run = planRun(shape);
  const edge_mm = shape.measuredAt === 'back' ? profile.back_mm : profile.front_mm;
  const offset_mm = profile.centroid_mm - edge_mm;
  const sides_mm = sidesAt(run, offset_mm);
  const run_mm = total(sides_mm);
  const surface = madeSurface({
    area_mm2: profile.girth_mm * run_mm,
    girth_mm: profile.girth_mm,
    run_mm,
    closedRun: run.closed,
    sides_mm,
    parts: profile.elements.map(partOf(run, edge_mm)),
    laying: 'lays',
    finish: 'moulded',
    reasons: [
      because('measure-profile-girth', [profile.girth_mm, 'mm'], { elements: profile.elements.length }),
      because('measure-plan-run', [run_mm, 'mm'], { offset_mm: Math.abs(offset_mm), edge: shape.measuredAt }),
    ],
  });
  return flutedSurface(surface, shape.fluting);
}
