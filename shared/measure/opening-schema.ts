import * as z from 'zod';
import { measuredShapeSchema } from '#shared/measure/measured-shape-schema';
import { flatShapeSchemas } from '#shared/measure/flat-shape-schema';
import { complainOfImpossible } from '#shared/measure/shape-schema';
import { count, identifier } from '#shared/problems/entry-schema';

/** A flat face or a given area, cut out of each of a member's identical pieces so many times. */
export const openingSchema = z.strictObject({
  id: identifier,
  shape: z.discriminatedUnion('kind', [...flatShapeSchemas, measuredShapeSchema]).check(complainOfImpossible),
  count,
});
