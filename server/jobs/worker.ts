import { Op } from 'sequelize'
import { inTransaction } from '#server/db/transaction.ts'
import type { Deps } from '#server/deps.ts'
import { Job } from '#server/models/job.ts'
import type { TaskName } from './queue.ts'
import { sweep } from './sweep.ts'
import { tasks } from './tasks/index.ts'

/** Seconds until the next attempt; after the last one the job is kept as failed, with its error. */
const backOff = [10, 40, 160, 640, 2560]
const sweepEvery = 3600_000

/**
 * Takes the oldest job that is due and does it. The row is locked while the task runs and deleted in the task's own
 * transaction, so that no two workers do one job. Mail goes out before the commit: only a crash between the two
 * can send it twice.
 *
 * @returns whether there was one
 */
export async function runNextJob(deps: Deps): Promise<boolean> {
  const now = deps.clock.now()
  let taken: Job | null = null
  try {
    await inTransaction(deps.sequelize, {}, async () => {
      taken = await Job.findOne({
        where: { failedAt: null, runAt: { [Op.lte]: now } },
        order: [
          ['runAt', 'asc'],
          ['id', 'asc'],
        ],
        lock: true,
        skipLocked: true,
      })
      if (!taken) return
      const task = tasks[taken.task as TaskName] as ((data: unknown, deps: Deps) => Promise<void>) | undefined
      if (!task) throw new Error(`There is no task ${taken.task}.`)
      await task(taken.data, deps)
      await taken.destroy()
    })
  } catch (error) {
    if (taken) await putOff(deps, taken, now, error)
    else throw error
  }
  return taken !== null
}

async function putOff(deps: Deps, job: Job, now: Date, error: unknown): Promise<void> {
  const wait = backOff[job.attempts]
  const told = error instanceof Error ? error.message : String(error)
  deps.log.warn({ task: job.task, job: job.id, attempt: job.attempts + 1, err: error }, 'a job failed')
  await inTransaction(deps.sequelize, {}, () =>
    Job.update(
      {
        attempts: job.attempts + 1,
        lastError: told.slice(0, 500),
        ...(wait === undefined ? { failedAt: now } : { runAt: new Date(now.getTime() + wait * 1000) }),
      },
      { where: { id: job.id } },
    ),
  )
}

/** Looks for due jobs every second. Any number of processes may do so against one database. */
export function startWorker(deps: Deps, everyMs = 1000): { stop(): Promise<void> } {
  let stopped = false
  let rest: { timer: NodeJS.Timeout; end: () => void } | undefined
  let nextSweep = 0
  const round = async (): Promise<void> => {
    if (Date.now() >= nextSweep) {
      nextSweep = Date.now() + sweepEvery
      await sweep(deps)
    }
    while (!stopped && (await runNextJob(deps)));
  }
  const work = async (): Promise<void> => {
    let wait = everyMs
    while (!stopped) {
      try {
        await round()
        wait = everyMs
      } catch (error) {
        // The database is away: ask less and less often, at most every half minute.
        wait = Math.min(wait * 2, 30_000)
        deps.log.error({ err: error }, 'the worker could not look for jobs')
      }
      if (stopped) return
      await new Promise<void>((resolve) => {
        rest = { timer: setTimeout(resolve, wait), end: resolve }
      })
    }
  }
  const ended = work()
  return {
    stop: () => {
      stopped = true
      clearTimeout(rest?.timer)
      rest?.end()
      return ended
    },
  }
}
