import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Comment extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare plantId: string
  declare entryId: string
  declare authorId: string
  declare text: string
  declare writtenAt: Date
}

export function initComment(sequelize: Sequelize): void {
  Comment.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    plantId: { type: DataTypes.UUID, allowNull: false },
    entryId: { type: DataTypes.UUID, allowNull: false },
    authorId: { type: DataTypes.UUID, allowNull: false },
    text: { type: DataTypes.TEXT, allowNull: false },
    writtenAt: { type: DataTypes.DATE(3), allowNull: false },
  }, { sequelize, tableName: 'comment' })
}
