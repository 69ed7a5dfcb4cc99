import { snapshotOf } from '~/utils/offline/idb-storage'
import { StorageFull } from '~/utils/offline/ports'
import type { JournalStorage, ReadRequest, Snapshot, StoredPair } from '~/utils/offline/ports'

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

  function read({ keys = [], prefixes = [] }: ReadRequest): Snapshot {
    const under = (prefix: string) => [...pairs.keys()].filter(key => key.startsWith(prefix)).sort()
      .map((key): StoredPair => [key, copy(pairs.get(key))])
    return snapshotOf(
      new Map(keys.map(key => [key, copy(pairs.get(key))])),
      new Map(prefixes.map(prefix => [prefix, under(prefix)])),
    )
  }

  return {
    async read(request) {
      return read(request)
    },
    async transact(request, decide) {
      const { result, put = [], remove = [] } = decide(read(request))
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
