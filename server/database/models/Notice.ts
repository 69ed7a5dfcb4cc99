import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Notice extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare accountId: string
  declare code: string
  declare plantId: string | null
  declare entryId: string | null
  declare subjectId: string
  declare byAccountId: string | null
  declare at: Date
  declare seenAt: Date | null
}

export function initNotice(sequelize: Sequelize): void {
  Notice.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    accountId: { type: DataTypes.UUID, allowNull: false },
    code: { type: DataTypes.STRING, allowNull: false },
    plantId: { type: DataTypes.UUID, allowNull: true },
    entryId: { type: DataTypes.UUID, allowNull: true },
    subjectId: { type: DataTypes.UUID, allowNull: false },
    byAccountId: { type: DataTypes.UUID, allowNull: true },
    at: { type: DataTypes.DATE(3), allowNull: false },
    seenAt: { type: DataTypes.DATE(3), allowNull: true },
  }, { sequelize, tableName: 'notice' })
}
