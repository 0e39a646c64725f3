import { Rejection } from '#shared/problems/rejection';

const mostWaiting = 200;
const retryAfter_seconds = 10;

/**
 * Lets a few run at once and the others wait in the order they came, before anything is taken for them: no connection, no lock. More
 * than 200 waiting are refused.
 */
export class Turns {
  private readonly waiting: (() => void)[] = [];
  private running = 0;

  constructor(
    private readonly atOnce: number,
    private readonly longestQueue = mostWaiting,
  ) {}

  async take<T>(work: () => Promise<T>): Promise<T> {
    await this.turn();
    try {
      return await work();
    } finally {
      this.running -= 1;
      this.waiting.shift()?.();
    }
  }

  private async turn(): Promise<void> {
    if (this.running >= this.atOnce) {
      if (this.waiting.length >= this.longestQueue)
        throw new Rejection('unavailable', 'problem-busy', { retryAfter_seconds });
      await new Promise<void>((resolve) => this.waiting.push(resolve));
    }
    this.running += 1;
  }
}
