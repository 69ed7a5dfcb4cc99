import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Photo extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare plantId: string
  declare entryId: string
  declare authorId: string
  declare subject: string
  declare sha256: string
  declare byteLength: number
  declare widthPx: number
  declare heightPx: number
  declare takenAt: Date | null
  declare storedAt: Date | null
  declare placeholder: string | null
  declare files: unknown
}

export function initPhoto(sequelize: Sequelize): void {
  Photo.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    plantId: { type: DataTypes.UUID, allowNull: false },
    entryId: { type: DataTypes.UUID, allowNull: false },
    authorId: { type: DataTypes.UUID, allowNull: false },
    subject: { type: DataTypes.STRING, allowNull: false },
    sha256: { type: DataTypes.CHAR(64), allowNull: false, field: 'sha256' },
    byteLength: { type: DataTypes.INTEGER, allowNull: false },
    widthPx: { type: DataTypes.INTEGER, allowNull: false },
    heightPx: { type: DataTypes.INTEGER, allowNull: false },
    takenAt: { type: DataTypes.DATE(3), allowNull: true },
    storedAt: { type: DataTypes.DATE(3), allowNull: true },
    placeholder: { type: DataTypes.TEXT, allowNull: true },
    files: { type: DataTypes.JSON, allowNull: true },
  }, { sequelize, tableName: 'photo' })
}
