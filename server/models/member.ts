import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** A person in a panel; a user only if they sign in. */
export class Member extends Model<InferAttributes<Member>, InferCreationAttributes<Member>> {
  declare panelId: string
  declare id: string
  declare userId: CreationOptional<string | null>
  declare displayName: string
  declare email: CreationOptional<string | null>
  declare roles: CreationOptional<string[]>
  declare createdAt: Date
  declare removedAt: CreationOptional<Date | null>
}

export function initMember(sequelize: Sequelize): void {
  Member.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      userId: { type: DataTypes.UUID },
      displayName: { type: DataTypes.TEXT, allowNull: false },
      email: { type: DataTypes.TEXT },
      roles: { type: DataTypes.ARRAY(DataTypes.TEXT), allowNull: false, defaultValue: [] },
      createdAt: { type: DataTypes.DATE, allowNull: false },
      removedAt: { type: DataTypes.DATE },
    },
    { sequelize, tableName: 'members' },
  )
}
