import { ref } from 'vue'
import type { Invitation } from '#shared/domain/club.schema'
import { useClubStore } from '~/stores/club'
import { useClubActions } from './useClubActions'

/** Making, handing on and withdrawing a club's invitations. */
export function useInvitations(clubId: string, clubName: string) {
  const club = useClubStore()
  const { busy, failure, run } = useClubActions()
  const role = ref<'grower' | 'mentor'>('grower')
  const uses = ref<number | null>(1)
  const link = ref<string | null>(null)
  const copied = ref(false)
  const open = ref<Invitation[]>([])
  const canShare = typeof navigator !== 'undefined' && typeof navigator.share === 'function'

  async function load(): Promise<void> {
    const answer = await run(() => club.invitations(clubId))
    if (answer) open.value = answer.invitations
  }

  async function make(): Promise<void> {
    const answer = await run(() => club.invite(clubId, { role: role.value, usesLeft: uses.value ?? 1 }))
    if (!answer) return
    copied.value = false
    link.value = `${window.location.origin}/join/${answer.token}`
    open.value = [...open.value, answer.invitation]
  }

  async function copy(): Promise<void> {
    try {
      await navigator.clipboard.writeText(link.value ?? '')
      copied.value = true
    } catch {
      failure.value = 'The browser did not let the link be copied. Touch it, hold, and copy it by hand.'
    }
  }

  async function share(): Promise<void> {
    // Whoever closes the browser's own sheet has changed their mind; the link still stands here.
    await navigator.share({ title: clubName, text: `Join ${clubName} on Stillroot`, url: link.value ?? '' }).catch(() => undefined)
  }

  async function withdraw(id: string): Promise<void> {
    const gone = await run(() => club.withdraw(clubId, id))
    if (gone) open.value = open.value.filter(one => one.id !== id)
  }

  return { role, uses, link, copied, canShare, open, busy, failure, load, make, copy, share, withdraw }
}
