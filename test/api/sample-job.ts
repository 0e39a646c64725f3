import { randomInt } from 'node:crypto';
import { v7 as newId } from 'uuid';
import { keepClient } from '#shared/jobs/clients-endpoints';
import type { ClientContent } from '#shared/jobs/client-schema';
import { keepJob } from '#shared/jobs/jobs-endpoints';
import type { JobContent } from '#shared/jobs/job-schema';
import type { TestWorkshop } from './test-workshop';
import type { Visitor } from './visitor';

export const clientNamed = (name: string, more: Partial<ClientContent> = {}): ClientContent => ({
  name,
  kind: 'firm',
  contact: '',
  email: '',
  telephone: '',
  address: '',
  website: '',
  taxRegistration: '',
  note: '',
  ...more,
});

export const jobTitled = (title: string, clientId: string, more: Partial<JobContent> = {}): JobContent => ({
  title,
  clientId,
  kind: 'new',
  reference: '',
  site: '',
  note: '',
  ...more,
});

async function done(call: PromiseLike<{ status: number; text: string }>): Promise<void> {
  const response = await call;
  if (response.status >= 300) throw new Error(`the sample could not be made: ${response.status} ${response.text}`);
}

/** Enters a client; answers their id. */
export async function enterClient(visitor: Visitor, content: ClientContent): Promise<string> {
  const clientId = newId();
  await done(visitor.call(keepClient, { params: { clientId }, version: 0, body: content }));
  return clientId;
}

/** Opens a job; answers its id. */
export async function openJob(visitor: Visitor, content: JobContent): Promise<string> {
  const jobId = newId();
  await done(visitor.call(keepJob, { params: { jobId }, version: 0, body: content }));
  return jobId;
}

/** A client in the workshop's name. */
export function sampleClient({ mark, people }: TestWorkshop): Promise<string> {
  const number = randomInt(1e9);
  const reached = { address: `${mark} quay`, email: `client-${number}@${mark.toLowerCase()}.example` };
  return enterClient(people.owner.visitor, clientNamed(`${mark} client ${number}`, reached));
}

/** A job of a client, in the workshop's name. */
export async function sampleJob(workshop: TestWorkshop): Promise<string> {
  const content = jobTitled(`${workshop.mark} base`, await sampleClient(workshop));
  return openJob(workshop.people.owner.visitor, content);
}
