import { TestBed } from '@angular/core/testing';
import { refusal } from '../../test/estimate-server';
import { EstimateClient } from './estimate-client';
import { Presence, type PresenceAnswer } from './presence';

describe('Presence', () => {
  const answer: PresenceAnswer = { version: 4, others: ['Wim Haas'], rateCardInForceId: 'c' };
  let asked: number;
  let answers: (() => Promise<PresenceAnswer>)[];
  let heard: PresenceAnswer[];

  const hide = (state: 'hidden' | 'visible') => {
    Object.defineProperty(document, 'visibilityState', { configurable: true, value: state });
    document.dispatchEvent(new Event('visibilitychange'));
  };

  beforeEach(() => {
    jest.useFakeTimers();
    [asked, answers, heard] = [0, [], []];
    const presence = () => {
      asked += 1;
      return answers.shift()?.() ?? Promise.resolve(answer);
    };
    TestBed.configureTestingModule({ providers: [{ provide: EstimateClient, useValue: { presence } }] });
  });
  afterEach(() => {
    Reflect.deleteProperty(document, 'visibilityState');
    jest.useRealTimers();
  });

  const watch = () =>
    TestBed.inject(Presence)
      .of('e')
      .subscribe((one) => heard.push(one));

  it('is told every 20 seconds', async () => {
    const watching = watch();
    await jest.advanceTimersByTimeAsync(50_000);
    expect([asked, heard[0]]).toEqual([3, answer]);
    watching.unsubscribe();
    await jest.advanceTimersByTimeAsync(60_000);
    expect(asked).toBe(3);
  });

  it('is not told from a page nobody looks at, and at once when somebody does again', async () => {
    const watching = watch();
    hide('hidden');
    await jest.advanceTimersByTimeAsync(120_000);
    expect(asked).toBe(0);
    hide('visible');
    await jest.advanceTimersByTimeAsync(1);
    expect(asked).toBe(1);
    watching.unsubscribe();
  });

  it('goes on after a server that was away', async () => {
    answers.push(() => Promise.reject(refusal(503)));
    const watching = watch();
    await jest.advanceTimersByTimeAsync(30_000);
    expect([asked, heard.length]).toEqual([2, 1]);
    watching.unsubscribe();
  });

  it('waits for one answer before it asks again', async () => {
    answers.push(() => new Promise(() => undefined));
    const watching = watch();
    await jest.advanceTimersByTimeAsync(100_000);
    expect(asked).toBe(1);
    watching.unsubscribe();
  });
});
