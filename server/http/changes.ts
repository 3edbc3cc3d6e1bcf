import { EventEmitter } from 'node:events'
import type { Logger } from 'pino'
import pg from 'pg'
import { QueryTypes } from 'sequelize'
import type { Context } from './context.ts'

/** What happened, in ids only: screens are told no more than which seat changed, and fetch what they may see. */
export interface Change {
  round: string
  /** A seat's id and its number on the table; absent where the whole round changed (a turn, closing). */
  seat?: { id: string; number: number }
}

export interface ChangeHub {
  listen(hear: (change: Change) => void): () => void
  stop(): Promise<void>
}

const channel = 'scrim_changes'

/** Tells every process once the transaction commits. */
export async function announce(context: Context, change: Change): Promise<void> {
  await context.deps.sequelize.query('select pg_notify($1, $2)', {
    bind: [channel, JSON.stringify(change)],
    type: QueryTypes.SELECT,
  })
}

/** One connection that listens; it comes back by itself when the database was away. */
export async function changeHub(databaseUrl: string, log: Logger): Promise<ChangeHub> {
  const emitter = new EventEmitter().setMaxListeners(0)
  let client: pg.Client | null = null
  let stopped = false
  let again: NodeJS.Timeout | undefined
  const later = (): void => {
    if (!stopped) again = setTimeout(() => void connect().catch(later), 1000)
  }
  const connect = async (): Promise<void> => {
    const next = new pg.Client({ connectionString: databaseUrl, application_name: 'scrim changes' })
    next.on('error', (error) => {
      log.warn({ err: error }, 'lost the line that carries changes')
      client = null
      later()
    })
    next.on('notification', ({ payload }) => {
      if (payload) emitter.emit('change', JSON.parse(payload) as Change)
    })
    await next.connect()
    await next.query(`listen ${channel}`)
    client = next
  }
  await connect()
  return {
    listen: (hear) => {
      emitter.on('change', hear)
      return () => emitter.off('change', hear)
    },
    stop: async () => {
      stopped = true
      clearTimeout(again)
      await client?.end()
    },
  }
}
