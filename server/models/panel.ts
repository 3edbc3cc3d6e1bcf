import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** The standing group that owns everything. */
export class Panel extends Model<InferAttributes<Panel>, InferCreationAttributes<Panel>> {
  declare id: string
  declare slug: string
  declare name: string
  declare timeZone: string
  declare version: CreationOptional<number>
  declare createdAt: Date
}

export function initPanel(sequelize: Sequelize): void {
  Panel.init(
    {
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      slug: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      timeZone: { type: DataTypes.TEXT, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      createdAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'panels' },
  )
}
