import { draftInOrder } from '#shared/estimates/draft-in-order';
import { draftForSpecs, memberForSpecs } from '#shared/estimates/member-for-specs';

const { settings } = draftForSpecs([]);
const piece = (id: string, place: number) => ({ id, content: { name: id, place, note: '' } });
const member = (id: string, pieceId: string, place: number) => {
  const { id: _, ...content } = memberForSpecs({ pieceId, place, name: id });
  return { id, content };
};

describe('A draft in working order', () => {
  it('has its pieces by their places, and in each its members by theirs', () => {
    const draft = draftInOrder(
      settings,
      [piece('stand', 2), piece('table', 1)],
      [member('foot', 'stand', 1), member('leg', 'table', 5), member('apron', 'table', -3)],
    );
    expect(draft.pieces.map(({ id }) => id)).toEqual(['table', 'stand']);
    expect(draft.members.map(({ id }) => id)).toEqual(['apron', 'leg', 'foot']);
  });

  it('tells members of one place apart by their ids, however they were read', () => {
    const pieces = [piece('table', 1)];
    const rows = [member('b', 'table', 1), member('a', 'table', 1), member('c', 'table', 0.5)];
    const read = draftInOrder(settings, pieces, rows).members.map(({ id }) => id);
    expect(read).toEqual(['c', 'a', 'b']);
    expect(draftInOrder(settings, pieces, rows.toReversed()).members.map(({ id }) => id)).toEqual(read);
  });
});
