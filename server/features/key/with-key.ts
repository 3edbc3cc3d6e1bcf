import type { Context } from '#server/http/context.ts'

/**
 * Runs statements as the role that may read the key, and gives the role back at once. The application's own role
 * has no right on the key's tables, so a query that forgot this fails instead of leaking (B1).
 */
export async function withKey<T>(context: Pick<Context, 'deps'>, work: () => Promise<T>): Promise<T> {
  const { sequelize } = context.deps
  await sequelize.query('set local role scrim_key')
  const result = await work() // a failed statement ends the transaction, and the role with it
  await sequelize.query('reset role')
  return result
}
