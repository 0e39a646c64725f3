import { memberEntry, type MemberEntry } from '../entries/member-entry';
import { ornamentEntry, pieces, run } from '../entries/ornament-entry';
import { classical, straight } from '../entries/profile-entry';
import { partsOf, shareOf, zoneEntry } from '../entries/zone-entry';
import { giltOnOil, painted, sealedSilver } from './cabinet-stand-finishes';

function topMoulding(): MemberEntry {
  const leaves = zoneEntry('Leaf and tongue', { ...partsOf('cyma'), ...giltOnOil, relief: 'low' });
  const bead = zoneEntry('Silver bead', { ...partsOf('bead'), ...sealedSilver });
  const rest = zoneEntry('Fillets and soffit', { ...partsOf('fillet', 'soffit', 'top-fillet'), ...giltOnOil });
  return memberEntry(
    'Moulding under the cabinet',
    {
      kind: 'moulding',
      profile: [
        classical('fillet', 'fillet', [4, 0]),
        classical('cyma', 'cyma-reversa', [26, 22]),
        straight('soffit', 8, 0),
        classical('bead', 'bead', [9, 4]),
        classical('top-fillet', 'fillet', [7, 3]),
      ],
      plan: { form: 'polygon', sides_mm: [1080, 520, 1080, 520], turns_degrees: [90, 90, 90, 90], closed: true },
      measuredAt: 'back',
      facing: 'outward',
    },
    {
      zones: [leaves, bead, rest],
      ornaments: [
        ornamentEntry('leaf-and-tongue', run(1096, { runs: 2, mitreLeaves: 2, mitreLeaf_mm: 20 }), { zone: leaves }),
        ornamentEntry('leaf-and-tongue', run(536, { runs: 2, mitreLeaves: 2, mitreLeaf_mm: 20 }), { zone: leaves }),
      ],
      note: 'The silver bead is laid last, after the gold has stood for two days.',
    },
  );
}

function frieze(): MemberEntry {
  const band = zoneEntry('Ribbon and stick', { ...giltOnOil, relief: 'low' });
  return memberEntry(
    'Frieze band',
    {
      kind: 'band',
      length: {
        by: 'parts',
        parts: [
          { part: 'straight', length_mm: 960 },
          { part: 'curve', radius_mm: 40, angle_degrees: 90 },
          { part: 'straight', length_mm: 400 },
          { part: 'curve', radius_mm: 40, angle_degrees: 90 },
          { part: 'straight', length_mm: 960 },
          { part: 'curve', radius_mm: 40, angle_degrees: 90 },
          { part: 'straight', length_mm: 400 },
          { part: 'curve', radius_mm: 40, angle_degrees: 90 },
        ],
      },
      height_mm: 56,
      closed: true,
      stretch_mm: 740,
    },
    {
      zones: [band],
      ornaments: [
        ornamentEntry('ribbon-and-stick', run(960, { runs: 2, centre_mm: 80 }), { zone: band, relief: 'low' }),
        ornamentEntry('ribbon-and-stick', run(400, { runs: 2 }), { zone: band, relief: 'low' }),
      ],
    },
  );
}

function bracket(): MemberEntry {
  const pierced = zoneEntry('Pierced leaf', { ...giltOnOil, relief: 'pierced' });
  return memberEntry(
    'Corner bracket',
    { kind: 'triangle', base_mm: 150, height_mm: 130 },
    {
      count: 8,
      zones: [pierced],
      ornaments: [ornamentEntry('acanthus-leaf', pieces(1), { zone: pierced, size_mm: 110, relief: 'pierced' })],
      note: 'Four and four, left and right; drawn once and turned over.',
    },
  );
}

function apronPlaque(): MemberEntry[] {
  const field = zoneEntry('Field', { ...sealedSilver, relief: 'low' });
  const rim = zoneEntry('Rim', { ...giltOnOil, relief: 'low' });
  return [
    memberEntry(
      'Round plaque',
      { kind: 'circle', diameter_mm: 118 },
      {
        count: 2,
        zones: [field],
        ornaments: [ornamentEntry('patera', pieces(1), { zone: field, size_mm: 110, relief: 'low' })],
      },
    ),
    memberEntry(
      'Rim of the plaque',
      { kind: 'ring', outerDiameter_mm: 150, innerDiameter_mm: 118 },
      {
        count: 2,
        zones: [rim],
        ornaments: [
          ornamentEntry('bead-and-reel', run(420), { zone: rim, relief: 'low', plan: 'quick-sweep', size_mm: 20 }),
        ],
      },
    ),
  ];
}

function innerFaces(): MemberEntry {
  const black = zoneEntry('Painted black', { ...shareOf(100), ...painted });
  return memberEntry(
    'Inner faces of the frame',
    { kind: 'rectangle', length_mm: 2960, height_mm: 90 },
    { timberId: 'poplar', zones: [black] },
  );
}

/** The frame the cabinet stands on. */
export const cabinetStandFrame = (): MemberEntry[] => [
  topMoulding(),
  frieze(),
  bracket(),
  ...apronPlaque(),
  innerFaces(),
];
