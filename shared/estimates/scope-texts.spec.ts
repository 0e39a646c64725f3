import { draftForSpecs, memberForSpecs } from '#shared/estimates/member-for-specs';
import { scopeTexts } from '#shared/estimates/scope-texts';
import { formatsFor } from '#shared/units/formats-for';
import { en } from '#shared/words/en';
import { say } from '#shared/words/say';

const words = say(en, formatsFor({ locale: 'en-GB', currency: 'EUR', digits: 2, lengthUnit: 'mm' }));
const bare = memberForSpecs({ id: 'bare', name: 'Back rail', zones: [] });
const lines = [
  { memberId: 'gilt', kind: 'ground', price_minor: 100 },
  { memberId: 'gilt', kind: 'gilding', price_minor: 200 },
  { memberId: null, kind: 'packing', price_minor: -50 },
] as const;
const draftWith = (written: { included: string; excluded: string }) =>
  draftForSpecs([memberForSpecs({ id: 'gilt' }), bare], written);

describe('scopeTexts', () => {
  it('names the kinds of work that are priced, and what was measured only, where nobody wrote anything', () => {
    const draft = draftWith({ included: '', excluded: '' });
    expect(scopeTexts({ draft, choice: [], lines }, words)).toEqual({
      included: 'Ground, Gilding: what the lines above name, and no more.',
      excluded: 'Measured only, with no work on it in this price: Back rail.\nWhatever is not named here.',
    });
  });

  it('gives what was written, and what was measured only beside it', () => {
    const draft = draftWith({ included: 'All gilding.', excluded: 'The marble top.' });
    expect(scopeTexts({ draft, choice: [], lines }, words)).toEqual({
      included: 'All gilding.',
      excluded: 'Measured only, with no work on it in this price: Back rail.\nThe marble top.',
    });
  });

  it('says nothing of a member that a chosen alternative replaces', () => {
    const alternatives = [{ id: 'plain', name: 'Plain', group: '', note: '', replaces: ['bare'] }];
    const draft = draftForSpecs([memberForSpecs({ id: 'gilt' }), bare], { alternatives, excluded: 'The top.' });
    expect(scopeTexts({ draft, choice: ['plain'], lines }, words).excluded).toBe('The top.');
  });
});
