import { DataTypes, Model } from 'sequelize'
import type { Sequelize } from 'sequelize'

export class Entry extends Model {
  declare id: string
  declare ver: number
  declare deletedAt: Date | null
  declare plantId: string
  declare authorId: string
  declare occurredAt: Date
  declare recordedAt: Date
  declare lookedNoChange: boolean
  declare note: string | null
  declare ph: number | null
  declare ecMilliSiemensPerCm: number | null
  declare waterLevelCm: number | null
  declare airGapCm: number | null
  declare waterCelsius: number | null
  declare airCelsius: number | null
  declare relativeHumidityPercent: number | null
  declare actions: string[]
  declare topUpLitres: number | null
  declare topUpWith: string | null
  declare changeLitres: number | null
  declare harvestGrams: number | null
  declare harvestCount: number | null
}

export function initEntry(sequelize: Sequelize): void {
  Entry.init({
    id: { type: DataTypes.UUID, primaryKey: true },
    ver: { type: DataTypes.INTEGER, allowNull: false },
    deletedAt: { type: DataTypes.DATE(3), allowNull: true },
    plantId: { type: DataTypes.UUID, allowNull: false },
    authorId: { type: DataTypes.UUID, allowNull: false },
    occurredAt: { type: DataTypes.DATE(3), allowNull: false },
    recordedAt: { type: DataTypes.DATE(3), allowNull: false },
    lookedNoChange: { type: DataTypes.BOOLEAN, allowNull: false },
    note: { type: DataTypes.TEXT, allowNull: true },
    ph: { type: DataTypes.DOUBLE, allowNull: true },
    ecMilliSiemensPerCm: { type: DataTypes.DOUBLE, allowNull: true, field: 'ec_milli_siemens_per_cm' },
    waterLevelCm: { type: DataTypes.DOUBLE, allowNull: true },
    airGapCm: { type: DataTypes.DOUBLE, allowNull: true },
    waterCelsius: { type: DataTypes.DOUBLE, allowNull: true },
    airCelsius: { type: DataTypes.DOUBLE, allowNull: true },
    relativeHumidityPercent: { type: DataTypes.DOUBLE, allowNull: true },
    actions: { type: DataTypes.JSON, allowNull: false },
    topUpLitres: { type: DataTypes.DOUBLE, allowNull: true },
    topUpWith: { type: DataTypes.STRING, allowNull: true },
    changeLitres: { type: DataTypes.DOUBLE, allowNull: true },
    harvestGrams: { type: DataTypes.DOUBLE, allowNull: true },
    harvestCount: { type: DataTypes.INTEGER, allowNull: true },
  }, { sequelize, tableName: 'entry' })
}
