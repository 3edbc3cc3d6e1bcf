import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** Who did what, when; added to, never changed. */
export class AuditEvent extends Model<InferAttributes<AuditEvent>, InferCreationAttributes<AuditEvent>> {
  declare panelId: string
  declare id: string
  declare roundId: CreationOptional<string | null>
  declare actor: string
  declare action: string
  declare facts: CreationOptional<unknown>
  declare at: Date
}

export function initAuditEvent(sequelize: Sequelize): void {
  AuditEvent.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      roundId: { type: DataTypes.UUID },
      actor: { type: DataTypes.TEXT, allowNull: false },
      action: { type: DataTypes.TEXT, allowNull: false },
      facts: { type: DataTypes.JSONB, allowNull: false, defaultValue: {} },
      at: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'audit_events' },
  )
}
