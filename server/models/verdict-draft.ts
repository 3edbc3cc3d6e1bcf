import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** What the organiser has written so far. */
export class VerdictDraft extends Model<
  InferAttributes<VerdictDraft>,
  InferCreationAttributes<VerdictDraft>
> {
  declare panelId: string
  declare roundId: string
  declare headline: CreationOptional<string>
  declare summary: CreationOptional<string>
  declare version: CreationOptional<number>
}

export function initVerdictDraft(sequelize: Sequelize): void {
  VerdictDraft.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      roundId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      headline: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      summary: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
    },
    { sequelize, tableName: 'verdict_drafts' },
  )
}
