export const startRiskWorker = (): Worker => new Worker(new URL('./risk-worker', import.meta.url));
