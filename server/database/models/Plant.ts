import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Plant extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare ownerId: string
  declare name: string
  declare cropId: string
  declare cultivar: string | null
  declare origin: string | null
  declare sownOn: string | null
  declare setUpOn: string
  declare timeZone: string
  declare vesselId: string | null
  declare place: string | null
  declare visibility: string
  declare clubId: string | null
  declare endedOn: string | null
  declare endReason: string | null
}

export function initPlant(sequelize: Sequelize): void {
  Plant.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    ownerId: { type: DataTypes.UUID, allowNull: false },
    name: { type: DataTypes.STRING, allowNull: false },
    cropId: { type: DataTypes.STRING, allowNull: false },
    cultivar: { type: DataTypes.STRING, allowNull: true },
    origin: { type: DataTypes.STRING, allowNull: true },
    sownOn: { type: DataTypes.DATEONLY, allowNull: true },
    setUpOn: { type: DataTypes.DATEONLY, allowNull: false },
    timeZone: { type: DataTypes.STRING, allowNull: false },
    vesselId: { type: DataTypes.UUID, allowNull: true },
    place: { type: DataTypes.STRING, allowNull: true },
    visibility: { type: DataTypes.STRING, allowNull: false },
    clubId: { type: DataTypes.UUID, allowNull: true },
    endedOn: { type: DataTypes.DATEONLY, allowNull: true },
    endReason: { type: DataTypes.STRING, allowNull: true },
  }, { sequelize, tableName: 'plant' })
}
