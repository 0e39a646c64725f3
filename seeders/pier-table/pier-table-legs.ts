import type { Alternative } from '#shared/estimates/settings';
import { alternativeEntry } from '../entries/alternative-entry';
import { memberEntry, type MemberEntry } from '../entries/member-entry';
import { ornamentEntry, pieces, run, squareDecimetres } from '../entries/ornament-entry';
import { shareOf, zoneEntry } from '../entries/zone-entry';
import { burnished, burnishedAndMatte, matte, sealed, tonedBack } from './pier-table-finishes';

function frontLeg(): MemberEntry {
  const shaft = zoneEntry('Shaft and scroll', { ...shareOf(50), ...matte, relief: 'middle', recutting: 'plain' });
  const knee = zoneEntry('Knee, acanthus', {
    ...shareOf(50),
    ...burnishedAndMatte,
    relief: 'middle',
    recutting: 'plain',
  });
  return memberEntry(
    'Front leg',
    { kind: 'cabriole', length_mm: 736.6, girths_mm: [420, 410, 345, 285, 250, 245, 310] },
    {
      count: 2,
      zones: [shaft, knee],
      ornaments: [
        ornamentEntry('leg-from-block', pieces(1)),
        ornamentEntry('acanthus-leaf', pieces(1), { zone: knee, size_mm: 140 }),
        ornamentEntry('acanthus-leaf', pieces(2), { zone: knee, size_mm: 80, isMirrored: true, joinsLearning: true }),
        ornamentEntry('husk', pieces(3), { zone: shaft, size_mm: 40 }),
      ],
      typed: { 'shape.length_mm': '29 in' },
      note: 'Left and right are a pair; girths taken with a paper strip at seven stations.',
    },
  );
}

/** The back legs as they are priced, and the cheaper way: nobody sees them but from the side. */
function backLeg(): { member: MemberEntry; alternative: Alternative } {
  const gilt = zoneEntry('All faces, fluted', { ...matte, relief: 'low', recutting: 'plain' });
  const alternative = alternativeEntry('Back legs toned, not gilt', {
    note: 'The back legs are sized and washed with ochre; the fluting stays.',
    replaces: [gilt.id],
  });
  const toned = zoneEntry('All faces, toned', { ...tonedBack, relief: 'low', alternativeId: alternative.id });
  const member = memberEntry(
    'Back leg',
    {
      kind: 'straight-leg',
      section: 'square',
      length_mm: 736.6,
      top_mm: 70,
      foot_mm: 46,
      ends: { top: false, bottom: false },
    },
    {
      count: 2,
      zones: [gilt, toned],
      ornaments: [ornamentEntry('fluting', run(480, { runs: 2 }), { zone: gilt, relief: 'low' })],
      typed: { 'shape.length_mm': '29 in' },
    },
  );
  return { member, alternative };
}

function legBlock(): MemberEntry {
  const faces = zoneEntry('Faces, sunk panel', { ...burnished, relief: 'low', recutting: 'plain' });
  return memberEntry(
    'Leg block',
    {
      kind: 'box',
      length_mm: 82,
      depth_mm: 82,
      height_mm: 96,
      faces: { top: false, bottom: false, front: true, back: false, left: true, right: true },
    },
    {
      count: 4,
      zones: [faces],
      ornaments: [ornamentEntry('plain-ground-lowered', squareDecimetres(0.6), { zone: faces, relief: 'low' })],
      note: 'Dry-fit the marble before the size coat.',
    },
  );
}

function patera(): MemberEntry {
  const face = zoneEntry('Face', { ...burnishedAndMatte, relief: 'middle', recutting: 'plain' });
  return memberEntry(
    'Patera on the block',
    { kind: 'boss', diameter_mm: 64, height_mm: 15 },
    { count: 4, zones: [face], ornaments: [ornamentEntry('patera', pieces(1), { zone: face, size_mm: 64 })] },
  );
}

function foot(): MemberEntry {
  const ball = zoneEntry('Ball, reeded below', { ...burnished, relief: 'low', finish: 'carved', ...sealed });
  return memberEntry(
    'Ball foot',
    { kind: 'ball-foot', diameter_mm: 82, cutTop_mm: 9, cutBottom_mm: 5, ends: { top: false, bottom: false } },
    {
      count: 4,
      zones: [ball],
      ornaments: [ornamentEntry('reeding', run(40, { runs: 16 }), { zone: ball, relief: 'low', plan: 'quick-sweep' })],
    },
  );
}

/** Legs, blocks and feet of the pier-table base, with another way of doing them. */
export function pierTableLegs(): { members: MemberEntry[]; alternatives: Alternative[] } {
  const { member, alternative } = backLeg();
  return { members: [frontLeg(), member, legBlock(), patera(), foot()], alternatives: [alternative] };
}
