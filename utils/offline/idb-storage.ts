import { promisifyRequest } from 'idb-keyval'
import { openJournalDatabase } from './database'
import { StorageFull } from './ports'
import type { JournalStorage, ReadRequest, Snapshot, StoredPair, StoreChanges } from './ports'

/** The phone's store in IndexedDB, one database for each account. */
export function createIdbStorage(databaseName: string, onBlocked: () => void): JournalStorage {
  const { useStore, destroy } = openJournalDatabase(databaseName, onBlocked)
  return {
    destroy,
    read: request => useStore('readonly', store => readSnapshot(store, request)),
    transact: (request, decide) => useStore('readwrite', async (store) => {
      const complete = completion(store.transaction)
      const snapshot = await readSnapshot(store, request)
      try {
        const { result, ...changes } = decide(snapshot)
        write(store, changes)
        await complete
        return result
      } catch (error) {
        abort(store.transaction)
        await complete.catch(() => undefined)
        throw error
      }
    }),
  }
}

/** Reads everything that was asked for at once, so that the transaction stays alive. */
async function readSnapshot(store: IDBObjectStore, request: ReadRequest): Promise<Snapshot> {
  const keyReads = (request.keys ?? []).map(async (key): Promise<StoredPair> => [key, await promisifyRequest(store.get(key))])
  const prefixReads = (request.prefixes ?? []).map(async (prefix): Promise<[string, StoredPair[]]> => {
    const range = IDBKeyRange.bound(prefix, `${prefix}\uffff`)
    const [found, values] = await Promise.all([
      promisifyRequest(store.getAllKeys(range)), promisifyRequest(store.getAll(range)),
    ])
    return [prefix, found.map((key, index): StoredPair => [String(key), values[index]])]
  })
  const [pairs, pages] = await Promise.all([Promise.all(keyReads), Promise.all(prefixReads)])
  return snapshotOf(new Map(pairs), new Map(pages))
}

/** What was not read must not look as if there were nothing. */
export function snapshotOf(byKey: ReadonlyMap<string, unknown>, byPrefix: ReadonlyMap<string, StoredPair[]>): Snapshot {
  return {
    get(key) {
      if (!byKey.has(key)) throw new Error(`${key} was not read`)
      return byKey.get(key)
    },
    under(prefix) {
      const pairs = byPrefix.get(prefix)
      if (!pairs) throw new Error(`${prefix} was not read`)
      return pairs
    },
  }
}

function write(store: IDBObjectStore, changes: StoreChanges): void {
  for (const key of changes.remove ?? []) store.delete(key)
  for (const [key, value] of changes.put ?? []) store.put(value, key)
}

/** Resolves when everything is on disk. */
function completion(transaction: IDBTransaction): Promise<void> {
  const complete = new Promise<void>((resolve, reject) => {
    transaction.oncomplete = () => resolve()
    transaction.onabort = () => reject(abortReason(transaction))
  })
  complete.catch(() => undefined)
  return complete
}

function abortReason(transaction: IDBTransaction): Error {
  const { error } = transaction
  if (error?.name === 'QuotaExceededError') return new StorageFull({ cause: error })
  return error ?? new DOMException('The transaction was aborted', 'AbortError')
}

function abort(transaction: IDBTransaction): void {
  try {
    transaction.abort()
  } catch {
    // It had ended already; its own outcome is the answer.
  }
}
