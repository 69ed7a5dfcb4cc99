import { defineStore } from 'pinia'
import { ref, shallowReactive, shallowRef } from 'vue'
import type { ShallowRef } from 'vue'
import type * as z from 'zod/mini'
import { recordSchemas } from '#shared/domain/records'
import type { RecordOf } from '#shared/domain/records'
import type { AttentionItem, OutboxItem } from '#shared/sync/outbox'
import type { RecordType } from '#shared/sync/protocol'
import type { View } from '~/types/view'
import { createJournalMirror, isMirrored } from '~/utils/offline/journal-mirror'
import type { ChangedRecord, JournalMirror } from '~/utils/offline/journal-mirror'
import { openPhone } from '~/utils/offline/phone'
import type { Phone } from '~/utils/offline/phone'
import type { UploadItem } from '~/utils/offline/stored-shapes'
import type { RunnerState } from '~/utils/offline/sync-runner'

type Shelves = { [T in RecordType]: ShallowRef<ReadonlyMap<string, View<RecordOf[T]>>> }

/**
 * The open journal of one account: every record as its person sees it, and what
 * waits. The noun stores read from here; nothing else touches the phone's store.
 */
export const useJournalStore = defineStore('journal', () => {
  const phone = shallowRef<Phone | null>(null)
  /** False until everything was read once; screens show their skeletons. */
  const ready = ref(false)
  const syncState = shallowRef<RunnerState>({ kind: 'idle' })
  const blockedByOldTab = ref(false)
  const waiting = shallowReactive<{ outbox: OutboxItem[], attention: AttentionItem[], uploads: UploadItem[] }>({
    outbox: [], attention: [], uploads: [],
  })
  const shelves: Shelves = {
    club: shallowRef(new Map()),
    membership: shallowRef(new Map()),
    vessel: shallowRef(new Map()),
    plant: shallowRef(new Map()),
    entry: shallowRef(new Map()),
    photo: shallowRef(new Map()),
    comment: shallowRef(new Map()),
    conflict: shallowRef(new Map()),
    notice: shallowRef(new Map()),
  }
  let mirror: JournalMirror | null = null
  let refreshing: Promise<void> = Promise.resolve()

  async function open(accountId: string): Promise<void> {
    close()
    const opened = createJournalMirror(accountId)
    mirror = opened
    const current = openPhone(accountId, {
      onNews: news => void refresh([...news.put.map(([key]) => key), ...news.remove]),
      onOtherTab: changedKeys => void refresh(changedKeys),
      onSyncState: state => syncState.value = state,
      onBlocked: () => blockedByOldTab.value = true,
    })
    phone.value = current
    show(await opened.load(current.storage))
    ready.value = true
  }

  /** Takes up what changed in the store, in order. Resolves when screens can see it. */
  function refresh(changedKeys: string[]): Promise<void> {
    if (!changedKeys.some(isMirrored)) return refreshing
    refreshing = refreshing.then(async () => {
      const current = phone.value
      if (current && mirror) show(await mirror.refresh(current.storage, changedKeys))
    }).catch(() => undefined)
    return refreshing
  }

  function show(changes: ChangedRecord[]): void {
    for (const type of new Set(changes.map(change => change.type))) {
      showType(type, changes.filter(change => change.type === type))
    }
    waiting.outbox = mirror?.outbox() ?? []
    waiting.attention = mirror?.attention() ?? []
    waiting.uploads = mirror?.uploads() ?? []
  }

  function showType<T extends RecordType>(type: T, changes: ChangedRecord[]): void {
    const shelf: ShallowRef<ReadonlyMap<string, View<RecordOf[T]>>> = shelves[type]
    const schema: z.ZodMiniType<RecordOf[T]> = recordSchemas[type]
    const next = new Map(shelf.value)
    for (const { id, record } of changes) {
      const parsed = record ? schema.safeParse(record.data) : null
      if (record && parsed?.success) next.set(id, { ...record, data: parsed.data })
      else next.delete(id)
    }
    shelf.value = next
  }

  function close(): void {
    phone.value?.close()
    phone.value = null
    mirror = null
    ready.value = false
    for (const shelf of Object.values(shelves)) shelf.value = new Map()
    show([])
  }

  /** Resolves when everything that was written before is on the screens. */
  const settled = (): Promise<void> => refreshing

  return { phone, ready, syncState, blockedByOldTab, waiting, shelves, open, close, settled }
})
