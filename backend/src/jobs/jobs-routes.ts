import { finishJob, keepJob, listJobs, readJob, removeJob } from '#shared/jobs/jobs-endpoints';
import { mount, type Route } from '../platform/http/mount';
import { presentJob } from './job-presenter';
import type { JobService } from './job-service';
import type { JobStateService } from './job-state-service';

interface Parts {
  readonly jobs: JobService;
  readonly states: JobStateService;
}

export const jobsRoutes = ({ jobs, states }: Parts): Route[] => [
  mount(listJobs, async ({ actor, query }) => {
    const page = await jobs.page(actor.workshopId, query);
    return { ...page, items: page.items.map(presentJob) };
  }),
  mount(readJob, async ({ actor, params }) => presentJob(await jobs.get(actor.workshopId, params.jobId))),
  mount(
    keepJob,
    async ({ actor, params, version, body }) => presentJob(await jobs.keep(actor, { id: params.jobId, version }, body)),
    presentJob,
  ),
  mount(
    finishJob,
    async ({ actor, params, version, body }) =>
      presentJob(await states.finish(actor, { id: params.jobId, version }, body.isFinished)),
    presentJob,
  ),
  mount(removeJob, ({ actor, params, version }) => jobs.remove(actor, { id: params.jobId, version }), presentJob),
];
