import type { FeedRow, PullQuery, PullResponse } from '#shared/sync/protocol'
import { SYNC_SCHEMA_OLDEST } from '#shared/sync/protocol'
import { feedPruned, notFound } from '#server/utils/errors'
import { isVisibleInScope, sharedClubOf } from '#server/policies/records'
import { presentRecord } from '#server/presenters/record'
import type { FeedRef, StoredRecord, SyncDependencies, SyncRepository } from './ports'

/**
 * Reads what changed in a feed since a cursor. A record that changed several
 * times stands in the answer once, at its last place. Numbers are given out in
 * the order of commits, so a reader never passes a row that appears later.
 */
export async function pullFeed(dependencies: SyncDependencies, accountId: string, query: PullQuery): Promise<PullResponse> {
  const { repository } = dependencies
  return repository.snapshot(async () => {
    if (!await mayReadFeed(repository, accountId, query.scope)) throw notFound()
    if (query.since < await repository.feedMinimum(query.scope)) throw feedPruned()
    const refs = await repository.feedAfter(query.scope, query.since, query.limit)
    return {
      serverTime: dependencies.now().toISOString(),
      epoch: await repository.epoch(),
      minSchema: SYNC_SCHEMA_OLDEST,
      rows: await readRows(repository, query.scope, refs),
      next: refs.at(-1)?.seq ?? query.since,
      more: refs.length === query.limit,
    }
  })
}

async function mayReadFeed(repository: SyncRepository, accountId: string, scope: string): Promise<boolean> {
  const [kind, id] = scope.split(':')
  if (!id) return false
  return kind === 'user' ? id === accountId : await repository.roleIn(id, accountId) !== null
}

async function readRows(repository: SyncRepository, scope: string, refs: (FeedRef & { seq: number })[]): Promise<FeedRow[]> {
  const last = new Map(refs.map(ref => [`${ref.type}/${ref.id}`, ref]))
  const records = await repository.findMany([...last.values()])
  const plants = await plantsOf(repository, records)
  const rows: FeedRow[] = []
  for (const record of records) {
    const told = last.get(`${record.type}/${record.id}`)
    if (!told) continue
    const { seq, ver: seen } = told
    const shared = record.type === 'vessel' && await vesselIsShared(repository, scope, record)
    const visible = isVisibleInScope(scope, record, plantOf(record, plants), shared)
    rows.push(visible
      ? { seq, seen, ...presentRecord(record) }
      : { seq, seen, type: record.type, id: record.id, ver: record.ver, state: 'revoked', data: null })
  }
  return rows.sort((left, right) => left.seq - right.seq)
}

async function plantsOf(repository: SyncRepository, records: StoredRecord[]): Promise<Map<string, StoredRecord>> {
  const ids = new Set(records.map(record => record.data.plantId).filter(id => typeof id === 'string'))
  const plants = await repository.findMany([...ids].map(id => ({ type: 'plant', id })))
  return new Map([...plants, ...records.filter(record => record.type === 'plant')].map(plant => [plant.id, plant]))
}

function plantOf(record: StoredRecord, plants: Map<string, StoredRecord>): StoredRecord | null {
  if (record.type === 'plant') return record
  return typeof record.data.plantId === 'string' ? plants.get(record.data.plantId) ?? null : null
}

async function vesselIsShared(repository: SyncRepository, scope: string, vessel: StoredRecord): Promise<boolean> {
  if (!scope.startsWith('club:')) return true
  const plants = await repository.plantsInVessel(vessel.id)
  return plants.some(plant => !plant.deleted && `club:${sharedClubOf(plant)}` === scope)
}
