import {
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** Seed, nonce and key file, encrypted. Read by server/features/key alone. */
export class RoundSecret extends Model<InferAttributes<RoundSecret>, InferCreationAttributes<RoundSecret>> {
  declare panelId: string
  declare roundId: string
  declare seedCipher: Buffer
  declare nonceCipher: Buffer
  declare keyCipher: Buffer
}

export function initRoundSecret(sequelize: Sequelize): void {
  RoundSecret.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      roundId: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      seedCipher: { type: DataTypes.BLOB, allowNull: false },
      nonceCipher: { type: DataTypes.BLOB, allowNull: false },
      keyCipher: { type: DataTypes.BLOB, allowNull: false },
    },
    { sequelize, tableName: 'round_secrets' },
  )
}
