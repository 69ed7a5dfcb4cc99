import { UNSURE_VERSION, withFeedRow, withState, withoutScope } from '#shared/sync/base-record'
import type { BaseRecord } from '#shared/sync/base-record'
import { ACKED_DAYS } from '#shared/sync/outbox'
import type { AttentionItem } from '#shared/sync/outbox'
import { accountScope, clubScope } from '#shared/sync/protocol'
import type { FeedRow, Op, OpResult, PullResponse, PushResponse } from '#shared/sync/protocol'
import { isoOf } from './journal'
import { keys, prefixes } from './keys'
import type { JournalStorage, StoredPair, Surroundings } from './ports'
import { readAcked, readBase, readBases, readCursor, readOutbox } from './stored-shapes'

const DAY = 24 * 60 * 60 * 1_000

/**
 * Takes the server's answer to a push. In one transaction acknowledged changes
 * leave the outbox while the record takes their place, refused ones move to
 * "needs attention"; what must be sent again stays. Answers that come twice or
 * late do nothing.
 *
 * @returns how many changes left the outbox
 */
export async function settlePush(
  storage: JournalStorage, around: Surroundings, accountId: string, response: Pick<PushResponse, 'results' | 'serverTime'>,
): Promise<number> {
  const told = response.results.flatMap(({ record }) => (record ? [record] : []))
  const baseKeys = told.map(record => keys.base(record.type, record.id))
  return storage.transact({ keys: baseKeys, prefixes: [prefixes.outbox, prefixes.acked] }, (snapshot) => {
    const waiting = new Map(readOutbox(snapshot).map(({ op }) => [op.opId, op]))
    const bases = new Map(baseKeys.map(key => [key, readBase(snapshot, key)]))
    const put: StoredPair[] = []
    const remove = readAcked(snapshot)
      .filter(item => Date.parse(response.serverTime) - Date.parse(item.ackedAt) > ACKED_DAYS * DAY)
      .map(item => keys.acked(item.op.opId))
    let settled = 0
    for (const result of response.results) {
      const op = waiting.get(result.opId)
      if (!op || result.status === 'retry') continue
      settled += 1
      remove.push(keys.outbox(op.deviceSeq, op.opId))
      if (result.status === 'rejected') put.push([keys.attention(op.opId), refusedItem(op, result, around)])
      else put.push([keys.acked(op.opId), { op, ackedAt: response.serverTime }])
      if (result.record) {
        const key = keys.base(result.record.type, result.record.id)
        bases.set(key, withState(bases.get(key) ?? null, accountScope(accountId), result.record))
      }
    }
    for (const [key, base] of bases) if (base) put.push([key, base])
    return { result: settled, put, remove }
  })
}

function refusedItem(op: Op, result: OpResult, around: Surroundings): AttentionItem {
  return {
    op,
    code: result.code ?? 'refused',
    message: result.message ?? 'The server could not take this change.',
    issues: result.issues ?? [],
    at: isoOf(around.now()),
  }
}

/** Moves one change to "needs attention" because no request with it can be read. */
export async function setAside(storage: JournalStorage, around: Surroundings, op: Op, code: string, message: string): Promise<void> {
  await storage.transact({}, () => ({
    result: null,
    put: [[keys.attention(op.opId), { op, code, message, issues: [], at: isoOf(around.now()) }]],
    remove: [keys.outbox(op.deviceSeq, op.opId)],
  }))
}

/**
 * Takes a page of a feed: rows and cursor in one transaction. Rows at or below
 * the cursor were taken before, so an answer that comes late is harmless.
 */
export async function settlePull(storage: JournalStorage, accountId: string, scope: string, response: PullResponse): Promise<void> {
  const membershipsEnded = response.rows.some(row => row.type === 'membership' && row.state !== 'live')
  const rowKeys = response.rows.map(row => keys.base(row.type, row.id))
  const request = { keys: [keys.epoch, keys.cursor(scope), ...rowKeys], prefixes: membershipsEnded ? [prefixes.base] : [] }
  await storage.transact(request, (snapshot) => {
    const since = readCursor(snapshot, keys.cursor(scope))
    const bases = new Map<string, BaseRecord | null>(rowKeys.map(key => [key, readBase(snapshot, key)]))
    const fresh = response.rows.filter(row => row.seq > since)
    const left = fresh.flatMap(row => clubLeft(row, bases.get(keys.base(row.type, row.id)) ?? null, accountId))
    for (const row of fresh) {
      const key = keys.base(row.type, row.id)
      bases.set(key, withFeedRow(bases.get(key) ?? null, scope, row))
    }
    for (const club of left) dropScope(clubScope(club), readBases(snapshot), bases)
    return {
      result: null,
      put: [
        [keys.epoch, response.epoch],
        [keys.cursor(scope), { since: Math.max(since, response.next) }],
        ...[...bases].flatMap(([key, base]): StoredPair[] => (base ? [[key, base]] : [])),
      ],
      remove: [
        ...[...bases].flatMap(([key, base]) => (base ? [] : [key])),
        ...left.map(club => keys.cursor(clubScope(club))),
      ],
    }
  })
}

/** The club that this person no longer belongs to, if the row says so. */
function clubLeft(row: FeedRow, base: BaseRecord | null, accountId: string): string[] {
  if (row.type !== 'membership' || row.state === 'live' || base?.data?.accountId !== accountId) return []
  return [String(base.data.clubId)]
}

function dropScope(scope: string, all: BaseRecord[], changed: Map<string, BaseRecord | null>): void {
  for (const stored of all) {
    const key = keys.base(stored.type, stored.id)
    const base = changed.has(key) ? changed.get(key) ?? null : stored
    if (base?.scopes.includes(scope)) changed.set(key, withoutScope(base, scope))
  }
}

/** Forgets a club's feed, because the server says that there is none for this person. */
export async function leaveScope(storage: JournalStorage, scope: string): Promise<void> {
  await storage.transact({ prefixes: [prefixes.base] }, (snapshot) => {
    const changed = new Map<string, BaseRecord | null>()
    dropScope(scope, readBases(snapshot), changed)
    return {
      result: null,
      put: [...changed].flatMap(([key, base]): StoredPair[] => (base ? [[key, base]] : [])),
      remove: [keys.cursor(scope), ...[...changed].flatMap(([key, base]) => (base ? [] : [key]))],
    }
  })
}

/** Reads a feed from its start again. What waits and what needs attention stays as it is. */
export async function restartScope(storage: JournalStorage, scope: string): Promise<void> {
  await storage.transact({}, () => ({ result: null, remove: [keys.cursor(scope)] }))
}

/**
 * The server was restored from a backup: everything is read again, and every
 * change it had acknowledged within the last weeks is sent again. Receipts make
 * that safe where the backup holds them; where it does not, it is what brings
 * the lost entries back. Records stay on the screen until their answer comes.
 */
export async function recoverFromRestore(storage: JournalStorage, around: Surroundings, epoch: string): Promise<void> {
  const request = { prefixes: [prefixes.base, prefixes.acked, prefixes.cursor] }
  await storage.transact(request, (snapshot) => {
    const acked = readAcked(snapshot)
    return {
      result: null,
      put: [
        [keys.epoch, epoch],
        ...readBases(snapshot).map((base): StoredPair => [keys.base(base.type, base.id), { ...base, ver: UNSURE_VERSION, seen: UNSURE_VERSION }]),
        ...acked.map(({ op }): StoredPair => [keys.outbox(op.deviceSeq, op.opId), { op, savedAt: isoOf(around.now()) }]),
      ],
      remove: [...acked.map(({ op }) => keys.acked(op.opId)), ...snapshot.under(prefixes.cursor).map(([key]) => key)],
    }
  })
}
