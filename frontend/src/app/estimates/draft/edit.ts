import type { Change } from '#shared/estimates/change-schema';
import type { MemberContent, PieceContent } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';

/** What a piece, a member or the settings are to become; null takes a piece or a member away. */
export type Edit =
  | { readonly kind: 'member'; readonly id: string; readonly content: MemberContent | null }
  | { readonly kind: 'piece'; readonly id: string; readonly content: PieceContent | null }
  | { readonly kind: 'settings'; readonly id: string; readonly content: EstimateSettings };

export type EditKind = Edit['kind'];

/** An edit with the version it was made from, as the server takes it. */
export const changeOf = (edit: Edit, version: number): Change => ({ ...edit, version });
