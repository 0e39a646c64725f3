import { v7 as newId } from 'uuid';
import type { Problem } from '#shared/problems/problem-schema';
import { changeEstimate, readEstimate, takeRateCard } from '#shared/estimates/estimates-endpoints';
import type { CardDifference } from '#shared/rate-cards/card-differences';
import type { CardEffectsAnswer } from '#shared/rate-cards/card-effects-schema';
import type { RateCard } from '#shared/rate-cards/rate-card';
import {
  copyRateCard,
  exportRateCard,
  importRateCard,
  keepRateCard,
  listRateCards,
  putRateCardInForce,
  readCardDifferences,
  readCardEffects,
  removeRateCard,
  takeRateCardBack,
  workCardEffects,
  type WholeRateCard,
} from '#shared/rate-cards/rate-cards-endpoints';
import type { RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import { startCard } from '#shared/rate-cards/start-card';
import { withValueAt } from '#shared/rate-cards/tables/value-at';
import { cardInForce, dayAhead, draftCard, wholeCard, workOut as workOutOf } from './sample-card';
import { sampleEstimate } from './sample-estimate';
import { startApi, type Api } from './start-api';
import type { Visitor } from './visitor';

let api: Api;
let owner: Visitor;
beforeAll(async () => {
  api = await startApi();
  owner = api.as('owner');
}, 60_000);
afterAll(() => api.stop());

const at = ({ id, version }: { id: string; version: number }) => ({ params: { rateCardId: id }, version });
const problem = (response: { body: unknown }) => response.body as Problem;
const summary = (response: { body: unknown }) => response.body as RateCardSummary;

const gilderPath = ['money', 'grades', 2, 'costPerHour'];
const withGilder = (content: RateCard, costPerHour: string): RateCard => withValueAt(content, gilderPath, costPerHour);

const keep = (card: WholeRateCard, content: RateCard, name = card.name) =>
  owner.call(keepRateCard, { ...at(card), body: { name, content } });

const workOut = (id: string) => workOutOf(api.ours, api, id);

const dateFrom = async (card: RateCardSummary, days: number) =>
  owner.call(putRateCardInForce, { ...at(card), body: { from: await dayAhead(api.ours, api, days) } });

/** The effect is looked at, then the card is given its day. */
const putFrom = async (card: RateCardSummary, days: number) => {
  await workOut(card.id);
  return dateFrom(card, days);
};

async function historyOf(id: string) {
  return api.platform.database.select<{ code: string; after: { count: number; lines: CardDifference[] } | null }>(
    'SELECT code, after FROM audit WHERE workshop_id = :workshopId AND subject_id = :id ORDER BY id',
    { workshopId: api.ours.id, id },
  );
}

describe('A workshop', () => {
  it('begins with the start card, in force since the beginning', async () => {
    const { body } = await owner.call(listRateCards);
    const { items } = body as { items: RateCardSummary[] };
    expect(items).toEqual([expect.objectContaining({ state: 'in-force', basedOnId: null, from: '1970-01-01' })]);
    expect((await wholeCard(api.ours, items[0].id)).content).toEqual(startCard);
  });
});

describe('The currency of a card', () => {
  const currencyOf = async (id: string) => (await wholeCard(api.ours, id)).content.money.currency;

  it('is the workshop’s as it was when something of the card was changed, whatever is sent', async () => {
    const draft = await draftCard(api.ours, 'Rates in their currency');
    const lying = (content: RateCard): RateCard => ({ ...content, money: { ...content.money, currency: 'XXX' } });
    await keep(draft, lying(draft.content), 'Only another name');
    expect(await currencyOf(draft.id)).toBeUndefined();
    const named = await wholeCard(api.ours, draft.id);
    await keep(named, lying(withGilder(named.content, '41')));
    expect(await currencyOf(draft.id)).toBe('EUR');
    const { body } = await owner.call(readCardDifferences, { params: { rateCardId: draft.id }, query: {} });
    expect((body as { differences: CardDifference[] }).differences.map(({ field }) => field)).toEqual(['costPerHour']);
    await owner.call(removeRateCard, at(await wholeCard(api.ours, draft.id)));
  });
});

describe('A copy', () => {
  it('is a draft with everything its model holds', async () => {
    const from = await cardInForce(api.ours);
    const draft = await draftCard(api.ours, 'Spring rates');
    expect(draft).toMatchObject({ name: 'Spring rates', state: 'draft', from: null, basedOnId: from.id, version: 1 });
    expect(draft.content).toEqual(startCard);
  });

  it('is made once, however often it is asked for', async () => {
    const from = await cardInForce(api.ours);
    const call = { params: { rateCardId: from.id }, body: { id: newId(), name: 'Twice' } };
    const [first, second] = [await owner.call(copyRateCard, call), await owner.call(copyRateCard, call)];
    expect(second.body).toEqual(first.body);
    expect((await historyOf(call.body.id)).length).toBe(1);
  });

  it('does not overwrite a card that stands under its id', async () => {
    const from = await cardInForce(api.ours);
    const response = await owner.call(copyRateCard, {
      params: { rateCardId: from.id },
      body: { id: from.id, name: 'Over itself' },
    });
    expect([response.status, problem(response).type]).toEqual([409, 'urn:problem:rate-card-id-taken']);
  });

  it('of a draft is based on the dated card that one came from', async () => {
    const draft = await draftCard(api.ours);
    const id = newId();
    await owner.call(copyRateCard, { params: { rateCardId: draft.id }, body: { id, name: 'Second thoughts' } });
    expect((await wholeCard(api.ours, id)).basedOnId).toBe(draft.basedOnId);
  });
});

describe('A draft', () => {
  it('keeps what is entered, and tells the history what differs', async () => {
    const draft = await draftCard(api.ours);
    const response = await keep(draft, withGilder(draft.content, '36.50'));
    expect([response.status, summary(response).version]).toEqual([200, 2]);
    expect((await wholeCard(api.ours, draft.id)).content.money.grades[2]?.costPerHour).toBe('36.50');
    const [, changed] = await historyOf(draft.id);
    expect(changed?.code).toBe('history-rate-card-changed');
    expect(changed?.after?.lines).toEqual([
      expect.objectContaining({ itemId: 'gilder', before: '33.00', after: '36.50' }),
    ]);
  });

  it('makes one entry of one person’s saves in ten minutes', async () => {
    const draft = await draftCard(api.ours);
    const first = summary(await keep(draft, withGilder(draft.content, '34.00')));
    await keep({ ...draft, version: first.version }, withGilder(draft.content, '35.00'));
    const entries = (await historyOf(draft.id)).filter(({ code }) => code === 'history-rate-card-changed');
    expect(entries.map(({ after }) => after?.lines.map(({ after: value }) => value))).toEqual([['35.00']]);
  });

  it('takes the same save twice as one', async () => {
    const draft = await draftCard(api.ours);
    const content = withGilder(draft.content, '34.00');
    const [first, second] = [await keep(draft, content), await keep(draft, content)];
    expect([first.status, second.status, summary(second).version]).toEqual([200, 200, 2]);
  });

  it('is refused to whoever saw an older one, with what stands there now', async () => {
    const draft = await draftCard(api.ours);
    await keep(draft, withGilder(draft.content, '34.00'));
    const response = await keep(draft, withGilder(draft.content, '40.00'));
    expect(response.status).toBe(412);
    const current = problem(response).current as WholeRateCard;
    expect([current.version, current.state, current.content.money.grades[2]?.costPerHour]).toEqual([
      2,
      'draft',
      '34.00',
    ]);
  });

  it('is refused as a whole when one figure is not right, which is named', async () => {
    const draft = await draftCard(api.ours);
    const response = await keep(draft, withGilder(draft.content, 'fair'));
    expect(response.status).toBe(400);
    expect(problem(response).errors).toEqual([
      { path: ['content', ...gilderPath], message: expect.any(String) as string },
    ]);
    expect((await wholeCard(api.ours, draft.id)).version).toBe(1);
  });

  it('takes nothing that is not on the card, nor a state or day', async () => {
    const draft = await draftCard(api.ours);
    for (const more of [{ workshopId: api.theirs.id }, { state: 'in-force' }, { from: '2026-01-01' }, { version: 7 }]) {
      const body = { name: draft.name, content: draft.content, ...more };
      expect((await owner.call(keepRateCard, { ...at(draft), body })).status).toBe(400);
    }
  });

  it('can be removed', async () => {
    const draft = await draftCard(api.ours);
    expect((await owner.call(removeRateCard, at(draft))).status).toBe(204);
    expect((await owner.call(readCardDifferences, { params: { rateCardId: draft.id } })).status).toBe(404);
    expect((await historyOf(draft.id)).at(-1)?.code).toBe('history-rate-card-removed');
  });

  it('is not removed while another was copied from it', async () => {
    const set = summary(await putFrom(await draftCard(api.ours), 75));
    const id = newId();
    await owner.call(copyRateCard, {
      params: { rateCardId: set.id },
      body: { id, name: 'Copied before it was taken back' },
    });
    const back = summary(await owner.call(takeRateCardBack, at(set)));
    const response = await owner.call(removeRateCard, at(back));
    expect([response.status, problem(response).title]).toEqual([
      409,
      '“Copied before it was taken back” was copied from this card; remove that draft first.',
    ]);
  });

  it('tells its differences against the card in force, or any other', async () => {
    const draft = await draftCard(api.ours);
    await keep(draft, withGilder(draft.content, '36.00'));
    const other = await draftCard(api.ours);
    await keep(other, withGilder(other.content, '39.00'));
    const call = (query?: { against: string }) =>
      owner.call(readCardDifferences, { params: { rateCardId: draft.id }, ...(query ? { query } : {}) });
    type Answer = { against: RateCardSummary; differences: CardDifference[] };
    const inForce = (await call()).body as Answer;
    expect([inForce.against.state, inForce.differences.map(({ before, after }) => [before, after])]).toEqual([
      'in-force',
      [['33.00', '36.00']],
    ]);
    const against = (await call({ against: other.id })).body as Answer;
    expect(against.differences.map(({ before, after }) => [before, after])).toEqual([['39.00', '36.00']]);
    expect((await call({ against: (await cardInForce(api.theirs)).id })).status).toBe(404);
  });
});

describe('A card put in force', () => {
  it('from a later day is set, and nothing changes until that day comes', async () => {
    const before = await cardInForce(api.ours);
    const draft = await draftCard(api.ours, 'Next month');
    const response = await putFrom(draft, 30);
    expect(summary(response)).toMatchObject({ state: 'set', from: await dayAhead(api.ours, api, 30) });
    expect((await cardInForce(api.ours)).id).toBe(before.id);
  });

  it('is what a draft for a day after that is compared with; it is compared with the one before it', async () => {
    const before = await cardInForce(api.ours);
    const next = await draftCard(api.ours, 'The month after');
    await putFrom(next, 75);
    const draft = await draftCard(api.ours);
    const against = async (rateCardId: string, days: number) => {
      const query = { from: await dayAhead(api.ours, api, days) };
      const { body } = await owner.call(readCardDifferences, { params: { rateCardId }, query });
      return (body as { against: RateCardSummary }).against.id;
    };
    expect(await Promise.all([against(draft.id, 0), against(draft.id, 75)])).toEqual([before.id, next.id]);
    expect(await against(next.id, 0)).not.toBe(next.id);
    expect(await against(before.id, 75)).toBe(before.id);
  });

  it('may be asked for twice', async () => {
    const draft = await draftCard(api.ours);
    const [first, second] = [await putFrom(draft, 31), await putFrom(draft, 31)];
    expect([first.status, second.status]).toEqual([200, 200]);
    expect(second.body).toEqual(first.body);
    const dated = (await historyOf(draft.id)).filter(({ code }) => code === 'history-rate-card-in-force');
    expect(dated).toHaveLength(1);
  });

  it.each([
    ['yesterday', -1, 400],
    ['a day on which another begins', 30, 409],
  ])('is refused for %s', async (_, days, status) => {
    const response = await putFrom(await draftCard(api.ours), days);
    expect([response.status, problem(response).errors.map(({ path }) => path)]).toEqual([status, [['from']]]);
  });

  it('is refused while nobody has seen what the card as it stands does to the open estimates', async () => {
    const draft = await draftCard(api.ours);
    const unseen = await dateFrom(draft, 70);
    expect([unseen.status, problem(unseen).type]).toEqual([409, 'urn:problem:rate-card-effects-unseen']);
    await owner.call(workCardEffects, { params: { rateCardId: draft.id } });
    expect((await dateFrom(draft, 70)).status).toBe(409);
    await api.platform.tasks.runDue();
    const changed = summary(await keep(draft, withGilder(draft.content, '39.00')));
    expect(problem(await dateFrom(changed, 70)).type).toBe('urn:problem:rate-card-effects-unseen');
    expect((await putFrom(changed, 70)).status).toBe(200);
  });

  it('takes no estimate before its day has come', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const set = summary(await putFrom(await draftCard(api.ours), 71));
    const { version } = (await owner.call(readEstimate, { params: { estimateId } })).body as { version: number };
    const asked = await owner.call(takeRateCard, { params: { estimateId }, body: { rateCardId: set.id }, version });
    expect([asked.status, problem(asked).type]).toEqual([409, 'urn:problem:rate-card-not-begun']);
  });

  it('is refused for what is no day', async () => {
    const draft = await draftCard(api.ours);
    for (const from of ['2026-02-30', 'soon', '', null])
      expect((await owner.call(putRateCardInForce, { ...at(draft), body: { from } })).status).toBe(400);
  });

  it('begins once, however many ask at the same time', async () => {
    const drafts = await Promise.all([1, 2, 3, 4].map(() => draftCard(api.ours)));
    const statuses = (await Promise.all(drafts.map((draft) => putFrom(draft, 60)))).map(({ status }) => status);
    expect(statuses.sort()).toEqual([200, 409, 409, 409]);
  });

  it('is never changed, filled, removed or dated again', async () => {
    const dated = { ...(await wholeCard(api.ours, (await cardInForce(api.ours)).id)) };
    const { bytes } = await api.app.rateCards.workbooks.export(api.ours.id, dated.id);
    const answers = [
      await keep(dated, withGilder(dated.content, '1.00')),
      await owner.call(removeRateCard, at(dated)),
      await putFrom(dated, 90),
      await owner.call(importRateCard, { ...at(dated), file: { name: 'rates.xlsx', bytes } }),
    ];
    expect(answers.map(({ status }) => status)).toEqual([409, 409, 409, 409]);
    expect(await wholeCard(api.ours, dated.id)).toEqual(dated);
  });

  it('can be taken back before its day, and not after', async () => {
    const set = summary(await putFrom(await draftCard(api.ours), 45));
    const back = await owner.call(takeRateCardBack, at(set));
    expect(summary(back)).toMatchObject({ state: 'draft', from: null });
    const begun = await owner.call(takeRateCardBack, at(await cardInForce(api.ours)));
    expect([begun.status, problem(begun).type]).toEqual([409, 'urn:problem:rate-card-begun']);
  });
});

describe('The effects of a draft on open estimates', () => {
  const effectsOf = async (id: string, by = owner) =>
    (await by.call(readCardEffects, { params: { rateCardId: id } })).body as CardEffectsAnswer;

  it('are not there until somebody asks', async () => {
    const draft = await draftCard(api.ours);
    expect(await effectsOf(draft.id)).toEqual({
      ...{ state: 'none', isCurrent: false, worked: 0, total: 0, workedAt: null, effects: [] },
    });
  });

  it('are the old price, the new price and the lines that differ, of every open estimate', async () => {
    const { estimateId, jobId } = await sampleEstimate(api.ours);
    const draft = await draftCard(api.ours);
    await keep(draft, withGilder(draft.content, '66.00'));
    expect((await workOut(draft.id)).state).toBe('waiting');
    const known = await effectsOf(draft.id, api.as('estimator'));
    expect(known).toMatchObject({ state: 'done', isCurrent: true, worked: known.total });
    const effect = known.effects.find((one) => one.estimateId === estimateId);
    const { body } = await owner.call(readEstimate, { params: { estimateId } });
    const net = (body as { figures: { price: { net_minor: number } } }).figures.price.net_minor;
    expect(effect).toMatchObject({ jobId, currency: 'EUR', before_minor: net, findings: [] });
    const rises = effect!.lines.map(({ before_minor, after_minor }) => after_minor! - before_minor!);
    expect(rises.every((rise) => rise > 0)).toBe(true);
    expect(rises.reduce((sum, rise) => sum + rise, 0)).toBe(effect!.after_minor - effect!.before_minor);
    expect(effect!.lines.map(({ kind }) => kind)).toEqual(expect.arrayContaining(['ground', 'gilding']));
    expect(effect!.lines.map(({ kind }) => kind)).not.toContain('carving');
  });

  it('are what taking the card then comes to, to the cent', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const draft = await draftCard(api.ours);
    await keep(draft, withGilder(draft.content, '41.00'));
    await workOut(draft.id);
    const promised = (await effectsOf(draft.id)).effects.find((one) => one.estimateId === estimateId)!.after_minor;
    await putFrom({ ...draft, version: 2 }, 0);
    const { version } = (await owner.call(readEstimate, { params: { estimateId } })).body as { version: number };
    const taken = await owner.call(takeRateCard, { params: { estimateId }, body: { rateCardId: draft.id }, version });
    expect((taken.body as { figures: { price: { net_minor: number } } }).figures.price.net_minor).toBe(promised);
  });

  it('say what the new card lacks', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const draft = await draftCard(api.ours);
    const ornaments = draft.content.carving.ornaments.filter(({ id }) => id !== 'egg-and-dart');
    await keep(draft, { ...draft.content, carving: { ...draft.content.carving, ornaments } });
    await workOut(draft.id);
    const effect = (await effectsOf(draft.id)).effects.find((one) => one.estimateId === estimateId);
    expect(effect?.findings).toEqual([expect.objectContaining({ kind: 'missing', code: 'carving-ornament-unknown' })]);
  });

  it('say of an estimate that it cannot be worked on the new card, and of all others what they come to', async () => {
    const { estimateId, memberId, member } = await sampleEstimate(api.ours);
    const forty = { kind: 'member', id: memberId, version: 1, content: { ...member, count: 40 } } as const;
    await owner.call(changeEstimate, { params: { estimateId }, body: { changes: [forty] } });
    const draft = await draftCard(api.ours);
    // Specks of leaf, each bought by itself.
    const products = draft.content.leaf.products.map((one) => ({ ...one, side_mm: 20, leavesPerBooklet: 1 }));
    await keep(draft, { ...draft.content, leaf: { ...draft.content.leaf, products } });
    await workOut(draft.id);
    const answer = await effectsOf(draft.id);
    expect(answer.state).toBe('done');
    const effect = answer.effects.find((one) => one.estimateId === estimateId)!;
    expect(effect.findings).toEqual([{ kind: 'refuse', code: 'effect-too-large', values: {} }]);
    expect(effect.after_minor).toBe(effect.before_minor);
  });

  it('are old when the draft has changed since', async () => {
    const draft = await draftCard(api.ours);
    await workOut(draft.id);
    await keep(draft, withGilder(draft.content, '37.00'));
    expect(await effectsOf(draft.id)).toMatchObject({ state: 'done', isCurrent: false });
    await workOut(draft.id);
    expect(await effectsOf(draft.id)).toMatchObject({ state: 'done', isCurrent: true });
  });

  it('stay those of the card while only its name or its day is another', async () => {
    const draft = await draftCard(api.ours);
    await workOut(draft.id);
    const renamed = summary(await keep(draft, draft.content, 'Renamed'));
    expect(await effectsOf(draft.id)).toMatchObject({ state: 'done', isCurrent: true });
    const set = summary(await putFrom(renamed, 120));
    expect(await effectsOf(draft.id)).toMatchObject({ state: 'done', isCurrent: true });
    await owner.call(takeRateCardBack, at(set));
    expect(await effectsOf(draft.id)).toMatchObject({ state: 'done', isCurrent: true });
  });

  it('are worked out once while they are being worked out', async () => {
    const draft = await draftCard(api.ours);
    const ask = () => owner.call(workCardEffects, { params: { rateCardId: draft.id } });
    await ask();
    await ask();
    const waiting = await api.platform.database.select(
      "SELECT id FROM tasks WHERE kind = 'card effects' AND failed_at IS NULL",
    );
    expect(waiting).toHaveLength(1);
    await api.platform.tasks.runDue();
  });

  it('leave another workshop alone', async () => {
    const theirs = await sampleEstimate(api.theirs);
    const draft = await draftCard(api.ours);
    await workOut(draft.id);
    const known = await effectsOf(draft.id);
    expect(known.effects.map((one) => one.estimateId)).not.toContain(theirs.estimateId);
    const other = await draftCard(api.theirs);
    expect((await owner.call(workCardEffects, { params: { rateCardId: other.id } })).status).toBe(404);
  });

  it('leave out what was accepted or declined', async () => {
    const { estimateId, jobId } = await sampleEstimate(api.ours);
    await api.platform.database.transaction(() =>
      api.app.jobs.markState(api.ours.people.owner.actor, jobId, 'accepted'),
    );
    const draft = await draftCard(api.ours);
    await workOut(draft.id);
    expect((await effectsOf(draft.id)).effects.map((one) => one.estimateId)).not.toContain(estimateId);
  });

  it('do not prolong the session of a page that asks how far they are', async () => {
    const { visitor } = await api.newcomer(api.ours, 'owner');
    const draft = await draftCard(api.ours);
    const seenAt = async () => {
      const [row] = await api.platform.database.select<{ seenAt: Date }>('SELECT MAX(seen_at) AS seenAt FROM sessions');
      return row?.seenAt;
    };
    await visitor.call(readCardEffects, { params: { rateCardId: draft.id } });
    const before = await seenAt();
    api.clock.move({ minutes: 2 });
    await visitor.call(readCardEffects, { params: { rateCardId: draft.id } }).set('x-unattended', '1');
    expect(await seenAt()).toEqual(before);
    await visitor.call(readCardEffects, { params: { rateCardId: draft.id } });
    expect(await seenAt()).not.toEqual(before);
  });
});

describe('A card as a workbook', () => {
  const draftAndBook = async () => {
    const draft = await draftCard(api.ours, 'Rates, “autumn” <2026>');
    const sent = await owner
      .call(exportRateCard, { params: { rateCardId: draft.id } })
      .buffer(true)
      .parse((response, done) => {
        const parts: Buffer[] = [];
        response.on('data', (part: Buffer) => parts.push(part));
        response.on('end', () => done(null, Buffer.concat(parts)));
      });
    return { draft, sent, bytes: sent.body as Buffer };
  };

  it('is sent as an attachment under its own name', async () => {
    const { sent } = await draftAndBook();
    expect(sent.headers['content-type']).toContain('spreadsheetml');
    expect(sent.headers['content-disposition']).toContain(
      'attachment; filename="Rates, _autumn_ <2026>.xlsx"; filename*=UTF-8\'\'Rates%2C%20%E2%80%9Cautumn%E2%80%9D%20%3C2026%3E.xlsx',
    );
  });

  it('fills another draft with the same card exactly', async () => {
    const { draft, bytes } = await draftAndBook();
    const other = await draftCard(api.ours);
    await keep(other, withGilder(other.content, '99.00'));
    const file = { name: 'rates.xlsx', bytes };
    const filled = await owner.call(importRateCard, { ...at({ id: other.id, version: 2 }), file });
    expect([filled.status, summary(filled).version]).toEqual([200, 3]);
    expect((await wholeCard(api.ours, other.id)).content).toEqual(draft.content);
  });

  it.each([
    ['something else under its name', 'rates.xlsx', Buffer.from('<html></html>'), 415],
    ['a picture', 'rates.png', Buffer.from('\x89PNG'), 415],
  ])('is refused when it is %s, and the draft stays as it is', async (_, name, bytes, status) => {
    const draft = await draftCard(api.ours);
    const response = await owner.call(importRateCard, { ...at(draft), file: { name, bytes } });
    expect(response.status).toBe(status);
    expect(await wholeCard(api.ours, draft.id)).toEqual(draft);
  });

  it('is refused to whoever saw an older draft, and without a file', async () => {
    const { draft, bytes } = await draftAndBook();
    await keep(draft, withGilder(draft.content, '35.00'));
    const file = { name: 'rates.xlsx', bytes };
    expect((await owner.call(importRateCard, { ...at(draft), file })).status).toBe(412);
    expect((await owner.call(importRateCard, at({ ...draft, version: 2 }))).status).toBe(415);
  });
});

describe('The day of a card', () => {
  it('takes over when its day comes in the workshop’s own zone, and estimates keep the card they were begun on', async () => {
    const { estimateId } = await sampleEstimate(api.ours);
    const before = await cardInForce(api.ours);
    const draft = await draftCard(api.ours, 'From tomorrow');
    await putFrom(draft, 1);
    expect((await cardInForce(api.ours)).id).toBe(before.id);
    api.clock.move({ minutes: 24 * 60 });
    const { visitor } = await api.newcomer(api.ours, 'owner');
    const { body } = await visitor.call(listRateCards);
    const states = Object.fromEntries((body as { items: RateCardSummary[] }).items.map(({ id, state }) => [id, state]));
    expect([states[draft.id], states[before.id]]).toEqual(['in-force', 'past']);
    const estimate = (await visitor.call(readEstimate, { params: { estimateId } })).body as {
      rateCardId: string;
      version: number;
    };
    expect(estimate.rateCardId).toBe(before.id);
    const take = (rateCardId: string, version: number) =>
      visitor.call(takeRateCard, { params: { estimateId }, body: { rateCardId }, version });
    const taken = (await take(draft.id, estimate.version)).body as { rateCardId: string; version: number };
    expect(taken.rateCardId).toBe(draft.id);
    const undone = (await take(before.id, taken.version)).body as { rateCardId: string };
    expect(undone.rateCardId).toBe(before.id);
  });
});
