import { StorageFull } from '~/utils/offline/ports'
import type { JournalStorage, Snapshot, StoredPair } from '~/utils/offline/ports'

export type MemoryStorage = JournalStorage & {
  /** The next writing transaction finds the phone full. */
  fillOnce: () => void
  /** Everything that is stored, for looking at. */
  contents: () => ReadonlyMap<string, unknown>
}

/** The phone's store in memory, with the same promises as IndexedDB. */
export function createMemoryStorage(): MemoryStorage {
  const pairs = new Map<string, unknown>()
  let full = false

  function snapshotOf(): Snapshot {
    return {
      get: key => copy(pairs.get(key)),
      under: prefix => [...pairs.keys()].filter(key => key.startsWith(prefix)).sort()
        .map((key): StoredPair => [key, copy(pairs.get(key))]),
    }
  }

  return {
    async read() {
      return snapshotOf()
    },
    async transact(_request, decide) {
      const { result, put = [], remove = [] } = decide(snapshotOf())
      if (full && put.length > 0) {
        full = false
        throw new StorageFull()
      }
      for (const key of remove) pairs.delete(key)
      for (const [key, value] of put) pairs.set(key, copy(value))
      return result
    },
    async destroy() {
      pairs.clear()
    },
    fillOnce() {
      full = true
    },
    contents: () => pairs,
  }
}

function copy<T>(value: T): T {
  return structuredClone(value)
}
