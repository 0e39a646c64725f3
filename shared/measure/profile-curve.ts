import type { Point } from '#shared/geometry/point';
import type { Stroke } from '#shared/geometry/stroke';
import type { ArcElement, ClassicalElement, LineElement, ProfileElement } from '#shared/measure/profile-element';

/** One element of a profile as drawn, in mm: x outwards from where the profile begins, y upwards. */
export interface ProfilePiece {
  readonly id: string;
  readonly element: ProfileElement['element'];
  readonly strokes: readonly Stroke[];
  /** The step a fillet stands forward or back by, which does not count. */
  readonly uncounted?: Stroke;
  readonly end: Point;
}

const at = (x: number, y: number): Point => ({ x, y });
const line = (from: Point, to: Point): Stroke => ({ stroke: 'line', from, to });
const quarter = (from: Point, to: Point, centre: Point): Stroke => ({ stroke: 'quarter', from, to, centre });

// A round quarter going out, or a hollow one going in, has its centre straight above its beginning; the other two beside it.
function quadrant(from: Point, to: Point, form: 'round' | 'hollow'): Stroke {
  const isAbove = (form === 'round') === to.x >= from.x;
  return quarter(from, to, isAbove ? at(from.x, to.y) : at(to.x, from.y));
}

// Two half-size curves, round below and hollow above or the other way; read upside down when the member goes in.
function doubleCurve([from, to]: readonly [Point, Point], lower: 'round' | 'hollow', curve: typeof quadrant): Stroke[] {
  const middle = at((from.x + to.x) / 2, (from.y + to.y) / 2);
  const upper = lower === 'round' ? 'hollow' : 'round';
  return [curve(from, middle, lower), curve(middle, to, upper)];
}

// An arc of 60°: its radius is its chord, so it rises 1 − cos 30° of it.
function sixtyDegrees(from: Point, to: Point, form: 'round' | 'hollow'): Stroke {
  const rise = (1 - Math.sqrt(3) / 2) * Math.hypot(to.x - from.x, to.y - from.y);
  return { stroke: 'arc', from, to, bow: form === 'round' ? rise : -rise };
}

// Two quarter-circles that share their deepest point: radii (h + p)/2 on the side that stands out further, (h − p)/2 on the other.
function scotia(from: Point, { height_mm, projection_mm, going }: ClassicalElement): Stroke[] {
  const wide = (height_mm + projection_mm) / 2;
  const tight = (height_mm - projection_mm) / 2;
  const [lower, out] = going === 'out' ? [tight, projection_mm] : [wide, -projection_mm];
  const deepest = at(from.x - lower, from.y + lower);
  const top = at(from.x + out, from.y + height_mm);
  return [quarter(from, deepest, at(from.x, deepest.y)), quarter(deepest, top, at(top.x, deepest.y))];
}

function halfRound(from: Point, { height_mm, projection_mm }: ClassicalElement): Stroke[] {
  const centre = at(from.x, from.y + height_mm / 2);
  const crown = at(from.x + projection_mm, centre.y);
  return [quarter(from, crown, centre), quarter(crown, at(from.x, from.y + height_mm), centre)];
}

// Going out, it stands forward of what lies below; going in, of what lies above: so a profile turned upside down stays the same.
function fillet(from: Point, { id, height_mm, projection_mm, going }: ClassicalElement): ProfilePiece {
  const isOut = going === 'out';
  const foot = at(isOut ? from.x + projection_mm : from.x, from.y);
  const head = at(foot.x, foot.y + height_mm);
  const end = at(isOut ? head.x : head.x - projection_mm, head.y);
  const face = { id, element: 'fillet', strokes: [line(foot, head)], end } as const;
  return projection_mm === 0 ? face : { ...face, uncounted: isOut ? line(from, foot) : line(head, end) };
}

function classicalStrokes(from: Point, member: ClassicalElement): Stroke[] {
  const isOut = member.going === 'out';
  const to = at(from.x + (isOut ? member.projection_mm : -member.projection_mm), from.y + member.height_mm);
  switch (member.element) {
    case 'ovolo':
      return [quadrant(from, to, 'round')];
    case 'cavetto':
      return [quadrant(from, to, 'hollow')];
    case 'cyma-recta':
      return doubleCurve([from, to], isOut ? 'round' : 'hollow', quadrant);
    case 'cyma-reversa':
      return doubleCurve([from, to], isOut ? 'hollow' : 'round', quadrant);
    case 'flat-cyma':
      return doubleCurve([from, to], isOut ? 'round' : 'hollow', sixtyDegrees);
    case 'scotia':
      return scotia(from, member);
    default:
      return halfRound(from, member);
  }
}

function drawnStroke(from: Point, drawn: LineElement | ArcElement): Stroke {
  const to = at(from.x + drawn.across_mm, from.y + drawn.up_mm);
  return drawn.element === 'line' ? line(from, to) : { stroke: 'arc', from, to, bow: drawn.bow_mm };
}

function pieceFrom(from: Point, element: ProfileElement): ProfilePiece {
  if (element.element === 'fillet') return fillet(from, element);
  const strokes =
    element.element === 'line' || element.element === 'arc'
      ? [drawnStroke(from, element)]
      : classicalStrokes(from, element);
  return { id: element.id, element: element.element, strokes, end: strokes[strokes.length - 1].to };
}

/**
 * The curve of a profile, element by element from the bottom up, in mm from where it begins (`from_mm` out from the axis or wall).
 * Quadrants are quarter-ellipses in the box of height and projection, a cyma two half-size ones (Nicholson's constructions, as in
 * the ICS Building Trades Pocketbook, Roman mouldings); a scotia takes two quarter-circles, a flat cyma two arcs of 60°.
 */
export function profileCurve(profile: readonly ProfileElement[], from_mm = 0): ProfilePiece[] {
  const pieces: ProfilePiece[] = [];
  for (const element of profile) pieces.push(pieceFrom(pieces[pieces.length - 1]?.end ?? at(from_mm, 0), element));
  return pieces;
}

/** Everything a piece of a profile is drawn with, in mm: a fillet's step does not count, but the profile reaches as far as it. */
export const drawnStrokes = ({ strokes, uncounted }: ProfilePiece): readonly Stroke[] =>
  uncounted ? [...strokes, uncounted] : strokes;
