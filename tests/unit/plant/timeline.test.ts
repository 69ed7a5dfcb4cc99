import { describe, expect, it } from 'vitest'
import type { Entry, EntryFields } from '#shared/domain/entry.schema'
import { emptyVesselFields } from '#shared/domain/vessel.schema'
import { validEntry } from '~/tests/support/valid-fields'
import { drinksPerDay } from '~/utils/plant/drinking'
import { dayPosition, groupByDay, latestLevel, latestReadings, railOf, refillLimitOf } from '~/utils/plant/timeline'

const plant = { setUpOn: '2026-06-01', timeZone: 'Europe/Lisbon' }
const bucket = {
  ...emptyVesselFields, name: 'Grey bucket', shape: 'round' as const, topLengthCm: 28.5, bottomLengthCm: 26, heightCm: 35.5, netCupDepthCm: 12,
}
let count = 0
function entry(occurredAt: string, fields: Partial<EntryFields> = {}): { id: string, data: Entry } {
  count += 1
  const id = `01970000-0000-7000-8000-${String(count).padStart(12, '0')}`
  return { id, data: { ...validEntry, id, authorId: id, occurredAt, recordedAt: occurredAt, ...fields } }
}
const newestFirst = (...entries: ReturnType<typeof entry>[]) => entries.sort((a, b) => b.data.occurredAt.localeCompare(a.data.occurredAt))

describe('entries by day', () => {
  it('are grouped by the plant’s own midnight, wherever the reader is', () => {
    const late = entry('2026-06-03T22:59:00.000Z')
    const next = entry('2026-06-03T23:01:00.000Z')
    const before = entry('2026-05-31T12:00:00.000Z')
    expect(groupByDay(newestFirst(late, next, before), plant).map(({ day, entries }) => [day, entries.map(one => one.id)]))
      .toEqual([[3, [next.id]], [2, [late.id]], [-1, [before.id]]])
    expect(groupByDay(newestFirst(late, next), { ...plant, timeZone: 'Asia/Tokyo' }).map(({ day }) => day)).toEqual([3])
  })

  it('keep the order of visits within a day, newest first', () => {
    const morning = entry('2026-06-02T07:00:00.000Z')
    const evening = entry('2026-06-02T19:00:00.000Z')
    expect(groupByDay(newestFirst(morning, evening), plant)[0]?.entries.map(one => one.id)).toEqual([evening.id, morning.id])
  })

  it('lie along the rail at their time of day', () => {
    expect(dayPosition(plant, '2026-06-02T11:00:00.000Z')).toBe(1.5)
  })
})

describe('what is known now', () => {
  const entries = newestFirst(
    entry('2026-06-02T10:00:00.000Z', { ph: 6.1, waterLevelCm: 20, waterCelsius: 21 }),
    entry('2026-06-05T10:00:00.000Z', { ph: 6.4 }),
    entry('2026-06-06T10:00:00.000Z', { airGapCm: 7.5 }),
    entry('2026-06-07T10:00:00.000Z', { lookedNoChange: true }),
  )

  it('is the newest value of each reading', () => {
    expect(latestReadings(entries).readings).toEqual({ ph: 6.4, waterLevelCm: 20, waterCelsius: 21, airGapCm: 7.5 })
    expect(latestReadings(entries).entry?.data.airGapCm).toBe(7.5)
    expect(latestReadings([])).toEqual({ readings: {}, entry: null })
  })

  it('takes a level from an air gap where the cup was measured, and only there', () => {
    expect(latestLevel(entries, bucket)?.levelCm).toBe(16)
    expect(latestLevel(entries, null)?.levelCm).toBe(20)
  })

  it('draws levels as readings and pourings as steps', () => {
    const poured = newestFirst(...entries, entry('2026-06-08T10:00:00.000Z', { actions: ['topped-up', 'pruned'], waterLevelCm: 17 }))
    const rail = railOf(poured, plant, bucket)
    expect(rail.readings.map(reading => reading.levelCm)).toEqual([20, 16, 17])
    expect(rail.steps.map(step => step.kind)).toEqual(['topped-up'])
    expect(rail.steps[0]?.day).toBe(rail.readings[2]?.day)
  })

  it('sets the refill limit 2 cm above the lowest level', () => {
    expect(refillLimitOf(entries, bucket, plant)).toBe(18)
    expect(refillLimitOf([], bucket, plant)).toBeNull()
  })

  it('counts of the day of set-up only how the vessel was left: a first filling may be put right', () => {
    const first = entries.toSorted((left, right) => left.data.occurredAt.localeCompare(right.data.occurredAt))[0]
    if (!first) throw new Error('the plant of this test has no entries')
    const setUpOn = first.data.occurredAt.slice(0, 10)
    const clock = { setUpOn, timeZone: 'UTC' }
    const cup = { ...bucket, netCupDepthCm: 5, heightCm: 36 }
    const visit = (time: string, waterLevelCm: number) => entry(`${setUpOn}T${time}:00.000Z`, { waterLevelCm })
    const later = entry(new Date(Date.parse(`${setUpOn}T12:00:00.000Z`) + 86_400_000).toISOString(), { waterLevelCm: 29 })
    expect(refillLimitOf([visit('08:00', 20), visit('09:00', 31), later], cup, clock)).toBe(31)
    expect(refillLimitOf([visit('08:00', 31), later, entry(later.data.occurredAt.replace('T12', 'T14'), { waterLevelCm: 20 })], cup, clock)).toBe(22)
  })
})

describe('what a plant drinks', () => {
  it('is counted from the last time water came in', () => {
    const entries = newestFirst(
      entry('2026-06-01T10:00:00.000Z', { waterLevelCm: 10 }),
      entry('2026-06-02T10:00:00.000Z', { waterLevelCm: 23, actions: ['topped-up'] }),
      entry('2026-06-06T10:00:00.000Z', { waterLevelCm: 19 }),
    )
    // A frustum between 19 and 23 cm of this bucket, about 27.5 cm wide, holds 4 * pi * 27.5^2 / 4 cm3 = 2.4 L.
    expect(drinksPerDay(entries, bucket)).toBeCloseTo(0.59, 1)
  })

  it('is not guessed from too short a time, a rising level or an unmeasured vessel', () => {
    const short = newestFirst(entry('2026-06-02T10:00:00.000Z', { waterLevelCm: 20 }), entry('2026-06-03T10:00:00.000Z', { waterLevelCm: 19 }))
    const rising = newestFirst(entry('2026-06-02T10:00:00.000Z', { waterLevelCm: 18 }), entry('2026-06-07T10:00:00.000Z', { waterLevelCm: 19 }))
    expect([drinksPerDay(short, bucket), drinksPerDay(rising, bucket), drinksPerDay(short, null), drinksPerDay([], bucket)]).toEqual([null, null, null, null])
  })
})
