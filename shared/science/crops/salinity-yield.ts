import type { CropId } from './crop-ids'

/** Soil salinity from which yield falls, dS/m of the saturated paste, and the loss in % for each dS/m above it. */
const thresholds: Partial<Record<CropId, readonly [thresholdDeciSiemensPerM: number, lossPercentPerDeciSiemensPerM: number]>> = {
  bean: [1.0, 19],
  cucumber: [2.5, 13],
  lettuce: [1.3, 13],
  pepper: [1.5, 14],
  spinach: [2.0, 7.6],
  strawberry: [1.0, 33],
  tomato: [2.5, 9.9],
}

/**
 * Relative yield of a crop on a salty soil, Yr = 100 − b (EC − a), in % of the
 * yield without salt. EC: conductivity of the saturated paste, dS/m; a:
 * threshold, dS/m; b: loss, % per dS/m. Holds between 100 % and 0 %.
 *
 * A soil's paste is not a nutrient solution: this tells which crop bears more
 * salt, never what strength to mix. Values from memory.
 *
 * @param pasteDeciSiemensPerM conductivity of the saturated paste, 0 or more
 * @returns null for a crop without published values
 * @throws RangeError when the conductivity is negative or not finite
 * @source maas-hoffman-1977
 */
export function relativeYieldPercent(cropId: CropId, pasteDeciSiemensPerM: number): number | null {
  if (!Number.isFinite(pasteDeciSiemensPerM) || pasteDeciSiemensPerM < 0) {
    throw new RangeError('pasteDeciSiemensPerM must be a finite number from 0 up')
  }
  const row = thresholds[cropId]
  if (!row) return null
  const [threshold, loss] = row
  return Math.min(100, Math.max(0, 100 - loss * (pasteDeciSiemensPerM - threshold)))
}
