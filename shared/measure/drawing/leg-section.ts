import { cutSection } from '#shared/measure/drawing/cut-section';
import { cutEdges, cutsAcross, cutsRound, edgesInFront } from '#shared/measure/drawing/cut-spans';
import type { DrawingPath, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';
import { dimension, madeView } from '#shared/measure/drawing/made-view';
import { ellipseData, polylineData, spot } from '#shared/measure/drawing/polyline-data';
import type { Fluting } from '#shared/measure/fluting';
import type { StraightLegShape } from '#shared/measure/leg-shape';

/** Half a side of an octagon over half its width across the flats. */
export const octagonPart = Math.tan(Math.PI / 8);

const cornersOf = { square: 4, octagonal: 8 } as const;
const roundPlaces = 240;

// Clockwise as seen, so that the wood lies on the right.
function ringPlaces(radius_mm: number, count: number): DrawingPoint[] {
  return Array.from({ length: count }, (_, index) => {
    const angle = ((2 * index + 1) * Math.PI) / count;
    return spot(radius_mm * Math.cos(angle), radius_mm * Math.sin(angle));
  });
}

const closed = (places: readonly DrawingPoint[]) => [...places, places[0]];

function plainData(section: StraightLegShape['section'], width_mm: number): string {
  if (section === 'round') return ellipseData(spot(0, 0), [width_mm / 2, width_mm / 2]);
  return polylineData(facedCorners(section, width_mm), true);
}

const facedCorners = (section: keyof typeof cornersOf, width_mm: number): DrawingPoint[] =>
  ringPlaces(width_mm / 2 / Math.cos(Math.PI / cornersOf[section]), cornersOf[section]);

// What of the leg's surface is cut is set out at its mean width, and narrows with it.
function cutsOf({ section, top_mm, foot_mm }: StraightLegShape, fluting: Fluting) {
  const mean_mm = (top_mm + foot_mm) / 2;
  if (section === 'round') return cutsRound(fluting, Math.PI * mean_mm);
  return cutsAcross(fluting, section === 'square' ? mean_mm : octagonPart * mean_mm);
}

function cutData(shape: StraightLegShape, fluting: Fluting, width_mm: number): string {
  const cuts = cutsOf(shape, fluting);
  const into = (places: readonly DrawingPoint[]) => cutSection({ places, inside: 'right' }, cuts, fluting);
  if (shape.section === 'round') return into(closed(ringPlaces(width_mm / 2, roundPlaces)));
  const corners = closed(facedCorners(shape.section, width_mm));
  return corners
    .slice(1)
    .map((corner, index) => into([corners[index], corner]))
    .join(' ');
}

/** Edges of a leg's cuts as they are seen from the front, as parts of the half width. */
export function legCutParts(shape: StraightLegShape): number[] {
  if (!shape.fluting) return [];
  const edges = cutEdges(cutsOf(shape, shape.fluting), shape.fluting);
  if (shape.section === 'round') return edgesInFront(edges);
  const faces = shape.section === 'square' ? [-1, 1] : [-1, -octagonPart, octagonPart, 1];
  return faces.slice(1).flatMap((to, index) => edges.map((edge) => faces[index] + edge * (to - faces[index])));
}

/** The plan of a straight leg, its cuts let into the head; the larger of head and foot as the outline, the other within it; in mm. */
export function legSection(shape: StraightLegShape): DrawingView {
  const { section, top_mm, foot_mm, fluting } = shape;
  const half_mm = Math.max(top_mm, foot_mm) / 2;
  const reach_mm = half_mm + (fluting?.cut === 'reeds' ? fluting.depth_mm : 0);
  const foot: DrawingPath = { kind: foot_mm < top_mm ? 'hidden' : 'outline', data: plainData(section, foot_mm) };
  return madeView({
    view: 'plan',
    paths: [
      { kind: 'outline', data: fluting ? cutData(shape, fluting, top_mm) : plainData(section, top_mm) },
      ...(foot_mm === top_mm ? [] : [foot]),
    ],
    dimensions: [dimension(spot(-half_mm, half_mm), spot(half_mm, half_mm), 'below')],
    reach: [spot(-reach_mm, -reach_mm), spot(reach_mm, reach_mm)],
  });
}
