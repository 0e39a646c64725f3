export const startPlanningWorker = (): Worker => new Worker(new URL('./planning-worker', import.meta.url));
