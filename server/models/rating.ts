import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** A number or “can’t tell”. */
export class Rating extends Model<InferAttributes<Rating>, InferCreationAttributes<Rating>> {
  declare panelId: string
  declare submissionId: string
  declare descriptorId: string
  declare value: CreationOptional<number | null>
  declare cantTell: boolean
}

export function initRating(sequelize: Sequelize): void {
  Rating.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      submissionId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      descriptorId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      value: { type: DataTypes.DOUBLE },
      cantTell: { type: DataTypes.BOOLEAN, allowNull: false },
    },
    { sequelize, tableName: 'ratings' },
  )
}
