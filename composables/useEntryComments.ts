import { computed, ref } from 'vue'
import type { Comment } from '#shared/domain/comment.schema'
import type { Plant } from '#shared/domain/plant.schema'
import { useClubStore } from '~/stores/club'
import { useCommentsStore } from '~/stores/comments'
import { useSessionStore } from '~/stores/session'
import type { CommentItem } from '~/types/ui'
import type { View } from '~/types/view'
import { ROLE_WORDS } from '~/utils/words/names'

/** Names and roles of those who comment, as the plant's club knows them. */
export function useCommentWords(plant: () => View<Plant>) {
  const club = useClubStore()
  const session = useSessionStore()

  function roleOf(accountId: string): string | null {
    const { clubId, ownerId } = plant().data
    if (!clubId || accountId === ownerId) return null
    const role = club.membersOf(clubId).find(membership => membership.data.accountId === accountId)?.data.role
    // Most members grow; only what sets a voice apart is said.
    return role && role !== 'grower' ? ROLE_WORDS[role] : null
  }

  return function itemOf({ id, data, unsent, attention }: View<Comment>): CommentItem {
    return {
      id,
      authorName: club.person(data.authorId)?.displayName ?? 'A former member',
      role: roleOf(data.authorId),
      text: data.text,
      writtenAt: data.writtenAt,
      unsent,
      attention,
      mine: data.authorId === session.account?.id,
    }
  }
}

/** Half a sentence survives a closed form and a change of page. */
const typed = ref<Record<string, string>>({})

/** The comments of one entry, and writing one. */
export function useEntryComments(plant: () => View<Plant>, entryId: () => string) {
  const comments = useCommentsStore()
  const itemOf = useCommentWords(plant)
  const items = computed(() => comments.ofEntry(entryId()).map(itemOf))
  const text = computed({
    get: () => typed.value[entryId()] ?? '',
    set: value => typed.value = { ...typed.value, [entryId()]: value },
  })
  const error = ref<string>()
  const busy = ref(false)

  /** True when the comment is on the phone. */
  async function send(words: string): Promise<boolean> {
    busy.value = true
    const outcome = await comments.add(plant().id, entryId(), words)
    busy.value = false
    error.value = outcome.ok ? undefined : outcome.message
    if (outcome.ok) text.value = ''
    return outcome.ok
  }

  return { items, text, error, busy, send, remove: comments.remove }
}
