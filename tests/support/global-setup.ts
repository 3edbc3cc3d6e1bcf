import { holdThrowAwayFolder, removeThrowAway } from '../../scripts/postgres.mjs'

/**
 * Keeps a place for a PostgreSQL of the tests' own. Nothing is started here: the first test that asks for a
 * database starts it (see database.ts), so that tests without one need no PostgreSQL. `npm test` hands over a
 * place of its own in SCRIM_TEST_CLUSTER, for all its stages.
 */
export default async function setup(): Promise<(() => Promise<void>) | undefined> {
  if (process.env.SCRIM_TEST_CLUSTER) return undefined
  const folder = await holdThrowAwayFolder()
  process.env.SCRIM_TEST_CLUSTER = folder
  return async () => {
    delete process.env.SCRIM_TEST_CLUSTER
    await removeThrowAway(folder)
  }
}
