import type { QueryInterface, Sequelize } from 'sequelize'
import { Umzug, type UmzugStorage } from 'umzug'
import { migrations as allMigrations } from '#migrations/index.ts'
import { connect } from './sequelize.ts'

/**
 * One step of the schema and the way back. Both run inside a transaction that is already open on the only
 * connection of the pool: a step passes no transaction and opens none.
 */
export interface Migration {
  name: string
  up(params: { context: QueryInterface }): Promise<unknown>
  down(params: { context: QueryInterface }): Promise<unknown>
}

/** Any two numbers, the same in every process: only one at a time changes a database. */
const LOCK = '731, 1'

const ledger = 'schema_migrations'

/**
 * Brings a database to the newest schema, then does `afterwards` (seeds) while still holding the lock.
 *
 * @param ownerUrl connects as the owner of the tables
 * @returns the names of the migrations that were applied, in order
 */
export async function migrate(
  ownerUrl: string,
  options: { migrations?: readonly Migration[]; afterwards?: (sequelize: Sequelize) => Promise<void> } = {},
): Promise<string[]> {
  return underLock(ownerUrl, async (sequelize) => {
    const applied = await plan(sequelize, options.migrations ?? allMigrations).up()
    if (options.afterwards) {
      const pool = connect(ownerUrl, { max: 4 })
      await options.afterwards(pool).finally(() => pool.close())
    }
    return applied.map(({ name }) => name)
  })
}

/**
 * Takes migrations back, newest first.
 *
 * @param options.to the last one to take back; without it all are
 */
export async function revert(
  ownerUrl: string,
  options: { to?: string; migrations?: readonly Migration[] } = {},
): Promise<string[]> {
  return underLock(ownerUrl, async (sequelize) => {
    const reverted = await plan(sequelize, options.migrations ?? allMigrations).down({ to: options.to ?? 0 })
    return reverted.map(({ name }) => name)
  })
}

async function underLock<T>(ownerUrl: string, work: (sequelize: Sequelize) => Promise<T>): Promise<T> {
  const sequelize = connect(ownerUrl, { max: 1, idleMs: 3_600_000 })
  try {
    await sequelize.query(`select pg_advisory_lock(${LOCK})`)
    await sequelize.query(
      `create table if not exists ${ledger} (name text primary key, applied_at timestamptz not null default now())`,
    )
    return await work(sequelize)
  } finally {
    await sequelize.close() // ends the session, and the lock with it
  }
}

/** The transaction opens with the step and closes when the ledger has the step's name, or is rolled back. */
function plan(sequelize: Sequelize, migrations: readonly Migration[]) {
  const opening = (step: Migration['up']) => async (params: { context: QueryInterface }) => {
    await sequelize.query('begin')
    try {
      await step(params)
    } catch (error) {
      await sequelize.query('rollback')
      throw error
    }
  }
  return new Umzug({
    context: sequelize.getQueryInterface(),
    logger: undefined,
    storage: ledgerStorage(sequelize),
    migrations: migrations.map(({ name, up, down }) => ({ name, up: opening(up), down: opening(down) })),
  })
}

function ledgerStorage(sequelize: Sequelize): UmzugStorage<QueryInterface> {
  const closing = async (sql: string, name: string) => {
    try {
      await sequelize.query(sql, { bind: [name] })
      await sequelize.query('commit')
    } catch (error) {
      await sequelize.query('rollback')
      throw error
    }
  }
  return {
    logMigration: ({ name }) => closing(`insert into ${ledger} (name) values ($1)`, name),
    unlogMigration: ({ name }) => closing(`delete from ${ledger} where name = $1`, name),
    executed: async () => {
      const [rows] = await sequelize.query(`select name from ${ledger} order by name`)
      return (rows as { name: string }[]).map(({ name }) => name)
    },
  }
}
