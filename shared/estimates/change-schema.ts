import * as z from 'zod';
import { memberContentSchema, pieceContentSchema } from '#shared/estimates/member-schema';
import type { MemberContent, PieceContent } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';
import { settingsSchema } from '#shared/estimates/settings-schema';
import { identifier, versionSeen } from '#shared/problems/entry-schema';

/** One change of a draft: what it becomes (null: removed), and the version the person saw (0: there was none). */
export const changeSchema = z.discriminatedUnion('kind', [
  z.strictObject({
    kind: z.literal('member'),
    id: identifier,
    version: versionSeen,
    content: memberContentSchema.nullable(),
  }),
  z.strictObject({
    kind: z.literal('piece'),
    id: identifier,
    version: versionSeen,
    content: pieceContentSchema.nullable(),
  }),
  z.strictObject({ kind: z.literal('settings'), id: identifier, version: versionSeen, content: settingsSchema }),
]);
interface ChangeOf<Kind, Content> {
  readonly kind: Kind;
  readonly id: string;
  readonly version: number;
  readonly content: Content;
}

export type Change =
  | ChangeOf<'member', MemberContent | null>
  | ChangeOf<'piece', PieceContent | null>
  | ChangeOf<'settings', EstimateSettings>;

/** Several changes kept together or not at all: paste, duplicate, mirror and reorder send many. */
export const changesSchema = z.strictObject({ changes: z.array(changeSchema).min(1).max(500) });
