import { describe, expect, it } from 'vitest'
import fc from 'fast-check'
import { asTyped, readTypedNumber, stepped } from '~/utils/words/typed-number'

describe('a typed number', () => {
  it.each([
    ['6.1', 6.1], ['6,1', 6.1], [' 26 ', 26], ['-2', -2], ['\u22122,5', -2.5], ['.5', 0.5], ['7.', 7], ['+3', 3], ['\u0666\u066B\u0661', 6.1], ['\u096C', 6],
  ])('reads %j as %d', (typed, value) => {
    expect(readTypedNumber(typed)).toBe(value)
  })

  it('is missing when nothing was typed', () => {
    expect(readTypedNumber('  ')).toBeNull()
  })

  it.each(['six', '6.1.2', '1,234.5', '-', '6 cm', '1e3', 'Infinity'])('is unreadable as %j', (typed) => {
    expect(readTypedNumber(typed)).toBe('unreadable')
  })

  it.each(['en', 'de', 'pt', 'fa', 'hi'])('comes back from the form it is shown in (%s)', (locale) => {
    fc.assert(fc.property(fc.integer({ min: -99_999, max: 99_999 }), (hundredths) => {
      expect(readTypedNumber(asTyped(hundredths / 100, 0, locale))).toBeCloseTo(hundredths / 100, 9)
    }))
  })

  it('shows the decimals it is asked for', () => {
    expect(asTyped(6, 1, 'en')).toBe('6.0')
    expect(asTyped(6.25, 1, 'de')).toBe('6,25')
    expect(asTyped(null, 1, 'en')).toBe('')
  })
})

describe('a stepper', () => {
  const rule = { step: 0.1, start: 6, min: 0, max: 14 }

  it('begins at its start', () => {
    expect(stepped(null, 1, rule)).toBe(6)
    expect(stepped(null, -1, rule)).toBe(6)
  })

  it('gives 6.2 after 6.1, not 6.199999', () => {
    expect(stepped(6.1, 1, rule)).toBe(6.2)
    expect(stepped(6.1, -1, rule)).toBe(6)
  })

  it('goes from a finer value to the next whole step', () => {
    expect(stepped(6.14, 1, rule)).toBe(6.2)
    expect(stepped(6.14, -1, rule)).toBe(6.1)
  })

  it('stays within its limits', () => {
    expect(stepped(14, 1, rule)).toBe(14)
    expect(stepped(0, -1, rule)).toBe(0)
  })

  it('undoes itself on whole steps', () => {
    fc.assert(fc.property(fc.integer({ min: 1, max: 139 }), (tenths) => {
      expect(stepped(stepped(tenths / 10, 1, rule), -1, rule)).toBeCloseTo(tenths / 10, 9)
    }))
  })
})
