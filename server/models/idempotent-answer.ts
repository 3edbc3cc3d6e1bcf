import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** The first answer to a write that may be repeated. */
export class IdempotentAnswer extends Model<
  InferAttributes<IdempotentAnswer>,
  InferCreationAttributes<IdempotentAnswer>
> {
  declare panelId: string
  declare scope: string
  declare key: string
  declare requestDigest: string
  declare body: unknown
  declare createdAt: Date
}

export function initIdempotentAnswer(sequelize: Sequelize): void {
  IdempotentAnswer.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      scope: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
      key: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
      requestDigest: { type: DataTypes.TEXT, allowNull: false },
      body: { type: DataTypes.JSONB, allowNull: false },
      createdAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'idempotent_answers' },
  )
}
