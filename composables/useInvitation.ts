import { onMounted, ref } from 'vue'
import type { ClubRole } from '#shared/domain/club.schema'
import { useClubStore } from '~/stores/club'
import { useClubActions } from './useClubActions'

type State = 'looking' | 'open' | 'gone' | 'unreachable'

/** An invitation as whoever holds its link sees it, and the way in. */
export function useInvitation(token: string) {
  const club = useClubStore()
  const { busy, failure, run } = useClubActions()
  const state = ref<State>('looking')
  const invitation = ref<{ clubName: string, role: ClubRole } | null>(null)

  async function look(): Promise<void> {
    state.value = 'looking'
    const answer = await club.preview(token)
    if (answer.ok) invitation.value = answer.body
    state.value = answer.ok ? 'open' : answer.status === 404 || answer.status === 410 ? 'gone' : 'unreachable'
  }
  onMounted(look)

  /** True when the club is joined. */
  const join = async (): Promise<boolean> => await run(() => club.accept(token)) !== null

  return { state, invitation, busy, failure, look, join }
}
