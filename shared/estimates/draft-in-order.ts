import type { Draft } from '#shared/estimates/draft';
import type { Member, MemberContent, Piece, PieceContent } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';

/** A piece or member as it is kept: its id beside its content. */
export interface Kept<Content> {
  readonly id: string;
  readonly content: Content;
}

const inOrder = (one: { place: number; id: string }, other: { place: number; id: string }): number =>
  one.place - other.place || (one.id < other.id ? -1 : 1);

/** Puts kept pieces and members into working order, by their places, so that every reader works the same draft. */
export function draftInOrder(
  settings: EstimateSettings,
  pieces: readonly Kept<PieceContent>[],
  members: readonly Kept<MemberContent>[],
): Draft {
  const ordered = pieces.map(({ id, content }): Piece => ({ ...content, id })).toSorted(inOrder);
  const rank = new Map(ordered.map((piece, index) => [piece.id, index]));
  const sorted = members
    .map(({ id, content }): Member => ({ ...content, id }))
    .toSorted((one, other) => (rank.get(one.pieceId) ?? 0) - (rank.get(other.pieceId) ?? 0) || inOrder(one, other));
  return { settings, pieces: ordered, members: sorted };
}
