import { join } from 'node:path';
import { Rejection } from '#shared/problems/rejection';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { threadFile } from '../platform/threads/thread-file';
import { ThreadQueue } from '../platform/threads/thread-queue';
import type { CardAnswer, CardQuestion } from './workbook/card-answer';

const longest_milliseconds = 10_000;

/** Reads cards in a thread of its own: a small file can be made so that its XML takes many seconds. One that takes too long is refused. */
export class CardReading {
  private readonly thread: ThreadQueue<CardQuestion, CardAnswer>;

  constructor(milliseconds = longest_milliseconds) {
    const failure = () => new Rejection('too-large', 'workbook-too-large');
    const start = () => threadFile(join(__dirname, 'card-workbook-worker.ts'));
    this.thread = new ThreadQueue(start, { time: { milliseconds, failure } });
  }

  async card(bytes: Buffer, currency: string): Promise<RateCard> {
    const answer = await this.thread.ask({ bytes, currency });
    if ('card' in answer) return answer.card;
    const { kind, code, more } = answer.refusal;
    throw new Rejection(kind, code, more);
  }
}
