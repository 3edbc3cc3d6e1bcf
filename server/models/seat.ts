import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** One panelist’s place in a round. */
export class Seat extends Model<InferAttributes<Seat>, InferCreationAttributes<Seat>> {
  declare panelId: string
  declare id: string
  declare roundId: string
  declare sittingId: string
  declare memberId: CreationOptional<string | null>
  declare rowId: string
  declare codeSet: 'served' | 'takeover'
  declare number: number
  declare label: string
  declare linkHash: CreationOptional<string | null>
  declare linkVersion: CreationOptional<number>
  declare openedAt: CreationOptional<Date | null>
  declare consentVersion: CreationOptional<string | null>
  declare consentedAt: CreationOptional<Date | null>
  declare leftAt: CreationOptional<Date | null>
}

export function initSeat(sequelize: Sequelize): void {
  Seat.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID, allowNull: false },
      sittingId: { type: DataTypes.UUID, allowNull: false },
      memberId: { type: DataTypes.UUID },
      rowId: { type: DataTypes.UUID, allowNull: false },
      codeSet: { type: DataTypes.TEXT, allowNull: false },
      number: { type: DataTypes.INTEGER, allowNull: false },
      label: { type: DataTypes.TEXT, allowNull: false },
      linkHash: { type: DataTypes.TEXT },
      linkVersion: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      openedAt: { type: DataTypes.DATE },
      consentVersion: { type: DataTypes.TEXT },
      consentedAt: { type: DataTypes.DATE },
      leftAt: { type: DataTypes.DATE },
    },
    { sequelize, tableName: 'seats' },
  )
}
