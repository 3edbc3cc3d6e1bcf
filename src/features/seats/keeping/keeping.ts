import {
  changed,
  keptId,
  keptStart,
  requeued,
  submitted,
  type Change,
  type KeptServing,
  type Place,
} from './kept-serving.ts'
import { settled, type Reply } from './settle.ts'
import { memoryShelf, type Shelf } from './shelf.ts'

export interface KeepingState {
  /** False until the shelf has been read once. */
  ready: boolean
  durable: boolean
  /** A touch is on its way to the shelf. */
  saving: boolean
  sending: boolean
  records: ReadonlyMap<string, KeptServing>
}

export interface Keeping {
  state(): KeepingState
  subscribe(listener: () => void): () => void
  change(place: Place, change: Change): void
  /** Locks a serving into the outbox, then tries to send it. */
  submit(place: Place): Promise<void>
  /** Sends what waits; several calls at once are one. */
  flush(): Promise<void>
  /** Puts a refused submission back into the queue. */
  retry(id: string): Promise<void>
  /** Forgets one serving on this phone. */
  discard(id: string): Promise<void>
  /** Reads the shelf again: another tab has written. */
  reread(): Promise<void>
  close(): void
}

interface Means {
  open(): Promise<Shelf>
  send(kept: KeptServing): Promise<'taken' | 'late' | 'void'>
  /** Tells other tabs that the shelf has changed. */
  tell(): void
}

/** Keeps what a listener rates: at each touch in this browser, and in an outbox until the server has it. */
export function createKeeping({ open, send, tell }: Means): Keeping {
  let state: KeepingState = { ready: false, durable: true, saving: false, sending: false, records: new Map() }
  let shelf: Shelf = memoryShelf()
  let pending = 0
  let flushing: Promise<void> | null = null
  let again = false
  let closed = false
  const listeners = new Set<() => void>()

  const set = (part: Partial<KeepingState>) => {
    state = { ...state, ...part }
    for (const listener of listeners) listener()
  }
  const withRecord = (id: string, kept: KeptServing | undefined) => {
    const records = new Map(state.records)
    if (kept) records.set(id, kept)
    else records.delete(id)
    return records
  }
  const lose = () => {
    shelf.close()
    shelf = memoryShelf([...state.records.values()])
    set({ durable: false })
  }

  let work: Promise<unknown> = open()
    .then(async (opened) => {
      shelf = opened
      const records = new Map((await opened.all()).map((kept) => [kept.id, kept]))
      set({ durable: opened.durable, records, ready: true })
    })
    .catch(() => {
      lose()
      set({ ready: true })
    })

  /** One write after another; the screen shows the change at once, the shelf follows. */
  const write = (
    id: string,
    change: (before: KeptServing | undefined) => KeptServing | undefined,
  ): Promise<void> => {
    pending += 1
    const now = change(state.records.get(id))
    set({ saving: true, records: withRecord(id, now) })
    const done = work.then(async () => {
      let after: KeptServing | undefined
      try {
        after = await shelf.update(id, change)
      } catch {
        lose()
        after = state.records.get(id)
      }
      pending -= 1
      set({ saving: pending > 0, ...(pending === 0 ? { records: withRecord(id, after) } : {}) })
      if (!closed) tell()
    })
    work = done
    return done
  }

  const reread = (): Promise<void> => {
    const done = work.then(async () => {
      if (pending > 0) return
      try {
        const all = await shelf.all()
        if (pending === 0) set({ records: new Map(all.map((kept) => [kept.id, kept])) })
      } catch {
        lose()
      }
    })
    work = done
    return done
  }

  const waiting = () => [...state.records.values()].filter((kept) => kept.outbox?.state === 'queued')
  const sendAll = async () => {
    await reread()
    for (const kept of waiting()) {
      if (closed) return
      const reply: Reply = await send(kept).then(
        (outcome) => ({ outcome }),
        (error: unknown) => ({ error }),
      )
      await write(kept.id, (before) => before && settled(before, reply))
    }
  }
  const flush = (): Promise<void> => {
    if (flushing) {
      again = true
      return flushing
    }
    const run = async () => {
      set({ sending: true })
      do {
        again = false
        await sendAll()
      } while (again && !closed)
    }
    flushing = run().finally(() => {
      flushing = null
      set({ sending: false })
    })
    return flushing
  }

  return {
    state: () => state,
    subscribe(listener) {
      listeners.add(listener)
      return () => void listeners.delete(listener)
    },
    change(place, change) {
      void write(keptId(place), (before) => changed(before ?? keptStart(place), change))
    },
    async submit(place) {
      await write(keptId(place), (before) => before && submitted(before))
      await flush()
    },
    flush,
    async retry(id) {
      await write(id, requeued)
      await flush()
    },
    discard: (id) => write(id, () => undefined),
    reread,
    close() {
      closed = true
      listeners.clear()
      void work.then(() => shelf.close())
    },
  }
}
