import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** What a code hides. Read by server/features/key alone. */
export class KeyEntry extends Model<InferAttributes<KeyEntry>, InferCreationAttributes<KeyEntry>> {
  declare panelId: string
  declare rowPlaceId: string
  declare unitId: string
}

export function initKeyEntry(sequelize: Sequelize): void {
  KeyEntry.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      rowPlaceId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      unitId: { type: DataTypes.UUID, allowNull: false },
    },
    { sequelize, tableName: 'key_entries' },
  )
}
