import * as z from 'zod';
import type { OrnamentExtent, OrnamentUse } from '#shared/carving/ornament-use';
import { planCurves } from '#shared/carving/plan-curve';
import { isNoLengthOrKept, least_mm, shorterThanKept } from '#shared/measure/length-schema';
import { reliefs } from '#shared/measure/relief';
import { cardItemId } from '#shared/problems/card-entry-schema';
import { complain } from '#shared/problems/complaints-of';
import { count, identifier } from '#shared/problems/entry-schema';

const length_mm = z.number().min(0).max(1e6).refine(isNoLengthOrKept, shorterThanKept);

const leavesRoom = (run: Extract<OrnamentExtent, { way: 'run' }>): boolean =>
  run.run_mm < 0 || run.mitreLeaf_mm * run.mitreLeaves + (run.centre_mm ?? 0) <= run.run_mm;

/** How much of an ornament a member carries; mitre leaves and centrepiece must leave the run at least its length. */
export const ornamentExtentSchema = z.discriminatedUnion('way', [
  z.strictObject({ way: z.literal('pieces'), count }),
  z
    .strictObject({
      way: z.literal('run'),
      run_mm: length_mm,
      runs: count,
      mitreLeaf_mm: length_mm,
      mitreLeaves: z.int().min(0).max(100),
      centre_mm: length_mm.nullable(),
    })
    .refine(leavesRoom, { ...complain('carving-run-taken'), path: ['run_mm'] }),
  z.strictObject({ way: z.literal('area'), area_mm2: z.number().min(0).max(1e10) }),
]);

/** An ornament or item of the card as a member carries it; ids it names are looked up when the hours are worked. */
export const ornamentUseSchema = z.strictObject({
  id: identifier,
  ornamentId: cardItemId,
  extent: ornamentExtentSchema,
  size_mm: z.number().min(least_mm).max(1e5).nullable(),
  relief: z.enum(reliefs),
  isUndercut: z.boolean(),
  plan: z.enum(planCurves),
  isMirrored: z.boolean(),
  joinsLearning: z.boolean(),
  hasOwnPattern: z.boolean(),
  zoneId: identifier.nullable(),
}) satisfies z.ZodType<OrnamentUse>;
