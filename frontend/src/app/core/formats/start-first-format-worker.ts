export const startFirstFormatWorker = (): Worker => new Worker(new URL('./first-format-worker', import.meta.url));
