import { piecesAlong } from '#shared/leaf/leaf-step';

/** A field drawn to scale: its size, and the pieces laid on it side by side, in mm. */
export interface LayPlanBand {
  readonly length_mm: number;
  readonly height_mm: number;
  readonly pieceLength_mm: number;
  readonly pieceHeight_mm: number;
  readonly lap_mm: number;
}

/** One leaf, strip or cut as it lies; neighbours overlap by the lap, the last is trimmed at the edge. */
export interface LaidPiece {
  readonly band: number;
  readonly course: number;
  readonly place: number;
  readonly x_mm: number;
  readonly y_mm: number;
  readonly width_mm: number;
  readonly height_mm: number;
}

/** Bands one above the other, all of them or the beginning of each. */
export interface LayPlan {
  readonly pieces: readonly LaidPiece[];
  readonly length_mm: number;
  readonly height_mm: number;
  readonly shownLength_mm: number;
  readonly shownHeight_mm: number;
  readonly isWhole: boolean;
}

interface Span {
  readonly at_mm: number;
  readonly size_mm: number;
}

interface Axis {
  readonly whole_mm: number;
  readonly piece_mm: number;
  readonly lap_mm: number;
}

const piecesOn = ({ whole_mm, piece_mm, lap_mm }: Axis): number =>
  piecesAlong(whole_mm, false, { side_mm: piece_mm, lap_mm });

function spans(axis: Axis, most: number): Span[] {
  const pitch_mm = axis.piece_mm - axis.lap_mm;
  return Array.from({ length: Math.min(piecesOn(axis), most) }, (_, index) => {
    const at_mm = index * pitch_mm;
    return { at_mm, size_mm: Math.min(axis.piece_mm, axis.whole_mm - at_mm) };
  });
}

const along = (band: LayPlanBand): Axis => ({
  whole_mm: band.length_mm,
  piece_mm: band.pieceLength_mm,
  lap_mm: band.lap_mm,
});
const across = (band: LayPlanBand): Axis => ({
  whole_mm: band.height_mm,
  piece_mm: band.pieceHeight_mm,
  lap_mm: band.lap_mm,
});

interface Grid {
  readonly columns: readonly Span[];
  readonly rows: readonly Span[];
}

const endOf = (spansOf: readonly Span[]): number =>
  Math.max(0, ...spansOf.slice(-1).map((span) => span.at_mm + span.size_mm));

// Rows are cut down first, so that no band is left out, then as many columns are shown as there is room for.
function grids(bands: readonly LayPlanBand[], most: number): Grid[] {
  const rowsEach = Math.max(1, Math.floor(most / Math.max(1, bands.length)));
  const rows = bands.map((band) => spans(across(band), rowsEach));
  const rowCount = rows.reduce((sum, next) => sum + next.length, 0);
  const columnsEach = Math.max(1, Math.floor(most / Math.max(1, rowCount)));
  return bands.map((band, index) => ({ columns: spans(along(band), columnsEach), rows: rows[index] ?? [] }));
}

function laid({ columns, rows }: Grid, band: number, top_mm: number): LaidPiece[] {
  return rows.flatMap((row, course) =>
    columns.map((column, place) => ({
      ...{ band, course, place },
      ...{ x_mm: column.at_mm, y_mm: top_mm + row.at_mm, width_mm: column.size_mm, height_mm: row.size_mm },
    })),
  );
}

const isAll = ({ columns, rows }: Grid, band: LayPlanBand): boolean =>
  columns.length === piecesOn(along(band)) && rows.length === piecesOn(across(band));

/**
 * Where every piece of leaf lies on the developed surface, to scale in mm, at most about `most` pieces: a longer plan shows the beginning
 * of each band. Pure geometry for drawings; the count of leaves is made elsewhere.
 */
export function layPlan(bands: readonly LayPlanBand[], most: number): LayPlan {
  const shown = grids(bands, most);
  const tops = shown.map((_, index) => shown.slice(0, index).reduce((sum, grid) => sum + endOf(grid.rows), 0));
  return {
    pieces: shown.flatMap((grid, index) => laid(grid, index, tops[index] ?? 0)),
    length_mm: Math.max(0, ...bands.map((band) => band.length_mm)),
    height_mm: bands.reduce((sum, band) => sum + band.height_mm, 0),
    shownLength_mm: Math.max(0, ...shown.map((grid) => endOf(grid.columns))),
    shownHeight_mm: shown.reduce((sum, grid) => sum + endOf(grid.rows), 0),
    isWhole: shown.every((grid, index) => isAll(grid, bands[index])),
  };
}
