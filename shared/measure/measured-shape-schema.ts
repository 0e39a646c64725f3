import * as z from 'zod';
import { areaEntry } from '#shared/measure/length-schema';
import { paragraphs } from '#shared/problems/entry-schema';

export const measuredShapeSchema = z.strictObject({
  kind: z.literal('measured'),
  area_mm2: areaEntry,
  uncertainty_mm2: areaEntry,
  note: paragraphs(500).min(1),
  isTrueSurface: z.boolean(),
});
