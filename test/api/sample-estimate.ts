import { v7 as newId } from 'uuid';
import { beginEstimate, changeEstimate } from '#shared/estimates/estimates-endpoints';
import type { Change } from '#shared/estimates/change-schema';
import type { MemberContent, MemberOrnament, Zone } from '#shared/estimates/member';
import { sampleJob } from './sample-job';
import type { TestWorkshop } from './start-api';

const sampleZone = (id: string): Zone => ({
  id,
  name: 'Face',
  take: { way: 'share', share_percent: 100 },
  relief: 'middle',
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
});

const sampleRun = (zoneId: string): MemberOrnament => ({
  id: newId(),
  ornamentId: 'egg-and-dart',
  extent: { way: 'run', run_mm: 1200, runs: 1, mitreLeaf_mm: 0, mitreLeaves: 0, centre_mm: null },
  size_mm: null,
  relief: 'middle',
  isUndercut: false,
  plan: 'straight',
  isMirrored: false,
  joinsLearning: false,
  hasOwnPattern: false,
  zoneId,
  alternativeId: null,
});

/** A gilt frieze with one zone and one carved run, as an estimator would enter it. */
export function sampleMember(pieceId: string, name: string): MemberContent {
  const zone = sampleZone(newId());
  return {
    ...{ pieceId, place: 1, name, count: 2, timberId: 'lime' },
    shape: { kind: 'rectangle', length_mm: 1200, height_mm: 150 },
    openings: [],
    zones: [zone],
    ornaments: [sampleRun(zone.id)],
    ...{ lot: '', note: '', typed: {}, alternativeId: null },
  };
}

export interface SampleEstimate {
  readonly jobId: string;
  readonly estimateId: string;
  readonly pieceId: string;
  readonly memberId: string;
  readonly member: MemberContent;
}

async function done(call: PromiseLike<{ status: number; text: string }>): Promise<void> {
  const response = await call;
  if (response.status >= 300) throw new Error(`the sample could not be made: ${response.status} ${response.text}`);
}

/** The changes that enter one piece with one member. */
export const sampleChanges = ({ pieceId, memberId, member }: SampleEstimate, mark: string): Change[] => [
  { kind: 'piece', id: pieceId, version: 0, content: { name: `${mark} table`, place: 1, note: '' } },
  { kind: 'member', id: memberId, version: 0, content: member },
];

/** A job with an estimate of one piece and one member. */
export async function sampleEstimate(workshop: TestWorkshop): Promise<SampleEstimate> {
  const { visitor } = workshop.people.owner;
  const jobId = await sampleJob(workshop);
  const [estimateId, pieceId, memberId] = [newId(), newId(), newId()];
  const sample = { jobId, estimateId, pieceId, memberId, member: sampleMember(pieceId, `${workshop.mark} frieze`) };
  await done(
    visitor.call(beginEstimate, { params: { jobId, estimateId }, body: { title: `${workshop.mark} estimate` } }),
  );
  const changes = sampleChanges(sample, workshop.mark);
  await done(visitor.call(changeEstimate, { params: { estimateId }, body: { changes } }));
  return sample;
}
