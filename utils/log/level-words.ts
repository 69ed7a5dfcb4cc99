import type { ReadingField } from '#shared/domain/entry.schema'
import type { VesselFields } from '#shared/domain/vessel.schema'
import { cupBottomOf, gapOf, levelOf, litresIn } from '~/utils/plant/vessel-water'
import { litres, number } from '~/utils/words/numbers'
import type { Readings } from '~/utils/words/readings'

/** What the typed level or gap means: the other one, and the litres. */
export function levelHints(readings: Readings, vessel: VesselFields | null): Partial<Record<ReadingField, string>> {
  const level = levelOf(readings, vessel)
  const gap = gapOf(readings, vessel)
  const volume = litresIn(vessel, level)
  const hints: Partial<Record<ReadingField, string>> = {}
  if (readings.waterLevelCm !== null && volume !== null) hints.waterLevelCm = `${litres(volume)} left`
  if (readings.waterLevelCm === null && readings.airGapCm !== null && level !== null) hints.waterLevelCm = `${number(level)} cm by the air gap`
  if (readings.airGapCm === null && readings.waterLevelCm !== null && gap !== null) hints.airGapCm = `${number(gap)} cm by the water level`
  if (readings.airGapCm !== null && readings.waterLevelCm === null && volume !== null) hints.airGapCm = `${litres(volume)} left`
  return hints
}

function withLitres(levelCm: number, vessel: VesselFields | null): string {
  const volume = litresIn(vessel, levelCm)
  return `${number(levelCm)} cm${volume === null ? '' : ` (${litres(volume)})`}`
}

/** How high the water may go, told before anybody pours. */
export function limitWords(limitCm: number | null, vessel: VesselFields | null): string | null {
  if (limitCm === null) return null
  return `Fill to ${withLitres(limitCm, vessel)} at most. The roots above that breathe air and may be harmed under water.`
}

/** Said when a level lies above the rim: more often a slip of the finger than a flood. */
export function aboveRimWords(levelCm: number | null, vessel: VesselFields | null): string | null {
  if (levelCm === null || !vessel?.heightCm || levelCm <= vessel.heightCm) return null
  return `The vessel is only ${number(vessel.heightCm)} cm high, and this says ${number(levelCm)} cm. Please look once more; you can save it as it is.`
}

/** Said when a level lies above the limit. It never keeps anybody from saving. */
export function aboveLimitWords(levelCm: number | null, limitCm: number | null, vessel: VesselFields | null): string | null {
  if (levelCm === null || limitCm === null || levelCm <= limitCm) return null
  return `This is above the refill limit of ${withLitres(limitCm, vessel)}. Roots that breathe air may be harmed under water. If the water stands that high now, take some out. You can save it as it is.`
}

/**
 * Said on the day of set-up when the water ends below the net cup: nothing drinks there yet.
 * That the water touches the cup at the start is common practice, no source.
 */
export function belowCupWords(levelCm: number | null, vessel: VesselFields | null): string | null {
  const cupCm = cupBottomOf(vessel)
  if (levelCm === null || cupCm === null || levelCm >= cupCm) return null
  return `The water ends ${number(cupCm - levelCm)} cm below the net cup. Unless roots hang into it already, the plant dries out: fill until the cup touches the water, at ${withLitres(cupCm, vessel)}. You can save it as it is.`
}
