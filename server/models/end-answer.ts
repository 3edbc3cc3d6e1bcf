import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** What a listener answered at the end. */
export class EndAnswer extends Model<InferAttributes<EndAnswer>, InferCreationAttributes<EndAnswer>> {
  declare panelId: string
  declare seatId: string
  declare recognised: 'none' | 'perhaps' | 'yes'
  declare recognitions: unknown
  declare receivedAt: Date
}

export function initEndAnswer(sequelize: Sequelize): void {
  EndAnswer.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      seatId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      recognised: { type: DataTypes.TEXT, allowNull: false },
      recognitions: { type: DataTypes.JSONB, allowNull: false },
      receivedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'end_answers' },
  )
}
