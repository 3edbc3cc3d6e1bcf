import {
  type CreationOptional,
  DataTypes,
  type InferAttributes,
  type InferCreationAttributes,
  Model,
  type Sequelize,
} from 'sequelize'

/** One physical earphone specimen. */
export class Unit extends Model<InferAttributes<Unit>, InferCreationAttributes<Unit>> {
  declare panelId: string
  declare id: string
  declare maker: string
  declare name: string
  declare serial: CreationOptional<string>
  declare firmware: CreationOptional<string>
  declare provenance: CreationOptional<'bought' | 'loan' | 'gift' | 'discounted' | 'prototype' | null>
  declare lender: CreationOptional<string | null>
  declare returnOn: CreationOptional<string | null>
  declare disclosure: CreationOptional<string | null>
  declare priceMinor: CreationOptional<string | null>
  declare priceCurrency: CreationOptional<string | null>
  declare priceOn: CreationOptional<string | null>
  declare priceUnknown: CreationOptional<boolean>
  declare photoId: CreationOptional<string | null>
  declare version: CreationOptional<number>
  declare createdAt: Date
}

export function initUnit(sequelize: Sequelize): void {
  Unit.init(
    {
      panelId: { type: DataTypes.UUID, allowNull: false },
      id: { type: DataTypes.UUID, allowNull: false, primaryKey: true },
      maker: { type: DataTypes.TEXT, allowNull: false },
      name: { type: DataTypes.TEXT, allowNull: false },
      serial: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      firmware: { type: DataTypes.TEXT, allowNull: false, defaultValue: '' },
      provenance: { type: DataTypes.TEXT },
      lender: { type: DataTypes.TEXT },
      returnOn: { type: DataTypes.DATEONLY },
      disclosure: { type: DataTypes.TEXT },
      priceMinor: { type: DataTypes.BIGINT },
      priceCurrency: { type: DataTypes.TEXT },
      priceOn: { type: DataTypes.DATEONLY },
      priceUnknown: { type: DataTypes.BOOLEAN, allowNull: false, defaultValue: false },
      photoId: { type: DataTypes.UUID },
      version: { type: DataTypes.INTEGER, allowNull: false, defaultValue: 1 },
      createdAt: { type: DataTypes.DATE, allowNull: false },
    },
    { sequelize, tableName: 'units' },
  )
}
