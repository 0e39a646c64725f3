import type { MouldingRun } from '#shared/leaf/lays-laying';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';
import type { Course } from '#shared/measure/surface';

/** What one member offers a zone to be laid on, in mm and mm²: the whole surface, or its parts of the girth by themselves. */
export interface LaidField {
  readonly area_mm2: number;
  /** Null where the shape has no girth and run. */
  readonly moulding: MouldingRun | null;
  readonly courses: readonly Course[];
}

/** All that decides the field: the surface, and the parts of the girth a zone takes by themselves. */
type FieldInput = Pick<ZoneLeafInput, 'surface' | 'partKeys'>;

// The run that gives the area with this girth, never shorter than measured: outer parts of a curved moulding run longer than its middle.
const runFor = (area_mm2: number, girth_mm: number, run_mm: number): number =>
  girth_mm > 0 ? Math.max(area_mm2 / girth_mm, run_mm) : run_mm;

function partsField({ surface }: FieldInput, keys: readonly string[]): LaidField {
  const parts = surface.parts.filter((part) => keys.includes(part.key));
  const area_mm2 = parts.reduce((sum, part) => sum + part.area_mm2, 0);
  const girth_mm = parts.reduce((sum, part) => sum + part.girth_mm, 0);
  const run_mm = girth_mm > 0 ? area_mm2 / girth_mm : 0;
  return { area_mm2, moulding: { girth_mm, run_mm, closedRun: surface.closedRun }, courses: [] };
}

const alongField = ({ length_mm, height_mm, closed }: Course): MouldingRun => ({
  girth_mm: closed ? height_mm : Math.min(length_mm, height_mm),
  run_mm: closed ? length_mm : Math.max(length_mm, height_mm),
  closedRun: closed,
});

function wholeMoulding({ surface }: FieldInput): MouldingRun | null {
  const { area_mm2, girth_mm, run_mm, closedRun, courses } = surface;
  const [only, ...others] = courses;
  // A single narrow field is a moulding without a profile; it is laid along its longer side, or round.
  if (only && others.length === 0 && area_mm2 <= only.length_mm * only.height_mm * (1 + 1e-9)) return alongField(only);
  if (girth_mm !== undefined && run_mm !== undefined)
    return { girth_mm, run_mm: runFor(area_mm2, girth_mm, run_mm), closedRun };
  return null;
}

/** The field a zone is laid on: a share is counted on the whole member and split afterwards, parts of the girth by themselves. */
export function laidField(input: FieldInput): LaidField {
  if (input.partKeys) return partsField(input, input.partKeys);
  return { area_mm2: input.surface.area_mm2, moulding: wholeMoulding(input), courses: input.surface.courses };
}

/** Share of that field the zone keeps (0…1): its own share, less the openings of the member. */
export function keptShare({ share, openings_mm2, surface }: ZoneLeafInput): number {
  if (surface.area_mm2 <= 0) return 0;
  return share * Math.max(0, 1 - openings_mm2 / surface.area_mm2);
}
