import type { CropId } from './crop-ids'
import { PUBLISHED_RANGE_ROWS, type PublishedRange, type RangedQuantity } from './published-range-rows'

export type { PublishedRange, RangedQuantity }

/**
 * The pH band given for all crops nearly everywhere, 5.5 to 6.5.
 * Value from memory.
 *
 * @source jones-2005
 * @source hochmuth-hs796
 */
export const GENERAL_PH_RANGE: PublishedRange = {
  crops: 'all', quantity: 'ph', low: 5.5, high: 6.5, source: 'jones-2005', place: '',
  provenance: 'memory', context: 'all crops, the band given nearly everywhere',
}

const lowerGeneralPhRange: PublishedRange = {
  crops: 'all', quantity: 'ph', low: 5.3, high: 6.3, source: 'combrink-mixing', place: '',
  provenance: 'seen', context: 'all crops',
}

/** A crop row that reaches this pH repeats an older list; the lettuce handbook and the general band lie below it. */
const OUTDATED_FROM_PH = 7.0

/**
 * Every published band of one quantity for one crop, those of the crop before
 * those of all crops. Empty where nobody published one, which is so for the
 * strength of "other".
 *
 * @source singh-dunn-2016 table 2
 * @source combrink-mixing pH for all crops
 */
export function publishedRanges(cropId: CropId, quantity: RangedQuantity): PublishedRange[] {
  const ofCrop = PUBLISHED_RANGE_ROWS.filter(
    row => row.quantity === quantity && row.crops !== 'all' && row.crops.includes(cropId),
  )
  return quantity === 'ph' ? [...ofCrop, GENERAL_PH_RANGE, lowerGeneralPhRange] : ofCrop
}

/**
 * The one band that a reading is held against first; the others stay beside it.
 * Strength: the crop's first row. pH: the crop's first row that is a band (a
 * single printed value is no band to be inside of) and lies below pH 7.0 (rows
 * up to 7.0 repeat an older list), else the general 5.5 to 6.5.
 * Null where nothing is published.
 *
 * @source jones-2005 the general pH band
 */
export function primaryRange(cropId: CropId, quantity: RangedQuantity): PublishedRange | null {
  const ranges = publishedRanges(cropId, quantity)
  if (quantity === 'ec') return ranges[0] ?? null
  return ranges.find(range => range.low < range.high && range.high < OUTDATED_FROM_PH) ?? GENERAL_PH_RANGE
}

/**
 * Where a reading lies against a band whose ends belong to it.
 *
 * @param value in the unit of the band
 * @throws RangeError when `value` is not a finite number
 * @source common practice, no source
 */
export function placeInRange(value: number, range: Pick<PublishedRange, 'low' | 'high'>): 'below' | 'in' | 'above' {
  if (!Number.isFinite(value)) throw new RangeError('value must be a finite number')
  if (value < range.low) return 'below'
  return value > range.high ? 'above' : 'in'
}
