import { checkOpFields } from '#shared/sync/record-schemas'
import type { ChangeRequest } from '#shared/sync/outbox'
import { useJournalStore } from '~/stores/journal'
import type { SaveOutcome } from '~/types/view'
import { saveChanges } from '~/utils/offline/journal'
import type { NewPhotoBytes } from '~/utils/offline/journal'
import { forgetKeptPictures } from '~/utils/offline/pictures'
import type { Phone } from '~/utils/offline/phone'
import { StorageFull } from '~/utils/offline/ports'

type Extras = { photos?: NewPhotoBytes[], endDraftOf?: string }

/**
 * Saves changes on the phone: checks them with the schemas their forms use,
 * writes them in one transaction, and starts sending. Never throws; nothing is
 * written unless everything is.
 */
export function useSave() {
  const journal = useJournalStore()

  async function save(requests: ChangeRequest[], extras: Extras = {}): Promise<SaveOutcome> {
    const issues = requests.flatMap((request) => {
      const checked = checkOpFields(request)
      return checked.ok ? [] : checked.issues
    })
    if (issues.length > 0) return { ok: false, message: 'Something needs another look. Nothing was lost.', issues }
    const { phone } = journal
    const [first] = requests
    if (!phone || !first) return failure('Sign in first. What you typed is kept as a draft.')
    try {
      await saveMakingRoom(phone, requests, extras)
    } catch (error) {
      return failure(error instanceof StorageFull
        ? 'This phone has no room left for this. Free some space, or save without photos; what you typed is still here.'
        : 'This phone’s store did not take it. Your text is still here: try again, or reload the page.')
    }
    await journal.settled()
    phone.runner.kick()
    void askToKeepStorage()
    return { ok: true, id: first.entityId }
  }

  return { save, newId: () => journal.phone?.around.newId() ?? crypto.randomUUID() }
}

/** A full phone first lets go of the copies of pictures that it keeps for seeing without signal. */
async function saveMakingRoom(phone: Phone, requests: ChangeRequest[], extras: Extras): Promise<void> {
  try {
    await saveChanges(phone.storage, phone.around, requests, extras)
  } catch (error) {
    if (!(error instanceof StorageFull) || !await forgetKeptPictures(phone)) throw error
    await saveChanges(phone.storage, phone.around, requests, extras)
  }
}

function failure(message: string): SaveOutcome {
  return { ok: false, message, issues: [] }
}

/** Once there is something to lose, the browser is asked not to clear it. */
async function askToKeepStorage(): Promise<void> {
  if (navigator.storage?.persisted && !await navigator.storage.persisted()) await navigator.storage.persist()
}
