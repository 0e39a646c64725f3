import { overlappingAlternatives } from '#shared/estimates/alternatives-overlapping';
import type { Draft } from '#shared/estimates/draft';

const alternative = (id: string, replaces: readonly string[], group = '') => ({
  ...{ id, name: id, group, note: '' },
  replaces: [...replaces],
});

/** A frieze of two zones and a crate, with these alternatives. */
const draftWith = (...alternatives: readonly ReturnType<typeof alternative>[]) =>
  ({
    members: [
      {
        ...{ id: 'frieze', name: 'Frieze', alternativeId: null, ornaments: [] },
        zones: [
          { id: 'front', name: 'front' },
          { id: 'back', name: 'back' },
        ],
      },
    ],
    settings: { alternatives, extras: [{ id: 'crate', name: 'Crate' }] },
  }) as unknown as Draft;

const said = (draft: Draft) =>
  overlappingAlternatives(draft).map(({ kind, about, values }) => [kind, about, values['second'], values['part']]);

describe('overlappingAlternatives', () => {
  it.each([
    ['a zone', ['front'], ['front'], 'Frieze, front'],
    ['a zone of a member the other takes whole', ['frieze'], ['back'], 'Frieze, back'],
    ['a member', ['frieze'], ['frieze'], 'Frieze'],
    ['a further line', ['crate'], ['crate'], 'Crate'],
  ])('warns of two that may be chosen together and take the place of %s', (_, first, second, part) => {
    const draft = draftWith(alternative('oil', first), alternative('silver', second));
    expect(said(draft)).toEqual([['warn', 'oil', 'silver', part]]);
  });

  it.each([
    ['two of one group', alternative('oil', ['front'], 'Frieze'), alternative('silver', ['front'], 'Frieze')],
    ['two of different zones', alternative('oil', ['front']), alternative('silver', ['back'])],
    ['two that take nothing away', alternative('oil', []), alternative('silver', [])],
  ])('says nothing of %s', (_, first, second) => {
    expect(said(draftWith(first, second))).toEqual([]);
  });

  it('warns across groups, once for each pair', () => {
    const draft = draftWith(
      alternative('oil', ['front'], 'One'),
      alternative('silver', ['front', 'back'], 'Other'),
      alternative('bare', ['back']),
    );
    expect(said(draft)).toEqual([
      ['warn', 'oil', 'silver', 'Frieze, front'],
      ['warn', 'silver', 'bare', 'Frieze, back'],
    ]);
  });
});
