import type { ClubRole } from '#shared/domain/club.schema'
import { TemporaryFailure } from '#server/services/sync/ports'
import type { EntityChange, FeedRef, Receipt, RecordRef, StoredRecord, SyncRepository } from '#server/services/sync/ports'

type Feed = { minimum: number, rows: (FeedRef & { seq: number })[] }

type Tables = {
  receipts: Map<string, Receipt>
  records: Map<string, StoredRecord>
  changes: Map<string, EntityChange[]>
  feeds: Map<string, Feed>
  /** The place of each change in the order of all. */
  order: Map<EntityChange, number>
  epoch: string
}

export type MemorySyncRepository = SyncRepository & {
  tables: () => Tables
  /** What a backup would hold now. */
  backUp: () => Tables
  restore: (backup: Tables, epoch: string) => void
  /** The next transactions fail before they begin, or after they committed. */
  failNext: (when: 'before' | 'after', times: number) => void
}

/** The records in memory: one transaction after the other, all or nothing. */
export function createMemorySyncRepository(): MemorySyncRepository {
  let tables: Tables = { receipts: new Map(), records: new Map(), changes: new Map(), feeds: new Map(), order: new Map(), epoch: '0197f000-0000-7000-8000-0000000000e0' }
  let undo: (() => void)[] | null = null
  let last: Promise<unknown> = Promise.resolve()
  const failures = { before: 0, after: 0 }

  function setIn<V>(map: Map<string, V>, key: string, value: V): void {
    const had = map.has(key)
    const former = map.get(key)
    undo?.push(() => {
      if (had && former !== undefined) map.set(key, former)
      else map.delete(key)
    })
    map.set(key, value)
  }

  function oneAfterTheOther<T>(work: () => Promise<T>): Promise<T> {
    const run = last.then(() => inTurn(work))
    last = run.catch(() => undefined)
    return run
  }

  async function inTurn<T>(work: () => Promise<T>): Promise<T> {
    if (failures.before > 0) {
      failures.before -= 1
      throw new TemporaryFailure('away before')
    }
    undo = []
    try {
      const result = await work()
      undo = null
      if (failures.after > 0) {
        failures.after -= 1
        throw new TemporaryFailure('away after the commit')
      }
      return result
    } catch (error) {
      for (const step of (undo ?? []).reverse()) step()
      undo = null
      throw error
    }
  }

  const keyOf = ({ type, id }: RecordRef) => `${type}/${id}`
  const all = (type: StoredRecord['type']) => [...tables.records.values()].filter(record => record.type === type)
  const feedOf = (scope: string): Feed => tables.feeds.get(scope) ?? { minimum: 0, rows: [] }

  return {
    tables: () => tables,
    backUp: () => structuredClone(tables),
    restore(backup, epoch) {
      tables = { ...structuredClone(backup), epoch }
    },
    failNext(when, times) {
      failures[when] = times
    },

    transaction: oneAfterTheOther,
    snapshot: oneAfterTheOther,

    async claimReceipt(accountId, opId, payloadSha256) {
      const key = `${accountId}/${opId}`
      const receipt = tables.receipts.get(key)
      if (receipt) return receipt
      setIn(tables.receipts, key, { payloadSha256, result: null })
      return null
    },
    async completeReceipt(accountId, opId, result) {
      const key = `${accountId}/${opId}`
      const receipt = tables.receipts.get(key)
      if (receipt) setIn(tables.receipts, key, { ...receipt, result: structuredClone(result) })
    },

    async lockScopes() {},
    async appendFeed(scope, refs) {
      const feed = feedOf(scope)
      const from = feed.rows.at(-1)?.seq ?? 0
      const added = refs.map(({ type, id, ver }, index) => ({ type, id, ver, seq: from + index + 1 }))
      setIn(tables.feeds, scope, { ...feed, rows: [...feed.rows, ...added] })
    },
    async feedAfter(scope, since, limit) {
      return feedOf(scope).rows.filter(row => row.seq > since).slice(0, limit)
    },
    async feedMinimum(scope) {
      return feedOf(scope).minimum
    },
    async epoch() {
      return tables.epoch
    },

    async find(type, id) {
      return structuredClone(tables.records.get(keyOf({ type, id }))) ?? null
    },
    async findMany(refs) {
      return refs.flatMap((ref) => {
        const record = tables.records.get(keyOf(ref))
        return record ? [structuredClone(record)] : []
      })
    },
    async insert(record) {
      if (tables.records.has(keyOf(record))) throw new Error('duplicate key')
      setIn(tables.records, keyOf(record), structuredClone(record))
    },
    async update(record) {
      setIn(tables.records, keyOf(record), structuredClone(record))
    },
    async changesAfter(entityId, ver) {
      return (tables.changes.get(entityId) ?? []).filter(change => change.ver > ver).sort((left, right) => left.ver - right.ver)
    },
    async appendChange(change) {
      const kept = structuredClone(change)
      tables.order.set(kept, tables.order.size)
      setIn(tables.changes, change.entityId, [...tables.changes.get(change.entityId) ?? [], kept])
    },

    async roleIn(clubId, accountId): Promise<ClubRole | null> {
      const found = all('membership').find(({ deleted, data }) => !deleted && data.clubId === clubId && data.accountId === accountId)
      const role = found?.data.role
      return role === 'grower' || role === 'mentor' || role === 'steward' ? role : null
    },
    async descendantsOf(plantId) {
      return [...all('comment'), ...all('photo'), ...all('entry')].filter(record => record.data.plantId === plantId)
        .map(({ type, id, ver }) => ({ type, id, ver }))
    },
    async plantsInVessel(vesselId) {
      return all('plant').filter(plant => !plant.deleted && plant.data.vesselId === vesselId)
    },
    async commentersOn(entryId, limit) {
      const authors = all('comment').filter(({ deleted, data }) => !deleted && data.entryId === entryId).map(({ data }) => String(data.authorId))
      return [...new Set(authors)].slice(0, limit)
    },
  }
}
