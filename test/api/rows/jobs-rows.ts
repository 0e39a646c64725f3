import type { MatrixRows } from '../matrix-row';
import { clientNamed, jobTitled, sampleClient, sampleJob } from '../sample-job';
import type { TestWorkshop } from '../start-api';

const seenOnce = { version: 1 };
const oneClient = async (workshop: TestWorkshop) => ({ params: { clientId: await sampleClient(workshop) } });
const oneJob = async (workshop: TestWorkshop) => ({ params: { jobId: await sampleJob(workshop) } });

export const jobsRows: MatrixRows = {
  listClients: {
    prepare: async (workshop) => {
      await sampleClient(workshop);
      return {};
    },
  },
  readClient: { prepare: oneClient },
  keepClient: {
    prepare: async (workshop) => ({
      ...(await oneClient(workshop)),
      ...seenOnce,
      body: clientNamed(`${workshop.mark} client, renamed`),
    }),
    history: 'history-client-changed',
  },
  removeClient: {
    prepare: async (workshop) => ({ ...(await oneClient(workshop)), ...seenOnce }),
    history: 'history-client-removed',
  },
  listJobs: {
    prepare: async (workshop) => {
      await sampleJob(workshop);
      return {};
    },
  },
  readJob: { prepare: oneJob },
  keepJob: {
    prepare: async (workshop) => ({
      ...(await oneJob(workshop)),
      ...seenOnce,
      body: jobTitled(`${workshop.mark} stand`, await sampleClient(workshop)),
    }),
    history: 'history-job-changed',
  },
  finishJob: {
    prepare: async (workshop) => ({ ...(await oneJob(workshop)), ...seenOnce, body: { isFinished: true } }),
    history: 'history-job-state',
  },
  removeJob: {
    prepare: async (workshop) => ({ ...(await oneJob(workshop)), ...seenOnce }),
    history: 'history-job-removed',
  },
};
