import * as z from 'zod';
import { ornamentUseSchema } from '#shared/carving/ornament-use-schema';
import type { MemberContent, PieceContent } from '#shared/estimates/member';
import { finishes, reliefs } from '#shared/measure/relief';
import { openingComplaints } from '#shared/measure/opening-complaints';
import { openingSchema } from '#shared/measure/opening-schema';
import { shapeSchema } from '#shared/measure/shape-schema';
import { zoneTakeSchema } from '#shared/measure/zone-take-schema';
import { recuttingManners } from '#shared/carving/carving-card';
import { layingWays } from '#shared/leaf/leaf-card';
import { complain } from '#shared/problems/complaints-of';
import { cardItemId, percentEntry } from '#shared/problems/card-entry-schema';
import { asTyped, count, identifier, line, optionalLine, paragraphs } from '#shared/problems/entry-schema';

const few = <S extends z.ZodType>(item: S, maximum: number) => z.array(item).max(maximum);

export const zoneSchema = z.strictObject({
  id: identifier,
  name: line(80),
  take: zoneTakeSchema,
  relief: z.enum(reliefs),
  finish: z.enum(finishes).nullable(),
  buildUpId: cardItemId,
  leafId: cardItemId.nullable(),
  laying: z.strictObject({
    way: z.enum(['proposed', ...layingWays]),
    strips: z.int().min(1).max(8).nullable(),
    cuts: z.int().min(1).max(8).nullable(),
  }),
  chosenStepIds: few(cardItemId, 40),
  burnished_percent: percentEntry.nullable(),
  painted_percent: percentEntry,
  recutting: z.enum(recuttingManners).nullable(),
  protectedEdge_mm: z.number().min(0).max(1e6),
  alternativeId: identifier.nullable(),
});

const sharesFit = (zones: readonly z.infer<typeof zoneSchema>[]) =>
  zones
    .filter((zone) => zone.alternativeId === null)
    .reduce((sum, zone) => sum + (zone.take.way === 'share' ? zone.take.share_percent : 0), 0) <=
  100 + 1e-9;

/** The entries of a member; shares of its base zones come to 100 % at most. */
const memberFields = z.strictObject({
  pieceId: identifier,
  place: z.number().min(-1e9).max(1e9),
  name: line(80),
  count: count,
  timberId: cardItemId,
  shape: shapeSchema,
  openings: few(openingSchema, 40),
  zones: few(zoneSchema, 24).refine(sharesFit, complain('zone-shares-over')),
  ornaments: few(ornamentUseSchema.safeExtend({ alternativeId: identifier.nullable() }), 60),
  lot: optionalLine(60),
  note: paragraphs(2000),
  typed: z
    .record(asTyped(120), asTyped(60))
    .refine((typed) => Object.keys(typed).length <= 400, complain('entry-too-many', { maximum: 400 })),
  alternativeId: identifier.nullable(),
});

function complainOfOpenings({ value, issues }: z.core.ParsePayload<MemberContent>): void {
  for (const { path, code, values } of openingComplaints(value.shape, value.openings))
    issues.push({ code: 'custom', input: value, path: [...path], params: { code, values }, message: code });
}

/** A member as it is entered; openings lie within its shape. */
export const memberContentSchema = memberFields.check(complainOfOpenings) satisfies z.ZodType<MemberContent>;

export const pieceContentSchema = z.strictObject({
  name: line(120),
  place: z.number().min(-1e9).max(1e9),
  note: paragraphs(2000),
}) satisfies z.ZodType<PieceContent>;
