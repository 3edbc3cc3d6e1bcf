import { AsyncLocalStorage } from 'node:async_hooks'
import { Sequelize } from 'sequelize'

/**
 * Makes the transaction of a request ambient: every query that runs inside it takes part in it, so that none can
 * slip past panel and user (row-level security). Sequelize asks for the interface of a continuation-local store;
 * Node's own AsyncLocalStorage stands behind it.
 */
const storage = new AsyncLocalStorage<Map<string, unknown>>()

const store = {
  get: (key: string): unknown => storage.getStore()?.get(key),
  set: (key: string, value: unknown): unknown => {
    storage.getStore()?.set(key, value)
    return value
  },
  run: (work: (context: unknown) => unknown): unknown => {
    const context = new Map(storage.getStore())
    return storage.run(context, () => work(context))
  },
  bind: <F extends (...input: never[]) => unknown>(work: F, context?: Map<string, unknown>): F =>
    ((...input: Parameters<F>) =>
      storage.run(context ?? storage.getStore() ?? new Map(), () => work(...input))) as F,
}

export function useAmbientTransactions(): void {
  Sequelize.useCLS(store)
}
