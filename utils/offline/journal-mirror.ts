import type { BaseRecord } from '#shared/sync/base-record'
import type { AttentionItem, OutboxItem } from '#shared/sync/outbox'
import { overlay } from '#shared/sync/overlay'
import type { OverlaidRecord } from '#shared/sync/overlay'
import type { RecordType } from '#shared/sync/protocol'
import { prefixes } from './keys'
import type { JournalStorage, Snapshot } from './ports'
import { readAttention, readBases, readOutbox, readUploads } from './stored-shapes'
import type { UploadItem } from './stored-shapes'

const MIRRORED = [prefixes.base, prefixes.outbox, prefixes.attention, prefixes.upload]

/** True for keys whose change a screen could show; drafts, pictures and cursors are none. */
export function isMirrored(key: string): boolean {
  return MIRRORED.some(prefix => key.startsWith(prefix))
}

/** A record whose appearance may have changed. */
export type ChangedRecord = { type: RecordType, id: string, record: OverlaidRecord | null }

/**
 * The journal in memory, kept equal to the phone's store. Screens read it, so
 * that they never wait; it is rebuilt from the store whenever the app starts.
 */
export function createJournalMirror(accountId: string) {
  const bases = new Map<string, BaseRecord>()
  let outbox: OutboxItem[] = []
  let attention: AttentionItem[] = []
  let uploads: UploadItem[] = []

  /** Reads everything. */
  async function load(storage: JournalStorage): Promise<ChangedRecord[]> {
    const snapshot = await storage.read({ prefixes: MIRRORED })
    take(snapshot)
    if (bases.size < snapshot.under(prefixes.base).length) await readAgainFromServer(storage)
    const touched = new Map([...bases.values(), ...waitingRecords()].map(record => [`${record.type}/${record.id}`, record]))
    return [...touched.values()].map(appearance)
  }

  /** Reads the keys that changed, and what waits, which is always little. */
  async function refresh(storage: JournalStorage, changedKeys: string[]): Promise<ChangedRecord[]> {
    const before = waitingRecords()
    const baseKeys = changedKeys.filter(key => key.startsWith(prefixes.base))
    const snapshot = await storage.read({ keys: baseKeys, prefixes: [prefixes.outbox, prefixes.attention, prefixes.upload] })
    takeWaiting(snapshot)
    const touched = new Map([...before, ...waitingRecords()].map(record => [`${record.type}/${record.id}`, record]))
    for (const key of baseKeys) {
      const [base] = readBases({ get: () => undefined, under: () => [[key, snapshot.get(key)]] })
      const former = bases.get(key)
      if (base) bases.set(key, base)
      else bases.delete(key)
      const known = base ?? former
      if (known) touched.set(`${known.type}/${known.id}`, known)
    }
    return [...touched.values()].map(appearance)
  }

  function take(snapshot: Snapshot): void {
    bases.clear()
    for (const base of readBases(snapshot)) bases.set(`${prefixes.baseOf(base.type)}${base.id}`, base)
    takeWaiting(snapshot)
  }

  function takeWaiting(snapshot: Snapshot): void {
    outbox = readOutbox(snapshot)
    attention = readAttention(snapshot)
    uploads = readUploads(snapshot)
  }

  function waitingRecords(): { type: RecordType, id: string }[] {
    return [...outbox, ...attention].map(({ op }) => ({ type: op.entityType, id: op.entityId }))
  }

  function appearance({ type, id }: { type: RecordType, id: string }): ChangedRecord {
    const base = bases.get(`${prefixes.baseOf(type)}${id}`) ?? null
    const mine = ({ op }: OutboxItem | AttentionItem) => op.entityId === id && op.entityType === type
    const record = overlay(base, outbox.filter(mine).map(item => item.op), attention.filter(mine).map(item => item.op), accountId)
    return { type, id, record }
  }

  return {
    load,
    refresh,
    outbox: () => outbox,
    attention: () => attention,
    uploads: () => uploads,
  }
}

export type JournalMirror = ReturnType<typeof createJournalMirror>

/**
 * A record that this version of the app cannot read must not look as if it had
 * never been: every feed is read from its start, and what the server has takes
 * the unreadable record's place.
 */
async function readAgainFromServer(storage: JournalStorage): Promise<void> {
  await storage.transact({ prefixes: [prefixes.cursor] }, snapshot => ({
    result: null, remove: snapshot.under(prefixes.cursor).map(([key]) => key),
  }))
}
