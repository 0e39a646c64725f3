import { AsyncLocalStorage } from 'node:async_hooks';
import { Sequelize } from 'sequelize';

const storage = new AsyncLocalStorage<Map<string, unknown>>();

/** Sequelize asks this for the transaction that runs here, so that a repository joins it without being handed it. */
const context = {
  get: (key: string) => storage.getStore()?.get(key),
  set: (key: string, value: unknown) => void storage.getStore()?.set(key, value),
  run: <T>(work: () => T): T => storage.run(new Map(), work),
  bind: <T>(work: T): T => work,
};

Sequelize.useCLS(context);

export const isInTransaction = (): boolean => Boolean(context.get('transaction'));

/** Runs work that must not join the transaction it is called from, such as a log of refusals. */
export const outsideTransaction = <T>(work: () => T): T => context.run(work);
