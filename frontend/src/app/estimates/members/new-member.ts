import type { MemberContent } from '#shared/estimates/member';

type Start = Pick<MemberContent, 'pieceId' | 'place' | 'timberId' | 'name' | 'shape'>;

/** A member with nothing on it yet but its shape. */
export const newMember = (start: Start): MemberContent => ({
  ...start,
  count: 1,
  openings: [],
  zones: [],
  ornaments: [],
  lot: '',
  note: '',
  typed: {},
  alternativeId: null,
});
