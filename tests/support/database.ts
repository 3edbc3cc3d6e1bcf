import { randomBytes } from 'node:crypto'
import { existsSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { Client } from 'pg'
import { migrate } from '#server/db/migrate.ts'
import { joinThrowAwayCluster } from '../../scripts/postgres.mjs'
import { withLock } from '../../scripts/start/lock.mjs'

/** A migrated, empty database of one test file's own. */
export interface TestDatabase {
  name: string
  /** Connects as the application's role. */
  appUrl: string
  /** Connects as the owner of the tables. */
  ownerUrl: string
  drop(): Promise<void>
}

const TEMPLATE = 'scrim_template'

/** Clones the migrated template database, making it (and starting PostgreSQL) when this is the first call. */
export async function createTestDatabase({ migrated = true } = {}): Promise<TestDatabase> {
  const folder = process.env.SCRIM_TEST_CLUSTER
  if (!folder) throw new Error('SCRIM_TEST_CLUSTER is not set: run the tests by vitest or npm test.')
  const cluster = await joinThrowAwayCluster(folder)
  const admin = (sql: string) => asSuperuser(cluster.url('postgres', 'postgres'), sql)
  if (migrated) {
    await withLock(join(folder, 'template.lock'), async () => {
      const ready = join(folder, 'template-ready')
      if (existsSync(ready)) return
      await admin(`drop database if exists ${TEMPLATE} with (force)`)
      await admin(`create database ${TEMPLATE} owner scrim_owner`)
      await migrate(cluster.url('scrim_owner', TEMPLATE))
      writeFileSync(ready, '')
    })
  }
  const name = `scrim_test_${process.pid}_${randomBytes(4).toString('hex')}`
  await admin(`create database ${name} template ${migrated ? TEMPLATE : 'template1'} owner scrim_owner`)
  return {
    name,
    appUrl: cluster.url('scrim_app', name),
    ownerUrl: cluster.url('scrim_owner', name),
    drop: () => admin(`drop database if exists ${name} with (force)`),
  }
}

async function asSuperuser(url: string, sql: string): Promise<void> {
  const client = new Client({ connectionString: url })
  await client.connect()
  try {
    await client.query(sql)
  } finally {
    await client.end()
  }
}
