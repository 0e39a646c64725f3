import { layPlan, type LaidPiece, type LayPlan, type LayPlanBand } from '#shared/leaf/lay-plan';
import type { ScaleView } from '../ui/drawing/scale-view';

/** A lay plan and how it is drawn. */
export interface LayPlanDrawn {
  readonly plan: LayPlan;
  readonly view: ScaleView;
}

/** A row of carved repeats beneath the plan, to its scale: how high it is, and how it is drawn from a top down to a length. */
export interface CarvedRow {
  readonly height_mm: number;
  readonly path: (top_mm: number, to_mm: number) => string;
}

const mostPieces = 420;
const fewestAlong = 7;
/** A plan longer than so many times its height would be a thread. */
const slender = 9;

const piecesAlong = ({ length_mm, pieceLength_mm, lap_mm }: LayPlanBand): number =>
  Math.ceil((length_mm - lap_mm) / (pieceLength_mm - lap_mm) - 1e-6);

const rowsOf = ({ height_mm, pieceHeight_mm, lap_mm }: LayPlanBand): number =>
  Math.max(1, Math.ceil((height_mm - lap_mm) / (pieceHeight_mm - lap_mm) - 1e-6));

/** How many pieces are drawn: all of a compact plan, the beginning of a long one. */
function shownPieces(bands: readonly LayPlanBand[]): number {
  const rows = bands.reduce((sum, band) => sum + rowsOf(band), 0);
  const height_mm = bands.reduce((sum, band) => sum + band.height_mm, 0);
  const widest = [...bands].sort((one, other) => other.length_mm - one.length_mm).at(0);
  if (!widest) return 0;
  const pitch_mm = widest.pieceLength_mm - widest.lap_mm;
  const along = Math.max(fewestAlong, Math.floor((slender * height_mm) / pitch_mm));
  return Math.min(mostPieces, rows * Math.min(along, piecesAlong(widest)));
}

const rectangle = ({ x_mm, y_mm, width_mm, height_mm }: Pick<LaidPiece, 'x_mm' | 'y_mm' | 'width_mm' | 'height_mm'>) =>
  `M${x_mm} ${y_mm}h${width_mm}v${height_mm}h${-width_mm}Z`;

const isDark = ({ band, course, place }: LaidPiece): boolean => (band + course + place) % 2 === 0;

/** Where a piece lies over the one before it, along and across. */
function lapsOf(piece: LaidPiece, { lap_mm }: LayPlanBand): string {
  const { x_mm, y_mm, width_mm, height_mm, place, course } = piece;
  const along = place > 0 ? rectangle({ x_mm, y_mm, width_mm: Math.min(lap_mm, width_mm), height_mm }) : '';
  const across = course > 0 ? rectangle({ x_mm, y_mm, width_mm, height_mm: Math.min(lap_mm, height_mm) }) : '';
  return along + across;
}

/** Where one band ends and the next begins. */
function arrises({ pieces, shownLength_mm }: LayPlan): string {
  const tops = new Set(pieces.filter(({ band, course }) => band > 0 && course === 0).map(({ y_mm }) => y_mm));
  return [...tops].map((y_mm) => `M0 ${y_mm}H${shownLength_mm}`).join('');
}

function dimensionsOf({ shownLength_mm, shownHeight_mm }: LayPlan): ScaleView['dimensions'] {
  const [left, right] = [
    { x_mm: 0, y_mm: 0 },
    { x_mm: shownLength_mm, y_mm: 0 },
  ];
  return [
    { from: left, to: right, label_mm: shownLength_mm, side: 'above' },
    { from: right, to: { x_mm: shownLength_mm, y_mm: shownHeight_mm }, label_mm: shownHeight_mm, side: 'right' },
  ];
}

/** Rows of repeats one under the other, clear of the plan. */
function carvedRows(rows: readonly CarvedRow[], plan: LayPlan): { data: string; bottom_mm: number } {
  const gap_mm = 0.015 * plan.shownLength_mm;
  let bottom_mm = plan.shownHeight_mm;
  const paths = rows.map(({ height_mm, path }) => {
    const top_mm = bottom_mm + gap_mm;
    bottom_mm = top_mm + height_mm;
    return path(top_mm, plan.shownLength_mm);
  });
  return { data: paths.join(''), bottom_mm };
}

/** The pieces of leaf as they lie, to scale, neighbours in two shades so that one sees them, laps darker; carved repeats beneath. */
export function layPlanDrawn(bands: readonly LayPlanBand[], rows: readonly CarvedRow[] = []): LayPlanDrawn {
  const plan = layPlan(bands, Math.max(1, shownPieces(bands)));
  const pathOf = (pieces: readonly LaidPiece[]) => pieces.map(rectangle).join('');
  const carved = carvedRows(rows, plan);
  return {
    plan,
    view: {
      paths: [
        { kind: 'leaf', data: pathOf(plan.pieces.filter(isDark)) },
        { kind: 'pale', data: pathOf(plan.pieces.filter((piece) => !isDark(piece))) },
        { kind: 'lap', data: plan.pieces.map((piece) => lapsOf(piece, bands[piece.band])).join('') },
        { kind: 'outline', data: arrises(plan) },
        { kind: 'outline', data: carved.data },
      ],
      dimensions: dimensionsOf(plan),
      box: { left_mm: 0, top_mm: 0, width_mm: plan.shownLength_mm, height_mm: carved.bottom_mm },
    },
  };
}
