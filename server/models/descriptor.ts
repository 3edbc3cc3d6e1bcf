import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** One thing rated, on its own scale. */
export class Descriptor extends Model<InferAttributes<Descriptor>, InferCreationAttributes<Descriptor>> {
  declare panelId: string
  declare id: string
  declare scorecardId: string
  declare place: number
  declare key: string
  declare name: string
  declare sentence: string
  declare family: 'liking' | 'tonal-balance' | 'staging' | 'timbre'
  declare scaleLow: number
  declare scaleHigh: number
  declare step: number
  declare sided: 'one' | 'two'
  declare lowWords: string
  declare middleWords: CreationOptional<string | null>
  declare highWords: string
}

export function initDescriptor(sequelize: Sequelize): void {
  Descriptor.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      scorecardId: { type: DataTypes.UUID, allowNull: false },
      place: { type: DataTypes.INTEGER, allowNull: false },
      key: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      sentence: { type: DataTypes.TEXT, allowNull: false },
      family: { type: DataTypes.TEXT, allowNull: false },
      scaleLow: { type: DataTypes.DOUBLE, allowNull: false },
      scaleHigh: { type: DataTypes.DOUBLE, allowNull: false },
      step: { type: DataTypes.DOUBLE, allowNull: false },
      sided: { type: DataTypes.TEXT, allowNull: false },
      lowWords: { type: DataTypes.TEXT, allowNull: false },
      middleWords: { type: DataTypes.TEXT },
      highWords: { type: DataTypes.TEXT, allowNull: false },
    },
    { sequelize, tableName: 'descriptors' },
  )
}
