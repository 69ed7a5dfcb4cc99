import { computed } from 'vue'
import type { Entry } from '#shared/domain/entry.schema'
import type { Plant } from '#shared/domain/plant.schema'
import { useCommentsStore } from '~/stores/comments'
import type { View } from '~/types/view'
import { dayOf } from '~/utils/plant/timeline'
import { useCommentWords } from './useEntryComments'

const SHOWN = 3

/** The newest comments on a plant, whichever entry they were said of. */
export function useLatestComments(plant: () => View<Plant>, entries: () => readonly View<Entry>[]) {
  const comments = useCommentsStore()
  const itemOf = useCommentWords(plant)
  return computed(() => entries()
    .flatMap(entry => comments.ofEntry(entry.id).map(comment => ({ entry, comment })))
    .sort((left, right) => right.comment.data.writtenAt.localeCompare(left.comment.data.writtenAt))
    .slice(0, SHOWN)
    .map(({ entry, comment }) => ({ entryId: entry.id, day: dayOf(plant().data, entry.data.occurredAt), item: itemOf(comment) })))
}
