import { describe, expect, it } from 'vitest'
import { instantOf, localTime, shareOfDay } from '~/utils/plant/zoned-time'

describe('the clock beside a plant', () => {
  it.each([
    ['2026-06-09T05:40:00.000Z', 'Europe/Lisbon', '2026-06-09T06:40'],
    ['2026-01-09T05:40:00.000Z', 'Europe/Lisbon', '2026-01-09T05:40'],
    ['2026-06-09T23:10:00.000Z', 'Pacific/Auckland', '2026-06-10T11:10'],
    ['2026-06-09T18:20:00.000Z', 'Asia/Kathmandu', '2026-06-10T00:05'],
  ])('shows %s in %s as %s', (instant, timeZone, local) => {
    expect(localTime(instant, timeZone)).toBe(local)
    expect(instantOf(local, timeZone)).toBe(instant)
  })

  it('takes a time that the clocks skip as if they had not been put forward', () => {
    // Lisbon, 29 March 2026: 01:00 becomes 02:00.
    expect(instantOf('2026-03-29T01:30', 'Europe/Lisbon')).toBe('2026-03-29T01:30:00.000Z')
    expect(instantOf('2026-03-29T02:30', 'Europe/Lisbon')).toBe('2026-03-29T01:30:00.000Z')
  })

  it('takes the first of a time that comes twice', () => {
    // Lisbon, 25 October 2026: 02:00 becomes 01:00.
    expect(instantOf('2026-10-25T01:30', 'Europe/Lisbon')).toBe('2026-10-25T00:30:00.000Z')
  })

  it('says so when it is no time', () => {
    expect(['', '2026-06-09', 'soon', '2026-13-09T10:00'].map(text => instantOf(text, 'UTC'))).toEqual([null, null, null, null])
  })

  it('tells how much of the local day has passed', () => {
    expect(shareOfDay('2026-06-09T05:00:00.000Z', 'Europe/Lisbon')).toBe(0.25)
    expect(shareOfDay('2026-06-09T23:00:00.000Z', 'Europe/Lisbon')).toBe(0)
  })
})
