import { describe, expect, it, onTestFinished } from 'vitest'
import { createIdbStorage } from '~/utils/offline/idb-storage'
import { describeJournalStorage } from '../../support/journal-storage-contract'
import { createMemoryStorage } from '../../support/memory-storage'

let databases = 0
const freshName = () => `contract-${Date.now()}-${databases += 1}`

describeJournalStorage('memory', createMemoryStorage)
describeJournalStorage('IndexedDB', () => createIdbStorage(freshName(), () => undefined))

describe('IndexedDB alone', () => {
  it('goes on after the browser closed its connection', async () => {
    const name = freshName()
    const storage = createIdbStorage(name, () => undefined)
    onTestFinished(() => storage.destroy())
    await storage.transact({}, () => ({ result: null, put: [['a', 1]] }))
    await loseConnection(() => storage.transact({}, () => ({ result: null, put: [['b', 2]] })))
    const snapshot = await storage.read({ keys: ['a', 'b'] })
    expect([snapshot.get('a'), snapshot.get('b')]).toEqual([1, 2])
  })

  it('asks for strict durability in every write', async () => {
    const durabilities: (string | undefined)[] = []
    const original = IDBDatabase.prototype.transaction
    IDBDatabase.prototype.transaction = function (stores, mode, options) {
      if (mode === 'readwrite') durabilities.push(options?.durability)
      return original.call(this, stores, mode, options)
    }
    onTestFinished(() => {
      IDBDatabase.prototype.transaction = original
    })
    const storage = createIdbStorage(freshName(), () => undefined)
    await storage.transact({}, () => ({ result: null, put: [['a', 1]] }))
    await storage.destroy()
    expect(durabilities).toEqual(['strict'])
  })

  it('yields to another tab that removes the database', async () => {
    const name = freshName()
    const here = createIdbStorage(name, () => undefined)
    const there = createIdbStorage(name, () => undefined)
    await here.transact({}, () => ({ result: null, put: [['a', 1]] }))
    await there.destroy()
    expect((await here.read({ keys: ['a'] })).get('a')).toBeUndefined()
    await here.destroy()
  })
})

/** Makes the next transaction fail the way a lost connection does, once. */
async function loseConnection(work: () => Promise<unknown>): Promise<void> {
  const original = IDBDatabase.prototype.transaction
  IDBDatabase.prototype.transaction = function () {
    IDBDatabase.prototype.transaction = original
    throw new DOMException('Connection to Indexed Database server lost', 'UnknownError')
  }
  await work()
}
