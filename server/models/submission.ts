import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** What a listener sent for a serving; added to, never changed. */
export class Submission extends Model<InferAttributes<Submission>, InferCreationAttributes<Submission>> {
  declare panelId: string
  declare id: string
  declare servingId: string
  declare revision: number
  declare idempotencyKey: string
  declare receivedAt: Date
  declare outcome: 'taken' | 'late' | 'void'
  declare reason: CreationOptional<string | null>
  declare remark: CreationOptional<string>
}

export function initSubmission(sequelize: Sequelize): void {
  Submission.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      servingId: { type: DataTypes.UUID, allowNull: false },
      revision: { type: DataTypes.INTEGER, allowNull: false },
      idempotencyKey: { type: DataTypes.TEXT, allowNull: false },
      receivedAt: { type: DataTypes.DATE, allowNull: false },
      outcome: { type: DataTypes.TEXT, allowNull: false },
      reason: { type: DataTypes.TEXT },
      remark: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
    },
    { sequelize, tableName: 'submissions' },
  )
}
