import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** What went wrong. */
export class Incident extends Model<InferAttributes<Incident>, InferCreationAttributes<Incident>> {
  declare panelId: string
  declare id: string
  declare roundId: string
  declare sittingId: string
  declare seatId: CreationOptional<string | null>
  declare servingId: CreationOptional<string | null>
  declare kind: 'mix-up' | 'lost-seal' | 'unit-fault' | 'key-learned' | 'wrong-code' | 'void' | 'other'
  declare text: string
  declare createdAt: Date
}

export function initIncident(sequelize: Sequelize): void {
  Incident.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID, allowNull: false },
      sittingId: { type: DataTypes.UUID, allowNull: false },
      seatId: { type: DataTypes.UUID },
      servingId: { type: DataTypes.UUID },
      kind: { type: DataTypes.TEXT, allowNull: false },
      text: { type: DataTypes.TEXT, allowNull: false },
      createdAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'incidents' },
  )
}
