import { cutSection, lengthThrough } from '#shared/measure/drawing/cut-section';
import { cutsRound } from '#shared/measure/drawing/cut-spans';
import type { DrawingPath, DrawingPoint, DrawingView } from '#shared/measure/drawing/drawing';
import { dimension, madeView } from '#shared/measure/drawing/made-view';
import { polylineData, spot } from '#shared/measure/drawing/polyline-data';
import { axis, closedOutline, uprightCorners } from '#shared/measure/drawing/upright-corners';
import type { Fluting } from '#shared/measure/fluting';
import type { HelicoidShape, TwistedShape } from '#shared/measure/leg-shape';
import { sectionOutline } from '#shared/measure/section-outline';

/** An edge winding about an axis from the top down: its radius in mm, the angle it starts at, and how it turns over its height. */
interface Winding {
  readonly radius_mm: number;
  readonly start_radians: number;
  readonly turns: number;
  readonly height_mm: number;
}

// Twenty-four places a turn draw a smooth curve at any size a page has; very many turns are drawn more coarsely.
const placesFor = (turns: number) => Math.min(1200, Math.max(2, Math.ceil(24 * Math.abs(turns))));

function windingPlaces({ radius_mm, start_radians, turns, height_mm }: Winding) {
  const places = placesFor(turns);
  return Array.from({ length: places + 1 }, (_, index) => {
    const angle = start_radians + (2 * Math.PI * turns * index) / places;
    return { isInFront: Math.cos(angle) >= -1e-9, at: spot(radius_mm * Math.sin(angle), (height_mm * index) / places) };
  });
}

// The front of the edge as outline, the back as hidden line; each piece begins where the one before ended.
function windingPaths(winding: Winding): DrawingPath[] {
  const places = windingPlaces(winding);
  const runs: { isInFront: boolean; at: DrawingPoint[] }[] = [];
  places.slice(1).forEach((place, index) => {
    const last = runs[runs.length - 1];
    const isInFront = place.isInFront && places[index].isInFront;
    if (last && last.isInFront === isInFront) last.at.push(place.at);
    else runs.push({ isInFront, at: [places[index].at, place.at] });
  });
  return runs.map(({ isInFront, at }) => ({ kind: isInFront ? 'outline' : 'hidden', data: polylineData(at) }));
}

const handed = ({ turns, hand }: { readonly turns: number; readonly hand: 'left' | 'right' }) =>
  hand === 'right' ? turns : 0 - turns;

function sectionView(shape: TwistedShape): DrawingView {
  const outline = sectionOutline(shape.section);
  const steps = shape.section.outline === 'square' ? 4 : Math.min(720, 24 * shape.section.lobes);
  const corners = Array.from({ length: steps }, (_, index) => {
    const angle = (2 * Math.PI * (index + 0.5)) / steps;
    const radius_mm = shape.section.outline === 'square' ? outline.radiusAt(Math.PI / 4) : outline.radiusAt(angle);
    return spot(radius_mm * Math.cos(angle), radius_mm * Math.sin(angle));
  });
  const half_mm = greatestRadius(shape);
  return madeView({
    view: 'plan',
    paths: [shape.fluting ? cutOutline(corners, shape.fluting) : closedOutline(corners)],
    dimensions:
      shape.section.outline === 'square'
        ? [dimension(corners[1], corners[0], 'below')]
        : [dimension(spot(-half_mm, half_mm), spot(half_mm, half_mm), 'below')],
    reach: shape.fluting?.cut === 'reeds' ? uprightReach(half_mm + shape.fluting.depth_mm) : corners,
  });
}

const uprightReach = (half_mm: number) => [spot(-half_mm, -half_mm), spot(half_mm, half_mm)];

// The flutes wind with the twist; on the elevation they would hide it, so the section alone shows them.
function cutOutline(corners: readonly DrawingPoint[], fluting: Fluting): DrawingPath {
  const places = [...corners, corners[0]];
  const cuts = cutsRound(fluting, lengthThrough(places));
  return { kind: 'outline', data: cutSection({ places, inside: 'right' }, cuts, fluting) };
}

function greatestRadius({ section }: TwistedShape): number {
  return section.outline === 'square' ? section.across_mm / Math.SQRT2 : section.radius_mm + section.depth_mm / 2;
}

/** Elevation of a twisted member with its winding edges or crests, and its section, in mm. */
export function twistedViews(shape: TwistedShape): DrawingView[] {
  const radius_mm = greatestRadius(shape);
  const edges = shape.section.outline === 'square' ? 4 : shape.section.lobes;
  const windings = Array.from({ length: edges }, (_, index) =>
    windingPaths({
      radius_mm,
      start_radians: (2 * Math.PI * (index + 0.5)) / edges,
      turns: handed(shape),
      height_mm: shape.length_mm,
    }),
  );
  return [windingView(radius_mm, shape.length_mm, windings.flat()), sectionView(shape)];
}

/** Elevation of a ribbon about its core: both its edges winding down, in mm. */
export function helicoidElevation(shape: HelicoidShape): DrawingView {
  const height_mm = shape.risePerTurn_mm * shape.turns;
  const edges = [shape.radius_mm, shape.coreRadius_mm].flatMap((radius_mm) =>
    windingPaths({ radius_mm, start_radians: 0, turns: handed(shape), height_mm }),
  );
  return windingView(shape.radius_mm, height_mm, edges);
}

function windingView(radius_mm: number, height_mm: number, paths: readonly DrawingPath[]): DrawingView {
  const corners = uprightCorners(2 * radius_mm, height_mm).map(({ x_mm, y_mm }) => spot(x_mm - radius_mm, y_mm));
  return madeView({
    view: 'elevation',
    paths: [...paths, closedOutline(corners), axis(spot(0, 0), spot(0, height_mm))],
    dimensions: [dimension(corners[0], corners[1], 'above'), dimension(corners[0], corners[3], 'left')],
    reach: corners,
  });
}
