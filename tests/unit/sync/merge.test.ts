import { describe, expect, it } from 'vitest'
import { decidePatch, sameValue } from '#shared/sync/merge'
import type { HistoryChange } from '#shared/sync/merge'

function change(field: string, from: unknown, to: unknown, ver = 2): HistoryChange {
  return { ver, fields: { [field]: { from, to } } }
}

describe('decidePatch', () => {
  it('applies a field that nobody else touched', () => {
    const decision = decidePatch({ ph: 6 }, { ph: 6.2 }, [])
    expect(decision).toEqual({ apply: { ph: 6.2 }, kept: {}, merged: false })
  })

  it('keeps what another device wrote, and the new value beside it', () => {
    const decision = decidePatch({ ph: 6.1 }, { ph: 6.2 }, [change('ph', 6, 6.1)])
    expect(decision.apply).toEqual({})
    expect(decision.kept).toEqual({ ph: 6.2 })
  })

  it('finds no conflict where both wrote the same', () => {
    expect(decidePatch({ ph: 6.2 }, { ph: 6.2 }, [change('ph', 6, 6.2)]).kept).toEqual({})
  })

  it('merges different fields', () => {
    const decision = decidePatch({ ph: 6.1, note: null }, { note: 'white roots' }, [change('ph', 6, 6.1)])
    expect(decision).toEqual({ apply: { note: 'white roots' }, kept: {}, merged: true })
  })

  it('counts both devices’ additions and removals in a set', () => {
    const unseen = [change('actions', ['swirled', 'moved'], ['swirled', 'pruned'])]
    const decision = decidePatch({ actions: ['swirled', 'pruned'] }, { actions: ['moved', 'covered'] }, unseen)
    expect(decision.apply.actions).toEqual(['pruned', 'covered'])
    expect(decision.kept).toEqual({})
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
