import { computed, onScopeDispose, ref, toValue, watch } from 'vue'
import type { MaybeRefOrGetter } from 'vue'
import type { Photo } from '#shared/domain/photo.schema'
import { useJournalStore } from '~/stores/journal'
import type { View } from '~/types/view'
import { findPicture } from '~/utils/offline/pictures'

/**
 * The picture of a photo: from this phone when it was taken here or seen
 * before, else from the server, kept for the next time without signal.
 * `missing` means that it is nowhere to be had just now.
 */
export function usePicture(photo: MaybeRefOrGetter<View<Photo>>) {
  const journal = useJournalStore()
  const source = ref<string | null>(null)
  const missing = ref(false)
  let shown: string | null = null

  function show(blob: Blob | null): void {
    if (shown) URL.revokeObjectURL(shown)
    shown = blob ? URL.createObjectURL(blob) : null
    source.value = shown
    missing.value = blob === null
  }

  const identity = computed(() => {
    const { id, data } = toValue(photo)
    return `${id}/${data.sha256}/${data.stored}`
  })
  async function find(): Promise<void> {
    const { phone } = journal
    const { id, data } = toValue(photo)
    const found = phone ? await findPicture(phone, id, data.sha256, data.stored) : null
    if (id === toValue(photo).id) show(found)
  }
  watch(identity, find, { immediate: true })
  // What could not be had without signal is asked for again when syncing moves on.
  watch(() => journal.syncState.kind, () => {
    if (missing.value) void find()
  })
  onScopeDispose(() => {
    if (shown) URL.revokeObjectURL(shown)
  })

  return { source, missing }
}
