import type { JournalStorage, StoredPair } from './ports'

/** What a transaction changed. */
export type StoreNews = { put: StoredPair[], remove: string[] }

/** A store that tells of every change once it is on disk. */
export function watchStorage(storage: JournalStorage, tell: (news: StoreNews) => void): JournalStorage {
  return {
    read: request => storage.read(request),
    destroy: () => storage.destroy(),
    async transact(request, decide) {
      let news: StoreNews = { put: [], remove: [] }
      const result = await storage.transact(request, (snapshot) => {
        const decision = decide(snapshot)
        news = { put: decision.put ?? [], remove: decision.remove ?? [] }
        return decision
      })
      if (news.put.length + news.remove.length > 0) tell(news)
      return result
    },
  }
}
