import { v7 as newId } from 'uuid';
import { addDays } from '#shared/calendar/add-days';
import type { MatrixRows } from '../matrix-row';
import { acceptedIssue, linkTo, sampleIssue } from '../sample-client-visit';
import { sampleJob } from '../sample-job';
import type { Api, TestWorkshop } from '../start-api';

const oneJob = async (workshop: TestWorkshop) => ({ params: { jobId: await sampleJob(workshop) } });
const template = { kind: 'answer', subject: 'About {job}', text: 'Dear {client},\n\n{text}\n' };

/** A letter that was given up, as after the last attempt. */
async function givenUp({ id, mark }: TestWorkshop, { platform }: Api): Promise<string> {
  const { database, mailbox } = platform;
  const letter = { to: { name: mark, email: 'guest@guests.example' }, subject: mark, text: mark };
  await database.transaction(() => mailbox.post(id, letter));
  await database.execute(
    "UPDATE tasks SET failed_at = :now, attempts = 12, last_error = 'x' WHERE workshop_id = :id AND kind = 'mail'",
    { id, now: new Date() },
  );
  return (await mailbox.givenUp(id))[0]?.id ?? '';
}

export const agreementsRows: MatrixRows = {
  giveAccess: {
    prepare: async (workshop, api) => ({
      params: { issueId: (await sampleIssue(workshop, api)).issueId },
      body: {
        endsOn: addDays(await api.app.rateCards.service.today(workshop.id), 30),
        send: false,
        note: workshop.mark,
      },
    }),
    history: 'history-access-given',
  },
  listAccesses: { prepare: oneJob },
  revokeAccess: {
    prepare: async (workshop, api) => {
      const { issueId } = await sampleIssue(workshop, api);
      return { params: { accessId: (await linkTo(workshop, api, issueId)).accessId } };
    },
    history: 'history-access-revoked',
  },
  listQuestions: { prepare: oneJob },
  answerQuestion: {
    prepare: async (workshop, api) => {
      const { jobId, issueId } = await sampleIssue(workshop, api);
      return { params: { jobId }, body: { issueId, text: `${workshop.mark} answers` } };
    },
    history: 'history-question-answered',
  },
  readAgreement: {
    prepare: async (workshop, api) => ({ params: { jobId: (await acceptedIssue(workshop, api)).jobId } }),
  },
  readAcceptedPaper: {
    prepare: async (workshop, api) => {
      const { jobId } = await acceptedIssue(workshop, api);
      const [decision] = await api.app.agreements.contracts.decisions(workshop.id, jobId);
      return { params: { decisionId: decision.id } };
    },
  },
  beginVariation: {
    prepare: async (workshop, api) => ({
      params: { jobId: (await acceptedIssue(workshop, api)).jobId },
      body: { id: newId(), title: `${workshop.mark} variation` },
    }),
    history: 'history-variation-begun',
  },
  listLetterTemplates: { prepare: () => ({}) },
  keepLetterTemplate: {
    prepare: async (workshop, api) => {
      const known = await api.app.agreements.templates.get(workshop.id, 'answer');
      return { version: known.version, body: { ...template, text: `${template.text}${newId()}` } };
    },
    history: 'history-letter-template-changed',
  },
  resetLetterTemplate: { prepare: () => ({ body: { kind: 'receipt' } }) },
  previewLetter: { prepare: () => ({ body: template }) },
  listGivenUpLetters: {
    prepare: async (workshop, api) => {
      await givenUp(workshop, api);
      return {};
    },
  },
  sendLetterAgain: { prepare: async (workshop, api) => ({ params: { letterId: await givenUp(workshop, api) } }) },
};
