import { navigateTo } from '#imports'
import { useSyncStore } from '~/stores/sync'
import { useSavedWord } from './useSavedWord'

/** From a form back to the timeline, where the entry just saved is in sight. */
export function useSavedEntry() {
  const word = useSavedWord()
  const sync = useSyncStore()
  const later = () => (sync.reason === 'no-signal' ? ' It will be sent when there is signal.' : '')

  async function showSaved(plantId: string, entryId: string): Promise<void> {
    word.value = `Saved on this phone.${later()}`
    // The form is left behind for good: Back must not bring it up again.
    await navigateTo({ path: `/plants/${plantId}`, hash: `#entry-${entryId}` }, { replace: true })
  }

  async function showRemoved(plantId: string): Promise<void> {
    word.value = `Deleted on this phone.${later()}`
    await navigateTo(`/plants/${plantId}`, { replace: true })
  }

  return { showSaved, showRemoved }
}
