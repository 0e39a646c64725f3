import { randomUUID } from 'node:crypto';
import fc from 'fast-check';
import { v7 as newId } from 'uuid';
import { acceptIssue, readClientIssue, readClientPaper } from '#shared/client-page/client-issues-endpoints';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { issueEstimate, readPaper } from '#shared/estimates/issues-endpoints';
import {
  beginStageInvoice,
  readContractAccount,
  type ContractAccountAnswer,
} from '#shared/invoices/contract-account-endpoints';
import type { Invoice } from '#shared/invoices/invoice-schema';
import { keepInvoice } from '#shared/invoices/invoices-endpoints';
import type { StageClaim } from '#shared/invoices/stage-claim';
import { contractFaults, ledgerFaults } from './ledger';
import { acceptanceOf, acceptedIssue, issueOf } from './sample-client-visit';
import { sampleEstimate } from './sample-estimate';
import { creditDraft, issued, readBack, sayWho, stageInvoice } from './sample-invoice';
import { acceptedVariation, variationDraft } from './sample-variation';
import { startApi, type Api } from './start-api';
import type { Visitor } from './visitor';

let api: Api;
beforeAll(async () => {
  api = await startApi();
  await sayWho(api.ours);
}, 60_000);
afterEach(async () => {
  expect(await ledgerFaults(api.platform.database)).toEqual([]);
  expect(await contractFaults(api.app, api.platform.database)).toEqual([]);
});
afterAll(() => api.stop());

type Part = ContractAccountAnswer['parts'][number];

const account = async (jobId: string): Promise<ContractAccountAnswer> => {
  const response = await api.as('office').call(readContractAccount, { params: { jobId } });
  return (response.body as { contract: ContractAccountAnswer }).contract;
};
const partOf = async (jobId: string, issueId: string): Promise<Part> => {
  const part = (await account(jobId)).parts.find((one) => one.issueId === issueId);
  if (!part) throw new Error('no such part');
  return part;
};
const begin = (jobId: string, issueId: string, claim: StageClaim) =>
  api.as('office').call(beginStageInvoice, { params: { jobId }, body: { invoiceId: newId(), issueId, claim } });
const typeOf = ({ body }: { body: unknown }): string => (body as { type?: string }).type ?? '';
const whole = { of: 'work', from_percent: '0', to_percent: '100' } as const;

/** Raises whatever is offered next until nothing is. */
async function raiseAll(jobId: string): Promise<void> {
  for (let step = 0; step < 40; step += 1) {
    const { parts } = await account(jobId);
    const open = parts.flatMap((part) => part.next.map(({ claim }) => ({ issueId: part.issueId, claim })));
    const [next] = open;
    if (!next) return;
    const begun = await begin(jobId, next.issueId, next.claim);
    if (begun.status === 200) await issued(api.ours, (begun.body as Invoice).id);
    else {
      // What is taken away waits for an invoice with room for it.
      const other = open.find(({ issueId }) => issueId !== next.issueId);
      if (!other) throw new Error(begun.text);
      await stageInvoice(api.ours, { jobId, issueId: other.issueId }, other.claim);
    }
  }
  throw new Error('the account never ends');
}

/** Credits so much of each line of an invoice, in percent. */
async function creditShare(invoiceId: string, percent: number): Promise<void> {
  const draft = await creditDraft(api.ours, invoiceId);
  const lines = draft.content.lines.map((line) => ({
    ...line,
    price: ((Number(line.price) * percent) / 100).toFixed(2),
  }));
  const params = { invoiceId: draft.id };
  await api.as('office').call(keepInvoice, { params, version: 1, body: { ...draft.content, lines } });
  await issued(api.ours, draft.id);
}

describe('A variation that takes work away', () => {
  it('is issued, read and accepted like any other, and lowers the contract', async () => {
    const { jobId, visitor } = await acceptedIssue(api.ours, api);
    const before = await account(jobId);
    const issueId = await issueOf(api.ours, api, await variationDraft(api.ours, api, { jobId, price: '-100.00' }));
    const page = (await visitor.call(readClientIssue, { params: { issueId } })).body as ClientIssue;
    expect(page.issue).toMatchObject({ kind: 'variation', state: 'open', gross_minor: -120_00 });
    expect(page.price).toMatchObject({ gross_minor: -120_00, payments: [] });
    expect(page.varies).toEqual([
      { number: before.parts[0].number.split(',')[0], letter: 'A', title: expect.any(String) as string },
    ]);
    expect((await visitor.call(acceptIssue, await acceptanceOf(visitor, issueId))).status).toBe(200);
    expect((await account(jobId)).gross_minor).toBe(before.gross_minor - 120_00);
    expect((await partOf(jobId, issueId)).next).toMatchObject([
      { claim: whole, gross_minor: -120_00, net_minor: -100_00 },
    ]);
  });

  it('is headed as what it is on its papers, which say what it changes', async () => {
    const { jobId, visitor } = await acceptedIssue(api.ours, api);
    const issueId = await issueOf(api.ours, api, await variationDraft(api.ours, api, { jobId, price: '-100.00' }));
    const paper = await visitor.call(readClientPaper, { params: { issueId }, query: {} });
    expect(paper.headers['content-disposition']).toContain('variation-');
    const books = await api.as('owner').call(readPaper, { params: { issueId, paper: 'estimate.xlsx' } });
    expect(books.headers['content-disposition']).toContain('variation-');
  });

  it('is credited against an invoice of the job once there is one, and waits as long as there is none', async () => {
    const { jobId, issueId, visitor } = await acceptedIssue(api.ours, api);
    const variation = await acceptedVariation(api.ours, api, { jobId, price: '-100.00', visitor });
    const early = await begin(jobId, variation, whole);
    expect([early.status, typeOf(early)]).toEqual([409, 'urn:problem:invoice-nothing-to-credit']);
    const invoice = await stageInvoice(api.ours, { jobId, issueId }, whole);
    const begun = (await begin(jobId, variation, whole)).body as Invoice;
    expect(begun).toMatchObject({ kind: 'credit-note', creditedInvoiceId: invoice.id, due_minor: 120_00 });
    expect((await begin(jobId, variation, whole)).status).toBe(409);
    await issued(api.ours, begun.id);
    expect(await readBack(api.ours, invoice.id)).toMatchObject({ open_minor: invoice.due_minor - 120_00 });
    expect(await partOf(jobId, variation)).toMatchObject({ invoiced_minor: -120_00, left_minor: 0, isComplete: true });
    // It took nothing from the stage itself: of that nothing is offered again.
    expect((await partOf(jobId, issueId)).next.map(({ claim }) => claim.of)).not.toContain('again');
  });

  it('is credited in parts where no invoice has room for the whole of it', async () => {
    const { jobId, issueId, visitor } = await acceptedIssue(api.ours, api);
    const { net_minor } = await partOf(jobId, issueId);
    const price = `-${(Math.floor(net_minor * 0.6) / 100).toFixed(2)}`;
    const variation = await acceptedVariation(api.ours, api, { jobId, price, visitor });
    const first = await stageInvoice(api.ours, { jobId, issueId }, { of: 'work', from_percent: '0', to_percent: '40' });
    const note = await issued(api.ours, ((await begin(jobId, variation, whole)).body as Invoice).id);
    expect(first.due_minor - note.due_minor).toBeLessThanOrEqual(1);
    await raiseAll(jobId);
    const done = await account(jobId);
    expect(done).toMatchObject({ left_minor: 0 });
    expect(done.parts.every(({ isComplete }) => isComplete)).toBe(true);
  });

  it('takes away no more than was agreed, nor under another tax: neither issued nor marked accepted', async () => {
    const { jobId, issueId, visitor } = await acceptedIssue(api.ours, api);
    const { net_minor } = await partOf(jobId, issueId);
    const price = `-${(net_minor / 100).toFixed(2)}`;
    const issueIt = async (estimateId: string) => {
      const { version } = (await api.app.estimates.drafts.whole(api.ours.id, estimateId)).estimate;
      const body = { version, note: '', acceptsOldCard: false };
      return api.as('owner').call(issueEstimate, { params: { estimateId }, body, key: randomUUID() });
    };
    const over = await issueIt(
      await variationDraft(api.ours, api, { jobId, price: `-${(net_minor / 100 + 0.01).toFixed(2)}` }),
    );
    expect([over.status, typeOf(over)]).toEqual([409, 'urn:problem:variation-takes-too-much']);
    const taxed = await issueIt(
      await variationDraft(api.ours, api, { jobId, price: '-1.00', taxCategoryId: 'exempt' }),
    );
    expect(typeOf(taxed)).toBe('urn:problem:variation-takes-too-much');
    // Two take all of it away; each might, but not both.
    const both = [
      await issueOf(api.ours, api, await variationDraft(api.ours, api, { jobId, price })),
      await issueOf(api.ours, api, await variationDraft(api.ours, api, { jobId, price })),
    ];
    const parts = await Promise.all(both.map((one) => acceptanceOf(visitor, one)));
    const answers = await Promise.all(parts.map((one) => visitor.call(acceptIssue, one)));
    expect(answers.map(({ status }) => status).toSorted()).toEqual([200, 409]);
    expect((await account(jobId)).gross_minor).toBe(0);
  });

  it('is what an estimate may not be', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const { settings } = (await api.app.estimates.drafts.whole(api.ours.id, estimateId)).estimate;
    const extra = {
      ...{ id: newId(), name: 'Less', taxCategoryId: settings.taxCategoryId, memberId: null, alternativeId: null },
      ...{ kind: 'price', price: '-90000.00' },
    };
    const changes = [{ kind: 'settings', id: estimateId, version: 1, content: { ...settings, extras: [extra] } }];
    await api.as('owner').call(changeEstimate, { params: { estimateId }, body: { changes } });
    const { version } = (await api.app.estimates.drafts.whole(api.ours.id, estimateId)).estimate;
    const body = { version, note: '', acceptsOldCard: false };
    const refused = await api.as('owner').call(issueEstimate, { params: { estimateId }, body, key: randomUUID() });
    expect(typeOf(refused)).toBe('urn:problem:issue-below-nothing');
  });
});

describe('What was credited of a stage', () => {
  it('may be claimed again, under the taxes it was credited under, to the cent', async () => {
    const { jobId, issueId } = await acceptedIssue(api.ours, api);
    const stage = await stageInvoice(api.ours, { jobId, issueId }, whole);
    await creditShare(stage.id, 33);
    const { credited_minor } = await readBack(api.ours, stage.id);
    const claim = { of: 'again', invoiceId: stage.id } as const;
    const offered = (await partOf(jobId, issueId)).next.find((next) => next.claim.of === 'again');
    expect(offered).toMatchObject({ claim, name: stage.number, gross_minor: credited_minor });
    const again = await stageInvoice(api.ours, { jobId, issueId }, claim);
    expect(again.due_minor).toBe(credited_minor);
    expect(typeOf(await begin(jobId, issueId, claim))).toBe('urn:problem:invoice-claim-taken');
    await raiseAll(jobId);
    expect(await partOf(jobId, issueId)).toMatchObject({ left_minor: 0, isComplete: true });
  });
});

describe('Contracts of many variations', () => {
  const anyDeed = fc.record({
    what: fc.constantFrom('vary', 'raise', 'raise', 'credit'),
    at: fc.nat({ max: 50 }),
    share_percent: fc.integer({ min: -45, max: 30 }).filter((share) => share !== 0),
  });
  const walks = fc.sample(fc.array(anyDeed, { minLength: 5, maxLength: 7 }), { numRuns: 3, seed: 20_260_701 });

  const raise = async (jobId: string, at: number) => {
    const { parts } = await account(jobId);
    const open = parts.flatMap((part) => part.next.map(({ claim }) => ({ issueId: part.issueId, claim })));
    const one = open[at % Math.max(1, open.length)];
    const begun = one && (await begin(jobId, one.issueId, one.claim));
    if (begun?.status === 200) await issued(api.ours, (begun.body as Invoice).id);
  };
  const credit = async (jobId: string, at: number, percent: number) => {
    const rows = (await api.app.invoices.reading.page(api.ours.id, { jobId, kind: 'invoice', limit: 100 })).items;
    const some = rows.filter((row) => row.state === 'issued' && row.due_minor > row.credited_minor + 500);
    const one = some[at % Math.max(1, some.length)];
    if (one && one.credited_minor === 0) await creditShare(one.id, percent);
  };
  const vary = async (at: { jobId: string; visitor: Visitor; net_minor: number }, share_percent: number) => {
    const price = (Math.round((at.net_minor * share_percent) / 100) / 100).toFixed(2);
    const { net_minor } = (await account(at.jobId)).parts.reduce(
      (sum, part) => ({ net_minor: sum.net_minor + part.net_minor }),
      { net_minor: 0 },
    );
    if (net_minor + Math.round(Number(price) * 100) >= 0) await acceptedVariation(api.ours, api, { ...at, price });
  };

  it.each(walks.map((walk, place) => [place + 1, walk] as const))(
    'come to the cent in the end, whatever is done to them: walk %i',
    async (_place, walk) => {
      const { jobId, issueId, visitor } = await acceptedIssue(api.ours, api);
      const { net_minor } = await partOf(jobId, issueId);
      for (const { what, at, share_percent } of walk) {
        if (what === 'vary') await vary({ jobId, visitor, net_minor }, share_percent);
        else if (what === 'raise') await raise(jobId, at);
        else await credit(jobId, at, Math.abs(share_percent));
      }
      await raiseAll(jobId);
      const done = await account(jobId);
      expect(done.left_minor).toBe(0);
      expect(done.invoiced_minor - done.credited_minor).toBe(done.gross_minor);
      expect(done.parts.every(({ isComplete }) => isComplete)).toBe(true);
    },
    240_000,
  );
});
