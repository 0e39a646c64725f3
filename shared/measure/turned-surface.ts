import { flutedSurface } from '#shared/measure/fluted-surface';
import { because, madeSurface } from '#shared/measure/made-surface';
import { profileCurve } from '#shared/measure/profile-curve';
import { profileGirth } from '#shared/measure/profile-girth';
import type { Surface, SurfacePart } from '#shared/measure/surface';
import type { TurnedShape } from '#shared/measure/turned-shape';

const end = (key: string, radius_mm: number): SurfacePart => ({
  key,
  element: 'end',
  girth_mm: radius_mm,
  area_mm2: Math.PI * radius_mm * radius_mm,
});

// Radii at the foot and the head of the profile; a fillet's uncounted step is part of the end it stands on.
function endParts({ ends, radius_mm, profile }: TurnedShape): SurfacePart[] {
  const pieces = profileCurve(profile, radius_mm);
  const foot_mm = pieces[0]?.strokes[0].from.x ?? radius_mm;
  const head_mm = pieces.at(-1)?.strokes.at(-1)?.to.x ?? radius_mm;
  return [...(ends.bottom ? [end('end-bottom', foot_mm)] : []), ...(ends.top ? [end('end-top', head_mm)] : [])];
}

/**
 * The surface of a turned piece in mm and mm², element by element by the theorem of Pappus: 2π × girth × distance of the centroid
 * from the axis. A chosen end is a part of its own, a radius turned round.
 */
export function turnedSurface(shape: TurnedShape): Surface {
  const turned = profileGirth(profileCurve(shape.profile, shape.radius_mm)).elements.map(
    ({ id, element, girth_mm, moment_mm2 }): SurfacePart => ({
      key: id,
      element,
      girth_mm,
      area_mm2: 2 * Math.PI * moment_mm2,
    }),
  );
  return withEndParts(flutedSurface(revolved(turned), shape.fluting), endParts(shape));
}

function revolved(parts: readonly SurfacePart[]): Surface {
  const area_mm2 = parts.reduce((sum, part) => sum + part.area_mm2, 0);
  const girth_mm = parts.reduce((sum, part) => sum + part.girth_mm, 0);
  const run_mm = girth_mm === 0 ? 0 : area_mm2 / girth_mm;
  const reasons = [
    because('measure-profile-girth', [girth_mm, 'mm'], { elements: parts.length }),
    because('measure-turned-run', [run_mm, 'mm']),
  ];
  return madeSurface({
    area_mm2,
    girth_mm,
    run_mm,
    sides_mm: [run_mm],
    closedRun: true,
    parts,
    laying: 'patches',
    finish: 'moulded',
    reasons,
  });
}

function withEndParts(turned: Surface, ends: readonly SurfacePart[]): Surface {
  if (ends.length === 0) return turned;
  const { area_mm2, girth_mm, run_mm, sides_mm } = revolved([...turned.parts, ...ends]);
  const ends_mm2 = ends.reduce((sum, part) => sum + part.area_mm2, 0);
  return {
    ...turned,
    area_mm2,
    girth_mm,
    run_mm,
    sides_mm,
    parts: [...turned.parts, ...ends],
    reasons: [...turned.reasons, because('measure-ends', [ends_mm2, 'mm2'])],
  };
}
