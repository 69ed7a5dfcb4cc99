import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Club extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare name: string
  declare createdAt: Date
}

export function initClub(sequelize: Sequelize): void {
  Club.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    name: { type: DataTypes.STRING, allowNull: false },
    createdAt: { type: DataTypes.DATE(3), allowNull: false },
  }, { sequelize, tableName: 'club' })
}
