import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'
import type { ClubRole } from '#shared/domain/club.schema'

export class Invitation extends Model {
  declare id: string
  declare clubId: string
  declare tokenSha256: string
  declare role: ClubRole
  declare usesLeft: number
  declare expiresAt: Date
  declare createdBy: string
  declare revokedAt: Date | null
}

export function initInvitation(sequelize: Sequelize): void {
  Invitation.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    clubId: { type: DataTypes.UUID, allowNull: false },
    tokenSha256: { type: DataTypes.CHAR(64), allowNull: false, field: 'token_sha256' },
    role: { type: DataTypes.STRING, allowNull: false },
    usesLeft: { type: DataTypes.INTEGER, allowNull: false },
    expiresAt: { type: DataTypes.DATE(3), allowNull: false },
    createdBy: { type: DataTypes.UUID, allowNull: false },
    revokedAt: { type: DataTypes.DATE(3), allowNull: true },
  }, { sequelize, tableName: 'invitation' })
}
