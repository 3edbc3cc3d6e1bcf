import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** A split key’s letters. Read by server/features/key alone. */
export class KeyLetter extends Model<InferAttributes<KeyLetter>, InferCreationAttributes<KeyLetter>> {
  declare panelId: string
  declare roundId: string
  declare letter: string
  declare unitId: string
  declare served: string
  declare reserve: string
}

export function initKeyLetter(sequelize: Sequelize): void {
  KeyLetter.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      roundId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      letter: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
      unitId: { type: DataTypes.UUID, allowNull: false },
      served: { type: DataTypes.TEXT, allowNull: false },
      reserve: { type: DataTypes.TEXT, allowNull: false },
    },
    { sequelize, tableName: 'key_letters' },
  )
}
