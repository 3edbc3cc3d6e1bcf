import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** An order of units, by codes alone. */
export class Row extends Model<InferAttributes<Row>, InferCreationAttributes<Row>> {
  declare panelId: string
  declare id: string
  declare roundId: string
  declare spare: boolean
}

export function initRow(sequelize: Sequelize): void {
  Row.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID, allowNull: false },
      spare: { type: DataTypes.BOOLEAN, allowNull: false },
    },
    { sequelize, tableName: 'rows' },
  )
}
