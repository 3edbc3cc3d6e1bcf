import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** One line of an imported ratings file. */
export class ImportedRating extends Model<
  InferAttributes<ImportedRating>,
  InferCreationAttributes<ImportedRating>
> {
  declare panelId: string
  declare id: string
  declare roundId: string
  declare memberId: string
  declare listener: number
  declare unitId: string
  declare descriptorId: string
  declare replicate: string
  declare position: CreationOptional<number | null>
  declare value: CreationOptional<number | null>
  declare cantTell: CreationOptional<boolean>
}

export function initImportedRating(sequelize: Sequelize): void {
  ImportedRating.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID, allowNull: false },
      memberId: { type: DataTypes.UUID, allowNull: false },
      listener: { type: DataTypes.INTEGER, allowNull: false },
      unitId: { type: DataTypes.UUID, allowNull: false },
      descriptorId: { type: DataTypes.UUID, allowNull: false },
      replicate: { type: DataTypes.TEXT, allowNull: false },
      position: { type: DataTypes.INTEGER },
      value: { type: DataTypes.DOUBLE },
      cantTell: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
    },
    { sequelize, tableName: 'imported_ratings' },
  )
}
