import type { Sequelize, Transaction } from 'sequelize'

/** On whose behalf the rows are read: what row-level security compares them with. */
export interface RowScope {
  panelId?: string | null
  userId?: string | null
}

/**
 * Runs `work` in one transaction that knows panel and user, and commits when it resolves. The settings end
 * with the transaction, so a pooled connection carries nothing over to the next request.
 */
export function inTransaction<T>(
  sequelize: Sequelize,
  scope: RowScope,
  work: (transaction: Transaction) => Promise<T>,
): Promise<T> {
  return sequelize.transaction(async (transaction) => {
    await setScope(sequelize, scope, transaction)
    return work(transaction)
  })
}

/** Changes the scope inside a running transaction, for instance once a link has told which panel it belongs to. */
export async function setScope(
  sequelize: Sequelize,
  scope: RowScope,
  transaction?: Transaction,
): Promise<void> {
  await sequelize.query(
    `select set_config('scrim.panel_id', $1, true), set_config('scrim.user_id', $2, true)`,
    { bind: [scope.panelId ?? '', scope.userId ?? ''], ...(transaction ? { transaction } : {}) },
  )
}
