import type { MouldingShape } from '#shared/measure/moulding-shape';
import { memberEntry, type MemberEntry } from '../entries/member-entry';
import { ornamentEntry, pieces, run } from '../entries/ornament-entry';
import { classical } from '../entries/profile-entry';
import { partsOf, zoneEntry } from '../entries/zone-entry';
import { giltAbove, giltBelow, giltMatte } from './painted-plinth-finishes';

const upperProfile: MouldingShape['profile'] = [
  classical('bead', 'astragal', [10, 5]),
  classical('cavetto', 'cavetto', [22, 18]),
  classical('fillet', 'fillet', [6, 3]),
  classical('ovolo', 'ovolo', [14, 12]),
];

const lowerProfile: MouldingShape['profile'] = [
  classical('plinth', 'fillet', [30, 0]),
  classical('torus', 'torus', [26, 13]),
  classical('fillet', 'fillet', [5, 6], 'in'),
  classical('scotia', 'scotia', [20, 10], 'in'),
];

const curve = { form: 'arc', radius_mm: 609.6, angle_degrees: 180 } as const;
const ends = { form: 'straight', sides_mm: [304.8, 304.8], returns_mm: [40, 40] } as const;
const outside = { kind: 'moulding', measuredAt: 'back', facing: 'outward' } as const;

function upper(name: string, plan: MouldingShape['plan'], [run_mm, runs]: readonly [number, number]): MemberEntry {
  const carved = zoneEntry('Bead and reel', { ...partsOf('bead'), ...giltAbove, relief: 'low' });
  const hollow = zoneEntry('Hollow, matte', { ...partsOf('cavetto'), ...giltMatte });
  const rest = zoneEntry('Fillet and ovolo', { ...partsOf('fillet', 'ovolo'), ...giltAbove });
  const sweep = plan.form === 'arc' ? 'flat-sweep' : 'straight';
  return memberEntry(
    name,
    { ...outside, profile: upperProfile, plan },
    {
      zones: [carved, hollow, rest],
      ornaments: [
        ornamentEntry('bead-and-reel', run(run_mm, { runs }), {
          zone: carved,
          size_mm: 22,
          relief: 'low',
          plan: sweep,
        }),
        ornamentEntry('plain-moulding', run(run_mm, { runs }), { plan: sweep }),
      ],
    },
  );
}

function lower(name: string, plan: MouldingShape['plan'], [run_mm, runs]: readonly [number, number]): MemberEntry {
  const leaf = zoneEntry('Torus, bound leaves', { ...partsOf('torus'), ...giltBelow, relief: 'low' });
  const plain = zoneEntry('Plinth and hollow', { ...partsOf('plinth', 'fillet', 'scotia'), ...giltBelow });
  const sweep = plan.form === 'arc' ? 'flat-sweep' : 'straight';
  return memberEntry(
    name,
    { ...outside, profile: lowerProfile, plan },
    {
      zones: [leaf, plain],
      ornaments: [
        ornamentEntry('leaf-and-tongue', run(run_mm, { runs }), {
          zone: leaf,
          size_mm: 38,
          relief: 'low',
          plan: sweep,
        }),
        ornamentEntry('plain-moulding', run(run_mm, { runs }), { plan: sweep }),
      ],
    },
  );
}

function pilaster(): MemberEntry {
  const face = zoneEntry('Face, reeded', giltMatte);
  return memberEntry(
    'Pilaster strip',
    {
      kind: 'rectangle',
      length_mm: 228.6,
      height_mm: 62,
      fluting: { cut: 'reeds', width_mm: 9, depth_mm: 4.5, between_mm: 1, share_percent: 80 },
    },
    {
      count: 4,
      zones: [face],
      ornaments: [ornamentEntry('reeding', run(200, { runs: 5 }), { zone: face, relief: 'low' })],
    },
  );
}

function details(): MemberEntry[] {
  const patera = zoneEntry('Face', { ...giltAbove, relief: 'middle' });
  const drop = zoneEntry('Drop', giltAbove);
  const mask = zoneEntry('All over', { ...giltAbove, relief: 'in-the-round' });
  return [
    memberEntry(
      'Patera on the pilaster',
      { kind: 'boss', diameter_mm: 54, height_mm: 13 },
      { count: 4, zones: [patera], ornaments: [ornamentEntry('patera', pieces(1), { zone: patera, size_mm: 54 })] },
    ),
    memberEntry(
      'Drop below the pilaster',
      { kind: 'cone', bottomDiameter_mm: 14, topDiameter_mm: 9, height_mm: 18, ends: { top: false, bottom: true } },
      { count: 24, timberId: 'beech', zones: [drop], note: 'Six to a pilaster.' },
    ),
    memberEntry(
      'Mask of Flora',
      {
        kind: 'measured',
        area_mm2: 31_000,
        uncertainty_mm2: 3_000,
        note: 'Foil on the plaster model of the first plinth.',
        isTrueSurface: true,
      },
      {
        zones: [mask],
        ornaments: [
          ornamentEntry('mask', pieces(1), { zone: mask, size_mm: 120, relief: 'high', isUndercut: true }),
          ornamentEntry('trial-piece', pieces(1)),
        ],
      },
    ),
  ];
}

const halfRound_mm = 1915;
const end_mm = 304.8;

/** Mouldings, pilasters and carved details of the plinth. */
export const paintedPlinthMouldings = (): MemberEntry[] => [
  upper('Upper moulding, half round', curve, [halfRound_mm, 1]),
  upper('Upper moulding, ends', ends, [end_mm, 2]),
  lower('Lower moulding, half round', curve, [halfRound_mm, 1]),
  lower('Lower moulding, ends', ends, [end_mm, 2]),
  pilaster(),
  ...details(),
];
