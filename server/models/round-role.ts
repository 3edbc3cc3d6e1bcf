import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** What a member may hold in one round. */
export class RoundRole extends Model<InferAttributes<RoundRole>, InferCreationAttributes<RoundRole>> {
  declare panelId: string
  declare id: string
  declare roundId: string
  declare memberId: string
  declare role: 'organiser' | 'keeper' | 'letters' | 'codes' | 'steward' | 'panelist'
  declare linkHash: CreationOptional<string | null>
  declare linkVersion: CreationOptional<number>
  declare openedAt: CreationOptional<Date | null>
}

export function initRoundRole(sequelize: Sequelize): void {
  RoundRole.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID, allowNull: false },
      memberId: { type: DataTypes.UUID, allowNull: false },
      role: { type: DataTypes.TEXT, allowNull: false },
      linkHash: { type: DataTypes.TEXT },
      linkVersion: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      openedAt: { type: DataTypes.DATE },
    },
    { sequelize, tableName: 'round_roles' },
  )
}
