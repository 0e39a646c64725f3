import { changeWorkshop, readWorkshop } from '#shared/accounts/workshop-endpoints';
import type { Workshop } from '#shared/accounts/workshop-schema';
import { readClientIssue } from '#shared/client-page/client-issues-endpoints';
import type { CostedEstimate } from '#shared/estimates/estimate-schema';
import { changeEstimate, readAlternatives, readEstimate } from '#shared/estimates/estimates-endpoints';
import { v7 as newId } from 'uuid';
import { clientOf, issueOf } from './sample-client-visit';
import { sampleEstimate } from './sample-estimate';
import { sampleDraft } from './sample-invoice';
import { startApi, type Api, type TestWorkshop } from './start-api';

/** An estimate and its issues stay in their own currency, and only what is offered is frozen. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

async function change(workshop: TestWorkshop, currency: string) {
  const { visitor } = workshop.people.owner;
  const { version, id: _id, logoFileId: _logo, ...own } = (await visitor.call(readWorkshop)).body as Workshop;
  return visitor.call(changeWorkshop, { version, body: { ...own, currency } });
}

describe('another currency', () => {
  const read = async (estimateId: string): Promise<CostedEstimate> =>
    (await api.as('owner').call(readEstimate, { params: { estimateId } })).body as CostedEstimate;

  test('takes the drafts along, worked anew; once something is issued it is refused beside its entry', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const before = await read(estimateId);
    expect((await change(api.ours, 'JPY')).status).toBe(200);
    const after = await read(estimateId);
    expect([before.currency, after.currency]).toEqual(['EUR', 'JPY']);
    expect(after.version).toBe(before.version + 1);
    // Each line is rounded to whole yen where it was rounded to cents.
    const { net_minor, lines } = after.figures.price;
    expect(Math.abs(net_minor - before.figures.price.net_minor / 100)).toBeLessThan(lines.length);
    expect(after.figures.cost.findings.map(({ code }) => code)).toContain('card-start-prices');

    const issueId = await issueOf(api.ours, api, estimateId);
    const { snapshot } = await api.app.estimates.frozen.read(api.ours.id, issueId);
    expect([snapshot.workshop.currency, snapshot.figures.price.net_minor]).toEqual(['JPY', net_minor]);
    const refused = await change(api.ours, 'USD');
    expect(refused.status).toBe(409);
    const { errors } = refused.body as { errors: { path: string[]; message: string }[] };
    expect(errors).toMatchObject([
      { path: ['currency'], message: expect.stringContaining('have been issued') as string },
    ]);
    expect((await read(estimateId)).currency).toBe('JPY');
  });

  test('is refused once there is an invoice', async () => {
    await sampleDraft(api.theirs);
    const refused = await change(api.theirs, 'SEK');
    expect([refused.status, (refused.body as { errors: { path: string[] }[] }).errors[0].path]).toEqual([
      409,
      ['currency'],
    ]);
  });

  test('an issue freezes the currency of its estimate, and its client reads it in that', async () => {
    const { estimateId } = await sampleEstimate(api.theirs);
    await api.platform.database.execute("UPDATE workshops SET currency = 'USD' WHERE id = :id", { id: api.theirs.id });
    const issueId = await issueOf(api.theirs, api, estimateId);
    const { snapshot } = await api.app.estimates.frozen.read(api.theirs.id, issueId);
    expect(snapshot.workshop.currency).toBe('EUR');
    const client = await clientOf(api.theirs, api, issueId);
    const { body } = await client.call(readClientIssue, { params: { issueId } });
    expect(body).toMatchObject({ letterhead: { currency: 'EUR' }, issue: { currency: 'EUR' } });
  });
});

test('an alternative with nothing in it is warned of, and neither priced nor frozen nor offered', async () => {
  const { estimateId } = await sampleEstimate(api.theirs);
  const { visitor } = api.theirs.people.owner;
  const call = { params: { estimateId } };
  const { settings, settingsVersion } = (await visitor.call(readEstimate, call)).body as CostedEstimate;
  const alternatives = [{ id: newId(), name: 'Another way', group: '', note: '', replaces: [] }];
  const changes = [
    { kind: 'settings', id: estimateId, version: settingsVersion, content: { ...settings, alternatives } },
  ];
  const kept = await visitor.call(changeEstimate, { ...call, body: { changes } });
  const { findings } = (kept.body as CostedEstimate).figures;
  expect(findings).toContainEqual(expect.objectContaining({ kind: 'warn', code: 'alternative-empty' }));
  expect((await visitor.call(readAlternatives, call)).body).toEqual({ items: [] });
  const issueId = await issueOf(api.theirs, api, estimateId);
  const { snapshot } = await api.app.estimates.frozen.read(api.theirs.id, issueId);
  expect(snapshot.alternatives).toEqual([]);
  const client = await clientOf(api.theirs, api, issueId);
  expect((await client.call(readClientIssue, { params: { issueId } })).body).toMatchObject({ alternatives: [] });
});
