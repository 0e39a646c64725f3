/** Puts one question to a worker and waits for its one answer; the worker is ended afterwards, or as soon as `signal` says so. */
export function askWorker<Question, Answer>(worker: Worker, question: Question, signal?: AbortSignal): Promise<Answer> {
  return new Promise<Answer>((resolve, reject) => {
    const end = (settle: () => void) => {
      worker.terminate();
      settle();
    };
    worker.addEventListener('message', ({ data }: MessageEvent<Answer>) => end(() => resolve(data)));
    worker.addEventListener('error', (event) => end(() => reject(new Error(event.message))));
    signal?.addEventListener('abort', () => end(() => reject(signal.reason as Error)));
    worker.postMessage(question);
  });
}
