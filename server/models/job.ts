import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** Work to be done after the request that asked for it. */
export class Job extends Model<InferAttributes<Job>, InferCreationAttributes<Job>> {
  declare id: string
  declare panelId: CreationOptional<string | null>
  declare task: string
  declare data: unknown
  declare runAt: Date
  declare attempts: CreationOptional<number>
  declare failedAt: CreationOptional<Date | null>
  declare lastError: CreationOptional<string | null>
  declare createdAt: Date
}

export function initJob(sequelize: Sequelize): void {
  Job.init(
    {
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      panelId: { type: DataTypes.UUID },
      task: { type: DataTypes.TEXT, allowNull: false },
      data: { type: DataTypes.JSONB, allowNull: false },
      runAt: { type: DataTypes.DATE, allowNull: false },
      attempts: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
      failedAt: { type: DataTypes.DATE },
      lastError: { type: DataTypes.TEXT },
      createdAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'jobs' },
  )
}
