import { openDB, type DBSchema, type IDBPDatabase } from 'idb'
import type { KeptServing } from './kept-serving.ts'

/** Where kept servings lie. `update` reads and writes in one step, so that two tabs never overwrite each other. */
export interface Shelf {
  /** False where the browser keeps nothing: what lies here lasts as long as the page. */
  readonly durable: boolean
  all(): Promise<KeptServing[]>
  update(
    id: string,
    change: (before: KeptServing | undefined) => KeptServing | undefined,
  ): Promise<KeptServing | undefined>
  close(): void
}

interface SeatDatabase extends DBSchema {
  servings: { key: string; value: KeptServing }
}

export function memoryShelf(from: readonly KeptServing[] = []): Shelf {
  const records = new Map(from.map((kept) => [kept.id, kept]))
  return {
    durable: false,
    all: () => Promise.resolve([...records.values()]),
    update(id, change) {
      const after = change(records.get(id))
      if (after) records.set(id, after)
      else records.delete(id)
      return Promise.resolve(after)
    },
    close: () => undefined,
  }
}

const shelfOf = (db: IDBPDatabase<SeatDatabase>): Shelf => ({
  durable: true,
  all: () => db.getAll('servings'),
  async update(id, change) {
    const work = db.transaction('servings', 'readwrite')
    const before = await work.store.get(id)
    const after = change(before)
    if (after) await work.store.put(after, id)
    else await work.store.delete(id)
    await work.done
    return after
  },
  close: () => db.close(),
})

const patience = 3_000

/** Opens this browser's shelf in IndexedDB; rejects where the browser refuses or does not answer within three seconds. */
export async function openShelf(name = 'scrim-seat'): Promise<Shelf> {
  const opening = openDB<SeatDatabase>(name, 1, {
    upgrade: (db) => void db.createObjectStore('servings'),
  })
  let timer: ReturnType<typeof setTimeout> | undefined
  const late = new Promise<never>((_, reject) => {
    timer = setTimeout(() => reject(new Error('IndexedDB did not answer.')), patience)
  })
  try {
    return shelfOf(await Promise.race([opening, late]))
  } finally {
    clearTimeout(timer)
  }
}
