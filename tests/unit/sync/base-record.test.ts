import { describe, expect, it } from 'vitest'
import { UNSURE_VERSION, withFeedRow, withState, withoutScope } from '#shared/sync/base-record'
import type { BaseRecord } from '#shared/sync/base-record'
import type { FeedRow } from '#shared/sync/protocol'

const base: BaseRecord = { type: 'plant', id: 'a', ver: 3, seen: 3, state: 'live', data: { name: 'Juniper' }, scopes: ['user:1'] }
const row = (part: Partial<FeedRow>): FeedRow => ({ seq: 9, seen: part.ver ?? 4, type: 'plant', id: 'a', ver: 4, state: 'live', data: { name: 'Marigold' }, ...part })

describe('withFeedRow', () => {
  it('takes a newer version', () => {
    expect(withFeedRow(base, 'user:1', row({}))).toMatchObject({ ver: 4, data: { name: 'Marigold' } })
  })

  it('never goes back to an older or equal one, but learns that another feed shows it', () => {
    expect(withFeedRow(base, 'club:2', row({ ver: 3 }))).toEqual({ ...base, scopes: ['user:1', 'club:2'] })
  })

  it('knows up to where it was told everything: a feed says so, an answer to a push does not', () => {
    expect(withState(base, 'user:1', row({ ver: 6 }))).toMatchObject({ ver: 6, seen: 3 })
    expect(withFeedRow({ ...base, ver: 6 }, 'user:1', row({ ver: 6, seen: 5 }))).toMatchObject({ ver: 6, seen: 5 })
    expect(withState(null, 'user:1', row({ ver: 1 }))).toMatchObject({ ver: 1, seen: 0 })
  })

  it('forgets a record when the last feed that showed it takes it back', () => {
    const shared = { ...base, scopes: ['user:1', 'club:2'] }
    const own = withFeedRow(shared, 'club:2', row({ state: 'revoked', data: null }))
    expect(own).toEqual(base)
    expect(own && withFeedRow(own, 'user:1', row({ state: 'revoked', data: null }))).toBeNull()
  })

  it('has nothing to forget of a record it never had', () => {
    expect(withFeedRow(null, 'club:2', row({ state: 'revoked', data: null }))).toBeNull()
  })

  it('keeps a deletion, so that an older row cannot bring the record back', () => {
    const deleted = withFeedRow(base, 'user:1', row({ state: 'deleted', data: null }))
    expect(deleted && withFeedRow(deleted, 'user:1', row({ ver: 3 }))?.state).toBe('deleted')
  })

  it('lets any answer replace a record kept through a restore of the server', () => {
    const kept = { ...base, ver: UNSURE_VERSION }
    expect(withState(kept, 'user:1', row({ ver: 1 }))).toMatchObject({ ver: 1, data: { name: 'Marigold' } })
  })
})

describe('withoutScope', () => {
  it('leaves the other feeds', () => {
    expect(withoutScope({ ...base, scopes: ['user:1', 'club:2'] }, 'user:1')?.scopes).toEqual(['club:2'])
  })
})
