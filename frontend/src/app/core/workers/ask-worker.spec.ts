import { askWorker } from './ask-worker';

/** A worker that does what a test tells it to. */
class TestWorker extends EventTarget {
  readonly terminate = jest.fn();
  readonly postMessage = jest.fn();
  answer(data: unknown): void {
    this.dispatchEvent(new MessageEvent('message', { data }));
  }
}

const asWorker = (worker: TestWorker): Worker => worker as unknown as Worker;

describe('askWorker', () => {
  it('gives the answer and ends the worker', async () => {
    const worker = new TestWorker();
    const answer = askWorker<number, number>(asWorker(worker), 20);
    worker.answer(42);
    await expect(answer).resolves.toBe(42);
    expect(worker.postMessage).toHaveBeenCalledWith(20);
    expect(worker.terminate).toHaveBeenCalledTimes(1);
  });

  it('fails as the worker failed', async () => {
    const worker = new TestWorker();
    const answer = askWorker(asWorker(worker), 20);
    worker.dispatchEvent(new ErrorEvent('error', { message: 'no such figure' }));
    await expect(answer).rejects.toThrow('no such figure');
  });

  it('ends the worker when nobody wants the answer any more', async () => {
    const worker = new TestWorker();
    const control = new AbortController();
    const answer = askWorker(asWorker(worker), 20, control.signal);
    control.abort(new Error('another figure was typed'));
    await expect(answer).rejects.toThrow('another figure was typed');
    expect(worker.terminate).toHaveBeenCalledTimes(1);
  });
});
