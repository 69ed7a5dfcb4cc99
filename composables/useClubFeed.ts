import { computed, ref } from 'vue'
import { useClubStore } from '~/stores/club'
import { useEntriesStore } from '~/stores/entries'
import { usePlantsStore } from '~/stores/plants'

const STRETCH = 10

/** What the members of a person's clubs share: the plants, and their newest entries. */
export function useClubFeed() {
  const club = useClubStore()
  const plants = usePlantsStore()
  const entries = useEntriesStore()
  /** One club, or null for all of them. */
  const only = ref<string | null>(null)
  const wanted = ref(STRETCH)

  const clubIds = computed(() => new Set(only.value ? [only.value] : club.clubs.map(one => one.id)))
  const shared = computed(() => [...plants.own, ...plants.shared]
    .filter(({ data }) => data.visibility === 'club' && data.clubId !== null && clubIds.value.has(data.clubId)))
  const newest = computed(() => shared.value
    .flatMap(plant => entries.ofPlant(plant.id).map(entry => ({ plant, entry })))
    .sort((left, right) => right.entry.data.occurredAt.localeCompare(left.entry.data.occurredAt) || right.entry.id.localeCompare(left.entry.id)))
  const shown = computed(() => newest.value.slice(0, wanted.value))
  const more = computed(() => newest.value.length > wanted.value)
  const showMore = (): void => {
    wanted.value += STRETCH
  }

  return { only, shared, shown, more, showMore }
}
