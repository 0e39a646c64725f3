import { sectionShare } from '#shared/measure/section-share';
import type { CabrioleShape, TwistedSection } from '#shared/measure/leg-shape';
import type { Shape } from '#shared/measure/shape';
import type { BallFootShape, BunFootShape } from '#shared/measure/solid-shape';

const frustum = ([one, other]: readonly [number, number], length_mm: number): number =>
  (length_mm * (one * one + one * other + other * other)) / 3;

// ∫ π·a²·(1 − z²/c²) dz between the two cuts.
function footVolume({ diameter_mm, cutTop_mm, cutBottom_mm }: BallFootShape | BunFootShape, height_mm: number): number {
  const half = height_mm / 2;
  if (half === 0) return 0;
  const upTo = (z: number) => z - z ** 3 / (3 * half * half);
  return (Math.PI / 4) * diameter_mm ** 2 * (upTo(half - cutTop_mm) - upTo(cutBottom_mm - half));
}

// ½∫ρ² dφ of a wavy round is π·(r² + (d/2)²/2).
const sectionArea = (section: TwistedSection): number =>
  section.outline === 'square'
    ? section.across_mm ** 2
    : Math.PI * (section.radius_mm ** 2 + section.depth_mm ** 2 / 8);

// Each girth taken for that of a round section, g²/4π.
const girthsVolume = ({ girths_mm, length_mm }: CabrioleShape): number =>
  ((girths_mm.reduce((sum, girth) => sum + girth * girth, 0) / girths_mm.length) * length_mm) / (4 * Math.PI);

/**
 * The volume of a member in mm³, near enough to know its weight by; null for faces, mouldings and whatever else says nothing of what is
 * behind its surface (mensuration of solids, ICS Building Trades Pocketbook).
 */
export function solidVolume(shape: Shape): number | null {
  switch (shape.kind) {
    case 'box':
      return shape.length_mm * shape.depth_mm * shape.height_mm;
    case 'straight-leg':
      return sectionShare[shape.section] * frustum([shape.top_mm, shape.foot_mm], shape.length_mm);
    case 'cone':
      return (Math.PI / 4) * frustum([shape.topDiameter_mm, shape.bottomDiameter_mm], shape.height_mm);
    case 'sphere':
      return (Math.PI / 6) * shape.diameter_mm ** 3;
    case 'ball-foot':
      return footVolume(shape, shape.diameter_mm);
    case 'bun-foot':
      return footVolume(shape, shape.height_mm);
    case 'torus':
      return (Math.PI ** 2 / 4) * shape.centreDiameter_mm * shape.sectionDiameter_mm ** 2;
    case 'twisted':
      return sectionArea(shape.section) * shape.length_mm;
    case 'cabriole':
      return girthsVolume(shape);
    default:
      return null;
  }
}
