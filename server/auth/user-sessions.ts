import { QueryTypes, type Sequelize } from 'sequelize'

/** Ends a user's sessions, all or all but the one in hand. */
export async function endSessions(sequelize: Sequelize, userId: string, butId = ''): Promise<void> {
  await sequelize.query(`delete from sessions where sess #>> '{passport,user}' = $1 and sid <> $2`, {
    bind: [userId, butId],
    type: QueryTypes.DELETE,
  })
}
