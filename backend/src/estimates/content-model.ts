import type { MemberContent, PieceContent } from '#shared/estimates/member';
import { column } from '../platform/database/columns';
import type { Database } from '../platform/database/database';
import type { VersionedRow } from '../platform/database/workshop-rows';

/** A piece or a member: one JSON document with its own version. */
export interface ContentRow<Content> extends VersionedRow {
  readonly estimateId: string;
  readonly content: Content;
}

export type PieceContentRow = ContentRow<PieceContent>;

/** A member's row names its piece too, so that the database refuses a piece of another estimate. */
export interface MemberContentRow extends ContentRow<MemberContent> {
  readonly pieceId: string;
}

const columns = {
  workshopId: column.workshopId,
  id: column.id,
  estimateId: column.reference,
  version: column.whole,
  content: column.json,
};

export const pieceContentTable = (database: Database) => database.table<PieceContentRow>('pieces', columns);

export const memberContentTable = (database: Database) =>
  database.table<MemberContentRow>('members', { ...columns, pieceId: column.reference });
