import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class AccountSession extends Model {
  declare sidSha256: string
  declare accountId: string
  declare device: string
  declare createdAt: Date
  declare lastSeenAt: Date
  declare idleUntil: Date
  declare absoluteUntil: Date
  declare revokedAt: Date | null
}

export function initAccountSession(sequelize: Sequelize): void {
  AccountSession.init({
    sidSha256: { type: DataTypes.CHAR(64), primaryKey: true, field: 'sid_sha256' },
    accountId: { type: DataTypes.UUID, allowNull: false },
    device: { type: DataTypes.STRING, allowNull: false },
    createdAt: { type: DataTypes.DATE(3), allowNull: false },
    lastSeenAt: { type: DataTypes.DATE(3), allowNull: false },
    idleUntil: { type: DataTypes.DATE(3), allowNull: false },
    absoluteUntil: { type: DataTypes.DATE(3), allowNull: false },
    revokedAt: { type: DataTypes.DATE(3), allowNull: true },
  }, { sequelize, tableName: 'account_session' })
}
