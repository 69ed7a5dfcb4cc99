import { computed } from 'vue'
import type { Entry } from '#shared/domain/entry.schema'
import type { Plant } from '#shared/domain/plant.schema'
import type { Vessel } from '#shared/domain/vessel.schema'
import { useClubStore } from '~/stores/club'
import { useConflictsStore } from '~/stores/conflicts'
import { usePhotosStore } from '~/stores/photos'
import { useSessionStore } from '~/stores/session'
import type { View } from '~/types/view'
import { dayOf } from '~/utils/plant/timeline'
import { verdictsOf } from '~/utils/plant/verdicts'
import { levelOf, litresIn } from '~/utils/plant/vessel-water'
import { usePictures } from './usePictures'

/** What a card tells of one entry. */
export function useEntryView(entry: () => View<Entry>, plant: () => View<Plant>, vessel: () => Vessel | null) {
  const photosStore = usePhotosStore()
  const club = useClubStore()
  const session = useSessionStore()
  const conflictsStore = useConflictsStore()

  const day = computed(() => dayOf(plant().data, entry().data.occurredAt))
  const photos = computed(() => photosStore.ofEntry(entry().id))
  const pictures = usePictures(photos, day)
  const waitingPhotos = computed(() => photos.value.filter(photo => photosStore.isUploading(photo.id)).length)
  const attention = computed(() => entry().attention || photos.value.some(photo => photo.attention))
  const verdicts = computed(() => verdictsOf(entry().data, plant().data.cropId))
  const litres = computed(() => litresIn(vessel(), levelOf(entry().data, vessel())))
  const conflicts = computed(() => conflictsStore.openOf(entry().id))
  /** Whoever wrote it, when it was not the grower whose page this is. */
  const authorName = computed(() => {
    const { authorId } = entry().data
    if (authorId === plant().data.ownerId || authorId === session.account?.id) return null
    return club.person(authorId)?.displayName ?? 'A former member'
  })

  return { day, pictures, waitingPhotos, attention, verdicts, litres, conflicts, authorName }
}
