import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { dayAfter, dayBefore, instantAt } from '#server/demo/local-time'

describe('instantAt', () => {
  // Offsets by the IANA time zone database: Lisbon is at UTC+0 in winter and UTC+1 in summer, Kathmandu at UTC+5:45.
  it.each([
    ['2026-01-15', '07:40', 'Europe/Lisbon', '2026-01-15T07:40:00.000Z'],
    ['2026-06-15', '07:40', 'Europe/Lisbon', '2026-06-15T06:40:00.000Z'],
    ['2026-06-15', '07:40', 'Asia/Kathmandu', '2026-06-15T01:55:00.000Z'],
    ['2026-03-29', '12:00', 'Europe/Lisbon', '2026-03-29T11:00:00.000Z'],
    ['2026-10-25', '12:00', 'Europe/Lisbon', '2026-10-25T12:00:00.000Z'],
  ])('%s %s in %s is %s', (day, time, zone, instant) => {
    expect(instantAt(day, time, zone).toISOString()).toBe(instant)
  })
})

describe('days', () => {
  it('are counted in the zone, not in UTC', () => {
    expect(dayBefore(new Date('2026-06-09T23:30:00.000Z'), 0, 'Europe/Lisbon')).toBe('2026-06-10')
    expect(dayBefore(new Date('2026-06-09T23:30:00.000Z'), 10, 'UTC')).toBe('2026-05-30')
  })

  it('go forth and back over leap days and summer time', () => {
    fc.assert(fc.property(fc.integer({ min: 0, max: 400 }), (days) => {
      expect(dayAfter(dayAfter('2028-02-20', days), -days)).toBe('2028-02-20')
    }))
  })
})
