import { defineStore } from 'pinia'
import { computed } from 'vue'
import type { Op } from '#shared/sync/protocol'
import { sendable } from '#shared/sync/outbox'
import { countDrafts, readUnsent } from '~/utils/offline/export-unsent'
import type { UnsentExport } from '~/utils/offline/export-unsent'
import { dropPhoto, sendPhotoAgain } from '~/utils/offline/failed-photos'
import { discardRefused, isoOf, sendAgain } from '~/utils/offline/journal'
import type { UploadItem } from '~/utils/offline/stored-shapes'
import { useJournalStore } from './journal'
import { useSessionStore } from './session'

/** What waits on this phone, why, and what a person can do about it. */
export const useSyncStore = defineStore('sync', () => {
  const journal = useJournalStore()
  const session = useSessionStore()

  const attention = computed(() => journal.waiting.attention)
  const failedPhotos = computed(() => journal.waiting.uploads.filter(item => item.code !== null))
  const waitingPhotos = computed(() => journal.waiting.uploads.length - failedPhotos.value.length)
  const waitingChanges = computed(() => journal.waiting.outbox.length)
  const held = computed(() => waitingChanges.value - sendable(journal.waiting.outbox, journal.waiting.attention).length)
  /** Everything that would be lost with this phone. */
  const unsent = computed(() => waitingChanges.value + waitingPhotos.value + attention.value.length + failedPhotos.value.length)
  const needsAttention = computed(() => attention.value.length + failedPhotos.value.length)

  /** Why what waits is waiting, for the line that every screen shows. */
  const reason = computed<'sent' | 'sending' | 'no-signal' | 'server' | 'signed-out' | 'other-account' | 'update-needed' | 'store'>(() => {
    const state = journal.syncState
    if (session.expired) return 'signed-out'
    if (state.kind === 'stopped') return state.why
    if (state.kind === 'waiting') return state.why === 'unreachable' ? 'no-signal' : 'server'
    return waitingChanges.value + waitingPhotos.value > held.value ? 'sending' : 'sent'
  })

  const kick = (): void => journal.phone?.runner.kick()

  async function tryAgain(op: Op, fields?: Record<string, unknown>): Promise<void> {
    const { phone } = journal
    if (!phone) return
    await sendAgain(phone.storage, phone.around, op, fields)
    phone.runner.kick()
  }

  async function discard(opId: string): Promise<void> {
    if (journal.phone) await discardRefused(journal.phone.storage, opId)
  }

  async function tryPhotoAgain(item: UploadItem): Promise<void> {
    if (journal.phone) await sendPhotoAgain(journal.phone.storage, item)
    kick()
  }

  async function discardPhoto(item: UploadItem): Promise<void> {
    if (journal.phone) await dropPhoto(journal.phone.storage, item)
  }

  /** Everything that is on this phone only, for a file of the person's own. */
  const exportUnsent = async (): Promise<UnsentExport | null> => (
    journal.phone ? readUnsent(journal.phone.storage, isoOf(journal.phone.around.now())) : null
  )
  const drafts = async (): Promise<number> => (journal.phone ? countDrafts(journal.phone.storage) : 0)

  return { tryPhotoAgain, discardPhoto, exportUnsent, drafts, attention, failedPhotos, waitingPhotos, waitingChanges, held, unsent, needsAttention, reason, kick, tryAgain, discard }
})
