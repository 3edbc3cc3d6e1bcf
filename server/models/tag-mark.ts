import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** A letter of a split key that has been tagged. */
export class TagMark extends Model<InferAttributes<TagMark>, InferCreationAttributes<TagMark>> {
  declare panelId: string
  declare roundId: string
  declare part: 'letters' | 'codes'
  declare letter: string
  declare markedAt: Date
}

export function initTagMark(sequelize: Sequelize): void {
  TagMark.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      roundId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      part: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
      letter: { type: DataTypes.TEXT, allowNull: false, primaryKey: true },
      markedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'tag_marks' },
  )
}
