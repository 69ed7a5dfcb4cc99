import { onScopeDispose, ref, toValue, watch } from 'vue'
import type { MaybeRefOrGetter } from 'vue'
import { useJournalStore } from '~/stores/journal'
import { findLargePicture } from '~/utils/offline/pictures'

/** A picture fit for the whole screen, where the server has one and there is signal; null until then. */
export function useLargePicture(photoId: MaybeRefOrGetter<string | undefined>) {
  const journal = useJournalStore()
  const source = ref<string | null>(null)

  function show(blob: Blob | null): void {
    if (source.value) URL.revokeObjectURL(source.value)
    source.value = blob ? URL.createObjectURL(blob) : null
  }

  watch(() => toValue(photoId), async (id) => {
    show(null)
    const { phone } = journal
    const photo = id === undefined ? undefined : journal.shelves.photo.get(id)
    if (!phone || !photo?.data.stored) return
    const found = await findLargePicture(phone, photo.id, photo.data.sha256)
    if (toValue(photoId) === photo.id) show(found)
  }, { immediate: true })
  onScopeDispose(() => show(null))

  return source
}
