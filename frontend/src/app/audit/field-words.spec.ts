import { TestBed } from '@angular/core/testing';
import { fieldChanges } from '#shared/audit/field-changes';
import { signIn, words } from '../../test/sign-in';
import { FieldWords } from './field-words';

const zone = (change: object = {}) => ({
  id: 'z',
  name: 'Face',
  take: { way: 'share', share_percent: 60 },
  relief: 'low',
  ...change,
});

describe('Fields that changed, in words', () => {
  function told(before: object, after: object, settings: Parameters<typeof signIn>[1] = {}): string[] {
    TestBed.configureTestingModule({ providers: [words] });
    signIn(['owner'], settings);
    const fields = TestBed.inject(FieldWords);
    return fieldChanges(before, after).map((change) => {
      const { label, deed, before: was, after: is } = fields.of(change);
      return `${label}: ${deed || `${was} → ${is}`}`.replace(/\u00a0/g, ' ');
    });
  }

  it.each<[string, object, object, string]>([
    ['a text', { name: 'Rail' }, { name: 'Frieze' }, 'Name: Rail → Frieze'],
    ['a length', { shape: { length_mm: 600 } }, { shape: { length_mm: 640 } }, 'Shape, length: 600 mm → 640 mm'],
    ['an area', { shape: { area_mm2: 1e5 } }, { shape: { area_mm2: 2e5 } }, 'Shape, area: 1,000 cm² → 2,000 cm²'],
    ['a side of a plan', { plan: { sides_mm: [1, 2] } }, { plan: { sides_mm: [1, 3] } }, 'Plan, side 2: 2 mm → 3 mm'],
    ['a choice', { zones: [zone()] }, { zones: [zone({ relief: 'high' })] }, 'Zone “Face”, relief: low → high'],
    [
      'a share',
      { zones: [zone()] },
      { zones: [zone({ take: { way: 'share', share_percent: 70 } })] },
      'Zone “Face”, share of the surface: 60% → 70%',
    ],
    ['a zone that came', { zones: [] }, { zones: [zone()] }, 'Zone “Face”: added'],
    [
      'an ornament that went',
      { ornaments: [{ id: 'o', ornamentId: 'egg-and-dart' }] },
      { ornaments: [] },
      'Ornament “egg and dart”: removed',
    ],
    ['a tick', { isTrueSurface: false }, { isTrueSurface: true }, 'Measured over the carving: no → yes'],
    ['an entry that was emptied', { note: 'By tape' }, { note: '' }, 'Note: By tape → –'],
    ['an angle', { turns_degrees: [90] }, { turns_degrees: [45.5] }, 'Mitre 1: 90° → 45.5°'],
    [
      'where the base will stand',
      { place: 'indoors' },
      { place: 'damp' },
      'Where it will stand: indoors → in the damp',
    ],
    ['the place in the list', { place: 1 }, { place: 2 }, 'Place in the list: in another order'],
    [
      'what a workshop calls by a mark',
      { timberId: 'lime' },
      { timberId: 'sweet-chestnut' },
      'Timber: lime → sweet chestnut',
    ],
  ])('say %s', (_, before, after, text) => {
    expect(told(before, after)).toEqual([text]);
  });

  it('say a length in inches where one measures in inches', () => {
    // 25.4 mm to the inch.
    expect(told({ length_mm: 254 }, { length_mm: 279.4 }, { lengthUnit: 'in' })).toEqual(['Length: 10 in → 11 in']);
  });
});
