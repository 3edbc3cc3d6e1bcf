import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** Listener numbers of the public file. Read by server/features/key alone. */
export class KeyListener extends Model<InferAttributes<KeyListener>, InferCreationAttributes<KeyListener>> {
  declare panelId: string
  declare roundId: string
  declare rowId: string
  declare codeSet: 'served' | 'takeover'
  declare number: number
}

export function initKeyListener(sequelize: Sequelize): void {
  KeyListener.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      roundId: { type: DataTypes.UUID, allowNull: false },
      rowId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      codeSet: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
      number: { type: DataTypes.INTEGER, allowNull: false },
    },
    { sequelize, tableName: 'key_listeners' },
  )
}
