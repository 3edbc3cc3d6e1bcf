import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { LockBusy, withLock } from './lock.mjs'
import { identity, pause, stillRuns } from './processes.mjs'

let folder: string
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), 'scrim-lock-'))
})
afterEach(() => rmSync(folder, { recursive: true }))

describe('the lock of a start', () => {
  it('lets one in at a time, however many come together', async () => {
    const path = join(folder, 'lock')
    let inside = 0
    let most = 0
    const visit = () =>
      withLock(path, async () => {
        inside += 1
        most = Math.max(most, inside)
        await pause(5)
        inside -= 1
      })
    await Promise.all(Array.from({ length: 8 }, visit))
    expect(most).toBe(1)
    expect(readdirSync(folder)).toEqual([])
  })

  it('is freed when the work fails', async () => {
    const path = join(folder, 'lock')
    await expect(withLock(path, () => Promise.reject(new Error('no')))).rejects.toThrow('no')
    expect(await withLock(path, async () => 'in', { waitMs: 0 })).toBe('in')
  })

  it('of a dead process is taken away', async () => {
    const path = join(folder, 'lock')
    writeFileSync(path, '4194303 12345')
    expect(await withLock(path, async () => 'in', { waitMs: 1000 })).toBe('in')
  })

  it('of a living process is respected, and the wait is said once', async () => {
    const path = join(folder, 'lock')
    writeFileSync(path, identity())
    let told = 0
    const entering = withLock(path, async () => 'in', { waitMs: 150, onWait: () => (told += 1) })
    await expect(entering).rejects.toBeInstanceOf(LockBusy)
    expect(told).toBe(1)
  })
})

describe('the name of a process', () => {
  it('fits the process itself', () => {
    expect(stillRuns(identity())).toBe(true)
  })

  it('does not fit a later process with the same number', () => {
    const [pid, start] = identity().split(' ')
    if (start === undefined) return // no /proc here: the number is all there is
    expect(stillRuns(`${pid} ${Number(start) - 1}`)).toBe(false)
  })

  it.each(['', 'nonsense', '-1 5', '0'])('“%s” fits none', (name) => {
    expect(stillRuns(name)).toBe(false)
  })
})
