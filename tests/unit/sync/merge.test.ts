import { describe, expect, it } from 'vitest'
import { decidePatch, hasUnseenChanges, sameValue } from '#shared/sync/merge'
import type { HistoryChange } from '#shared/sync/merge'

const mine = 'device-mine'
const theirs = 'device-theirs'

function change(deviceId: string, field: string, from: unknown, to: unknown, ver = 2): HistoryChange {
  return { ver, deviceId, fields: { [field]: { from, to } } }
}

describe('decidePatch', () => {
  it('applies a field that nobody else touched', () => {
    const decision = decidePatch({ ph: 6 }, { ph: 6.2 }, mine, [])
    expect(decision).toEqual({ apply: { ph: 6.2 }, kept: {}, merged: false })
  })

  it('applies over changes of the same device: it wrote them itself', () => {
    expect(decidePatch({ ph: 6.1 }, { ph: 6.2 }, mine, [change(mine, 'ph', 6, 6.1)]).apply).toEqual({ ph: 6.2 })
  })

  it('keeps what another device wrote, and the new value beside it', () => {
    const decision = decidePatch({ ph: 6.1 }, { ph: 6.2 }, mine, [change(theirs, 'ph', 6, 6.1)])
    expect(decision.apply).toEqual({})
    expect(decision.kept).toEqual({ ph: 6.2 })
  })

  it('finds no conflict where both wrote the same', () => {
    expect(decidePatch({ ph: 6.2 }, { ph: 6.2 }, mine, [change(theirs, 'ph', 6, 6.2)]).kept).toEqual({})
  })

  it('merges different fields', () => {
    const decision = decidePatch({ ph: 6.1, note: null }, { note: 'white roots' }, mine, [change(theirs, 'ph', 6, 6.1)])
    expect(decision).toEqual({ apply: { note: 'white roots' }, kept: {}, merged: true })
  })

  it('counts both devices’ additions and removals in a set', () => {
    const unseen = [change(theirs, 'actions', ['swirled', 'moved'], ['swirled', 'pruned'])]
    const decision = decidePatch({ actions: ['swirled', 'pruned'] }, { actions: ['moved', 'covered'] }, mine, unseen)
    expect(decision.apply.actions).toEqual(['pruned', 'covered'])
    expect(decision.kept).toEqual({})
  })
})

describe('hasUnseenChanges', () => {
  it('speaks of other devices only', () => {
    expect(hasUnseenChanges(mine, [change(mine, 'ph', 6, 7)])).toBe(false)
    expect(hasUnseenChanges(mine, [{ ver: 2, deviceId: theirs, fields: {} }])).toBe(true)
  })
})

describe('sameValue', () => {
  it.each([
    [null, null, true], [null, undefined, false], [0, null, false], ['', null, false], [6, 6, true],
    [['a', 'b'], ['b', 'a'], true], [['a'], ['a', 'b'], false], [[], [], true],
  ])('%j and %j: %s', (left, right, same) => {
    expect(sameValue(left, right)).toBe(same)
  })
})
