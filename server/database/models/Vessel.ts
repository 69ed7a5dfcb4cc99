import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Vessel extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare ownerId: string
  declare name: string
  declare kind: string
  declare shape: string
  declare topLengthCm: number | null
  declare topWidthCm: number | null
  declare bottomLengthCm: number | null
  declare bottomWidthCm: number | null
  declare heightCm: number | null
  declare capacityLitres: number | null
  declare netCupRimCm: number | null
  declare netCupDepthCm: number | null
  declare lightProof: boolean | null
  declare plantCount: number | null
}

export function initVessel(sequelize: Sequelize): void {
  Vessel.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    ownerId: { type: DataTypes.UUID, allowNull: false },
    name: { type: DataTypes.STRING, allowNull: false },
    kind: { type: DataTypes.STRING, allowNull: false },
    shape: { type: DataTypes.STRING, allowNull: false },
    topLengthCm: { type: DataTypes.DOUBLE, allowNull: true },
    topWidthCm: { type: DataTypes.DOUBLE, allowNull: true },
    bottomLengthCm: { type: DataTypes.DOUBLE, allowNull: true },
    bottomWidthCm: { type: DataTypes.DOUBLE, allowNull: true },
    heightCm: { type: DataTypes.DOUBLE, allowNull: true },
    capacityLitres: { type: DataTypes.DOUBLE, allowNull: true },
    netCupRimCm: { type: DataTypes.DOUBLE, allowNull: true },
    netCupDepthCm: { type: DataTypes.DOUBLE, allowNull: true },
    lightProof: { type: DataTypes.BOOLEAN, allowNull: true },
    plantCount: { type: DataTypes.INTEGER, allowNull: true },
  }, { sequelize, tableName: 'vessel' })
}
