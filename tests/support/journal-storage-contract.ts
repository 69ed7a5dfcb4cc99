import { describe, expect, it } from 'vitest'
import type { JournalStorage } from '~/utils/offline/ports'

/** What every store of a phone must do, wherever it keeps its pairs. */
export function describeJournalStorage(name: string, make: () => JournalStorage): void {
  describe(`${name} as a journal’s store`, () => {
    it('gives back what was put, and nothing for what was not', async () => {
      const storage = make()
      await put(storage, [['base/entry/1', { note: 'größer 🌱', list: [1, null] }]])
      const snapshot = await storage.read({ keys: ['base/entry/1', 'base/entry/2'] })
      expect(snapshot.get('base/entry/1')).toEqual({ note: 'größer 🌱', list: [1, null] })
      expect(snapshot.get('base/entry/2')).toBeUndefined()
      await storage.destroy()
    })

    it('keeps bytes as bytes', async () => {
      const storage = make()
      const bytes = new Uint8Array([0, 255, 7]).buffer
      await put(storage, [['bytes/1', bytes]])
      const found = (await storage.read({ keys: ['bytes/1'] })).get('bytes/1')
      expect(found).toBeInstanceOf(ArrayBuffer)
      expect([...new Uint8Array(found as ArrayBuffer)]).toEqual([0, 255, 7])
      await storage.destroy()
    })

    it('lists a prefix in the order of keys, and only that prefix', async () => {
      const storage = make()
      await put(storage, [['outbox/000010/b', 2], ['outbox/000002/a', 1], ['outboxes', 0], ['attention/1', 3]])
      const { under } = await storage.read({ prefixes: ['outbox/', 'attention/'] })
      expect(under('outbox/')).toEqual([['outbox/000002/a', 1], ['outbox/000010/b', 2]])
      expect(under('attention/')).toEqual([['attention/1', 3]])
      await storage.destroy()
    })

    it('finds what was read under a shorter prefix too, each pair once', async () => {
      const storage = make()
      await put(storage, [['base/plant/1', 2], ['base/club/1', 1], ['cursor/1', 0]])
      const { under } = await storage.read({ prefixes: ['base/plant/', 'base/club/', 'base/'] })
      expect(under('base/')).toEqual([['base/club/1', 1], ['base/plant/1', 2]])
      expect((await storage.read({ prefixes: ['base/plant/'] })).under('base/plant/')).toEqual([['base/plant/1', 2]])
      await storage.destroy()
    })

    it('refuses to speak of what was not asked for: it must not look as if there were nothing', async () => {
      const storage = make()
      await put(storage, [['base/entry/1', 1]])
      const snapshot = await storage.read({ keys: ['a'], prefixes: ['base/entry/'] })
      expect(() => snapshot.under('base/')).toThrow('was not read')
      expect(() => snapshot.get('base/entry/1')).toThrow('was not read')
      await storage.destroy()
    })

    it('puts and removes together, or does neither', async () => {
      const storage = make()
      await put(storage, [['a', 1]])
      const failing = storage.transact({ keys: ['a'] }, () => {
        throw new Error('changed its mind')
      })
      await expect(failing).rejects.toThrow('changed its mind')
      await storage.transact({ keys: ['a'] }, () => ({ result: null, put: [['b', 2]], remove: ['a'] }))
      const snapshot = await storage.read({ keys: ['a', 'b'] })
      expect([snapshot.get('a'), snapshot.get('b')]).toEqual([undefined, 2])
      await storage.destroy()
    })

    it('lets nobody in between reading and writing', async () => {
      const storage = make()
      const increase = () => storage.transact({ keys: ['count'] }, (snapshot) => {
        const next = Number(snapshot.get('count') ?? 0) + 1
        return { result: next, put: [['count', next]] }
      })
      const results = await Promise.all(Array.from({ length: 20 }, increase))
      expect([...results].sort((left, right) => left - right)).toEqual(Array.from({ length: 20 }, (_, index) => index + 1))
      await storage.destroy()
    })

    it('hands out copies: changing one changes nothing in the store', async () => {
      const storage = make()
      await put(storage, [['a', { list: [1] }]])
      const first = (await storage.read({ keys: ['a'] })).get('a') as { list: number[] }
      first.list.push(2)
      expect((await storage.read({ keys: ['a'] })).get('a')).toEqual({ list: [1] })
      await storage.destroy()
    })

    it('is empty once it was destroyed', async () => {
      const storage = make()
      await put(storage, [['a', 1]])
      await storage.destroy()
      expect((await storage.read({ keys: ['a'] })).get('a')).toBeUndefined()
      await storage.destroy()
    })
  })
}

function put(storage: JournalStorage, pairs: [string, unknown][]): Promise<null> {
  return storage.transact({}, () => ({ result: null, put: pairs }))
}
