import { v7 as newId } from 'uuid';
import type { MemberContent } from '#shared/estimates/member';
import type { Shape } from '#shared/measure/shape';

/** A member before it has its place in a piece. */
export interface MemberEntry {
  readonly id: string;
  readonly content: Omit<MemberContent, 'pieceId' | 'place'>;
}

/** A member as an estimator enters it: one, of lime, with nothing cut out, unless something else is said. */
export const memberEntry = (
  name: string,
  shape: Shape,
  work: Partial<Omit<MemberContent, 'pieceId' | 'place' | 'name' | 'shape'>>,
): MemberEntry => ({
  id: newId(),
  content: {
    name,
    count: 1,
    timberId: 'lime',
    shape,
    openings: [],
    zones: [],
    ornaments: [],
    lot: '',
    note: '',
    typed: {},
    alternativeId: null,
    ...work,
  },
});
