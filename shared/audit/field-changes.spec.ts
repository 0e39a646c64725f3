import { fieldChanges } from '#shared/audit/field-changes';

const face = { id: '018f0000-0000-7000-8000-000000000001', name: 'Face', share_percent: 60 };
const ground = { id: '018f0000-0000-7000-8000-000000000002', name: 'Ground', share_percent: 40 };
const told = (before: unknown, after: unknown) =>
  fieldChanges(before, after).map((change) => [change.path.join(' '), change.what, change.before, change.after]);

describe('The fields two versions differ in', () => {
  it.each<[string, unknown, unknown, unknown[]]>([
    ['a text', { name: 'Rail' }, { name: 'Frieze' }, [['name', 'changed', 'Rail', 'Frieze']]],
    [
      'a length within the shape',
      { shape: { kind: 'rectangle', length_mm: 600 } },
      { shape: { kind: 'rectangle', length_mm: 640 } },
      [['shape length_mm', 'changed', 600, 640]],
    ],
    ['a length in a list', { sides_mm: [800, 400] }, { sides_mm: [800, 450] }, [['sides_mm 2', 'changed', 400, 450]]],
    ['a length more', { sides_mm: [800] }, { sides_mm: [800, 450] }, [['sides_mm 2', 'changed', null, 450]]],
    ['nothing', { a: [{ id: '1' }], typed: { a: '1' } }, { a: [{ id: '1' }], typed: { a: '2' } }, []],
    ['a zone of its own name', { zones: [face] }, { zones: [face, ground] }, [['zones Ground', 'added', null, null]]],
    ['a zone that went', { zones: [face, ground] }, { zones: [ground] }, [['zones Face', 'removed', null, null]]],
    [
      'a share, whatever place its zone has now',
      { zones: [face, ground] },
      { zones: [{ ...ground, share_percent: 30 }] },
      [
        ['zones Face', 'removed', null, null],
        ['zones Ground share_percent', 'changed', 40, 30],
      ],
    ],
    [
      'zones that changed places',
      { zones: [face, ground] },
      { zones: [ground, face] },
      [['zones', 'moved', null, null]],
    ],
    ['the place in a list, which no one can read', { place: 1024 }, { place: 512 }, [['place', 'moved', null, null]]],
    ['another place of work', { place: 'indoors' }, { place: 'damp' }, [['place', 'changed', 'indoors', 'damp']]],
    [
      'flutes that were not there',
      { shape: {} },
      { shape: { fluting: { width_mm: 8 } } },
      [['shape fluting width_mm', 'changed', null, 8]],
    ],
    [
      'what a field points at, by its name',
      { zones: [face, ground], zoneId: face.id },
      { zones: [face, ground], zoneId: ground.id },
      [['zoneId', 'changed', 'Face', 'Ground']],
    ],
    ['a mark nobody knows', { pieceId: face.id }, { pieceId: ground.id }, [['pieceId', 'changed', null, null]]],
  ])('are %s', (_, before, after, changes) => {
    expect(told(before, after)).toEqual(changes);
  });

  it('are none where a thing was made or removed', () => {
    expect([fieldChanges(null, { name: 'A' }), fieldChanges({ name: 'A' }, null)]).toEqual([[], []]);
  });
});
