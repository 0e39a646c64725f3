import type { OrnamentExtent } from '#shared/carving/ornament-use';
import type { Draft } from '#shared/estimates/draft';
import type { Member, MemberOrnament, Zone } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';
import { startSettings } from '#shared/estimates/start-settings';
import { shapeDefaults } from '#shared/measure/shape-defaults';
import { startCard } from '#shared/rate-cards/start-card';

export const zone = (id: string, rest: Partial<Zone> = {}): Zone => ({
  id,
  name: 'All',
  take: { way: 'share', share_percent: 100 },
  relief: 'flat',
  finish: null,
  buildUpId: 'water-burnished',
  leafId: 'gold-23-5-loose',
  laying: { way: 'proposed', strips: null, cuts: null },
  chosenStepIds: [],
  burnished_percent: null,
  painted_percent: 0,
  recutting: null,
  protectedEdge_mm: 0,
  alternativeId: null,
  ...rest,
});

export const ornament = (
  id: string,
  ornamentId: string,
  rest: Partial<MemberOrnament> & Pick<MemberOrnament, 'extent'>,
): MemberOrnament => ({
  id,
  ornamentId,
  size_mm: null,
  relief: 'middle',
  isUndercut: false,
  plan: 'straight',
  isMirrored: false,
  joinsLearning: false,
  hasOwnPattern: false,
  zoneId: null,
  alternativeId: null,
  ...rest,
});

export const pieces = (count: number): OrnamentExtent => ({ way: 'pieces', count });

export const run = (run_mm: number): OrnamentExtent => ({
  way: 'run',
  run_mm,
  runs: 1,
  mitreLeaf_mm: 0,
  mitreLeaves: 0,
  centre_mm: null,
});

export const member = (id: string, rest: Partial<Member> & Pick<Member, 'name' | 'shape'>): Member => ({
  id,
  pieceId: 'piece-1',
  place: 0,
  count: 1,
  timberId: 'lime',
  openings: [],
  zones: [zone(`${id}-zone`)],
  ornaments: [],
  lot: '',
  note: '',
  typed: {},
  alternativeId: null,
  ...rest,
});

const stageIds = ['stage-1', 'stage-2', 'stage-3'];

export const settings = (rest: Partial<EstimateSettings> = {}): EstimateSettings => ({
  ...startSettings(startCard, { title: 'Pier table, paired herons', seed: 20_260, restoration: false, stageIds }),
  introduction:
    'Thank you for showing us the room. We propose a base in lime, carved and water gilt, to carry your marble.',
  included: 'Carving, ground, gilding and toning as described.\nOne sample board of the finish.',
  excluded: 'The marble top, its transport and the structural check of the whole.',
  terms:
    'Work begins when the deposit has come in and the drawing is approved.\nThe piece remains ours until it is paid.',
  ...rest,
});

const topEdge = member('edge', {
  name: 'Top edge',
  shape: {
    kind: 'moulding',
    profile: [
      { id: 'fillet-1', element: 'fillet', height_mm: 12, projection_mm: 0, going: 'out' },
      { id: 'ovolo-1', element: 'ovolo', height_mm: 30, projection_mm: 30, going: 'out' },
      { id: 'fillet-2', element: 'fillet', height_mm: 5, projection_mm: 3, going: 'out' },
    ],
    plan: { form: 'polygon', sides_mm: [480, 1900, 480], turns_degrees: [90, 90], closed: false },
    measuredAt: 'back',
    facing: 'outward',
  },
  zones: [
    zone('edge-ovolo', {
      name: 'Ovolo',
      take: { way: 'parts', parts: ['ovolo-1'] },
      relief: 'middle',
      recutting: 'plain',
    }),
    zone('edge-fillets', {
      name: 'Fillets',
      take: { way: 'parts', parts: ['fillet-1', 'fillet-2'] },
      buildUpId: 'water-matte',
    }),
  ],
  ornaments: [ornament('edge-egg', 'egg-and-dart', { extent: run(2860), zoneId: 'edge-ovolo' })],
});

const leg = member('leg', {
  name: 'Leg, heron',
  shape: shapeDefaults('cabriole'),
  count: 4,
  zones: [zone('leg-all', { relief: 'high', laying: { way: 'patches', strips: null, cuts: null } })],
  ornaments: [
    ornament('leg-block', 'leg-from-block', { extent: pieces(1) }),
    ornament('leg-leaf', 'acanthus-leaf', { extent: pieces(2), isUndercut: true, zoneId: 'leg-all' }),
  ],
});

const stretcher = member('stretcher', {
  name: 'Stretcher',
  shape: shapeDefaults('turned'),
  count: 2,
  zones: [zone('stretcher-all', { buildUpId: 'oil-12-hour', leafId: 'gold-22-loose' })],
  ornaments: [ornament('stretcher-bead', 'bead-and-reel', { extent: run(700) })],
});

/** A base of three members: a moulded top edge with egg and dart, carved legs, a stretcher in oil gilding. */
export const smallDraft = (rest: Partial<EstimateSettings> = {}): Draft => ({
  settings: settings(rest),
  pieces: [{ id: 'piece-1', name: 'Pier table', place: 0, note: '' }],
  members: [topEdge, leg, stretcher],
});

const shapes = ['moulding', 'cabriole', 'turned', 'straight-leg', 'rectangle', 'bun-foot', 'band', 'box'] as const;

function longMember(index: number, pieceId: string): Member {
  const id = `member-${index + 1}`;
  const share = (share_percent: number) => ({ take: { way: 'share', share_percent } }) as const;
  return member(id, {
    name: `Element ${index + 1}, ąćęłńóśźż`,
    shape: shapeDefaults(shapes[index % shapes.length]),
    pieceId,
    count: 1 + (index % 3),
    timberId: index % 4 === 0 ? 'oak' : 'lime',
    zones: [
      zone(`${id}-a`, { name: 'Highs', ...share(50), relief: 'middle' }),
      zone(`${id}-b`, { name: 'Grounds', ...share(30), buildUpId: 'water-matte' }),
      zone(`${id}-c`, { name: 'Back', ...share(20), buildUpId: 'oil-quick', leafId: 'gold-22-loose' }),
    ],
    ornaments: [
      ornament(`${id}-o`, index % 2 === 0 ? 'acanthus-leaf' : 'rosette', {
        extent: pieces(1 + (index % 5)),
        zoneId: `${id}-a`,
      }),
      ornament(`${id}-r`, 'bead-and-reel', { extent: run(600 + 7 * index), zoneId: `${id}-a` }),
    ],
  });
}

/** A draft as long as wanted: members of all sorts of shapes, three zones each in three build-ups. */
export const longDraft = (members: number, rest: Partial<EstimateSettings> = {}): Draft => ({
  settings: settings({ title: 'Długa praca: żyrandole i konsole, część pierwsza', ...rest }),
  pieces: [
    { id: 'piece-1', name: 'Konsola złocona', place: 0, note: '' },
    { id: 'piece-2', name: 'Cabinet stand', place: 1, note: '' },
  ],
  members: Array.from({ length: members }, (_, index) =>
    longMember(index, index < members / 2 ? 'piece-1' : 'piece-2'),
  ),
});
