import { computed } from 'vue'
import type { Ref } from 'vue'
import type { Photo } from '#shared/domain/photo.schema'
import type { Plant } from '#shared/domain/plant.schema'
import { useEntriesStore } from '~/stores/entries'
import { usePhotosStore } from '~/stores/photos'
import { usePlantsStore } from '~/stores/plants'
import type { View } from '~/types/view'
import { plantSubtitle } from '~/utils/plant/plant-words'
import { dayOf, latestLevel, latestReadings } from '~/utils/plant/timeline'
import { verdictsOf } from '~/utils/plant/verdicts'
import { litresIn } from '~/utils/plant/vessel-water'
import { daysAgo } from '~/utils/words/moments'
import { END_REASON_WORDS } from '~/utils/words/names'
import { usePictures } from './usePictures'

const PICTURE_LEVEL_SHARE = 0.7

/** What a card says of a plant. */
export function usePlantSummary(plant: () => View<Plant>, now: Readonly<Ref<Date>>) {
  const plants = usePlantsStore()
  const entries = useEntriesStore()
  const photos = usePhotosStore()

  const visits = computed(() => entries.ofPlant(plant().id))
  const vessel = computed(() => plants.vesselById(plant().data.vesselId)?.data ?? null)
  const day = computed(() => (plant().data.endedOn ? null : dayOf(plant().data, now.value.toISOString())))
  const daysSince = computed(() => {
    const [latest] = visits.value
    return latest ? dayOf(plant().data, now.value.toISOString()) - dayOf(plant().data, latest.data.occurredAt) : null
  })
  const lastLook = computed(() => (daysSince.value === null ? null : daysAgo(Math.max(0, daysSince.value))))

  /** The newest picture by which a person knows the plant again; roots and labels look alike. */
  const portrait = computed((): View<Photo>[] => {
    const taken = visits.value.flatMap(visit => photos.ofEntry(visit.id))
    const best = taken.find(photo => photo.data.subject === 'whole')
      ?? taken.find(photo => photo.data.subject === 'leaf' || photo.data.subject === 'fruit')
      ?? taken[0]
    return best ? [best] : []
  })
  const pictures = usePictures(portrait, day)
  const picture = computed(() => pictures.value[0] ?? null)

  const readings = computed(() => {
    const { ph, ecMilliSiemensPerCm } = latestReadings(visits.value).readings
    return { ph, ecMilliSiemensPerCm }
  })
  const verdicts = computed(() => verdictsOf(readings.value, plant().data.cropId))
  const levelCm = computed(() => latestLevel(visits.value, vessel.value)?.levelCm ?? null)
  const litres = computed(() => litresIn(vessel.value, levelCm.value))
  const levelShare = computed(() => {
    const heightCm = vessel.value?.heightCm
    return levelCm.value !== null && heightCm ? Math.min(1, levelCm.value / heightCm) : PICTURE_LEVEL_SHARE
  })
  const subtitle = computed(() => plantSubtitle(plant().data, vessel.value))
  const ended = computed(() => {
    const { endedOn, endReason } = plant().data
    return endedOn ? (endReason ? END_REASON_WORDS[endReason] : 'Ended') : null
  })

  return { day, daysSince, lastLook, picture, readings, verdicts, litres, levelShare, subtitle, ended }
}
