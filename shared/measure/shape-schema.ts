import * as z from 'zod';
import { bandShapeSchema } from '#shared/measure/band-shape-schema';
import { measuredShapeSchema } from '#shared/measure/measured-shape-schema';
import { flatShapeSchemas } from '#shared/measure/flat-shape-schema';
import { legShapeSchemas } from '#shared/measure/leg-shape-schema';
import { mouldingShapeSchema, turnedShapeSchema } from '#shared/measure/moulding-shape-schema';
import type { Shape } from '#shared/measure/shape';
import { shapeComplaints } from '#shared/measure/shape-complaints';
import { solidShapeSchemas } from '#shared/measure/solid-shape-schema';

type Check = { readonly value: Shape; readonly issues: z.core.$ZodRawIssue[] };

/** Complains of impossible shapes at their fields, by the same rules the calculators refuse them by; lengths in mm. */
export function complainOfImpossible({ value, issues }: Check): void {
  for (const { path, code, values } of shapeComplaints(value))
    issues.push({ code: 'custom', input: value, path: [...path], params: { code, values }, message: code });
}

/** A shape as `Shape` names it: strict, lengths in mm from 0 to under 100 m, counts bounded, impossible shapes refused with a word each. */
export const shapeSchema = z
  .discriminatedUnion('kind', [
    ...flatShapeSchemas,
    mouldingShapeSchema,
    turnedShapeSchema,
    ...legShapeSchemas,
    ...solidShapeSchemas,
    bandShapeSchema,
    measuredShapeSchema,
  ])
  .check(complainOfImpossible);
