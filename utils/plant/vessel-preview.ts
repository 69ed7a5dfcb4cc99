import type { VesselFields } from '#shared/domain/vessel.schema'
import { brimLitres } from '#shared/science/vessel/level-to-litres'
import { measuresOfVessel } from '#shared/science/vessel/measures-of-vessel'
import type { CutMeasures } from '~/utils/waterline/vessel-cut'
import { litres, number } from '~/utils/words/numbers'
import { cupBottomOf, litresIn } from './vessel-water'

/** Depth of the cup's foot in the water at the start, cm: the lower 2 cm or more (kratky-2004, as at `cupImmersionCm`). */
const START_IMMERSION_CM = 2

/** The measures that are known, for the drawing; the rest is drawn as in a common bucket. */
export function cutMeasuresOf(vessel: VesselFields): Partial<CutMeasures> | null {
  if (vessel.shape === 'unmeasured' || vessel.heightCm === null || vessel.topLengthCm === null || vessel.bottomLengthCm === null) return null
  const measures: Partial<CutMeasures> = { topCm: vessel.topLengthCm, bottomCm: vessel.bottomLengthCm, heightCm: vessel.heightCm }
  if (vessel.netCupRimCm !== null) measures.cupRimCm = vessel.netCupRimCm
  if (vessel.netCupDepthCm !== null && vessel.netCupDepthCm <= vessel.heightCm) measures.cupDepthCm = vessel.netCupDepthCm
  return measures
}

function startLevelCm(vessel: VesselFields): number | null {
  const bottom = cupBottomOf(vessel)
  return bottom === null || vessel.heightCm === null ? null : Math.min(vessel.heightCm, bottom + START_IMMERSION_CM)
}

/** How full the vessel is drawn: so that the cup's foot stands in the water. */
export function startLevelShare(vessel: VesselFields): number {
  const level = startLevelCm(vessel)
  return level !== null && vessel.heightCm ? level / vessel.heightCm : 0.82
}

/** What a vessel holds, in words; without a figure while measures are missing. */
export function fullVesselWords(vessel: VesselFields, locale?: string): { figure: string | null, text: string } {
  const measures = measuresOfVessel(vessel)
  if (!measures) {
    if (vessel.shape !== 'unmeasured') return { figure: null, text: 'Litres appear here once rim, floor and height are measured.' }
    if (vessel.capacityLitres === null) return { figure: null, text: 'Without measures a level is told in centimetres only. You can measure later.' }
    return { figure: litres(vessel.capacityLitres, locale), text: 'by its label. Litres at a lower level need measures.' }
  }
  const level = startLevelCm(vessel)
  const start = litresIn(vessel, level)
  const brim = litres(brimLitres(measures), locale)
  if (level === null || start === null) return { figure: brim, text: 'up to the rim' }
  return {
    figure: litres(start, locale),
    text: `to begin with: the foot of the net cup stands ${number(START_IMMERSION_CM, 1, locale)} cm in the water, ${number(level, 1, locale)} cm above the floor. ${brim} up to the rim.`,
  }
}
