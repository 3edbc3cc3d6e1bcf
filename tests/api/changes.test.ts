import { afterAll, beforeAll, expect, it } from 'vitest'
import pino from 'pino'
import { connect } from '#server/db/sequelize.ts'
import { changeHub, type Change } from '#server/http/changes.ts'
import { createTestDatabase, type TestDatabase } from '#tests/support/database.ts'

let database: TestDatabase
beforeAll(async () => {
  database = await createTestDatabase()
})
afterAll(() => database.drop())

it('changes are heard again after the line to the database was cut', async () => {
  const hub = await changeHub(database.appUrl, pino({ level: 'silent' }))
  const app = connect(database.appUrl, { max: 1 })
  const heard: Change[] = []
  const leave = hub.listen((change) => heard.push(change))
  const tell = () => app.query(`select pg_notify('scrim_changes', '{"round":"a round"}')`)
  try {
    await tell()
    await expect.poll(() => heard.length).toBe(1)
    await app.query(
      `select pg_terminate_backend(pid) from pg_stat_activity
       where application_name = 'scrim changes' and datname = current_database()`,
    )
    await expect
      .poll(async () => (await tell(), heard.length), { timeout: 15_000, interval: 200 })
      .toBeGreaterThan(1)
    leave()
    const count = heard.length
    await tell()
    await app.query('select 1')
    expect(heard).toHaveLength(count)
  } finally {
    await hub.stop()
    await app.close()
  }
})
