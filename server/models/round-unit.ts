import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** Which units a round compares; says nothing of codes. */
export class RoundUnit extends Model<InferAttributes<RoundUnit>, InferCreationAttributes<RoundUnit>> {
  declare panelId: string
  declare roundId: string
  declare unitId: string
}

export function initRoundUnit(sequelize: Sequelize): void {
  RoundUnit.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      roundId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      unitId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
    },
    { sequelize, tableName: 'round_units' },
  )
}
