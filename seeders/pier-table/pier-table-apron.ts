import { v7 as newId } from 'uuid';
import { memberEntry, type MemberEntry } from '../entries/member-entry';
import { ornamentEntry, pieces, run, squareDecimetres } from '../entries/ornament-entry';
import { classical } from '../entries/profile-entry';
import { partsOf, shareOf, zoneEntry } from '../entries/zone-entry';
import { burnished, burnishedAndMatte, matte, tonedBack } from './pier-table-finishes';

function frontApron(): MemberEntry {
  const carving = zoneEntry('Acanthus scrolls', {
    ...shareOf(60),
    ...burnishedAndMatte,
    relief: 'high',
    recutting: 'plain',
  });
  const ground = zoneEntry('Ground', { ...shareOf(40), ...matte, relief: 'low', recutting: 'plain' });
  return memberEntry(
    'Front apron',
    { kind: 'rectangle', length_mm: 1244.6, height_mm: 152.4 },
    {
      zones: [carving, ground],
      ornaments: [
        ornamentEntry('acanthus-leaf', pieces(3), { zone: carving, size_mm: 100 }),
        ornamentEntry('acanthus-leaf', pieces(3), {
          zone: carving,
          size_mm: 100,
          isMirrored: true,
          joinsLearning: true,
        }),
        ornamentEntry('rosette', pieces(2), { zone: carving, size_mm: 56 }),
        ornamentEntry('plain-ground-lowered', squareDecimetres(7.2), { zone: ground, relief: 'low' }),
      ],
      openings: [{ id: newId(), shape: { kind: 'ellipse', length_mm: 140, height_mm: 90 }, count: 1 }],
      typed: { 'shape.length_mm': '49 in', 'shape.height_mm': '6 in' },
      note: 'The oval opening is where the shell is let in.',
    },
  );
}

function sideApron(): MemberEntry {
  const carving = zoneEntry('Leaves and rosette', {
    ...shareOf(60),
    ...burnishedAndMatte,
    relief: 'high',
    recutting: 'plain',
  });
  const ground = zoneEntry('Ground', { ...shareOf(40), ...matte, relief: 'low', recutting: 'plain' });
  return memberEntry(
    'Side apron',
    { kind: 'rectangle', length_mm: 355.6, height_mm: 152.4 },
    {
      count: 2,
      zones: [carving, ground],
      ornaments: [
        ornamentEntry('acanthus-leaf', pieces(2), { zone: carving, size_mm: 80 }),
        ornamentEntry('rosette', pieces(1), { zone: carving, size_mm: 56 }),
        ornamentEntry('plain-ground-lowered', squareDecimetres(1.8), { zone: ground, relief: 'low' }),
      ],
      typed: { 'shape.length_mm': '14 in', 'shape.height_mm': '6 in' },
    },
  );
}

function shell(): MemberEntry {
  const face = zoneEntry('Face', { ...burnishedAndMatte, relief: 'in-the-round', recutting: 'plain' });
  return memberEntry(
    'Shell at the centre',
    {
      kind: 'measured',
      area_mm2: 36_000,
      uncertainty_mm2: 4_000,
      note: 'Foil pressed over the full-size drawing in clay, then weighed.',
      isTrueSurface: true,
    },
    {
      zones: [face],
      ornaments: [
        ornamentEntry('clay-model', pieces(1)),
        ornamentEntry('shell', pieces(1), { zone: face, size_mm: 100, relief: 'high', isUndercut: true }),
      ],
    },
  );
}

function swag(): MemberEntry {
  const whole = zoneEntry('All over', { ...burnishedAndMatte, relief: 'in-the-round', recutting: 'plain' });
  return memberEntry(
    'Swag below the apron',
    {
      kind: 'measured',
      area_mm2: 24_000,
      uncertainty_mm2: 4_000,
      note: 'Strips of paper over the drawing at full size.',
      isTrueSurface: true,
    },
    {
      count: 2,
      zones: [whole],
      ornaments: [ornamentEntry('swag', pieces(1), { zone: whole, size_mm: 200, relief: 'high' })],
    },
  );
}

function topMoulding(): MemberEntry {
  const enriched = zoneEntry('Egg and dart', {
    ...partsOf('ovolo'),
    ...burnished,
    relief: 'middle',
    recutting: 'plain',
    laying: { way: 'patches', strips: null, cuts: 2 },
  });
  const plain = zoneEntry('Fillets and cavetto', { ...partsOf('fillet', 'cavetto', 'top-fillet'), ...matte });
  return memberEntry(
    'Moulding under the marble',
    {
      kind: 'moulding',
      profile: [
        classical('fillet', 'fillet', [5, 0]),
        classical('ovolo', 'ovolo', [24, 20]),
        classical('cavetto', 'cavetto', [12, 10]),
        classical('top-fillet', 'fillet', [6, 3]),
      ],
      plan: { form: 'polygon', sides_mm: [508, 1397, 508], turns_degrees: [90, 90], closed: false },
      measuredAt: 'back',
      facing: 'outward',
    },
    {
      zones: [enriched, plain],
      ornaments: [
        ornamentEntry('egg-and-dart', run(1417, { mitreLeaves: 2, mitreLeaf_mm: 22, centre_mm: 34 }), {
          zone: enriched,
        }),
        ornamentEntry('egg-and-dart', run(518, { runs: 2, mitreLeaves: 1, mitreLeaf_mm: 22 }), { zone: enriched }),
        ornamentEntry('plain-moulding', run(2413)),
      ],
      typed: { 'shape.plan.sides_mm.0': '20 in', 'shape.plan.sides_mm.1': '55 in', 'shape.plan.sides_mm.2': '20 in' },
    },
  );
}

function lowerBead(): MemberEntry {
  const bead = zoneEntry('Bead', { ...burnished, relief: 'low', finish: 'carved' });
  return memberEntry(
    'Bead along the apron',
    {
      kind: 'moulding',
      profile: [classical('bead', 'bead', [12, 6])],
      plan: { form: 'straight', sides_mm: [1244.6, 355.6, 355.6], returns_mm: [] },
      measuredAt: 'back',
      facing: 'outward',
    },
    {
      zones: [bead],
      ornaments: [
        ornamentEntry('bead-and-reel', run(1244.6), { zone: bead, size_mm: 24 }),
        ornamentEntry('bead-and-reel', run(355.6, { runs: 2 }), { zone: bead, size_mm: 24 }),
      ],
      typed: { 'shape.plan.sides_mm.0': '49 in', 'shape.plan.sides_mm.1': '14 in', 'shape.plan.sides_mm.2': '14 in' },
    },
  );
}

function frieze(): MemberEntry {
  const band = zoneEntry('Guilloche', { ...burnishedAndMatte, relief: 'low', recutting: 'plain' });
  return memberEntry(
    'Guilloche band',
    { kind: 'rectangle', length_mm: 1244.6, height_mm: 63.5 },
    {
      zones: [band],
      ornaments: [ornamentEntry('guilloche', run(1244.6, { centre_mm: 44.6 }), { zone: band, relief: 'low' })],
      typed: { 'shape.length_mm': '49 in', 'shape.height_mm': '2 1/2 in' },
    },
  );
}

function backRail(): MemberEntry {
  const face = zoneEntry('Towards the wall', tonedBack);
  return memberEntry(
    'Back rail',
    { kind: 'rectangle', length_mm: 1244.6, height_mm: 76.2 },
    { timberId: 'poplar', zones: [face], typed: { 'shape.length_mm': '49 in', 'shape.height_mm': '3 in' } },
  );
}

/** Aprons, their mouldings and what hangs from them. */
export const pierTableApron = (): MemberEntry[] => [
  frontApron(),
  sideApron(),
  shell(),
  swag(),
  topMoulding(),
  lowerBead(),
  frieze(),
  backRail(),
];
