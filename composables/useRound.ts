import { computed, ref, watch } from 'vue'
import type { Ref } from 'vue'
import { useEntriesStore } from '~/stores/entries'
import { usePlantsStore } from '~/stores/plants'
import { dayOf } from '~/utils/plant/timeline'
import { byForgotten } from '~/utils/words/looks'

/**
 * The person's growing plants, the one nobody has looked at for longest first.
 * The order stands while the screen is open: a row that moved after a tap would
 * put another plant under the thumb.
 */
export function useRound(now: Readonly<Ref<Date>>) {
  const plants = usePlantsStore()
  const entries = useEntriesStore()
  const growing = computed(() => plants.own.filter(plant => plant.data.endedOn === null))
  const order = ref<string[]>([])

  function daysSince(plant: (typeof growing.value)[number]): number {
    const today = dayOf(plant.data, now.value.toISOString())
    const latest = entries.latest(plant.id)
    return latest ? today - dayOf(plant.data, latest.data.occurredAt) : today
  }

  watch(() => growing.value.map(plant => plant.id).sort().join(), () => {
    order.value = [...growing.value].sort(byForgotten(daysSince)).map(plant => plant.id)
  }, { immediate: true })

  return computed(() => order.value.flatMap(id => growing.value.find(plant => plant.id === id) ?? []))
}
