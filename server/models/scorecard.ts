import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** A versioned set of descriptors. */
export class Scorecard extends Model<InferAttributes<Scorecard>, InferCreationAttributes<Scorecard>> {
  declare panelId: string
  declare id: string
  declare name: string
  declare version: CreationOptional<number>
  declare createdAt: Date
}

export function initScorecard(sequelize: Sequelize): void {
  Scorecard.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      name: { type: DataTypes.TEXT, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      createdAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'scorecards' },
  )
}
