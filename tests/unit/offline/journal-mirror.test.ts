import { describe, expect, it } from 'vitest'
import type { BaseRecord } from '#shared/sync/base-record'
import { createJournalMirror } from '~/utils/offline/journal-mirror'
import { saveChanges } from '~/utils/offline/journal'
import { keys } from '~/utils/offline/keys'
import { countingIds } from '../../simulation/support/ids'
import { createMemoryStorage } from '../../support/memory-storage'

const newId = countingIds()
const id = newId()
const base: BaseRecord = { type: 'entry', id, ver: 3, seen: 3, state: 'live', data: { note: 'old' }, scopes: ['user:1'] }
const around = { now: () => Date.UTC(2026, 5, 9), random: () => 0.5, newId }

describe('the journal in memory', () => {
  it('shows what is stored, and what changes', async () => {
    const storage = createMemoryStorage()
    await storage.transact({}, () => ({ result: null, put: [[keys.base('entry', id), base]] }))
    const mirror = createJournalMirror('me')
    expect(await mirror.load(storage)).toMatchObject([{ type: 'entry', id, record: { data: { note: 'old' }, unsent: false } }])
    const [op] = await saveChanges(storage, around, [{ kind: 'patch', entityType: 'entry', entityId: id, fields: { note: 'new' } }])
    const changed = await mirror.refresh(storage, [keys.outbox(op?.deviceSeq ?? 0, op?.opId ?? '')])
    expect(changed).toMatchObject([{ id, record: { data: { note: 'new' }, unsent: true } }])
  })

  it('reads a row of the first build, which did not say what was told', async () => {
    const storage = createMemoryStorage()
    const { seen: _seen, ...older } = base
    await storage.transact({}, () => ({ result: null, put: [[keys.base('entry', id), older], [keys.cursor('user:1'), { since: 7 }]] }))
    expect(await createJournalMirror('me').load(storage)).toHaveLength(1)
    expect((await storage.read({ keys: [keys.cursor('user:1')] })).get(keys.cursor('user:1'))).toEqual({ since: 7 })
  })

  it('has everything read again when a row cannot be read, and leaves what waits', async () => {
    const storage = createMemoryStorage()
    await storage.transact({}, () => ({ result: null, put: [[keys.base('entry', id), { strange: true }], [keys.cursor('user:1'), { since: 7 }]] }))
    await saveChanges(storage, around, [{ kind: 'create', entityType: 'entry', entityId: newId(), fields: { note: 'mine' } }])
    const mirror = createJournalMirror('me')
    await mirror.load(storage)
    expect((await storage.read({ keys: [keys.cursor('user:1')] })).get(keys.cursor('user:1'))).toBeUndefined()
    expect(mirror.outbox()).toHaveLength(1)
  })
})
