import type { CostedEstimate } from '#shared/estimates/estimate-schema';
import { changeEstimate, readEstimate } from '#shared/estimates/estimates-endpoints';
import { keepLetterTemplate, listLetterTemplates } from '#shared/agreements/letters-endpoints';
import { totalsInLetters } from '../../backend/migrations/0059-totals-in-letters';
import { currencyOfCards } from '../../backend/migrations/0056-currency-of-cards';
import { severalMeasures } from '../../backend/migrations/0054-several-measures';
import { draftCard, wholeCard } from './sample-card';
import { sampleEstimate } from './sample-estimate';
import { startApi, type Api } from './start-api';

/** Rows as they were kept before a step of the schema, and what the step makes of them; taken twice it does no more. */
let api: Api;
beforeAll(async () => {
  api = await startApi();
}, 60_000);
afterAll(() => api.stop());

async function take({ statements }: { readonly statements: readonly string[] }): Promise<void> {
  for (const statement of [...statements, ...statements]) await api.platform.database.execute(statement);
}

const line = (id: string) => ({ id, name: 'Rail “A”', taxCategoryId: 'standard', memberId: null, alternativeId: null });

test('a line with one measure has it as the first of several, with its texts; the lines about it stay in their order', async () => {
  const { estimateId } = await sampleEstimate(api.ours);
  const ids = [1, 2, 3].map((number) => `018f0000-0000-7000-8000-00000000000${number}`);
  const paid = { kind: 'paid-quantity', unit: 'm²', price: '80' };
  const single = { length: null, girth: null, area: null, sides: 1, worth: 1 };
  const rail = {
    ...single,
    rule: 'plain-area',
    length: { text: `8' 2"`, mm: 2489.2 },
    girth: { text: '3 in', mm: 76.2 },
  };
  const panel = { ...single, rule: 'carved-each-side', area: { text: '0.5 m²', mm2: 500_000 }, sides: 2 };
  const extras = [
    { ...line(ids[0]), kind: 'price', price: '12.50' },
    { ...line(ids[1]), ...paid, rule: 'as measured', quantity: '0.1897', measured: rail },
    { ...line(ids[2]), ...paid, rule: 'carved', quantity: '2', measured: panel },
  ];
  // What was prepared for readers was made by another calculator then.
  await api.platform.database.execute('DELETE FROM estimate_readings WHERE id = :estimateId', { estimateId });
  await api.platform.database.execute(
    "UPDATE estimates SET settings = JSON_SET(settings, '$.extras', JSON_EXTRACT(:extras, '$')) WHERE id = :estimateId",
    { estimateId, extras: JSON.stringify(extras) },
  );
  await take(severalMeasures);
  const read = async () =>
    (await api.as('owner').call(readEstimate, { params: { estimateId } })).body as CostedEstimate;
  const { settings, settingsVersion } = await read();
  const nothing = { count: 1, length_mm: null, girth_mm: null, area_mm2: null, sides: 1, worth: 1 };
  expect(settings.extras).toEqual([
    extras[0],
    {
      ...extras[1],
      measured: {
        ...{ rule: 'plain-area', measures: [{ ...nothing, length_mm: 2489.2, girth_mm: 76.2 }] },
        typed: { 'measures.0.length_mm': `8' 2"`, 'measures.0.girth_mm': '3 in' },
      },
    },
    {
      ...extras[2],
      measured: {
        ...{ rule: 'carved-each-side', measures: [{ ...nothing, area_mm2: 500_000, sides: 2 }] },
        typed: { 'measures.0.area_mm2': '0.5 m²' },
      },
    },
  ]);
  // The quantity is still what its measures come to, so that the line can be kept as it stands.
  const changes = [
    { kind: 'settings', id: estimateId, version: settingsVersion, content: { ...settings, terms: 'x' } },
  ];
  const kept = await api.as('owner').call(changeEstimate, { params: { estimateId }, body: { changes } });
  expect(kept.status).toBe(200);
});

test('a card of the workshop’s own is meant in the currency there is; the start card stays as it was planted', async () => {
  const { id, basedOnId } = await draftCard(api.ours, 'Kept before');
  await take(currencyOfCards);
  expect((await wholeCard(api.ours, id)).content.money.currency).toBe('EUR');
  expect((await wholeCard(api.ours, basedOnId ?? '')).content.money.currency).toBeUndefined();
});

test('words of a letter that said “with tax” after the total leave it to the total', async () => {
  const text = 'It comes to {total} with tax, {client}.';
  const office = api.as('office');
  await office.call(keepLetterTemplate, {
    version: 0,
    body: { kind: 'accepted', subject: 'Ours: {total} with tax', text },
  });
  await take(totalsInLetters);
  const { items } = (await office.call(listLetterTemplates)).body as { items: readonly { kind: string }[] };
  expect(items.find(({ kind }) => kind === 'accepted')).toMatchObject({
    ...{ version: 1, subject: 'Ours: {total}', text: 'It comes to {total}, {client}.' },
  });
});
