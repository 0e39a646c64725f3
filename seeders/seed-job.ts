import { v7 as newId } from 'uuid';
import type { Actor } from '#shared/actor/actor';
import type { Change } from '#shared/estimates/change-schema';
import type { EstimateSettings } from '#shared/estimates/settings';
import type { App } from '../backend/src/app';
import { keptMembers, keptPieces, settingsOfJob } from './demonstration-draft';
import type { DemonstrationJob } from './demonstration-job';
import { seedPlan } from './seed-programme';
import { seedClientSide } from './seed-client-side';

interface Begun {
  readonly id: string;
  readonly settings: EstimateSettings;
}

async function openJob({ jobs, estimates }: App, actor: Actor, { client, job, title }: DemonstrationJob) {
  const [clientId, jobId] = [newId(), newId()];
  await jobs.clients.keep(actor, { id: clientId, version: 0 }, client);
  await jobs.service.keep(actor, { id: jobId, version: 0 }, { ...job, clientId });
  return estimates.drafts.begin(actor, { jobId, id: newId() }, { title, kind: 'estimate' });
}

/** Everything of a job as its estimator types it in. */
const entries = (job: DemonstrationJob, { id, settings }: Begun): Change[] => [
  { kind: 'settings', id, version: 1, content: settingsOfJob(job, settings) },
  ...keptPieces(job).map((piece): Change => ({ kind: 'piece', version: 0, ...piece })),
  ...keptMembers(job).map((member): Change => ({ kind: 'member', version: 0, ...member })),
];

function laterEntries(job: DemonstrationJob): Change[] {
  const changed = new Map(job.changedSince.map(({ id, content }) => [id, content]));
  return keptMembers(job)
    .filter(({ id }) => changed.has(id))
    .map(({ id, content }) => ({ kind: 'member', id, version: 1, content: { ...content, ...changed.get(id) } }));
}

async function issueFirst(app: App, actor: Actor, at: { id: string; job: DemonstrationJob }) {
  const { estimates } = app;
  const { job } = at;
  const { estimate } = await estimates.drafts.whole(actor.workshopId, at.id);
  const request = { version: estimate.version, note: job.issueNote, acceptsOldCard: false };
  const issue = await estimates.issues.issue(actor, at.id, request);
  if (job.stands !== 'issued') await seedClientSide(app, actor, { issueId: issue.id, jobId: estimate.jobId, job });
}

/** Enters a job with its client and estimate through the services, plans it, and brings its issue A to where it stands; answers the estimate's id. */
export async function seedJob(app: App, actor: Actor, job: DemonstrationJob): Promise<string> {
  const begun = await openJob(app, actor, job);
  await app.estimates.drafts.change(actor, begun.id, entries(job, begun));
  await seedPlan(app, actor, begun.id);
  await issueFirst(app, actor, { id: begun.id, job });
  if (job.stands === 'sent') await app.programme.holds.hold(actor, begun.id);
  const later = laterEntries(job);
  if (later.length > 0) await app.estimates.drafts.change(actor, begun.id, later);
  return begun.id;
}
