import { ref } from 'vue'
import { navigateTo } from '#imports'
import { useSessionStore } from '~/stores/session'
import { useSyncStore } from '~/stores/sync'
import { useDownload } from './useDownload'

/** Signing out, with everything told first that would be lost by it. */
export function useSignOut() {
  const session = useSessionStore()
  const sync = useSyncStore()
  const { saveJson } = useDownload()
  const open = ref(false)
  const drafts = ref(0)
  const busy = ref(false)
  const failure = ref<string | null>(null)

  async function ask(): Promise<void> {
    failure.value = null
    drafts.value = await sync.drafts()
    open.value = true
    // What can still be sent should not have to be decided about.
    sync.kick()
  }

  async function signOut(): Promise<void> {
    busy.value = true
    const answer = await session.signOut()
    busy.value = false
    if (answer.ok) await navigateTo('/', { replace: true })
    else failure.value = `${answer.message} You are still signed in.`
  }

  async function saveUnsent(): Promise<void> {
    saveJson('stillroot-not-sent', await sync.exportUnsent())
  }

  return { open, drafts, busy, failure, ask, signOut, saveUnsent }
}
