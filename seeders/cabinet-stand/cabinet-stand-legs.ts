import type { Alternative } from '#shared/estimates/settings';
import { alternativeEntry } from '../entries/alternative-entry';
import { memberEntry, type MemberEntry } from '../entries/member-entry';
import { ornamentEntry, pieces, run } from '../entries/ornament-entry';
import { classical, straight } from '../entries/profile-entry';
import { partsOf, zoneEntry } from '../entries/zone-entry';
import { giltOnOil, sealedSilver, whiteGold } from './cabinet-stand-finishes';

const noEnds = { top: false, bottom: false };

function frontLeg(): MemberEntry {
  const shaft = zoneEntry('Fluted shaft', { ...partsOf('shaft', 'neck'), ...giltOnOil, relief: 'low' });
  const turnings = zoneEntry('Base and cap', { ...partsOf('base', 'hollow', 'cap'), ...giltOnOil });
  const bead = zoneEntry('Silver bead', { ...partsOf('bead'), ...sealedSilver });
  return memberEntry(
    'Turned leg, front',
    {
      kind: 'turned',
      radius_mm: 30,
      profile: [
        classical('base', 'torus', [22, 9]),
        classical('hollow', 'scotia', [18, 6], 'in'),
        classical('bead', 'bead', [8, 4]),
        straight('shaft', 10, 480),
        classical('neck', 'fillet', [5, 2]),
        classical('cap', 'ovolo', [22, 14]),
      ],
      ends: noEnds,
    },
    {
      count: 4,
      timberId: 'beech',
      zones: [shaft, turnings, bead],
      ornaments: [
        ornamentEntry('fluting', run(440, { runs: 12 }), { zone: shaft, relief: 'low', plan: 'quick-sweep' }),
      ],
    },
  );
}

function backLeg(): MemberEntry {
  const faces = zoneEntry('All faces', giltOnOil);
  return memberEntry(
    'Octagonal leg, back',
    { kind: 'straight-leg', section: 'octagonal', length_mm: 560, top_mm: 64, foot_mm: 48, ends: noEnds },
    { count: 2, timberId: 'beech', zones: [faces] },
  );
}

function stretchers(): MemberEntry[] {
  const twist = zoneEntry('Twist', giltOnOil);
  const ribbon = zoneEntry('Silver ribbon', sealedSilver);
  return [
    memberEntry(
      'Twisted stretcher',
      {
        kind: 'twisted',
        section: { outline: 'lobed', radius_mm: 17, depth_mm: 9, lobes: 2 },
        length_mm: 470,
        turns: 5,
        hand: 'right',
      },
      {
        count: 4,
        timberId: 'beech',
        zones: [twist],
        note: 'Two right-handed, two left-handed; cut on a jig from the round.',
      },
    ),
    memberEntry(
      'Ribbon round the middle stretcher',
      { kind: 'helicoid', radius_mm: 24, coreRadius_mm: 16, risePerTurn_mm: 92, turns: 8, hand: 'right' },
      {
        timberId: 'beech',
        zones: [ribbon],
        ornaments: [ornamentEntry('jig', pieces(1))],
        note: 'The jig for the twist serves this one too.',
      },
    ),
  ];
}

function feet(): MemberEntry[] {
  const bun = zoneEntry('Bun', { ...giltOnOil, relief: 'middle' });
  const ring = zoneEntry('Ring', sealedSilver);
  return [
    memberEntry(
      'Bun foot',
      { kind: 'bun-foot', diameter_mm: 88, height_mm: 62, cutTop_mm: 7, cutBottom_mm: 5, ends: noEnds },
      {
        count: 6,
        timberId: 'beech',
        zones: [bun],
        ornaments: [ornamentEntry('gadroon', pieces(14), { zone: bun, size_mm: 20, plan: 'quick-sweep' })],
      },
    ),
    memberEntry(
      'Ring above the foot',
      { kind: 'torus', centreDiameter_mm: 62, sectionDiameter_mm: 9 },
      { count: 6, timberId: 'beech', zones: [ring] },
    ),
  ];
}

/** Rosettes and balls in silver, and the same in white gold, which keeps its colour better. */
function silverDetails(): { members: MemberEntry[]; alternative: Alternative } {
  const rosette = zoneEntry('Rosette', { ...sealedSilver, relief: 'middle' });
  const ball = zoneEntry('Ball', sealedSilver);
  const alternative = alternativeEntry('Rosettes and balls in white gold', {
    group: 'White metal',
    note: 'Twelve carat, sealed as silver is; a warmer white, and slower to dull should the seal wear.',
    replaces: [rosette.id, ball.id],
  });
  const instead = { ...whiteGold, alternativeId: alternative.id };
  const members = [
    memberEntry(
      'Rosette on the leg',
      { kind: 'boss', diameter_mm: 58, height_mm: 14 },
      {
        count: 8,
        zones: [rosette, zoneEntry('Rosette, white gold', { ...instead, relief: 'middle' })],
        ornaments: [ornamentEntry('rosette', pieces(1), { zone: rosette, size_mm: 58 })],
      },
    ),
    memberEntry(
      'Ball finial',
      { kind: 'sphere', diameter_mm: 46 },
      { count: 4, timberId: 'beech', zones: [ball, zoneEntry('Ball, white gold', instead)] },
    ),
  ];
  return { members, alternative };
}

/** Legs, stretchers and feet of the cabinet stand, with another way of doing the white metal. */
export function cabinetStandLegs(): { members: MemberEntry[]; alternatives: Alternative[] } {
  const { members, alternative } = silverDetails();
  return { members: [frontLeg(), backLeg(), ...stretchers(), ...feet(), ...members], alternatives: [alternative] };
}
