import { createHash } from 'node:crypto';
import { readdirSync, readFileSync } from 'node:fs';
import { mkdtemp, rm } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startSettings } from '#shared/estimates/start-settings';
import { startCard } from '#shared/rate-cards/start-card';
import { migrations } from '../../backend/migrations';
import { openApp, type App } from '../../backend/src/app';
import { systemClock } from '../../backend/src/platform/clock/clock';
import { readConfig } from '../../backend/src/platform/config/config';
import { migrate } from '../../backend/src/platform/database/migrate';
import { openLog } from '../../backend/src/platform/log/log';
import { openPlatform } from '../../backend/src/platform/open-platform';
import type { Platform } from '../../backend/src/platform/platform';
import { emptyDatabase } from '../database/fresh-database';
import released from './released-migrations.json';

const folder = join(__dirname, '../../backend/migrations');
const files = readdirSync(folder).filter((name) => /^\d/.test(name));
const hashOf = (name: string): string =>
  createHash('sha256')
    .update(readFileSync(join(folder, name)))
    .digest('hex');

test('every step of the schema stands as it was released; a new one is added to the list with its SHA-256', () => {
  expect(Object.fromEntries(files.map((name) => [name, hashOf(name)]))).toEqual(released);
});

test('every file of a step is taken, in the order of its number', () => {
  expect(migrations.map(({ name }) => `${name}.ts`)).toEqual(files);
});

/** Invoices were there; what came since changes rows that are kept. */
const lastBefore = '0050-invoices';
const at = new Date('2026-01-05T10:00:00Z');
const day = '2026-01-05';
const idOf = (number: number): string => `018f0000-0000-7000-8000-${`${number}`.padStart(12, '0')}`;
const [workshop, card, client, job, estimate, invoice, other] = [1, 2, 3, 4, 5, 6, 7].map(idOf);
const own = (id: string) => ({ workshop_id: workshop, id });

const { currency: _currency, ...moneyBefore } = startCard.money;
const single = {
  rule: 'plain-area',
  length: null,
  girth: null,
  area: { text: '0.5 m²', mm2: 500_000 },
  sides: 2,
  worth: 1,
};
const line = {
  ...{ id: other, name: 'Rail', taxCategoryId: 'standard', memberId: null, alternativeId: null },
  ...{ kind: 'paid-quantity', unit: 'm²', price: '80', rule: 'carved', quantity: '1', measured: single },
};
const start = { title: 'Table', seed: 1, restoration: false, stageIds: [] };
const settings = { ...startSettings(startCard, start), extras: [line] };

/** Rows as they were kept then, a table each; texts are JSON where the column is. */
const kept: readonly (readonly [string, object])[] = [
  [
    'workshops',
    {
      ...{
        id: workshop,
        name: 'Herons',
        currency: 'CHF',
        locale: 'en-GB',
        length_unit: 'mm',
        time_zone: 'Europe/Zurich',
      },
      ...{
        paper_size: 'A4',
        country: 'CH',
        address_lines: '["Quay 1"]',
        telephone: '',
        email: '',
        tax_registration: '',
      },
      ...{ default_tax_category: 'S', version: 1, created_at: at },
    },
  ],
  [
    'rate_cards',
    {
      ...{ ...own(card), version: 1, name: 'Kept', in_force_from: null, based_on_id: null, changed_at: at },
      content: JSON.stringify({ ...startCard, money: moneyBefore }),
    },
  ],
  [
    'clients',
    {
      ...{ ...own(client), name: 'Museum', kind: 'museum', contact: '', email: '', telephone: '', address: '' },
      ...{ website: '', tax_registration: '', note: 'x', jobs: 1, version: 1, created_at: at },
    },
  ],
  [
    'jobs',
    {
      ...{ ...own(job), client_id: client, year: 2026, ordinal: 1, title: 'Pier table', kind: 'new', reference: '' },
      ...{ site: '', note: '', state: 'open', reached: 'open', version: 1, changed_at: at, created_at: at },
    },
  ],
  [
    'estimates',
    {
      ...{ ...own(estimate), job_id: job, number: '2026-1', version: 1, rate_card_id: card, currency: 'CHF' },
      ...{ settings: JSON.stringify(settings), settings_version: 1, members: 0, letter: null, changed_at: at },
    },
  ],
  ['shops', { ...own(workshop), version: 1, content: '{"people":[]}', changed_at: at }],
  ['programmes', { ...own(estimate), version: 1, first_day: day, inputs: '{"inHand_days":3}', changed_at: at }],
  ['letter_templates', { ...own(other), kind: 'accepted', version: 1, subject: 'x', text: 'It is {total} with tax.' }],
  [
    'invoices',
    {
      ...{
        ...own(invoice),
        version: 1,
        kind: 'invoice',
        state: 'draft',
        client_id: client,
        currency: 'CHF',
        content: '{}',
      },
      ...{ rounding_minor: 0, net_minor: 100, tax_minor: 8, gross_minor: 108, due_minor: 108, open_minor: 108 },
      credited_minor: 0,
    },
  ],
  [
    'payments',
    {
      ...{ ...own(other), client_id: client, way: 'bank', currency: 'CHF', amount_minor: 100, credit_minor: 0 },
      ...{ received_on: day, reference: 'R 1', recorded_at: at, recorded_by: 'Ann' },
    },
  ],
  [
    'write_offs',
    { ...own(other), invoice_id: invoice, amount_minor: 8, reason: 'Small', written_on: day, at, by_name: 'Ann' },
  ],
  [
    'audit',
    {
      ...{ ...own(other), at, name: 'Ann', subject_kind: 'invoice', subject_id: invoice, code: 'history-written-off' },
      values: '{"amount_minor":8}',
    },
  ],
  ['reminders', { ...own(other), invoice_id: invoice, open_minor: 108, email: 'a@b.example', at, by_name: 'Ann' }],
];

describe('A database with rows is brought forward', () => {
  let app: App;
  let platform: Platform;
  let place: string;
  const found = async <T extends object>(sql: string): Promise<T | undefined> =>
    (await platform.database.select<T>(sql, { workshop }))[0];

  beforeAll(async () => {
    const url = await emptyDatabase();
    const before = migrations.findIndex(({ name }) => name === lastBefore) + 1;
    await migrate(url, migrations.slice(0, before));
    place = await mkdtemp(join(tmpdir(), 'bolewright-migrations-'));
    const secret = { SESSION_SECRET: 'a secret of this test alone, of no use elsewhere' };
    const config = readConfig({ ...secret, WEB_DIR: place, DATABASE_URL: url, DATA_DIR: place });
    platform = openPlatform(config, systemClock, openLog('error', { write: () => undefined }));
    for (const [table, row] of kept) await platform.database.sequelize.getQueryInterface().bulkInsert(table, [row]);
    expect(await migrate(url, migrations)).toEqual(migrations.slice(before).map(({ name }) => name));
    app = openApp(platform);
  }, 60_000);
  afterAll(async () => {
    await platform.database.close();
    await rm(place, { recursive: true, force: true });
  });

  test('its job, client, card and estimate read as they do today', async () => {
    expect(await app.jobs.job(workshop, job)).toMatchObject({ title: 'Pier table', clientName: 'Museum' });
    const { estimate: read } = await app.estimates.drafts.whole(workshop, estimate);
    expect(read).toMatchObject({ number: '2026-1', kind: 'estimate', settings: { title: 'Table' } });
    const measures = [{ count: 1, length_mm: null, girth_mm: null, area_mm2: 500_000, sides: 2, worth: 1 }];
    const measured = { rule: 'plain-area', measures, typed: { 'measures.0.area_mm2': '0.5 m²' } };
    expect(read.settings.extras).toEqual([{ ...line, measured }]);
    expect(await found('SELECT content FROM rate_cards WHERE workshop_id = :workshop')).toMatchObject({
      content: { money: { ...moneyBefore, currency: 'CHF' } },
    });
  });

  test('its programme, shop and letters say what they meant', async () => {
    expect(await found('SELECT inputs FROM programmes WHERE workshop_id = :workshop')).toEqual({
      inputs: { inHand_days: 3, hands: [] },
    });
    expect(await found('SELECT content FROM shops WHERE workshop_id = :workshop')).toEqual({
      content: { people: [], overtime_percent: 50 },
    });
    expect(await app.agreements.templates.get(workshop, 'accepted')).toMatchObject({ text: 'It is {total}.' });
  });

  test('its books stand as they stood, and the history says why something was written off', async () => {
    expect(await found('SELECT open_minor, number FROM invoices WHERE workshop_id = :workshop')).toEqual({
      open_minor: 108,
      number: null,
    });
    expect(await found('SELECT amount_minor, deed, follows FROM payments WHERE workshop_id = :workshop')).toEqual({
      ...{ amount_minor: 100, deed: null, follows: null },
    });
    expect(await found('SELECT kind, email FROM invoice_letters WHERE workshop_id = :workshop')).toEqual({
      kind: 'reminder',
      email: 'a@b.example',
    });
    expect(await found('SELECT `values` AS told FROM audit WHERE workshop_id = :workshop')).toEqual({
      told: { amount_minor: 8, reason: 'Small' },
    });
  });
});
