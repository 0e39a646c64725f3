import * as z from 'zod';
import { areaEntry } from '#shared/measure/length-schema';
import { complain } from '#shared/problems/complaints-of';
import { isBlank, paragraphs } from '#shared/problems/entry-schema';

export const measuredShapeSchema = z.strictObject({
  kind: z.literal('measured'),
  area_mm2: areaEntry,
  uncertainty_mm2: areaEntry,
  note: paragraphs(500).refine((text) => !isBlank(text), complain('entry-missing')),
  isTrueSurface: z.boolean(),
});
