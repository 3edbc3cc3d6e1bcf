import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** One blind comparison. */
export class Round extends Model<InferAttributes<Round>, InferCreationAttributes<Round>> {
  declare panelId: string
  declare id: string
  declare number: number
  declare title: string
  declare question: string
  declare status: 'draft' | 'open' | 'closed' | 'published' | 'cancelled'
  declare origin: 'live' | 'imported'
  declare blinding: 'double' | 'single' | 'split' | 'imported'
  declare mode: 'evening' | 'full'
  declare scorecardId: string
  declare primaryDescriptor: string
  declare plan: unknown
  declare publishesRows: CreationOptional<boolean>
  declare planFile: CreationOptional<string | null>
  declare planFingerprint: CreationOptional<string | null>
  declare keyFingerprint: CreationOptional<string | null>
  declare ratingsFile: CreationOptional<string | null>
  declare ratingsFingerprint: CreationOptional<string | null>
  declare createdAt: Date
  declare openedAt: CreationOptional<Date | null>
  declare closedAt: CreationOptional<Date | null>
  declare publishedAt: CreationOptional<Date | null>
  declare cancelledAt: CreationOptional<Date | null>
  declare cancelReason: CreationOptional<string | null>
  declare changedAt: Date
  declare version: CreationOptional<number>
}

export function initRound(sequelize: Sequelize): void {
  Round.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      number: { type: DataTypes.INTEGER, allowNull: false },
      title: { type: DataTypes.TEXT, allowNull: false },
      question: { type: DataTypes.TEXT, allowNull: false },
      status: { type: DataTypes.TEXT, allowNull: false },
      origin: { type: DataTypes.TEXT, allowNull: false },
      blinding: { type: DataTypes.TEXT, allowNull: false },
      mode: { type: DataTypes.TEXT, allowNull: false },
      scorecardId: { type: DataTypes.UUID, allowNull: false },
      primaryDescriptor: { type: DataTypes.TEXT, allowNull: false },
      plan: { type: DataTypes.JSONB, allowNull: false },
      publishesRows: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: true },
      planFile: { type: DataTypes.TEXT },
      planFingerprint: { type: DataTypes.TEXT },
      keyFingerprint: { type: DataTypes.TEXT },
      ratingsFile: { type: DataTypes.TEXT },
      ratingsFingerprint: { type: DataTypes.TEXT },
      createdAt: { type: DataTypes.DATE, allowNull: false },
      openedAt: { type: DataTypes.DATE },
      closedAt: { type: DataTypes.DATE },
      publishedAt: { type: DataTypes.DATE },
      cancelledAt: { type: DataTypes.DATE },
      cancelReason: { type: DataTypes.TEXT },
      changedAt: { type: DataTypes.DATE, allowNull: false },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: 'rounds' },
  )
}
