import { describe, expect, it } from 'vitest'
import { atMost } from '#server/utils/at-most'

/** Work that ends when the test says so. */
function held() {
  let release = () => {}
  const gate = new Promise<void>(resolve => release = resolve)
  return { gate, release }
}

describe('atMost', () => {
  it('starts no more than its limit, and the next as soon as one ends, in order', async () => {
    const inTurn = atMost(2)
    const begun: number[] = []
    const works = [held(), held(), held(), held()]
    const all = works.map((work, index) => inTurn(async () => {
      begun.push(index)
      await work.gate
    }))
    await Promise.resolve()
    expect(begun).toEqual([0, 1])
    works[1]?.release()
    await all[1]
    await Promise.resolve()
    expect(begun).toEqual([0, 1, 2])
    works.forEach(work => work.release())
    await Promise.all(all)
    expect(begun).toEqual([0, 1, 2, 3])
  })

  it('gives its place back when work fails', async () => {
    const inTurn = atMost(1)
    await expect(inTurn(async () => Promise.reject(new Error('no')))).rejects.toThrow('no')
    expect(await inTurn(async () => 'yes')).toBe('yes')
  })
})
