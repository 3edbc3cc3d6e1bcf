import type { Sequelize } from 'sequelize'
import { QueryTypes } from 'sequelize'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { migrate, revert, type Migration } from '#server/db/migrate.ts'
import { connect } from '#server/db/sequelize.ts'
import { inTransaction } from '#server/db/transaction.ts'
import { migrations } from '#migrations/index.ts'
import { createTestDatabase, type TestDatabase } from '#tests/support/database.ts'

let database: TestDatabase
let owner: Sequelize
let app: Sequelize

beforeAll(async () => {
  database = await createTestDatabase({ migrated: false })
  owner = connect(database.ownerUrl)
  app = connect(database.appUrl)
})

afterAll(async () => {
  await Promise.all([owner.close(), app.close()])
  await database.drop()
})

async function tables(): Promise<string[]> {
  const rows = await owner.query<{ tablename: string }>(
    `select tablename from pg_tables where schemaname = 'public' order by 1`,
    { type: QueryTypes.SELECT },
  )
  return rows.map(({ tablename }) => tablename)
}

/** Names of everything in the schema with its definition, to compare two states of it. */
async function columns(): Promise<unknown[]> {
  return owner.query(
    `select table_name, column_name, data_type, is_nullable, column_default from information_schema.columns
     where table_schema = 'public' order by table_name, column_name`,
    { type: QueryTypes.SELECT },
  )
}

const sequence: Migration[] = [
  {
    name: '0001-first',
    up: ({ context }) => context.createTable('first', { id: { type: 'integer' } }),
    down: ({ context }) => context.dropTable('first'),
  },
  {
    name: '0002-breaks',
    up: async ({ context }) => {
      await context.createTable('second', { id: { type: 'integer' } })
      await context.sequelize.query('select no_such_column from first')
    },
    down: ({ context }) => context.dropTable('second'),
  },
]

describe('migrations', () => {
  it('leave nothing behind of a step that failed half-way, and keep the steps before it', async () => {
    await expect(migrate(database.ownerUrl, { migrations: sequence })).rejects.toThrow(/0002-breaks/)
    expect(await tables()).toEqual(['first', 'schema_migrations'])
    expect(await revert(database.ownerUrl, { migrations: sequence })).toEqual(['0001-first'])
    expect(await tables()).toEqual(['schema_migrations'])
  })

  it('run once when several processes start together, and seed under the same lock', async () => {
    const inside: string[] = []
    const start = (name: string) =>
      migrate(database.ownerUrl, {
        migrations: sequence.slice(0, 1),
        afterwards: async (sequelize) => {
          inside.push(`${name} begins`)
          await sequelize.query('select pg_sleep(0.05)')
          inside.push(`${name} ends`)
        },
      })
    const applied = await Promise.all([start('a'), start('b'), start('c')])
    expect(applied.flat()).toEqual(['0001-first'])
    for (let place = 0; place < inside.length; place += 2) {
      expect(inside[place + 1]).toBe(inside[place]?.replace('begins', 'ends'))
    }
    await revert(database.ownerUrl, { migrations: sequence })
  })

  it('of the product can all be taken back and applied again to the same schema', async () => {
    const names = migrations.map(({ name }) => name)
    expect(await migrate(database.ownerUrl)).toEqual(names)
    const before = await columns()
    expect(await revert(database.ownerUrl)).toEqual([...names].reverse())
    expect(await tables()).toEqual(['schema_migrations'])
    expect(await migrate(database.ownerUrl)).toEqual(names)
    expect(await columns()).toEqual(before)
    expect(await migrate(database.ownerUrl)).toEqual([])
  })
})

describe('the application’s role', () => {
  it('owns no table and cannot pass by row-level security', async () => {
    const [role] = await app.query<Record<string, unknown>>(
      `select rolsuper, rolbypassrls, rolcreaterole, rolcreatedb,
         (select count(*)::int from pg_class where relowner = pg_roles.oid) as owned
       from pg_roles where rolname = current_user`,
      { type: QueryTypes.SELECT },
    )
    expect(role).toEqual({
      rolsuper: false,
      rolbypassrls: false,
      rolcreaterole: false,
      rolcreatedb: false,
      owned: 0,
    })
    await expect(app.query('create table mine (id integer)')).rejects.toThrow(/permission denied/)
  })

  it('cannot read the key unless the statement takes on the role for it', async () => {
    await migrate(database.ownerUrl)
    await expect(app.query('select * from key_entries')).rejects.toThrow(/permission denied/)
    const rows = await inTransaction(app, {}, async (transaction) => {
      await app.query('set local role scrim_key', { transaction })
      return app.query('select * from key_entries', { type: QueryTypes.SELECT, transaction })
    })
    expect(rows).toEqual([])
    await expect(app.query('select * from key_entries')).rejects.toThrow(/permission denied/)
  })
})

describe('a transaction', () => {
  const scope = `select current_setting('scrim.panel_id', true) as panel, current_setting('scrim.user_id', true) as "user"`

  it('knows panel and user until it ends, and the connection forgets them', async () => {
    const single = connect(database.appUrl, { max: 1 })
    const ids = {
      panelId: '0b0f9a3e-0000-4000-8000-000000000001',
      userId: '0b0f9a3e-0000-4000-8000-000000000002',
    }
    const inside = await inTransaction(single, ids, (transaction) =>
      single.query(scope, { type: QueryTypes.SELECT, transaction }),
    )
    expect(inside).toEqual([{ panel: ids.panelId, user: ids.userId }])
    expect(await single.query(scope, { type: QueryTypes.SELECT })).toEqual([{ panel: '', user: '' }])
    await single.close()
  })

  it('is undone as a whole when the work in it fails', async () => {
    const fails = inTransaction(owner, {}, async (transaction) => {
      await owner.query('create table half_done (id integer)', { transaction })
      throw new Error('no')
    })
    await expect(fails).rejects.toThrow('no')
    expect(await tables()).not.toContain('half_done')
  })
})
