import { computed, effectScope, onScopeDispose, shallowReactive, toValue, watch } from 'vue'
import type { ComputedRef, EffectScope, MaybeRefOrGetter } from 'vue'
import type { Photo } from '#shared/domain/photo.schema'
import type { PictureItem, PictureState } from '~/types/ui'
import type { View } from '~/types/view'
import { usePicture } from './usePicture'

type Followed = { scope: EffectScope, picture: ReturnType<typeof usePicture> }

/** The pictures of a set of photos that may change, as the screen shows them. */
export function usePictures(
  photos: MaybeRefOrGetter<readonly View<Photo>[]>, day: MaybeRefOrGetter<number | null> = null,
): ComputedRef<PictureItem[]> {
  const followed = shallowReactive(new Map<string, Followed>())

  function follow(photo: View<Photo>): void {
    let latest = photo
    const scope = effectScope(true)
    const picture = scope.run(() => usePicture(() => {
      latest = toValue(photos).find(one => one.id === photo.id) ?? latest
      return latest
    }))
    if (picture) followed.set(photo.id, { scope, picture })
  }

  function leave(id: string): void {
    followed.get(id)?.scope.stop()
    followed.delete(id)
  }

  watch(() => toValue(photos).map(photo => photo.id), (ids) => {
    for (const id of followed.keys()) if (!ids.includes(id)) leave(id)
    for (const photo of toValue(photos)) if (!followed.has(photo.id)) follow(photo)
  }, { immediate: true })
  onScopeDispose(() => [...followed.keys()].forEach(leave))

  return computed(() => toValue(photos).map(({ id, data }): PictureItem => {
    const picture = followed.get(id)?.picture
    const state: PictureState = !picture?.missing.value ? 'here' : data.stored ? 'missing' : 'waiting'
    const { placeholder, subject, widthPx, heightPx } = data
    return { id, src: picture?.source.value ?? null, placeholder, subject, day: toValue(day), widthPx, heightPx, state }
  }))
}
