import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { idSchema } from '#shared/domain/primitives'
import { uuidV7 } from '#shared/utils/uuid'

const TIME_MAX = 2 ** 48 - 1
const anyTime = fc.integer({ min: 0, max: TIME_MAX })
const anyBytes = fc.uint8Array({ minLength: 16, maxLength: 16 })

describe('uuidV7', () => {
  it('builds the example of RFC 9562, appendix A.6', () => {
    // unix_ts_ms 0x017F22E279B0 (22 February 2022, 14:22:22 at UTC−5), rand_a 0xCC3, rand_b 0x18C4DC0C0C07398F.
    const random = Uint8Array.from([0, 0, 0, 0, 0, 0, 0x0c, 0xc3, 0x18, 0xc4, 0xdc, 0x0c, 0x0c, 0x07, 0x39, 0x8f])
    expect(uuidV7(Date.UTC(2022, 1, 22, 19, 22, 22), random)).toBe('017f22e2-79b0-7cc3-98c4-dc0c0c07398f')
  })

  it('takes the first and the last time it can hold', () => {
    expect(uuidV7(0, new Uint8Array(16))).toBe('00000000-0000-7000-8000-000000000000')
    expect(uuidV7(TIME_MAX, new Uint8Array(16).fill(255))).toBe('ffffffff-ffff-7fff-bfff-ffffffffffff')
  })

  it.each([-1, TIME_MAX + 1, 0.5, Number.NaN, Number.POSITIVE_INFINITY])('refuses the time %d', (time) => {
    expect(() => uuidV7(time, new Uint8Array(16))).toThrow(RangeError)
  })

  it.each([0, 15, 17])('refuses %d random bytes', (length) => {
    expect(() => uuidV7(0, new Uint8Array(length))).toThrow(RangeError)
  })

  it('is always a record id', () => {
    fc.assert(fc.property(anyTime, anyBytes, (time, random) => {
      expect(idSchema.safeParse(uuidV7(time, random)).success).toBe(true)
    }))
  })

  it('leaves the random bytes it was given as they were', () => {
    const random = new Uint8Array(16).fill(255)
    uuidV7(1, random)
    expect([...random]).toEqual(new Array(16).fill(255))
  })

  it('sorts by time', () => {
    fc.assert(fc.property(anyTime, anyTime, anyBytes, anyBytes, (one, other, random, more) => {
      fc.pre(one < other)
      expect(uuidV7(one, random) < uuidV7(other, more)).toBe(true)
    }))
  })

  it('differs when any of the 74 random bits differs', () => {
    fc.assert(fc.property(anyTime, anyBytes, fc.integer({ min: 9, max: 15 }), fc.integer({ min: 0, max: 7 }), (time, random, byte, bit) => {
      const other = random.map((value, index) => index === byte ? value ^ (1 << bit) : value)
      expect(uuidV7(time, other)).not.toBe(uuidV7(time, random))
    }))
  })
})
