import type { Draft } from '#shared/estimates/draft';
import type { Member, MemberOrnament, Zone } from '#shared/estimates/member';
import type { EstimateSettings } from '#shared/estimates/settings';
import { startSettings } from '#shared/estimates/start-settings';
import { startCard } from '#shared/rate-cards/start-card';

/** The whole face of a member, water gilt and burnished, with what a check changes; for specs only. */
export const zoneEntryForSpecs = (given: Partial<Zone> = {}): Zone => ({
  id: 'zone',
  name: 'Face',
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
  ...given,
});

/** One rosette at its reference size, with what a check changes; for specs only. */
export const ornamentForSpecs = (given: Partial<MemberOrnament> = {}): MemberOrnament => ({
  id: 'ornament',
  ornamentId: 'rosette',
  extent: { way: 'pieces', count: 1 },
  size_mm: null,
  relief: 'middle',
  isUndercut: false,
  plan: 'straight',
  isMirrored: false,
  joinsLearning: false,
  hasOwnPattern: false,
  zoneId: null,
  alternativeId: null,
  ...given,
});

/** A plain panel of a quarter of a square metre with one zone, with what a check changes; for specs only. */
export const memberForSpecs = (given: Partial<Member> = {}): Member => ({
  id: 'member',
  pieceId: 'piece',
  place: 0,
  name: 'Panel',
  count: 1,
  timberId: 'lime',
  shape: { kind: 'rectangle', length_mm: 500, height_mm: 500 },
  openings: [],
  zones: [zoneEntryForSpecs()],
  ornaments: [],
  lot: '',
  note: '',
  typed: {},
  alternativeId: null,
  ...given,
});

/** A draft of these members in one piece on the start card, with what a check changes of its settings; for specs only. */
export function draftForSpecs(members: readonly Member[], settings: Partial<EstimateSettings> = {}): Draft {
  const begun = startSettings(startCard, { title: 'Base', seed: 1, restoration: false, stageIds: [] });
  const pieces = [{ id: 'piece', name: 'Base', place: 0, note: '' }];
  return { settings: { ...begun, ...settings }, pieces, members };
}
