import { TestBed } from '@angular/core/testing';
import { ActivatedRoute, convertToParamMap, provideRouter } from '@angular/router';
import { of } from 'rxjs';
import type { PricedIssueSummary } from '#shared/estimates/issue-schema';
import { EstimateServer, ids, refusal, workspaceOn } from '../../../test/estimate-server';
import { signIn, words } from '../../../test/sign-in';
import type { ProblemError } from '../../core/problems/problem-error';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';
import { IssueClient, type IssueRequest } from './issue-client';
import { Issuing } from './issuing';

const made = { id: ids.piece, letter: 'A' } as PricedIssueSummary;
const asked = { note: 'First', acceptsOldCard: false };

describe('Issuing', () => {
  let server: EstimateServer;
  let store: EstimateStore;
  let issuing: Issuing;
  /** Every request that went out, with its key. */
  let sent: { body: IssueRequest; key: string }[];
  let answers: (ProblemError | PricedIssueSummary)[];

  beforeEach(async () => {
    jest.useFakeTimers();
    server = new EstimateServer();
    sent = [];
    answers = [];
    const issue = (_estimateId: string, body: IssueRequest, key: string) => {
      sent.push({ body, key });
      const answer = answers.shift() ?? made;
      return answer instanceof Error ? Promise.reject(answer) : Promise.resolve(answer);
    };
    TestBed.configureTestingModule({
      providers: [
        words,
        provideRouter([]),
        { provide: ActivatedRoute, useValue: { queryParamMap: of(convertToParamMap({})) } },
        ...workspaceOn(server),
        { provide: IssueClient, useValue: { issue } },
        Issuing,
      ],
    });
    signIn(['estimator']);
    store = TestBed.inject(EstimateStore);
    void store.open({ jobId: ids.job, estimateId: ids.estimate });
    await jest.advanceTimersByTimeAsync(1);
    issuing = TestBed.inject(Issuing);
  });
  afterEach(() => jest.useRealTimers());

  const press = async (more: Partial<typeof asked> = {}) => {
    const issue = issuing.press({ ...asked, ...more });
    await jest.advanceTimersByTimeAsync(1);
    return issue;
  };

  it('sends what is unsent first, and issues the version that came of it', async () => {
    store.changeSettings({ title: 'Pier table' });
    expect(await press()).toBe(made);
    expect(server.settings.title).toBe('Pier table');
    expect(sent.map(({ body }) => body)).toEqual([{ ...asked, version: 2 }]);
  });

  it('makes one request of two presses in a row', async () => {
    const [one, other] = [issuing.press(asked), issuing.press(asked)];
    await jest.advanceTimersByTimeAsync(1);
    expect([await one, await other]).toEqual([made, undefined]);
    expect(sent).toHaveLength(1);
  });

  it('asks again under the same key where no answer came, and under another one afterwards', async () => {
    answers = [refusal(503), made, made];
    expect(await press()).toBeUndefined();
    expect(issuing.complaints()).toEqual(['refused 503']);
    await press();
    await press();
    expect(sent[1].key).toBe(sent[0].key);
    expect(sent[2].key).not.toBe(sent[1].key);
    expect(issuing.complaints()).toEqual([]);
  });

  it('takes another key where something else is asked meanwhile, since a key stands for one request', async () => {
    answers = [refusal(503), made];
    await press();
    await press({ note: 'Second' });
    expect(sent[1].key).not.toBe(sent[0].key);
  });

  it('reads the draft again where somebody changed it, and says so', async () => {
    answers = [refusal(412, { title: 'Changed since you saw it.' })];
    server.changeElsewhere(ids.leg, { name: 'Leg, left' });
    expect(await press()).toBeUndefined();
    await jest.advanceTimersByTimeAsync(1);
    expect(issuing.complaints()).toEqual(['Changed since you saw it.']);
    expect(store.members().map(({ name }) => name)).toContain('Leg, left');
  });

  it('tells everything the server says stops it', async () => {
    answers = [refusal(409, { title: 'Stopped.', errors: [{ path: [ids.edge], message: 'Choose the leaf.' }] })];
    await press();
    expect(issuing.complaints()).toEqual(['Stopped.', 'Choose the leaf.']);
  });

  it('sends nothing while an entry is not whole', async () => {
    TestBed.inject(UnfinishedEntries).put('profit', {});
    expect(await press()).toBeUndefined();
    expect(sent).toEqual([]);
    expect(issuing.complaints()).toHaveLength(1);
  });

  it('asks whether the old card is meant once the server said it is old, and sends nothing until it is said', async () => {
    answers = [refusal(409, { type: 'urn:problem:issue-card-old' })];
    expect(issuing.isCardOld()).toBe(false);
    await press();
    expect(issuing.isCardOld()).toBe(true);
    await press();
    expect(sent).toHaveLength(1);
    expect(await press({ acceptsOldCard: true })).toBe(made);
    expect(sent.at(-1)?.body.acceptsOldCard).toBe(true);
  });
});
