import type { PlantFields } from '#shared/domain/plant.schema'
import type { VesselFields } from '#shared/domain/vessel.schema'
import { cropOf } from '#shared/science/crops/crops'
import { brimLitres } from '#shared/science/vessel/level-to-litres'
import { measuresOfVessel } from '#shared/science/vessel/measures-of-vessel'
import { litres } from '~/utils/words/numbers'
import { VESSEL_KIND_WORDS } from '~/utils/words/names'

/** "12 L bucket", "bucket"; a kind that is no kind is called by the vessel's own name. */
export function vesselWords(vessel: VesselFields | null): string {
  if (!vessel) return ''
  const measures = measuresOfVessel(vessel)
  const size = vessel.capacityLitres ?? (measures ? brimLitres(measures) : null)
  const what = vessel.kind === 'other' ? vessel.name : VESSEL_KIND_WORDS[vessel.kind].toLowerCase()
  return size === null ? what : `${litres(Math.round(size * 2) / 2)} ${what}`
}

/** What the vessel is called in a sentence: "the bucket". */
export function vesselNoun(vessel: VesselFields | null): string {
  return vessel && vessel.kind !== 'other' ? VESSEL_KIND_WORDS[vessel.kind].toLowerCase() : 'vessel'
}

/** Crop, cultivar, vessel and place in one line. */
export function plantSubtitle(plant: PlantFields, vessel: VesselFields | null): string {
  return [cropOf(plant.cropId).name, plant.cultivar, vesselWords(vessel), plant.place].filter(Boolean).join(' · ')
}
