import type { ClubRole } from '#shared/domain/club.schema'
import type { HistoryChange } from '#shared/sync/merge'
import type { OpResult, RecordType } from '#shared/sync/protocol'

/** A record as the database holds it, deleted ones included. */
export type StoredRecord = {
  type: RecordType
  id: string
  ver: number
  deleted: boolean
  data: Record<string, unknown>
}

export type RecordRef = { type: RecordType, id: string }

/** What a feed keeps of a record: which, and at which version it was told. */
export type FeedRef = RecordRef & { ver: number }

/** `child`: something below the record changed; `conflict`: a second value was kept beside one of its own. */
export type ChangeKind = 'create' | 'patch' | 'delete' | 'restore' | 'child' | 'conflict'

/** A line in the history of one record. */
export type EntityChange = HistoryChange & {
  entityType: RecordType
  entityId: string
  kind: ChangeKind
  accountId: string
  deviceId: string
  opId: string | null
  at: string
}

/** What a receipt keeps of an answer; the record itself is looked up anew. */
export type StoredResult = Omit<OpResult, 'record'>

export type Receipt = { payloadSha256: string, result: StoredResult | null }

/** Thrown when the records cannot be reached: nothing was changed, later may do. */
export class TemporaryFailure extends Error {}

/**
 * Everything that push and pull ask of the records. One implementation speaks
 * to MariaDB, another to memory; both pass the same contract.
 */
export interface SyncRepository {
  /** All or nothing. May run `work` again after a deadlock. @throws TemporaryFailure */
  transaction<T>(work: () => Promise<T>): Promise<T>
  /** Reads that all see one moment. @throws TemporaryFailure */
  snapshot<T>(work: () => Promise<T>): Promise<T>

  /** Null when the operation is new: it is ours from now on. Waits for a concurrent twin. */
  claimReceipt(accountId: string, opId: string, payloadSha256: string, at: string): Promise<Receipt | null>
  completeReceipt(accountId: string, opId: string, result: StoredResult): Promise<void>

  /** Holds these feeds to the end of the transaction, in sorted order. */
  lockScopes(scopes: string[]): Promise<void>
  appendFeed(scope: string, refs: FeedRef[]): Promise<void>
  feedAfter(scope: string, since: number, limit: number): Promise<(FeedRef & { seq: number })[]>
  /** Rows up to this number may be gone from the feed. */
  feedMinimum(scope: string): Promise<number>
  epoch(): Promise<string>

  find(type: RecordType, id: string): Promise<StoredRecord | null>
  findMany(refs: RecordRef[]): Promise<StoredRecord[]>
  insert(record: StoredRecord): Promise<void>
  update(record: StoredRecord): Promise<void>
  changesAfter(entityId: string, ver: number): Promise<EntityChange[]>
  appendChange(change: EntityChange): Promise<void>

  roleIn(clubId: string, accountId: string): Promise<ClubRole | null>
  /** Comments, photos and entries of a plant, in this order, deleted ones included. */
  descendantsOf(plantId: string): Promise<FeedRef[]>
  plantsInVessel(vesselId: string): Promise<StoredRecord[]>
  /** Accounts that commented on an entry, at most `limit`. */
  commentersOn(entryId: string, limit: number): Promise<string[]>
}

export type SyncDependencies = {
  repository: SyncRepository
  now: () => Date
  newId: () => string
  /** Told of faults of ours that an operation ran into, without its content. */
  reportFault: (error: unknown, about: { opKind: string, entityType: string }) => void
}
