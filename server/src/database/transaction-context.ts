import { AsyncLocalStorage } from 'node:async_hooks';
import { Sequelize } from 'sequelize-typescript';

/**
 * Lets every query inside a transaction find it by itself. One query that forgets its transaction takes a second
 * connection while it holds the first, and enough of those starve the pool.
 */
const storage = new AsyncLocalStorage<Map<string, unknown>>();

const namespace = {
  bind: (work: unknown) => work,
  get: (key: string) => storage.getStore()?.get(key),
  set: (key: string, value: unknown) => storage.getStore()?.set(key, value),
  run: (work: (context: unknown) => unknown) => {
    const context = new Map(storage.getStore());
    return storage.run(context, () => work(context));
  },
};

export function useTransactionContext(): void {
  Sequelize.useCLS(namespace);
}

export function inTransaction(): boolean {
  return Boolean(namespace.get('transaction'));
}
