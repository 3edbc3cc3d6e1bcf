import { IDBFactory } from 'fake-indexeddb'
import { beforeEach, describe, expect, test, vi } from 'vitest'
import { CallError } from '#src/lib/call.ts'
import { createKeeping, type Keeping } from './keeping.ts'
import { keptId, submissionOf, type KeptServing } from './kept-serving.ts'
import { openShelf } from './shelf.ts'

const place = { seat: 's', serving: 'v', code: '417', ordinal: 1 }
const id = keptId(place)
const away = () =>
  Promise.reject(
    new CallError({ type: '', title: '', status: 503, detail: 'away', code: 'unavailable', requestId: '' }),
  )

type Outcome = 'taken' | 'late' | 'void'
const tab = (send: (kept: KeptServing) => Promise<Outcome> = away): Keeping =>
  createKeeping({ open: openShelf, send, tell: () => undefined })
const settledTab = async (keeping: Keeping) => {
  await keeping.reread()
  return keeping
}
const keptIn = (keeping: Keeping) => keeping.state().records.get(id)

beforeEach(() => {
  globalThis.indexedDB = new IDBFactory()
})

describe('keeping on this phone', () => {
  test('each touch shows at once and is there after a reload', async () => {
    const before = await settledTab(tab())
    before.change(place, { answers: { warmth: 62 } })
    expect(keptIn(before)?.answers).toEqual({ warmth: 62 })
    before.change(place, { answers: { width: 'cant-tell' }, screen: 2 })
    await before.reread()
    expect(before.state()).toMatchObject({ durable: true, saving: false })

    const after = await settledTab(tab())
    expect(keptIn(after)).toMatchObject({ answers: { warmth: 62, width: 'cant-tell' }, screen: 2 })
  })

  test('two tabs that rate different lines do not overwrite each other', async () => {
    const [one, two] = [await settledTab(tab()), await settledTab(tab())]
    one.change(place, { answers: { warmth: 62 } })
    two.change(place, { answers: { width: 30 } })
    await one.reread()
    await two.reread()
    await one.reread()
    expect(keptIn(one)?.answers).toEqual({ warmth: 62, width: 30 })
    expect(keptIn(two)?.answers).toEqual({ warmth: 62, width: 30 })
  })

  test('a submission while the network is away stays on the phone and is sent once when it is back', async () => {
    const send = vi
      .fn<(kept: KeptServing) => Promise<Outcome>>()
      .mockImplementationOnce(away)
      .mockResolvedValue('taken')
    const keeping = await settledTab(tab(send))
    keeping.change(place, { answers: { warmth: 62 } })
    await keeping.submit(place)
    expect(keptIn(keeping)?.outbox?.state).toBe('queued')

    const reloaded = await settledTab(tab(send))
    expect(keptIn(reloaded)?.outbox?.state).toBe('queued')
    await reloaded.flush()
    expect(keptIn(reloaded)).toBeUndefined()
    await reloaded.flush()
    expect(send).toHaveBeenCalledTimes(2)
  })

  test('a double tap and a second tab submit under one key', async () => {
    const keys = new Set<string | undefined>()
    const send = vi.fn((kept: KeptServing) => {
      keys.add(kept.outbox?.key)
      return Promise.resolve('taken' as const)
    })
    const [one, two] = [await settledTab(tab(send)), await settledTab(tab(send))]
    one.change(place, { answers: { warmth: 62 } })
    await one.reread()
    await two.reread()
    await Promise.all([one.submit(place), one.submit(place), two.submit(place)])
    expect(keys.size).toBe(1)
    expect(keptIn(one)).toBeUndefined()
  })

  test('a tab that submits after another one has sent does not send an empty serving', async () => {
    const send = vi.fn(() => Promise.resolve('taken' as const))
    const [one, two] = [await settledTab(tab(send)), await settledTab(tab(send))]
    one.change(place, { answers: { warmth: 62 } })
    await one.reread()
    await two.reread()
    await one.submit(place)
    await two.submit(place)
    expect(send).toHaveBeenCalledTimes(1)
  })

  test('submitted answers are what was touched last, although the shelf is slower than the hand', async () => {
    const sent: unknown[] = []
    const keeping = tab((kept) => {
      sent.push(submissionOf(kept).answers)
      return Promise.resolve('taken')
    })
    for (let value = 0; value <= 20; value++) keeping.change(place, { answers: { warmth: value } })
    await keeping.submit(place)
    expect(sent).toEqual([[{ descriptor: 'warmth', value: 20, cantTell: false }]])
  })

  test('nothing can be changed once it is in the outbox', async () => {
    const keeping = await settledTab(tab())
    keeping.change(place, { answers: { warmth: 62 } })
    await keeping.submit(place)
    keeping.change(place, { answers: { warmth: 10 } })
    await keeping.reread()
    expect(keptIn(keeping)?.answers).toEqual({ warmth: 62 })
  })

  test('what came late stays as a word to read until it is put away', async () => {
    const keeping = await settledTab(tab(() => Promise.resolve('late')))
    keeping.change(place, { answers: { warmth: 62 } })
    await keeping.submit(place)
    expect(keptIn(keeping)).toMatchObject({ answers: {}, outbox: { state: 'late' } })
    await keeping.discard(id)
    expect(keptIn(keeping)).toBeUndefined()
  })
})

describe('where the browser keeps nothing', () => {
  test('a refused IndexedDB leaves the rating in memory, says so, and still sends', async () => {
    const keeping = createKeeping({
      open: () => Promise.reject(new DOMException('denied', 'SecurityError')),
      send: () => Promise.resolve('taken'),
      tell: () => undefined,
    })
    await keeping.reread()
    expect(keeping.state()).toMatchObject({ ready: true, durable: false })
    keeping.change(place, { answers: { warmth: 62 } })
    expect(keptIn(keeping)?.answers).toEqual({ warmth: 62 })
    await keeping.submit(place)
    expect(keptIn(keeping)).toBeUndefined()
  })

  test('a shelf that fails in the middle loses nothing of what was touched', async () => {
    const shelf = await openShelf()
    let full = false
    const keeping = createKeeping({
      open: () =>
        Promise.resolve({
          ...shelf,
          update: (which, change) =>
            full
              ? Promise.reject(new DOMException('full', 'QuotaExceededError'))
              : shelf.update(which, change),
        }),
      send: away,
      tell: () => undefined,
    })
    await keeping.reread()
    keeping.change(place, { answers: { warmth: 62 } })
    await keeping.reread()
    full = true
    keeping.change(place, { answers: { width: 20 } })
    await keeping.reread()
    expect(keeping.state().durable).toBe(false)
    expect(keptIn(keeping)?.answers).toEqual({ warmth: 62, width: 20 })
  })
})
