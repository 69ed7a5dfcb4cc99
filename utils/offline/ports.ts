import type { PullResponse, PushResponse } from '#shared/sync/protocol'

/** A key of the phone's store and what stands there. */
export type StoredPair = [key: string, value: unknown]

/** What a transaction reads before it decides. */
export type ReadRequest = {
  keys?: string[]
  prefixes?: string[]
}

export type Snapshot = {
  /** The value under one of the asked keys; undefined when there is none. @throws Error for a key that was not asked for */
  get: (key: string) => unknown
  /** Every pair below one of the asked prefixes, in the order of keys. @throws Error for a prefix that was not asked for */
  under: (prefix: string) => StoredPair[]
}

export type StoreChanges = {
  put?: StoredPair[]
  remove?: string[]
}

/**
 * The phone's store. Keys are texts; values are whatever can be cloned.
 * Implementations: IndexedDB on the phone, memory in tests; both pass one contract.
 */
export interface JournalStorage {
  /**
   * One transaction: reads, lets `decide` choose without waiting for anything,
   * writes. All or nothing, and nobody else writes in between. Resolves when
   * the writes are on disk.
   * @throws StorageFull, StorageGone
   */
  transact<T>(request: ReadRequest, decide: (snapshot: Snapshot) => StoreChanges & { result: T }): Promise<T>
  /** @throws StorageGone */
  read(request: ReadRequest): Promise<Snapshot>
  /** Removes everything of this account from the phone. */
  destroy(): Promise<void>
}

/** The phone has no room for this. What was stored before is untouched. */
export class StorageFull extends Error {
  constructor(options?: ErrorOptions) {
    super('The phone has no room left for this.', options)
    this.name = 'StorageFull'
  }
}

/** The store cannot be reached any more; reloading the page helps. */
export class StorageGone extends Error {
  constructor(options?: ErrorOptions) {
    super('The phone’s store does not answer.', options)
    this.name = 'StorageGone'
  }
}

/** How a request to the server ended. Only `answered` carries news. */
export type Answer<T> =
  | { kind: 'answered', body: T }
  /** No connection, a time-out, or something that is not our server. */
  | { kind: 'unreachable' }
  | { kind: 'refused', status: number, code: string | null, message: string | null, retryAfterSeconds: number | null }

/** The way to the server, as the sync engine sees it. Never throws. */
export interface SyncTransport {
  push(accountId: string, ops: unknown[]): Promise<Answer<PushResponse>>
  pull(accountId: string, scope: string, since: number, limit: number): Promise<Answer<PullResponse>>
}

/** The clock and the dice, given from outside so that tests own them. */
export type Surroundings = {
  now: () => number
  /** From 0 up to, not including, 1. */
  random: () => number
  newId: () => string
}
