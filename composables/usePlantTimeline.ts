import { computed } from 'vue'
import type { Ref } from 'vue'
import { useClubStore } from '~/stores/club'
import { useEntriesStore } from '~/stores/entries'
import { usePlantsStore } from '~/stores/plants'
import { plantSubtitle, vesselNoun } from '~/utils/plant/plant-words'
import { dayOf, dayPosition, groupByDay, latestLevel, latestReadings, railOf, refillLimitOf } from '~/utils/plant/timeline'
import { gapOf, litresIn } from '~/utils/plant/vessel-water'
import { drinksPerDay } from '~/utils/plant/drinking'
import { verdictsOf } from '~/utils/plant/verdicts'
import { END_REASON_WORDS } from '~/utils/words/names'

/** One plant's story as its page tells it. */
export function usePlantTimeline(plantId: () => string, now: Readonly<Ref<Date>>) {
  const plants = usePlantsStore()
  const entriesStore = useEntriesStore()
  const club = useClubStore()

  const plant = computed(() => plants.byId(plantId()))
  const mine = computed(() => plant.value !== null && plants.isMine(plant.value))
  const vessel = computed(() => plants.vesselById(plant.value?.data.vesselId ?? null)?.data ?? null)
  const entries = computed(() => entriesStore.ofPlant(plantId()))
  const ended = computed(() => plant.value?.data.endedOn ?? null)
  /** A plant that ended stays at its last day. */
  const until = computed(() => {
    const present = now.value.toISOString()
    return ended.value !== null && ended.value < present.slice(0, 10) ? `${ended.value}T12:00:00.000Z` : present
  })

  const subtitle = computed(() => (plant.value ? plantSubtitle(plant.value.data, vessel.value) : ''))
  const grower = computed(() => (plant.value && !mine.value ? club.person(plant.value.data.ownerId)?.displayName ?? 'Somebody of the club' : null))
  const visibility = computed(() => {
    if (!plant.value) return null
    const { visibility: sharing, clubId } = plant.value.data
    return sharing === 'club' ? `Shared with ${club.nameOf(clubId) ?? 'the club'}` : 'Only you see it'
  })
  const endedWords = computed(() => {
    const reason = plant.value?.data.endReason
    return ended.value === null ? null : reason ? END_REASON_WORDS[reason] : 'Ended'
  })

  const day = computed(() => (plant.value ? dayOf(plant.value.data, until.value) : null))
  const untilDay = computed(() => (plant.value ? dayPosition(plant.value.data, until.value) : 0))
  const days = computed(() => (plant.value ? groupByDay(entries.value, plant.value.data) : []))
  const rail = computed(() => (plant.value ? railOf(entries.value, plant.value.data, vessel.value) : { readings: [], steps: [] }))
  const limitCm = computed(() => (plant.value ? refillLimitOf(entries.value, vessel.value, plant.value.data) : null))

  const latest = computed(() => latestReadings(entries.value))
  /** The header tells strength, pH and water; the vessel's picture tells the rest. */
  const headReadings = computed(() => {
    const { ph, ecMilliSiemensPerCm, waterCelsius } = latest.value.readings
    return { ph, ecMilliSiemensPerCm, waterCelsius }
  })
  const verdicts = computed(() => (plant.value ? verdictsOf(latest.value.readings, plant.value.data.cropId) : {}))
  const level = computed(() => latestLevel(entries.value, vessel.value))
  const levelCm = computed(() => level.value?.levelCm ?? null)
  const levelDay = computed(() => (plant.value && level.value ? dayOf(plant.value.data, level.value.entry.data.occurredAt) : null))
  const litres = computed(() => litresIn(vessel.value, levelCm.value))
  const litresPerDay = computed(() => drinksPerDay(entries.value, vessel.value))
  const gapCm = computed(() => gapOf({ waterLevelCm: levelCm.value }, vessel.value))

  return {
    plant, mine, vessel, vesselName: computed(() => vesselNoun(vessel.value)), entries, subtitle, grower, visibility, ended: endedWords,
    day, untilDay, days, rail, limitCm, headReadings, verdicts, levelCm, levelDay, litres, gapCm, litresPerDay,
  }
}
