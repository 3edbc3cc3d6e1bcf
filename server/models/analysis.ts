import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** A stored result with the digest of what it was computed from. */
export class Analysis extends Model<InferAttributes<Analysis>, InferCreationAttributes<Analysis>> {
  declare panelId: string
  declare id: string
  declare roundId: string
  declare digest: string
  declare libraryVersion: string
  declare seed: string
  declare result: unknown
  declare createdAt: Date
}

export function initAnalysis(sequelize: Sequelize): void {
  Analysis.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID, allowNull: false },
      digest: { type: DataTypes.TEXT, allowNull: false },
      libraryVersion: { type: DataTypes.TEXT, allowNull: false },
      seed: { type: DataTypes.TEXT, allowNull: false },
      result: { type: DataTypes.JSONB, allowNull: false },
      createdAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'analyses' },
  )
}
