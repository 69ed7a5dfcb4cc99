import type { ReadingField } from '#shared/domain/entry.schema'
import type { CropId } from '#shared/science/crops/crop-ids'
import { placeInRange, primaryRange } from '#shared/science/crops/published-ranges'
import type { RangedQuantity } from '#shared/science/crops/published-ranges'
import type { Aim } from '~/types/ui'
import type { Readings, Verdicts } from '~/utils/words/readings'

/** The readings that something is published for. */
const RANGED: readonly [ReadingField, RangedQuantity][] = [['ph', 'ph'], ['ecMilliSiemensPerCm', 'ec']]

/** The published spans a crop's readings are held against. */
export function aimsOf(cropId: CropId): Partial<Record<ReadingField, Aim>> {
  return Object.fromEntries(RANGED.flatMap(([field, quantity]) => {
    const range = primaryRange(cropId, quantity)
    return range ? [[field, { low: range.low, high: range.high }]] : []
  }))
}

/** Where each reading lies against what is published for the crop. */
export function verdictsOf(readings: Partial<Readings>, cropId: CropId): Verdicts {
  const aims = aimsOf(cropId)
  return Object.fromEntries(RANGED.flatMap(([field]) => {
    const value = readings[field]
    const aim = aims[field]
    return aim && typeof value === 'number' ? [[field, { side: placeInRange(value, aim) }]] : []
  }))
}
