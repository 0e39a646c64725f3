import { join } from 'node:path';
import { Worker } from 'node:worker_threads';
import type { PlanningQuestion } from '#shared/programme/planning-question';
import type { Programme } from '#shared/programme/programme-plan';
import { threadFile } from '../platform/threads/thread-file';

type Told = { readonly better: Programme } | { readonly plan: Programme };

/** One planning in a thread of its own: tells of better plans as they come, can be stopped, and then answers with the best it has. */
export class PlanningThread {
  private readonly stopped = new Int32Array(new SharedArrayBuffer(4));

  async plan(asked: Omit<PlanningQuestion, 'stop'>, onBetter: (plan: Programme) => void): Promise<Programme> {
    const { file, options } = threadFile(join(__dirname, 'programme-worker.ts'));
    const stop = this.stopped.buffer;
    const thread = new Worker(file, { ...options, workerData: { ...asked, stop } satisfies PlanningQuestion });
    try {
      return await new Promise<Programme>((resolve, reject) => {
        thread.on('message', (told: Told) => ('better' in told ? onBetter(told.better) : resolve(told.plan)));
        thread.on('error', reject);
        thread.on('exit', () => reject(new Error('the thread ended before it had planned')));
      });
    } finally {
      await thread.terminate();
    }
  }

  stop(): void {
    Atomics.store(this.stopped, 0, 1);
  }
}
