import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import type { MatrixRows } from '../matrix-row';
import { sampleIssue } from '../sample-client-visit';
import { sampleEstimate, type SampleEstimate } from '../sample-estimate';
import { sampleJob } from '../sample-job';
import type { Api, TestWorkshop } from '../start-api';

const oneEstimate = async (workshop: TestWorkshop) => {
  const { estimateId } = await sampleEstimate(workshop);
  return { params: { estimateId } };
};

async function versionOf(workshop: TestWorkshop, api: Api, estimateId: string): Promise<number> {
  return (await api.app.estimates.drafts.whole(workshop.id, estimateId)).estimate.version;
}

async function issuing(workshop: TestWorkshop, api: Api, { estimateId }: SampleEstimate) {
  const version = await versionOf(workshop, api, estimateId);
  return { params: { estimateId }, body: { version, note: workshop.mark, acceptsOldCard: false }, key: randomUUID() };
}

const oneIssue = async (workshop: TestWorkshop, api: Api) => ({
  params: { issueId: (await sampleIssue(workshop, api)).issueId },
});

export const estimatesRows: MatrixRows = {
  listEstimates: { prepare: async (workshop) => ({ params: { jobId: (await sampleEstimate(workshop)).jobId } }) },
  beginEstimate: {
    prepare: async (workshop) => ({
      params: { jobId: await sampleJob(workshop), estimateId: newId() },
      body: { title: `${workshop.mark} estimate` },
    }),
    history: 'history-estimate-begun',
  },
  readEstimate: { prepare: oneEstimate },
  changeEstimate: {
    prepare: async (workshop) => {
      const { estimateId, memberId, member } = await sampleEstimate(workshop);
      const content = { ...member, name: `${workshop.mark} rail` };
      return { params: { estimateId }, body: { changes: [{ kind: 'member', id: memberId, version: 1, content }] } };
    },
    history: 'history-member-changed',
  },
  takeRateCard: {
    prepare: async (workshop, api) => {
      const { estimateId } = await sampleEstimate(workshop);
      const { rateCardId } = (await api.app.estimates.drafts.whole(workshop.id, estimateId)).estimate;
      return { params: { estimateId }, body: { rateCardId }, version: await versionOf(workshop, api, estimateId) };
    },
    history: 'history-card-taken',
  },
  readAlternatives: { prepare: oneEstimate },
  tellPresence: { prepare: oneEstimate },
  listIssues: { prepare: oneEstimate },
  issueEstimate: {
    prepare: async (workshop, api) => issuing(workshop, api, await sampleEstimate(workshop)),
    history: 'history-issued',
  },
  readDifferences: { prepare: oneEstimate },
  readIssue: { prepare: oneIssue },
  markIssue: {
    prepare: async (workshop, api) => ({
      ...(await oneIssue(workshop, api)),
      body: { state: 'sent', day: await api.app.rateCards.service.today(workshop.id), note: workshop.mark },
    }),
    history: 'history-issue-sent',
    entries: 2,
  },
  readPaper: {
    prepare: async (workshop, api) => {
      const { params } = await oneIssue(workshop, api);
      return { params: { ...params, paper: 'estimate.pdf' } };
    },
  },
  readBenchSheet: {
    prepare: async (workshop) => {
      const { estimateId, pieceId } = await sampleEstimate(workshop);
      return { params: { estimateId, pieceId } };
    },
  },
};
