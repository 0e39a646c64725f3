import { randomUUID } from 'node:crypto';
import { v7 as newId } from 'uuid';
import type { Response } from 'supertest';
import { keepLetterTemplate, previewLetter } from '#shared/agreements/letters-endpoints';
import type { Endpoint } from '#shared/actor/endpoint';
import { addDays } from '#shared/calendar/add-days';
import {
  issueInvoice,
  keepInvoice,
  keepInvoiceSettings,
  listInvoices,
  readInvoice,
  readInvoicePaper,
  readInvoiceSettings,
  sendInvoice,
} from '#shared/invoices/invoices-endpoints';
import { readStatementPaper, remindOfInvoice, sendStatement } from '#shared/invoices/owed-endpoints';
import { listPayments, recordPayment, refundPayment, writeOff } from '#shared/invoices/payments-endpoints';
import { listFeeds, makeFeed, readFeed } from '#shared/programme/board-endpoints';
import { keepPlan, keepProgramme, keepShop, readProgramme, readShop } from '#shared/programme/programme-endpoints';
import { paymentOf, sampleContent, sampleDraft, sampleLine, stageInvoice } from '../api/sample-invoice';
import { programmeOf, shopOf, solved } from '../api/sample-programme';
import type { Parts } from '../api/visitor';
import type { Planting } from './planting';
import { done, type Stage } from './stage';

const allowance = {
  charge: false,
  reason: 'x',
  reasonCode: null,
  amount: { way: 'fixed', amount_minor: 100 },
} as const;
const dayOff = { firstDay: '2030-05-01', lastDay: '2030-05-01' };

/** A plan that is brought is worked out anew from its moments: what stands in it as words is not kept. */
export const wordsOfAPlan = '<b>a plan says</b>';

/** Hostile letters, invoices, payments, and a hostile programme; asked afterwards for all that leaves of them. */
export class PlantedBooks {
  private invoiceId = '';
  private feedAddress = '';
  private preview: unknown;

  constructor(
    private readonly stage: Stage,
    private readonly planting: Planting,
  ) {}

  /** Words of letters, before any of them is sent. */
  async plantLetters(): Promise<void> {
    const version = 0;
    const words = { kind: 'accepted', subject: 'x', text: 'x' };
    const preview = await this.send(previewLetter, { body: words }, isWithoutBraces);
    this.preview = preview.body;
    await this.send(keepLetterTemplate, { version, body: words }, isWithoutBraces);
  }

  async plant(): Promise<void> {
    await this.plantInvoice();
    await this.plantPayments();
    await this.plantReminder();
    await this.plantProgramme();
  }

  /** What the server answers of it: data, papers, calendar; `binary` for papers. */
  async answers(): Promise<{ readonly texts: readonly string[]; readonly papers: readonly Buffer[] }> {
    const { estimateId } = this.stage.sample;
    const params = { invoiceId: this.invoiceId };
    const reading: readonly [Endpoint, Parts][] = [
      [listInvoices, {}],
      [listPayments, {}],
      [readInvoice, { params }],
      [readInvoiceSettings, {}],
      [readShop, {}],
      [listFeeds, {}],
      [readProgramme, { params: { estimateId } }],
    ];
    const data: unknown[] = [this.preview];
    for (const [endpoint, parts] of reading) data.push((await done(this.stage.walk, endpoint, parts)).body);
    const xml = await this.paper(readInvoicePaper, { params: { ...params, paper: 'invoice.xml' } });
    const query = { secret: new URL(this.feedAddress).searchParams.get('secret') ?? '' };
    const calendar = await this.paper(readFeed, { query });
    const period = { from: '2020-01-01', to: '2099-12-31' };
    const client = { clientId: this.stage.jobClientId };
    return {
      texts: [...data.flatMap(textsOf), unescaped(xml.toString('utf8')), unfolded(calendar.toString('utf8'))],
      papers: [
        await this.paper(readInvoicePaper, { params: { ...params, paper: 'invoice.pdf' } }),
        await this.paper(readStatementPaper, { params: client, query: period }),
      ],
    };
  }

  private async paper(endpoint: Endpoint, parts: Parts): Promise<Buffer> {
    const response = await this.stage.walk.api.as('owner').call(endpoint, parts).responseType('blob');
    if (response.status !== 200) throw new Error(`${endpoint.name}: ${response.status}`);
    return response.body as Buffer;
  }

  private send(endpoint: Endpoint, parts: Parts, fits?: (text: string) => boolean): Promise<Response> {
    const body = this.planting.into(endpoint, parts.body, fits);
    return done(this.stage.walk, endpoint, { ...parts, body });
  }

  private async plantInvoice(): Promise<void> {
    const { walk, jobClientId, sent } = this.stage;
    const { ours } = walk.api;
    await sampleDraft(ours, { clientId: jobClientId });
    const { version, ...settings } = (await done(walk, readInvoiceSettings, {})).body as { version: number };
    const own = {
      seller: { vatId: 'ATU87654321', taxNumber: 'x', companyNumber: 'x' },
      account: { name: 'x', iban: 'AT611904300234573201', bic: '' },
    };
    await this.send(keepInvoiceSettings, { version, body: { ...settings, ...own, terms: 'x', closing: 'x' } });
    this.invoiceId = newId();
    const params = { invoiceId: this.invoiceId };
    await this.send(keepInvoice, { params, version: 0, body: fullInvoice(jobClientId) });
    await done(walk, issueInvoice, { params, body: { version: 1 }, key: randomUUID() });
    await this.send(sendInvoice, { params, body: { note: 'x' }, key: randomUUID() });
    const claim = { of: 'work', from_percent: '0', to_percent: '10' } as const;
    if (sent[0]) await stageInvoice(ours, sent[0], claim);
  }

  private async plantPayments(): Promise<void> {
    const { walk, jobClientId: clientId } = this.stage;
    const { invoiceId } = this;
    const entry = await paymentOf(walk.api.ours, walk.api, { clientId, invoiceId, amount_minor: 5_000 });
    const key = randomUUID();
    const paid = (await this.send(recordPayment, { body: { ...entry, reference: 'x' }, key })).body as { id: string };
    const back = { refundId: newId(), amount_minor: 500, refundedOn: entry.receivedOn, reference: 'x', reopens: true };
    await this.send(refundPayment, { params: { paymentId: paid.id }, body: back, key: randomUUID() });
    const account = { from: entry.receivedOn, to: entry.receivedOn, note: 'x' };
    const reached = (await walk.api.app.jobs.job(walk.api.ours.id, this.stage.sent[0].jobId)).clientId;
    await this.send(sendStatement, { params: { clientId: reached }, body: account, key: randomUUID() });
    await this.send(writeOff, { params: { invoiceId }, body: { amount_minor: 100, reason: 'x' }, key: randomUUID() });
  }

  /** In three weeks it is overdue. */
  private async plantReminder(): Promise<void> {
    const { api } = this.stage.walk;
    const minutes = 21 * 24 * 60;
    api.clock.move({ minutes });
    const { visitor } = await api.newcomer(api.ours, 'office');
    const body = this.planting.into(remindOfInvoice, { note: 'x' });
    const parts = { params: { invoiceId: this.invoiceId }, body, key: randomUUID() };
    const { status, text } = await visitor.call(remindOfInvoice, parts);
    await api.mails();
    api.clock.move({ minutes: -minutes });
    if (status >= 300) throw new Error(`remindOfInvoice: ${status} ${text}`);
  }

  private async plantProgramme(): Promise<void> {
    const { walk, sample } = this.stage;
    const { ours } = walk.api;
    const known = shopOf('x', ours.people.owner.actor.membershipId);
    const shop = {
      ...known,
      days: [{ id: newId(), name: 'x', ...dayOff, hours: [] }],
      people: known.people.map((one) => ({ ...one, absences: [{ id: newId(), note: 'x', ...dayOff }] })),
    };
    const kept = await done(walk, readShop, {});
    await this.send(keepShop, { version: (kept.body as { version: number }).version, body: shop });
    const params = { estimateId: sample.estimateId };
    const { version, inputs, request } = await programmeOf(ours, sample.estimateId);
    const lot = { lotId: 'x', portions: null, crew: null, mostPeople: null, places: null };
    const at = `${addDays(inputs.day, 1)}T09:00:00.000Z`;
    const more = {
      ...{ lots: [lot], pins: [{ taskId: 'x', at }], approvals: [{ approvalId: 'x', at }] },
      hands: [{ workId: 'x', crew: 1 }],
    };
    await this.send(keepProgramme, { params, version, body: { ...inputs, ...more } });
    const plan = { ...solved(request), cycle: [wordsOfAPlan] };
    await done(walk, keepPlan, { params, version: version + 1, body: plan });
    const feed = { params: { feedId: newId() }, body: { name: 'x', personId: null } };
    this.feedAddress = ((await this.send(makeFeed, feed)).body as { address: string }).address;
  }
}

const isWithoutBraces = (text: string): boolean => !/[{}]/.test(text);

/** An invoice with an entry of everything: taxed and exempt, reduced by line and as a whole. */
function fullInvoice(clientId: string): object {
  const content = sampleContent('x', clientId);
  return {
    ...content,
    ...{ terms: 'x', note: 'x', exemptions: [{ code: 'E', reasonCode: '', reason: 'x' }] },
    buyer: { ...content.buyer, ...{ name: 'x', contact: 'x', address: 'x', companyNumber: 'x', reference: 'x' } },
    lines: [
      sampleLine({ name: 'x', description: 'x', allowancesCharges: [allowance] }),
      sampleLine({ name: 'x', tax: { code: 'E', percent: '0' } }),
    ],
    allowancesCharges: [{ ...allowance, tax: { code: 'S', percent: '20' } }],
  };
}

/** Every text of an answer, as it is read. */
function textsOf(value: unknown): string[] {
  if (typeof value === 'string') return [value];
  return value !== null && typeof value === 'object' ? Object.values(value).flatMap(textsOf) : [];
}

const entities: Readonly<Record<string, string>> = { lt: '<', gt: '>', quot: '"', apos: "'", amp: '&' };
const unescaped = (xml: string): string => xml.replace(/&(lt|gt|quot|apos|amp);/g, (_, name: string) => entities[name]);

/** RFC 5545: long lines are folded, and some marks escaped. */
const unfolded = (calendar: string): string => calendar.replace(/\r?\n[ \t]/g, '').replace(/\\([\\,;])/g, '$1');
