/** Lets the browser do what else waits, a tap or a picture, before work goes on. */
export const nextTask = (): Promise<void> => new Promise((resolve) => setTimeout(resolve));
