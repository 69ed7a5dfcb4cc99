import { computed, toValue } from 'vue'
import type { MaybeRefOrGetter, Ref } from 'vue'
import type { EntryAction, ReadingField } from '#shared/domain/entry.schema'
import { ENTRY_ACTIONS } from '#shared/domain/entry.schema'
import type { Plant } from '#shared/domain/plant.schema'
import type { Vessel } from '#shared/domain/vessel.schema'
import { useEntriesStore } from '~/stores/entries'
import { usePlantsStore } from '~/stores/plants'
import type { View } from '~/types/view'
import { aboveLimitWords, aboveRimWords, belowCupWords, levelHints, limitWords } from '~/utils/log/level-words'
import type { LogForm } from '~/utils/log/log-form'
import { dayOf, latestReadings, refillLimitOf } from '~/utils/plant/timeline'
import { levelOf } from '~/utils/plant/vessel-water'
import { aimsOf, verdictsOf } from '~/utils/plant/verdicts'
import { instantOf } from '~/utils/plant/zoned-time'

/**
 * What a form can tell beside its fields: what to aim for, what was read last,
 * what a level means, and how high the water may go.
 *
 * @param entryId the entry being changed, which is not its own past
 */
export function useVisitHints(
  plant: Ref<View<Plant> | null>, form: Ref<LogForm>, now: MaybeRefOrGetter<Date>, entryId: string | null = null,
) {
  const entries = useEntriesStore()
  const plants = usePlantsStore()

  const vessel = computed<Vessel | null>(() => plants.vesselById(plant.value?.data.vesselId ?? null)?.data ?? null)
  const occurredAt = computed(() => {
    const { moment } = form.value
    const typed = moment && plant.value ? instantOf(moment, plant.value.data.timeZone) : null
    return typed ?? toValue(now).toISOString()
  })
  /** What happened before this visit, newest first. */
  const past = computed(() => entries.ofPlant(plant.value?.id ?? '')
    .filter(entry => entry.id !== entryId && entry.data.occurredAt < occurredAt.value))
  const day = computed(() => plant.value ? dayOf(plant.value.data, occurredAt.value) : null)

  const aims = computed(() => plant.value ? aimsOf(plant.value.data.cropId) : {})
  const verdicts = computed(() => plant.value ? verdictsOf(form.value.readings, plant.value.data.cropId) : {})
  const last = computed(() => latestReadings(past.value).readings)
  const settingUp = computed(() => (day.value ?? 0) <= 0)
  /** No root has learnt to breathe on the day of set-up, so a first filling may be put right. */
  const limitCm = computed(() => settingUp.value || !plant.value ? null : refillLimitOf(past.value, vessel.value, plant.value.data))
  const hints = computed<Partial<Record<ReadingField, string>>>(() => levelHints(form.value.readings, vessel.value))
  const caution = computed(() => limitWords(limitCm.value, vessel.value))
  const levelCaution = computed(() => {
    const level = levelOf(form.value.readings, vessel.value)
    const tooHigh = aboveRimWords(level, vessel.value)
    if (tooHigh) return tooHigh
    return settingUp.value ? belowCupWords(level, vessel.value) : aboveLimitWords(level, limitCm.value, vessel.value)
  })
  const phIsOff = computed(() => (verdicts.value.ph?.side ?? 'in') !== 'in')
  /** Setting up happens on the first day. */
  const offered = computed<EntryAction[]>(() => ENTRY_ACTIONS.filter(action => (
    action !== 'set-up' || settingUp.value || form.value.actions.includes('set-up')
  )))

  return { vessel, day, aims, verdicts, last, hints, limitCm, caution, levelCaution, phIsOff, offered }
}
