import type { LayPlanBand } from '#shared/leaf/lay-plan';
import type { LeafStep } from '#shared/leaf/leaf-step';
import type { Laying } from '#shared/leaf/laying';

const square = (area_mm2: number, piece_mm: number, lap_mm: number): LayPlanBand => {
  const side_mm = Math.sqrt(area_mm2);
  return { length_mm: side_mm, height_mm: side_mm, pieceLength_mm: piece_mm, pieceHeight_mm: piece_mm, lap_mm };
};

const field = (length_mm: number, height_mm: number, { side_mm, lap_mm }: LeafStep): LayPlanBand => ({
  ...{ length_mm, height_mm, pieceLength_mm: side_mm, pieceHeight_mm: side_mm, lap_mm },
});

/**
 * The bands to draw a laying of one member with, in mm: lays along their run, fields of sheets one above the other, surfaces counted by
 * area as a square of the same area, ribbon length by length.
 */
export function layPlanBands(laying: Laying, step: LeafStep): LayPlanBand[] {
  const { side_mm, lap_mm } = step;
  switch (laying.way) {
    case 'lays':
      return [{ ...field(laying.run_mm, laying.girth_mm, step), pieceHeight_mm: laying.chosen.strip_mm }];
    case 'sheets': {
      const rest = laying.rest_mm2 > 0 ? [square(laying.rest_mm2, side_mm, lap_mm)] : [];
      return [...laying.fields.map((each) => field(each.length_mm, each.height_mm, step)), ...rest];
    }
    case 'patches':
      return [square(laying.area_mm2, side_mm / laying.cuts, lap_mm)];
    case 'ribbon': {
      const each_mm = laying.pieces > 0 ? laying.length_mm / laying.pieces : 0;
      return [
        {
          ...field(each_mm, laying.pieces * (side_mm - lap_mm) + lap_mm, step),
          pieceLength_mm: Math.max(each_mm, side_mm),
        },
      ];
    }
  }
}
