import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dayNumber, localDay } from '#shared/science/time/day-number'

// Offsets and dates of clock changes: IANA time zone database. Local times below are written beside each instant.
describe('localDay', () => {
  it.each([
    ['2026-06-09T05:40:00.000Z', 'Europe/Lisbon', '2026-06-09'], // 06:40
    ['2026-06-09T23:30:00.000Z', 'Europe/Lisbon', '2026-06-10'], // 00:30 the next day, summer time
    ['2026-01-09T23:30:00.000Z', 'Europe/Lisbon', '2026-01-09'], // 23:30, winter time
    ['2026-06-09T05:40:00.000Z', 'America/Los_Angeles', '2026-06-08'], // 22:40 the day before
    ['2026-06-09T10:00:00.000Z', 'Pacific/Kiritimati', '2026-06-10'], // 00:00, UTC+14
    ['2026-06-09T18:15:00.000Z', 'Asia/Kathmandu', '2026-06-10'], // 00:00, UTC+5:45
    ['2024-02-29T12:00:00.000Z', 'UTC', '2024-02-29'],
  ])('of %s in %s is %s', (instant, zone, day) => {
    expect(localDay(instant, zone)).toBe(day)
  })

  it('refuses an unreadable instant, one without a zone, and an unknown zone', () => {
    expect(() => localDay('soon', 'UTC')).toThrow(RangeError)
    expect(() => localDay('2026-06-09T05:40:00.000', 'UTC')).toThrow(RangeError)
    expect(() => localDay('2026-06-09T05:40:00.000Z', 'Mars/Olympus')).toThrow(RangeError)
  })
})

describe('dayNumber', () => {
  it('is 0 from the first to the last minute of the day of set-up', () => {
    // Lisbon in summer is UTC+1.
    expect(dayNumber('2026-06-08T23:00:00.000Z', '2026-06-09', 'Europe/Lisbon')).toBe(0)
    expect(dayNumber('2026-06-09T22:59:59.999Z', '2026-06-09', 'Europe/Lisbon')).toBe(0)
    expect(dayNumber('2026-06-09T23:00:00.000Z', '2026-06-09', 'Europe/Lisbon')).toBe(1)
  })

  it('is negative before set-up', () => {
    expect(dayNumber('2026-06-08T12:00:00.000Z', '2026-06-09', 'Europe/Lisbon')).toBe(-1)
    expect(dayNumber('2026-05-09T12:00:00.000Z', '2026-06-09', 'Europe/Lisbon')).toBe(-31)
  })

  it('counts the day of 23 hours as one day', () => {
    // Berlin, 29 March 2026: from 01:59 winter time to 03:00 summer time.
    expect(dayNumber('2026-03-28T23:30:00.000Z', '2026-03-28', 'Europe/Berlin')).toBe(1) // 29 March 00:30
    expect(dayNumber('2026-03-29T21:30:00.000Z', '2026-03-28', 'Europe/Berlin')).toBe(1) // 29 March 23:30
    expect(dayNumber('2026-03-29T22:30:00.000Z', '2026-03-28', 'Europe/Berlin')).toBe(2) // 30 March 00:30
  })

  it('counts the day of 25 hours as one day', () => {
    // New York, 1 November 2026: from 01:59 summer time back to 01:00 winter time.
    expect(dayNumber('2026-11-01T04:30:00.000Z', '2026-10-31', 'America/New_York')).toBe(1) // 1 November 00:30
    expect(dayNumber('2026-11-02T04:30:00.000Z', '2026-10-31', 'America/New_York')).toBe(1) // 1 November 23:30
    expect(dayNumber('2026-11-02T05:30:00.000Z', '2026-10-31', 'America/New_York')).toBe(2) // 2 November 00:30
  })

  it('crosses a leap day and a century', () => {
    expect(dayNumber('2024-03-01T12:00:00.000Z', '2024-02-28', 'UTC')).toBe(2)
    expect(dayNumber('2026-03-01T12:00:00.000Z', '2026-02-28', 'UTC')).toBe(1)
    expect(dayNumber('2000-01-01T12:00:00.000Z', '1999-12-31', 'UTC')).toBe(1)
  })

  it('follows the calendar where a day was left out', () => {
    // Apia had no 30 December 2011: it moved across the date line.
    expect(localDay('2011-12-30T09:30:00.000Z', 'Pacific/Apia')).toBe('2011-12-29')
    expect(localDay('2011-12-30T10:30:00.000Z', 'Pacific/Apia')).toBe('2011-12-31')
    expect(dayNumber('2011-12-30T10:30:00.000Z', '2011-12-29', 'Pacific/Apia')).toBe(2)
  })

  it.each(['2026-02-30', '2026-2-3', '', 'yesterday', '2026-06-09T00:00'])('refuses "%s" as day of set-up', (day) => {
    expect(() => dayNumber('2026-06-09T12:00:00.000Z', day, 'UTC')).toThrow(/setUpOn/)
  })

  const zone = fc.constantFrom('Europe/Lisbon', 'America/New_York', 'Asia/Kathmandu', 'Australia/Lord_Howe', 'Pacific/Kiritimati')
  const instant = fc.integer({ min: Date.UTC(2015, 0, 1), max: Date.UTC(2035, 0, 1) })

  it('never falls as time goes on', () => {
    fc.assert(fc.property(instant, instant, zone, (one, other, timeZone) => {
      const numbers = [Math.min(one, other), Math.max(one, other)]
        .map(time => dayNumber(new Date(time).toISOString(), '2025-01-01', timeZone))
      expect(numbers[0]).toBeLessThanOrEqual(numbers[1] ?? Number.NaN)
    }))
  })

  it('is a whole number, 0 on the day that the instant falls on', () => {
    fc.assert(fc.property(instant, zone, (time, timeZone) => {
      const text = new Date(time).toISOString()
      expect(dayNumber(text, localDay(text, timeZone), timeZone)).toBe(0)
      expect(Number.isInteger(dayNumber(text, '2025-01-01', timeZone))).toBe(true)
    }))
  })
})
