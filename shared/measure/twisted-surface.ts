import { gaussLegendre } from '#shared/geometry/gauss-legendre';
import { flutedSurface } from '#shared/measure/fluted-surface';
import type { HelicoidShape, TwistedShape } from '#shared/measure/leg-shape';
import { because, madeSurface } from '#shared/measure/made-surface';
import { sectionOutline } from '#shared/measure/section-outline';
import type { Surface } from '#shared/measure/surface';

// ∫ √(ρ² + ρ′² + k²ρ²ρ′²) dφ round the section (own, from the first fundamental form), with k in radians per mm.
function developedGirth({ section }: TwistedShape, twist: number): number {
  const { radiusAt, slopeAt, piece_radians, pieces } = sectionOutline(section);
  const element = (angle: number) => {
    const [radius, slope] = [radiusAt(angle), slopeAt(angle)];
    return Math.hypot(radius, slope, twist * radius * slope);
  };
  return pieces * gaussLegendre(element, [0, piece_radians], 128);
}

/** The surface of an evenly twisted member in mm and mm²: its length times the developed girth of its section. */
export function twistedSurface(shape: TwistedShape): Surface {
  const twist = shape.length_mm === 0 ? 0 : (2 * Math.PI * shape.turns) / shape.length_mm;
  const girth_mm = developedGirth(shape, twist);
  const straight_mm = developedGirth(shape, 0);
  const factor = straight_mm === 0 ? 1 : girth_mm / straight_mm;
  const run_mm = shape.length_mm;
  const twisted = madeSurface({
    area_mm2: girth_mm * run_mm,
    girth_mm,
    run_mm,
    sides_mm: [run_mm],
    laying: 'patches',
    finish: 'moulded',
    reasons: [
      because('measure-girth-straight', [straight_mm, 'mm']),
      because('measure-twist', [factor, 'factor']),
      because('measure-run', [run_mm, 'mm']),
    ],
  });
  return flutedSurface(twisted, shape.fluting);
}

// One turn between the axis and a radius R, rising c per radian: π·(R√(R² + c²) + c²·asinh(R/c)) (standard, from memory).
const turnWithin = (radius: number, rise: number) =>
  Math.PI * (radius * Math.hypot(radius, rise) + (rise === 0 ? 0 : rise * rise * Math.asinh(radius / rise)));

// The difference of two nearly equal turns would lose its last digits, so a narrow thread is integrated directly.
function turnBetween(core_mm: number, edge_mm: number, rise: number): number {
  const isNarrow = edge_mm - core_mm < edge_mm * 1e-2;
  if (!isNarrow) return turnWithin(edge_mm, rise) - turnWithin(core_mm, rise);
  return gaussLegendre((radius) => 2 * Math.PI * Math.hypot(radius, rise), [core_mm, edge_mm], 8);
}

/** One face of a helicoid between its core and its edge, in mm². */
export function helicoidSurface({ radius_mm, coreRadius_mm, risePerTurn_mm, turns }: HelicoidShape): Surface {
  const rise = risePerTurn_mm / (2 * Math.PI);
  const turn_mm2 = turnBetween(coreRadius_mm, radius_mm, rise);
  return madeSurface({
    area_mm2: turns * turn_mm2,
    laying: 'patches',
    finish: 'moulded',
    reasons: [because('measure-helicoid-turn', [turn_mm2, 'mm2']), because('measure-turns', [turns, 'factor'])],
  });
}
