import { randomInt, randomUUID } from 'node:crypto';
import type { Response } from 'supertest';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { issueInvoice } from '#shared/invoices/invoices-endpoints';
import type { Payment } from '#shared/invoices/payment-schema';
import { recordPayment, refundPayment, sharePayment, writeOff } from '#shared/invoices/payments-endpoints';
import { keepJob } from '#shared/jobs/jobs-endpoints';
import { sampleEstimate, type SampleEstimate } from './sample-estimate';
import { paymentOf, sampleDraft, sampleInvoice, type SampleInvoice } from './sample-invoice';
import { jobTitled } from './sample-job';
import { startApi, type Api } from './start-api';

/**
 * Fifty at once at the same few invoices, payments, jobs and estimates, whatever comes to hand: nobody is told of a fault of ours, and
 * the books agree when it stops, numbers included (InnoDB's errors 1213 and 1205 mean that a transaction is to be repeated).
 */
const clients = 50;
const mix_milliseconds = 10_000;

let api: Api;
let invoices: SampleInvoice[];
let sample: SampleEstimate;
let clientId: string;
const payments: Payment[] = [];
const drafts: SampleInvoice[] = [];
const amount_minor = 7;

beforeAll(async () => {
  api = await startApi();
  const first = await sampleInvoice(api.ours);
  ({ clientId } = first);
  const others = [await sampleInvoice(api.ours, { clientId }), await sampleInvoice(api.ours, { clientId })];
  invoices = [first, ...others];
  while (drafts.length < 30) drafts.push(await sampleDraft(api.ours, { clientId }));
  sample = await sampleEstimate(api.ours);
}, 60_000);
afterAll(() => api.stop());

const oneOf = <T>(list: readonly T[]): T => list[randomInt(list.length)];
const owner = () => api.as('owner');
const key = () => randomUUID();

/** What somebody may do next; each takes rows in an order of its own. */
const deeds: Readonly<Record<string, () => Promise<Response | undefined>>> = {
  pay: async () => {
    const entry = await paymentOf(api.ours, api, { ...oneOf(invoices), amount_minor });
    const response = await owner().call(recordPayment, {
      body: { ...entry, amount_minor: 2 * amount_minor, surplus: 'keep' },
      key: key(),
    });
    if (response.status === 200) payments.push(response.body as Payment);
    return response;
  },
  share: async () => {
    if (payments.length === 0) return undefined;
    const params = { paymentId: oneOf(payments).id };
    return owner().call(sharePayment, { params, body: { ...idOf(oneOf(invoices)), amount_minor: 1 }, key: key() });
  },
  refund: async () => {
    if (payments.length === 0) return undefined;
    const { id: paymentId, receivedOn } = oneOf(payments);
    const body = { refundId: key(), amount_minor: 1, refundedOn: receivedOn, reference: '', reopens: true };
    return owner().call(refundPayment, { params: { paymentId }, body, key: key() });
  },
  writeOff: async () => {
    const body = { amount_minor: 1, reason: 'too little to ask for' };
    return owner().call(writeOff, { params: idOf(oneOf(invoices)), body, key: key() });
  },
  issue: async () => {
    const draft = drafts.pop();
    return draft && owner().call(issueInvoice, { params: idOf(draft), body: { version: 1 }, key: key() });
  },
  job: async () => {
    const { version } = await api.app.jobs.job(api.ours.id, sample.jobId);
    return api.as('estimator').call(keepJob, {
      ...{ params: { jobId: sample.jobId }, version },
      body: jobTitled(`Base ${randomInt(1e6)}`, clientId),
    });
  },
  estimate: async () => {
    const { estimateId, memberId: id, member } = sample;
    const whole = await api.app.estimates.drafts.whole(api.ours.id, estimateId);
    const version = whole.members.find((one) => one.id === id)?.version;
    const changes = [{ kind: 'member', id, version, content: { ...member, count: randomInt(1, 20) } }];
    return api.as('estimator').call(changeEstimate, { params: { estimateId }, body: { changes } });
  },
};

const idOf = ({ invoiceId }: SampleInvoice) => ({ invoiceId });

test('nobody is refused for a lock, and much of it is done', async () => {
  const done: Record<string, number> = {};
  const faults: string[] = [];
  const until = performance.now() + mix_milliseconds;
  const client = async () => {
    while (performance.now() < until) {
      const [name, deed] = oneOf(Object.entries(deeds));
      const response = await deed();
      if (response && response.status < 300) done[name] = (done[name] ?? 0) + 1;
      if (response && response.status >= 500) faults.push(`${name}: ${response.status} ${response.text.slice(0, 200)}`);
    }
  };
  await Promise.all(Array.from({ length: clients }, client));
  expect(faults).toEqual([]);
  expect(Object.keys(done).sort()).toEqual(Object.keys(deeds).sort());
}, 120_000);
