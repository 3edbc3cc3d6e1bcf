import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** One published version of a verdict, as it was. */
export class Verdict extends Model<InferAttributes<Verdict>, InferCreationAttributes<Verdict>> {
  declare panelId: string
  declare id: string
  declare roundId: string
  declare slug: string
  declare number: number
  declare version: number
  declare content: unknown
  declare correction: CreationOptional<string>
  declare publishedAt: Date
}

export function initVerdict(sequelize: Sequelize): void {
  Verdict.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID, allowNull: false },
      slug: { type: DataTypes.TEXT, allowNull: false },
      number: { type: DataTypes.INTEGER, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false },
      content: { type: DataTypes.JSONB, allowNull: false },
      correction: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      publishedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'verdicts' },
  )
}
