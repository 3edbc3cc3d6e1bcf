import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** Mail that the demo’s own mail server took in. */
export class DemoMessage extends Model<InferAttributes<DemoMessage>, InferCreationAttributes<DemoMessage>> {
  declare id: string
  declare recipient: string
  declare subject: string
  declare body: string
  declare receivedAt: Date
}

export function initDemoMessage(sequelize: Sequelize): void {
  DemoMessage.init(
    {
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      recipient: { type: DataTypes.TEXT, allowNull: false },
      subject: { type: DataTypes.TEXT, allowNull: false },
      body: { type: DataTypes.TEXT, allowNull: false },
      receivedAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'demo_messages' },
  )
}
