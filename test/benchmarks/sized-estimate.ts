import type { MemberOrnament, MemberContent, Zone } from '#shared/estimates/member';
import type { EstimateInput } from '#shared/estimates/estimate-figures';
import { startSettings } from '#shared/estimates/start-settings';
import type { Shape } from '#shared/measure/shape';
import { startCard } from '#shared/rate-cards/start-card';

/** What the members of a large job are made of, in turn. */
const shapes: readonly Shape[] = [
  { kind: 'rectangle', length_mm: 820, height_mm: 140 },
  {
    kind: 'moulding',
    profile: [
      { id: 'fillet', element: 'fillet', height_mm: 5, projection_mm: 0, going: 'out' },
      { id: 'ovolo', element: 'ovolo', height_mm: 20, projection_mm: 18, going: 'out' },
      { id: 'cavetto', element: 'cavetto', height_mm: 14, projection_mm: 12, going: 'out' },
    ],
    plan: { form: 'straight', sides_mm: [900, 450, 450], returns_mm: [] },
    measuredAt: 'back',
    facing: 'outward',
  },
  { kind: 'cabriole', length_mm: 640, girths_mm: [330, 290, 230, 190, 170, 180, 240] },
  { kind: 'boss', diameter_mm: 90, height_mm: 22 },
  { kind: 'band', length: { by: 'tape', length_mm: 2400 }, height_mm: 85, closed: true },
];

interface Finish {
  readonly buildUpId: string;
  readonly leafId: string | null;
}

const leafId = 'gold-23-5-loose';
const onWater: readonly Finish[] = [
  { buildUpId: 'water-burnished', leafId },
  { buildUpId: 'water-matte', leafId },
];
const onOil: Finish = { buildUpId: 'oil-3-hour', leafId };
const painted: Finish = { buildUpId: 'paint', leafId: null };
const ornaments = ['egg-and-dart', 'acanthus-leaf', 'rosette', 'bead-and-reel'] as const;

const zoneOf = (memberId: string, place: number, finish: Finish): Zone => ({
  id: `${memberId} zone ${place}`,
  name: `Zone ${place + 1}`,
  take: { way: 'share', share_percent: place === 2 ? 30 : 35 },
  relief: place === 0 ? 'middle' : 'low',
  finish: null,
  ...finish,
  laying: { way: 'proposed', strips: null, cuts: null },
  chosenStepIds: [],
  burnished_percent: null,
  painted_percent: 0,
  recutting: place === 0 ? 'plain' : null,
  protectedEdge_mm: 0,
  alternativeId: null,
});

const ornamentOf = (memberId: string, place: number, size_mm: number): MemberOrnament => ({
  id: `${memberId} ornament ${place}`,
  ornamentId: ornaments[place],
  extent:
    place === 0 || place === 3
      ? { way: 'run', run_mm: 800, runs: 1, mitreLeaf_mm: 20, mitreLeaves: 2, centre_mm: null }
      : { way: 'pieces', count: 3 },
  size_mm,
  relief: 'middle',
  isUndercut: place === 1,
  plan: 'straight',
  isMirrored: false,
  joinsLearning: false,
  hasOwnPattern: false,
  zoneId: `${memberId} zone ${place % 3}`,
  alternativeId: null,
});

const sizes_mm = [28, 115, 62, 26] as const;

function memberOf(place: number): MemberContent & { readonly id: string } {
  const id = `member ${place}`;
  return {
    id,
    pieceId: `piece ${Math.floor(place / 20)}`,
    place,
    name: `Member ${place + 1}`,
    count: 1 + (place % 3),
    timberId: 'lime',
    shape: shapes[place % shapes.length],
    openings: [],
    zones: [...onWater, place % 2 === 0 ? onOil : painted].map((finish, zone) => zoneOf(id, zone, finish)),
    ornaments: sizes_mm.map((size_mm, ornament) => ornamentOf(id, ornament, size_mm + (place % 7))),
    lot: '',
    note: '',
    typed: {},
    alternativeId: null,
  };
}

/** An estimate of so many members, each with three zones and four ornaments, twenty to a piece, on the start card. */
export function sizedEstimate(members: number): EstimateInput {
  const settings = startSettings(startCard, { title: 'Large job', seed: 7, restoration: false, stageIds: [] });
  const pieces = Array.from({ length: Math.ceil(members / 20) }, (_, place) => ({
    ...{ id: `piece ${place}`, name: `Piece ${place + 1}`, place, note: '' },
  }));
  const draft = { settings, pieces, members: Array.from({ length: members }, (_, place) => memberOf(place)) };
  return { draft, choice: [], card: startCard, currency: 'EUR' };
}
