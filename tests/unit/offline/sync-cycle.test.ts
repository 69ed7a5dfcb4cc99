import { beforeEach, describe, expect, it } from 'vitest'
import type { Op, OpResult, PullResponse } from '#shared/sync/protocol'
import { accountScope, clubScope } from '#shared/sync/protocol'
import { saveChanges } from '~/utils/offline/journal'
import { prefixes } from '~/utils/offline/keys'
import type { Answer, SyncTransport } from '~/utils/offline/ports'
import { readAcked, readAttention, readBases, readOutbox } from '~/utils/offline/stored-shapes'
import { runSyncCycle } from '~/utils/offline/sync-cycle'
import { countingIds } from '../../simulation/support/ids'
import { createMemoryStorage } from '../../support/memory-storage'
import type { MemoryStorage } from '../../support/memory-storage'

const newId = countingIds()
const around = { now: () => Date.UTC(2026, 5, 9), random: () => 0.5, newId }
const accountId = newId()
const epoch = 'one'

const emptyPull = (since: number): PullResponse => ({ serverTime: '2026-06-09T00:00:00.000Z', epoch, minSchema: 1, rows: [], next: since, more: false })
const refused = (status: number, code: string | null = null): Answer<never> => ({ kind: 'refused', status, code, message: null, retryAfterSeconds: null })

let storage: MemoryStorage
let pushed: Op[][]

beforeEach(() => {
  storage = createMemoryStorage()
  pushed = []
})

/** A server that does whatever `judge` says with each operation. */
function server(judge: (op: Op) => Partial<OpResult>, pull?: SyncTransport['pull']): SyncTransport {
  return {
    async push(_account, ops) {
      const sent = ops as Op[]
      pushed.push(sent)
      const results = sent.map((op): OpResult => ({ opId: op.opId, status: 'applied', record: null, ...judge(op) }))
      return { kind: 'answered', body: { serverTime: '2026-06-09T00:00:00.000Z', epoch, minSchema: 1, results } }
    },
    pull: pull ?? (async (_account, _scope, since) => ({ kind: 'answered', body: emptyPull(since) })),
  }
}

const cycle = (transport: SyncTransport) => runSyncCycle({ storage, transport, around, accountId })
const note = (text: string, entityId = newId()) => (
  saveChanges(storage, around, [{ kind: 'create', entityType: 'entry', entityId, fields: { note: text } }])
)
const stored = () => storage.read({ prefixes: Object.values(prefixes).filter(prefix => typeof prefix === 'string') })

describe('a cycle', () => {
  it('sends what waits in order and keeps what was acknowledged for a while', async () => {
    const [first] = await note('first')
    const [second] = await note('second')
    expect(await cycle(server(() => ({})))).toEqual({ kind: 'done' })
    expect(pushed).toEqual([[first, second]])
    expect(readOutbox(await stored())).toEqual([])
    expect(readAcked(await stored()).map(item => item.op)).toEqual([first, second])
  })

  it('moves a refused change to “needs attention”, byte for byte, and sends the rest', async () => {
    const [bad] = await note('bad')
    await note('good')
    await cycle(server(op => (op.fields.note === 'bad' ? { status: 'rejected', code: 'invalid', message: 'no' } : {})))
    expect(readAttention(await stored()).map(item => item.op)).toEqual([bad])
    expect(readOutbox(await stored())).toEqual([])
  })

  it('leaves everything where it is when the records are away, and says when to come back', async () => {
    await note('waits')
    expect(await cycle(server(() => ({ status: 'retry', code: 'unavailable' })))).toMatchObject({ kind: 'wait', why: 'server' })
    expect(readOutbox(await stored())).toHaveLength(1)
  })

  it.each([[401, null, 'signed-out'], [409, 'account_mismatch', 'other-account'], [426, null, 'update-needed']])(
    'stops at %i and loses nothing', async (status, code, kind) => {
      await note('waits')
      const transport = server(() => ({}))
      expect(await cycle({ ...transport, push: async () => refused(status, code) })).toEqual({ kind })
      expect(readOutbox(await stored())).toHaveLength(1)
    },
  )

  it.each([408, 425, 429, 500, 502, 503])('waits after %i, without counting tries', async (status) => {
    await note('waits')
    const transport = server(() => ({}))
    expect(await cycle({ ...transport, push: async () => refused(status) })).toMatchObject({ kind: 'wait' })
    expect(readOutbox(await stored())).toHaveLength(1)
  })

  it('finds the one change that the server cannot read among many, and sets only that aside', async () => {
    for (let index = 0; index < 9; index += 1) await note(index === 4 ? 'unreadable' : 'fine')
    const transport = server(() => ({}))
    const picky: SyncTransport = {
      ...transport,
      push: (account, ops) => ((ops as Op[]).some(op => op.fields.note === 'unreadable') ? Promise.resolve(refused(413)) : transport.push(account, ops)),
    }
    expect(await cycle(picky)).toEqual({ kind: 'done' })
    expect(readAttention(await stored()).map(item => item.op.fields.note)).toEqual(['unreadable'])
    expect(pushed.flat()).toHaveLength(8)
  })

  it('reads a club’s feed as soon as the person’s own feed names the club', async () => {
    const clubId = newId()
    const asked: string[] = []
    await cycle(server(() => ({}), async (_account, scope, since) => {
      asked.push(scope)
      const membership = { seq: 1, seen: 1, type: 'membership' as const, id: newId(), ver: 1, state: 'live' as const, data: { accountId, clubId } }
      return { kind: 'answered', body: { ...emptyPull(since), rows: scope === accountScope(accountId) ? [membership] : [], next: 1 } }
    }))
    expect(asked).toEqual([accountScope(accountId), clubScope(clubId)])
  })

  it('sends everything of the last weeks again when the server came back from a backup', async () => {
    const [op] = await note('kept')
    await cycle(server(() => ({})))
    pushed = []
    const restored = server(() => ({}), async (_account, _scope, since) => ({ kind: 'answered', body: { ...emptyPull(since), epoch: 'two' } }))
    await cycle(restored)
    await cycle(restored)
    expect(pushed.flat()).toEqual([op])
  })

  it('starts a feed anew after 410, and keeps what waits and what needs attention', async () => {
    await note('waits')
    const asked: number[] = []
    const transport = server(() => ({ status: 'retry', code: 'unavailable' }), async (_account, _scope, since) => {
      asked.push(since)
      if (asked.length === 1) return { kind: 'answered', body: { ...emptyPull(since), next: 50, more: true } }
      return asked.length === 2 ? refused(410, 'feed_pruned') : { kind: 'answered', body: emptyPull(since) }
    })
    await cycle(transport)
    expect(asked).toEqual([0, 50, 0])
    expect(readOutbox(await stored())).toHaveLength(1)
  })

  it('keeps own records and drops a club’s when the person left it', async () => {
    const clubId = newId()
    const membershipId = newId()
    const rows: Record<string, PullResponse['rows']> = {
      [accountScope(accountId)]: [
        { seq: 1, seen: 1, type: 'membership', id: membershipId, ver: 1, state: 'live', data: { accountId, clubId } },
        { seq: 2, seen: 1, type: 'plant', id: 'mine', ver: 1, state: 'live', data: { name: 'Mine' } },
      ],
      [clubScope(clubId)]: [
        { seq: 1, seen: 1, type: 'plant', id: 'mine', ver: 1, state: 'live', data: { name: 'Mine' } },
        { seq: 2, seen: 1, type: 'plant', id: 'theirs', ver: 1, state: 'live', data: { name: 'Theirs' } },
      ],
    }
    const transport = server(() => ({}), async (_account, scope, since) => {
      const fresh = (rows[scope] ?? []).filter(row => row.seq > since)
      return { kind: 'answered', body: { ...emptyPull(since), rows: fresh, next: fresh.at(-1)?.seq ?? since } }
    })
    await cycle(transport)
    expect(readBases(await stored()).map(base => base.id).sort()).toEqual([membershipId, 'mine', 'theirs'].sort())
    rows[accountScope(accountId)]?.push({ seq: 3, seen: 1, type: 'membership', id: membershipId, ver: 2, state: 'deleted', data: null })
    await cycle(transport)
    expect(readBases(await stored()).filter(base => base.type === 'plant').map(base => base.id)).toEqual(['mine'])
  })
})
