import { TestBed } from '@angular/core/testing';
import { problemSchema } from '#shared/problems/problem-schema';
import type { RateCard } from '#shared/rate-cards/rate-card';
import type { RateCardSummary } from '#shared/rate-cards/rate-card-summary-schema';
import type { WholeRateCard } from '#shared/rate-cards/rate-cards-endpoints';
import { startCard } from '#shared/rate-cards/start-card';
import { withValueAt } from '#shared/rate-cards/tables/value-at';
import { signIn, words } from '../../../test/sign-in';
import { ProblemError } from '../../core/problems/problem-error';
import { Saving } from '../../core/saving/saving';
import { RateCardCalls, type CardEntries, type SeenCard } from '../rate-card-calls';
import { CardSaving } from './card-saving';
import { CardStore } from './card-store';

const id = '018f0000-0000-7000-8000-000000000031';
const gilder = ['money', 'grades', 2, 'costPerHour'];
const carver = ['money', 'grades', 1, 'costPerHour'];

const refusal = (status: number, more: object = {}) =>
  new ProblemError(
    problemSchema.parse({ type: 'about:blank', title: `refused ${status}`, status, instance: '', errors: [], ...more }),
  );

/** The server's side of one draft, in memory. */
class CardServer implements Pick<RateCardCalls, 'read' | 'keep'> {
  card: WholeRateCard = {
    ...{ id, version: 1, name: 'Spring', state: 'draft', from: null, basedOnId: null },
    changedAt: '2026-03-01T08:00:00.000Z',
    content: startCard as WholeRateCard['content'],
  };
  readonly arrived: CardEntries[] = [];
  readonly failures: ProblemError[] = [];

  read = () => Promise.resolve(this.card);

  keep(seen: SeenCard, entries: CardEntries): Promise<RateCardSummary> {
    const failure = this.failures.shift();
    if (failure) return Promise.reject(failure);
    if (seen.version !== this.card.version) return Promise.reject(refusal(412, { current: this.card }));
    this.arrived.push(entries);
    this.change(entries);
    const { content: _content, ...summary } = this.card;
    return Promise.resolve(summary);
  }

  change({ name, content }: CardEntries): void {
    const version = this.card.version + 1;
    this.card = { ...this.card, version, name, content: content as WholeRateCard['content'] };
  }
}

describe('A draft of a rate card', () => {
  let server: CardServer;
  let store: CardStore;
  let cardSaving: CardSaving;
  const settle = (wait_ms = 0) => new Promise((resolve) => setTimeout(resolve, wait_ms));
  const saving = () => TestBed.inject(Saving);
  const gilderOf = ({ money }: RateCard) => money.grades[2]?.costPerHour;
  const carverOf = ({ money }: RateCard) => money.grades[1]?.costPerHour;

  beforeEach(async () => {
    server = new CardServer();
    TestBed.configureTestingModule({
      providers: [words, CardStore, CardSaving, { provide: RateCardCalls, useValue: server }],
    });
    signIn(['owner']);
    store = TestBed.inject(CardStore);
    cardSaving = TestBed.inject(CardSaving);
    store.open(id);
    TestBed.tick();
    await settle();
  });

  it('saves itself once after the last of several entries', async () => {
    store.enterCell(gilder, '34.00');
    store.enterCell(gilder, '35.00');
    expect(saving().state()).toBe('idle');
    await settle(700);
    expect(server.arrived.map(({ content }) => gilderOf(content))).toEqual(['35.00']);
    expect([saving().state(), store.isDirty(), store.summary()?.version]).toEqual(['kept', false, 2]);
  });

  it('is not sent while a figure is wrong, and says what is wrong beside it', async () => {
    store.enterCell(gilder, 'fair');
    await cardSaving.flush();
    expect([server.arrived.length, saving().state(), store.isDirty()]).toEqual([0, 'failed', true]);
    expect(store.remarks().of(gilder)).not.toBe('');
    expect([store.remarks().countIn('labour'), store.remarks().countIn('leaf')]).toEqual([1, 0]);
    store.enterCell(gilder, '34.00');
    expect(await cardSaving.flush()).toBe(true);
  });

  it('leaves a text standing that cannot be read, and sends nothing until it can', async () => {
    store.leaveUnread(gilder, { text: 'a lot', message: 'not clear' });
    expect([store.remarks().of(gilder), store.remarks().textOf(gilder)]).toEqual(['not clear', 'a lot']);
    expect(await cardSaving.flush()).toBe(false);
    store.enterCell(gilder, '34.00');
    expect([store.remarks().count, await cardSaving.flush()]).toEqual([0, true]);
  });

  it('takes steps back and forth, and saves what stands then', async () => {
    store.enterCell(gilder, '34.00');
    await cardSaving.flush();
    store.undo();
    expect(gilderOf(store.content()!)).toBe('33.00');
    await cardSaving.flush();
    store.redo();
    await cardSaving.flush();
    expect(server.arrived.map(({ content }) => gilderOf(content))).toEqual(['34.00', '33.00', '34.00']);
    expect(store.canRedo()).toBe(false);
  });

  it('lays together what two changed in different lines, by itself', async () => {
    server.change({ name: 'Summer', content: withValueAt<RateCard>(startCard, carver, '32.00') });
    store.enterCell(gilder, '34.00');
    expect(await cardSaving.flush()).toBe(true);
    expect([gilderOf(server.card.content), carverOf(server.card.content), server.card.name]).toEqual([
      '34.00',
      '32.00',
      'Summer',
    ]);
    expect([cardSaving.theirs(), saving().state()]).toEqual([undefined, 'kept']);
  });

  it('undoes what was entered here alone after that', async () => {
    server.change({ name: 'Spring', content: withValueAt<RateCard>(startCard, carver, '32.00') });
    store.enterCell(gilder, '34.00');
    await cardSaving.flush();
    store.undo();
    expect([gilderOf(store.content()!), carverOf(store.content()!)]).toEqual(['33.00', '32.00']);
    store.redo();
    expect([gilderOf(store.content()!), carverOf(store.content()!)]).toEqual(['34.00', '32.00']);
  });

  it('asks about a line both changed, and keeps it as chosen with the other lines of both', async () => {
    const both = withValueAt<RateCard>(startCard, carver, '32.00');
    server.change({ name: 'Spring', content: withValueAt<RateCard>(both, gilder, '40.00') });
    store.enterCell(gilder, '34.00');
    expect(await cardSaving.flush()).toBe(false);
    const theirs = cardSaving.theirs()!;
    expect([gilderOf(theirs.content), gilderOf(store.content()!)]).toEqual(['40.00', '34.00']);
    expect(store.mergedWith(theirs)?.overlaps).toEqual(['content/money/grades/gilder/costPerHour']);
    expect(await cardSaving.settle(() => 'mine')).toBe(true);
    expect([gilderOf(server.card.content), carverOf(server.card.content)]).toEqual(['34.00', '32.00']);
    expect([server.card.version, cardSaving.theirs()]).toEqual([3, undefined]);
  });

  it('sends nothing where theirs was chosen and nothing else differs', async () => {
    server.change({ name: 'Spring', content: withValueAt<RateCard>(startCard, gilder, '40.00') });
    store.enterCell(gilder, '34.00');
    await cardSaving.flush();
    expect(await cardSaving.settle(() => 'theirs')).toBe(true);
    expect([gilderOf(store.content()!), store.isDirty(), server.card.version]).toEqual(['40.00', false, 2]);
  });

  it('waits for a server that is away, and sends again', async () => {
    server.failures.push(refusal(503));
    store.enterCell(gilder, '34.00');
    const flushed = cardSaving.flush();
    await settle(20);
    expect(saving().state()).toBe('waiting');
    window.dispatchEvent(new Event('online'));
    expect(await flushed).toBe(true);
    expect(gilderOf(server.card.content)).toBe('34.00');
  });

  it('places what the server would not take beside its cell', async () => {
    server.failures.push(
      refusal(400, { errors: [{ path: ['content', ...gilder], message: 'Not in this workshop.' }] }),
    );
    store.enterCell(gilder, '34.00');
    expect(await cardSaving.flush()).toBe(false);
    expect(store.remarks().of(gilder)).toBe('Not in this workshop.');
  });

  it('cannot be changed by an estimator, nor once it is dated', () => {
    signIn(['estimator']);
    store.enterCell(gilder, '34.00');
    expect(store.isDirty()).toBe(false);
    signIn(['owner']);
    store.tell({ ...store.summary()!, state: 'set', from: '2026-04-01' });
    store.enterCell(gilder, '34.00');
    expect(gilderOf(store.content()!)).toBe('33.00');
  });
});
