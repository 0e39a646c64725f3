import type { Actor } from '#shared/actor/actor';
import type { ClientActor } from '#shared/actor/client-actor';
import { addDays } from '#shared/calendar/add-days';
import type { App } from '../backend/src/app';
import type { DemonstrationJob } from './demonstration-job';

interface Sent {
  readonly issueId: string;
  readonly jobId: string;
  readonly job: DemonstrationJob;
}

const openFor_days = 60;

/** Sends the client their link, as the office would, and opens it, as the client would. */
async function visit({ agreements, rateCards }: App, actor: Actor, { issueId, job }: Sent): Promise<ClientActor> {
  const today = await rateCards.service.today(actor.workshopId);
  const request = { endsOn: addDays(today, openFor_days), send: true, note: job.issueNote };
  const { link } = await agreements.access.give(actor, issueId, request);
  const opened = await agreements.visits.open(link.slice(link.indexOf('#') + 1));
  const client = opened && (await agreements.visits.load(opened));
  if (!client) throw new Error('the link of the demonstration opens nothing');
  return client;
}

/** What the client does on their page: asks, is answered, and accepts where the job is to stand so. */
export async function seedClientSide(app: App, actor: Actor, sent: Sent): Promise<void> {
  const { agreements } = app;
  const { issueId, jobId, job } = sent;
  const client = await visit(app, actor, sent);
  for (const { question, answer } of job.thread) {
    await agreements.questions.ask(client, issueId, question);
    if (answer !== '') await agreements.questions.answer(actor, jobId, { issueId, text: answer });
  }
  if (job.stands !== 'accepted') return;
  const issue = await agreements.scope.issue(client, issueId);
  const { chosen, sha256 } = await agreements.choices.reviewed(issue, []);
  const { gross_minor } = chosen.figures.price;
  const signed = { typedName: job.client.contact, choice: [], gross_minor, pdfSha256: sha256, address: '127.0.0.1' };
  await agreements.decisions.accept(client, issueId, signed);
}
