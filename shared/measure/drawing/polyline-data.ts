import type { DrawingPoint } from '#shared/measure/drawing/drawing';

// A tenth of a micrometre is finer than any print; adding 0 turns −0 into 0.
const written = (figure_mm: number) => String(Math.round(figure_mm * 1e4) / 1e4 + 0);

const pair = ({ x_mm, y_mm }: DrawingPoint) => `${written(x_mm)} ${written(y_mm)}`;

/** A place of a drawing in mm, y downwards. */
export const spot = (x_mm: number, y_mm: number): DrawingPoint => ({ x_mm, y_mm });

/** Path data that moves to a place, in mm. */
export const moveData = (to: DrawingPoint): string => `M ${pair(to)}`;

/** Path data of a line to a place, in mm. */
export const lineData = (to: DrawingPoint): string => `L ${pair(to)}`;

/** An arc of an upright ellipse from where the path stands, radii in mm; clockwise as seen, the long way round or the short. */
export interface EllipticArc {
  readonly radii_mm: readonly [number, number];
  readonly to: DrawingPoint;
  readonly isClockwise: boolean;
  readonly isLong?: boolean;
}

/** Path data of an elliptic arc, in mm. */
export const arcData = ({ radii_mm, to, isClockwise, isLong = false }: EllipticArc): string =>
  `A ${written(radii_mm[0])} ${written(radii_mm[1])} 0 ${isLong ? 1 : 0} ${isClockwise ? 1 : 0} ${pair(to)}`;

/** Path data of straight lines through places in order, closed when said, in mm. */
export function polylineData(places: readonly DrawingPoint[], isClosed = false): string {
  const [first, ...rest] = places;
  if (!first) return '';
  return [moveData(first), ...rest.map(lineData), ...(isClosed ? ['Z'] : [])].join(' ');
}

/** Path data of a whole upright ellipse about a centre, radii in mm. */
export function ellipseData(centre: DrawingPoint, [across_mm, up_mm]: readonly [number, number]): string {
  const right = spot(centre.x_mm + across_mm, centre.y_mm);
  const left = spot(centre.x_mm - across_mm, centre.y_mm);
  const half = { radii_mm: [across_mm, up_mm], isClockwise: true } as const;
  return [moveData(right), arcData({ ...half, to: left }), arcData({ ...half, to: right }), 'Z'].join(' ');
}
