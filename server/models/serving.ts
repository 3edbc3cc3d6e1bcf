import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** One coded unit at one position of a seat. */
export class Serving extends Model<InferAttributes<Serving>, InferCreationAttributes<Serving>> {
  declare panelId: string
  declare id: string
  declare seatId: string
  declare rowPlaceId: string
  declare turn: number
  declare position: number
  declare state: 'waiting' | 'tagged' | 'handed' | 'confirmed' | 'submitted' | 'void' | 'missed'
  declare wrongCodes: CreationOptional<number>
  declare sealed: CreationOptional<'yes' | 'unsure' | 'no' | null>
  declare handedAt: CreationOptional<Date | null>
  declare confirmedAt: CreationOptional<Date | null>
  declare submittedAt: CreationOptional<Date | null>
  declare restUntil: CreationOptional<Date | null>
  declare voidedAt: CreationOptional<Date | null>
  declare voidReason: CreationOptional<string | null>
  declare repeatsServingId: CreationOptional<string | null>
  declare version: CreationOptional<number>
}

export function initServing(sequelize: Sequelize): void {
  Serving.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      seatId: { type: DataTypes.UUID, allowNull: false },
      rowPlaceId: { type: DataTypes.UUID, allowNull: false },
      turn: { type: DataTypes.INTEGER, allowNull: false },
      position: { type: DataTypes.INTEGER, allowNull: false },
      state: { type: DataTypes.TEXT, allowNull: false },
      wrongCodes: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 0 },
      sealed: { type: DataTypes.TEXT },
      handedAt: { type: DataTypes.DATE },
      confirmedAt: { type: DataTypes.DATE },
      submittedAt: { type: DataTypes.DATE },
      restUntil: { type: DataTypes.DATE },
      voidedAt: { type: DataTypes.DATE },
      voidReason: { type: DataTypes.TEXT },
      repeatsServingId: { type: DataTypes.UUID },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: 'servings' },
  )
}
