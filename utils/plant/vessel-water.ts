import type { VesselFields } from '#shared/domain/vessel.schema'
import { litresAtLevel } from '#shared/science/vessel/level-to-litres'
import { measuresOfVessel } from '#shared/science/vessel/measures-of-vessel'
import { airGapCm, cupBottomCm, levelFromAirGapCm } from '#shared/science/vessel/net-cup'

/**
 * What a level means in one vessel. A record may hold measures that do not fit
 * each other; then nothing is worked out instead of something wrong.
 */
type LevelReadings = { waterLevelCm?: number | null, airGapCm?: number | null }

/** Height of the net cup's bottom above the floor, cm; null when the cup or the vessel was not measured. */
export function cupBottomOf(vessel: VesselFields | null): number | null {
  const { heightCm, netCupDepthCm } = vessel ?? { heightCm: null, netCupDepthCm: null }
  if (heightCm === null || netCupDepthCm === null || netCupDepthCm > heightCm) return null
  return cupBottomCm(heightCm, netCupDepthCm)
}

/** Depth of the water, as read or worked out from the air gap. A gap of 0 only says that the cup touches the water. */
export function levelOf(readings: LevelReadings, vessel: VesselFields | null): number | null {
  if (typeof readings.waterLevelCm === 'number') return readings.waterLevelCm
  const bottom = cupBottomOf(vessel)
  const gap = readings.airGapCm
  if (bottom === null || typeof gap !== 'number' || gap <= 0 || gap > bottom) return null
  return levelFromAirGapCm(bottom, gap)
}

/** Air between net cup and water, as read or worked out from the level. */
export function gapOf(readings: LevelReadings, vessel: VesselFields | null): number | null {
  if (typeof readings.airGapCm === 'number') return readings.airGapCm
  const bottom = cupBottomOf(vessel)
  if (bottom === null || typeof readings.waterLevelCm !== 'number') return null
  return airGapCm(bottom, readings.waterLevelCm)
}

/** Litres at a level; null in a vessel nobody measured, or above its rim. */
export function litresIn(vessel: VesselFields | null, levelCm: number | null): number | null {
  const measures = vessel ? measuresOfVessel(vessel) : null
  if (!measures || levelCm === null || levelCm < 0 || levelCm > measures.heightCm) return null
  return litresAtLevel(measures, levelCm)
}
