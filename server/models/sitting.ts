import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** A date and place at which listeners hear a round. */
export class Sitting extends Model<InferAttributes<Sitting>, InferCreationAttributes<Sitting>> {
  declare panelId: string
  declare id: string
  declare roundId: string
  declare name: string
  declare turn: CreationOptional<number>
  declare turns: number
  declare startedAt: CreationOptional<Date | null>
  declare endedAt: CreationOptional<Date | null>
  declare version: CreationOptional<number>
}

export function initSitting(sequelize: Sequelize): void {
  Sitting.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      turn: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
      turns: { type: DataTypes.INTEGER, allowNull: false },
      startedAt: { type: DataTypes.DATE },
      endedAt: { type: DataTypes.DATE },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: 'sittings' },
  )
}
