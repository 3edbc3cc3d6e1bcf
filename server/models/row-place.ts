import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** One place of a row: turn, position and code. No unit stands here (B1). */
export class RowPlace extends Model<InferAttributes<RowPlace>, InferCreationAttributes<RowPlace>> {
  declare panelId: string
  declare id: string
  declare rowId: string
  declare codeSet: 'served' | 'takeover' | 'reserve'
  declare turn: number
  declare position: number
  declare code: string
}

export function initRowPlace(sequelize: Sequelize): void {
  RowPlace.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      rowId: { type: DataTypes.UUID, allowNull: false },
      codeSet: { type: DataTypes.TEXT, allowNull: false },
      turn: { type: DataTypes.INTEGER, allowNull: false },
      position: { type: DataTypes.INTEGER, allowNull: false },
      code: { type: DataTypes.TEXT, allowNull: false },
    },
    { sequelize, tableName: 'row_places' },
  )
}
