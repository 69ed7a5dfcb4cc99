import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Account extends Model {
  declare id: string
  declare email: string
  declare displayName: string
  declare passwordHash: string
  declare createdAt: Date
}

export function initAccount(sequelize: Sequelize): void {
  Account.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    email: { type: DataTypes.STRING, allowNull: false },
    displayName: { type: DataTypes.STRING, allowNull: false },
    passwordHash: { type: DataTypes.STRING, allowNull: false },
    createdAt: { type: DataTypes.DATE(3), allowNull: false },
  }, { sequelize, tableName: 'account' })
}
