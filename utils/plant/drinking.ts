import type { Entry } from '#shared/domain/entry.schema'
import type { VesselFields } from '#shared/domain/vessel.schema'
import { meanLitresPerDay } from '#shared/science/water/water-use'
import { levelOf, litresIn } from './vessel-water'

const DAY_MILLISECONDS = 86_400_000
/** Over less than this a misread millimetre of level says more than the plant. */
const SHORTEST_DAYS = 2

/**
 * Litres a day since water last came in, from the first level read with or
 * after it to the newest. Null while that is too short to tell, or the level
 * has not fallen.
 *
 * @param entries newest first
 */
export function drinksPerDay(entries: readonly { data: Entry }[], vessel: VesselFields | null): number | null {
  const readings: { at: number, litres: number }[] = []
  for (const { data } of entries) {
    const litres = litresIn(vessel, levelOf(data, vessel))
    if (litres !== null) readings.push({ at: Date.parse(data.occurredAt), litres })
    if (data.actions.some(action => action === 'topped-up' || action === 'changed-solution' || action === 'rained-in')) break
  }
  const newest = readings[0]
  const oldest = readings.at(-1)
  if (!newest || !oldest) return null
  const days = (newest.at - oldest.at) / DAY_MILLISECONDS
  const drunk = oldest.litres - newest.litres
  return days < SHORTEST_DAYS || drunk <= 0 ? null : meanLitresPerDay(drunk, days)
}
