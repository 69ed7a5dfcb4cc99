import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'
import type { ClubRole } from '#shared/domain/club.schema'

export class Membership extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare clubId: string
  declare accountId: string
  declare role: ClubRole
  declare joinedAt: Date
}

export function initMembership(sequelize: Sequelize): void {
  Membership.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    clubId: { type: DataTypes.UUID, allowNull: false },
    accountId: { type: DataTypes.UUID, allowNull: false },
    role: { type: DataTypes.STRING, allowNull: false },
    joinedAt: { type: DataTypes.DATE(3), allowNull: false },
  }, { sequelize, tableName: 'membership' })
}
