import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Conflict extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare entityType: string
  declare entityId: string
  declare plantId: string | null
  declare field: string
  declare otherValue: unknown
  declare ownerId: string
  declare byAccountId: string
  declare deviceId: string
  declare at: Date
  declare resolvedAt: Date | null
}

export function initConflict(sequelize: Sequelize): void {
  Conflict.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    entityType: { type: DataTypes.STRING, allowNull: false },
    entityId: { type: DataTypes.UUID, allowNull: false },
    plantId: { type: DataTypes.UUID, allowNull: true },
    field: { type: DataTypes.STRING, allowNull: false },
    otherValue: { type: DataTypes.JSON, allowNull: true },
    ownerId: { type: DataTypes.UUID, allowNull: false },
    byAccountId: { type: DataTypes.UUID, allowNull: false },
    deviceId: { type: DataTypes.UUID, allowNull: false },
    at: { type: DataTypes.DATE(3), allowNull: false },
    resolvedAt: { type: DataTypes.DATE(3), allowNull: true },
  }, { sequelize, tableName: 'conflict' })
}
