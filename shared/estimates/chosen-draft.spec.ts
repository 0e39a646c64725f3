import { chosenDraft } from '#shared/estimates/chosen-draft';
import { draftForSpecs, memberForSpecs, ornamentForSpecs, zoneEntryForSpecs } from '#shared/estimates/member-for-specs';
import type { ExtraLine } from '#shared/estimates/settings';

const extra = (id: string, alternativeId: string | null): ExtraLine => ({
  ...{ id, name: id, taxCategoryId: 'standard', memberId: null, alternativeId },
  ...{ kind: 'price', price: '10' },
});

const draft = draftForSpecs(
  [
    memberForSpecs({
      id: 'apron',
      zones: [zoneEntryForSpecs({ id: 'gold' }), zoneEntryForSpecs({ id: 'silver', alternativeId: 'in-silver' })],
      ornaments: [ornamentForSpecs({ id: 'rosette' }), ornamentForSpecs({ id: 'shell', alternativeId: 'in-silver' })],
    }),
    memberForSpecs({ id: 'plain foot' }),
    memberForSpecs({ id: 'carved foot', alternativeId: 'carved' }),
  ],
  {
    extras: [extra('crate', null), extra('second crate', 'carved')],
    alternatives: [
      { id: 'in-silver', name: 'In silver', group: 'metal', note: '', replaces: ['gold'] },
      { id: 'carved', name: 'Carved feet', group: '', note: '', replaces: ['plain foot', 'crate', 'rosette'] },
    ],
  },
);

const namesOf = (choice: readonly string[]) => {
  const chosen = chosenDraft(draft, choice);
  return {
    members: chosen.members.map(({ id }) => id),
    zones: chosen.members.find(({ id }) => id === 'apron')?.zones.map(({ id }) => id),
    ornaments: chosen.members.find(({ id }) => id === 'apron')?.ornaments.map(({ id }) => id),
    extras: chosen.settings.extras.map(({ id }) => id),
  };
};

describe('A draft by its alternatives', () => {
  it('is the base when none is taken', () => {
    expect(namesOf([])).toEqual({
      members: ['apron', 'plain foot'],
      zones: ['gold'],
      ornaments: ['rosette'],
      extras: ['crate'],
    });
  });

  it('takes the zones and ornaments of an alternative in the place of what it replaces', () => {
    expect(namesOf(['in-silver'])).toMatchObject({ zones: ['silver'], ornaments: ['rosette', 'shell'] });
  });

  it('replaces members, ornaments and further lines', () => {
    expect(namesOf(['carved'])).toEqual({
      members: ['apron', 'carved foot'],
      zones: ['gold'],
      ornaments: [],
      extras: ['second crate'],
    });
  });

  it('takes several at once', () => {
    expect(namesOf(['carved', 'in-silver'])).toEqual({
      members: ['apron', 'carved foot'],
      zones: ['silver'],
      ornaments: ['shell'],
      extras: ['second crate'],
    });
  });

  it('knows nothing of one it does not offer', () => {
    expect(namesOf(['lost'])).toEqual(namesOf([]));
  });
});
