import { describe, expect, it } from 'vitest'
import { median, tableLines } from '~/scripts/lib/bench-table.mjs'

describe('median', () => {
  it.each([
    [[5], 5],
    [[9, 1, 5], 5],
    [[4, 1, 3, 2], 2.5],
  ])('of %j is %d', (values, expected) => {
    expect(median(values)).toBe(expected)
  })
})

describe('tableLines', () => {
  it('compares each row with the first of its unit', () => {
    const lines = tableLines([
      { label: 'one op', value: 2, unit: 'ms' },
      { label: 'size', value: 500, unit: 'kB' },
      { label: 'ten ops', value: 5, unit: 'ms' },
    ])
    expect(lines[0]).not.toContain('×')
    expect(lines[1]).not.toContain('×')
    expect(lines[2]).toMatch(/ten ops +5\.00 ms +× 2\.50$/)
  })
})
