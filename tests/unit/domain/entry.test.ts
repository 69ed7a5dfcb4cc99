import { describe, expect, it } from 'vitest'
import {
  ENTRY_ACTIONS, entryFieldsSchema, entryPatchSchema, FUTURE_TOLERANCE_MINUTES, liesInFuture, READING_FIELD_NAMES, readingFields,
} from '#shared/domain/entry.schema'
import { accepts, wrongPaths } from '~/tests/support/schema-checks'
import { validEntry } from '~/tests/support/valid-fields'

/** Lowest and highest of each number of an entry, as the journal promises them. */
const limits: [field: string, min: number, max: number][] = [
  ['ph', 0, 14],
  ['ecMilliSiemensPerCm', 0, 60],
  ['waterLevelCm', 0, 500],
  ['airGapCm', 0, 500],
  ['waterCelsius', -5, 60],
  ['airCelsius', -50, 70],
  ['relativeHumidityPercent', 0, 100],
  ['topUpLitres', 0, 5_000],
  ['changeLitres', 0, 5_000],
  ['harvestGrams', 0, 1_000_000],
]

describe('numbers of an entry', () => {
  it.each(limits)('%s goes from %d to %d', (field, min, max) => {
    for (const right of [min, max, (min + max) / 2, null]) expect(wrongPaths(entryFieldsSchema, { ...validEntry, [field]: right })).toEqual([])
    for (const wrong of [min - 0.01, max + 0.01, Number.NaN, Number.POSITIVE_INFINITY, String(max)]) {
      expect(wrongPaths(entryFieldsSchema, { ...validEntry, [field]: wrong })).toEqual([field])
    }
  })

  it('refuses pH 15 and a strength of −1', () => {
    expect(wrongPaths(entryFieldsSchema, { ...validEntry, ph: 15, ecMilliSiemensPerCm: -1 }))
      .toEqual(['ph', 'ecMilliSiemensPerCm'])
  })

  it('counts fruit in whole ones, to 100,000', () => {
    expect(accepts(entryFieldsSchema, { ...validEntry, harvestCount: 100_000 })).toBe(true)
    for (const wrong of [-1, 2.5, 100_001]) expect(wrongPaths(entryFieldsSchema, { ...validEntry, harvestCount: wrong })).toEqual(['harvestCount'])
  })

  it('lists every reading by name', () => {
    expect(Object.keys(readingFields).toSorted()).toEqual(READING_FIELD_NAMES.toSorted())
  })
})

describe('note of an entry', () => {
  it('holds 10,000 characters and not one more', () => {
    expect(accepts(entryFieldsSchema, { ...validEntry, note: 'a'.repeat(10_000) })).toBe(true)
    expect(wrongPaths(entryFieldsSchema, { ...validEntry, note: 'a'.repeat(10_001) })).toEqual(['note'])
    expect(wrongPaths(entryFieldsSchema, { ...validEntry, note: 'a'.repeat(100_000) })).toEqual(['note'])
  })

  it.each([
    ['emoji', 'Roots 🌱👩🏽‍🌾🪣 white again'],
    ['right-to-left text', 'الجذور بيضاء اليوم — \u2067pH 5.8\u2069'],
    ['letters made of two marks', 'cafe\u0301 e\u0301 n\u0303'],
    ['spaces and lines', '  first line\n\n\tsecond  \r\n'],
    ['markup', '<img src=x onerror=alert(1)> & "quotes" \\ %00'],
    ['half a pair', '\ud83c'],
  ])('keeps %s to the last unit', (_what, note) => {
    const parsed = entryFieldsSchema.safeParse({ ...validEntry, note })
    expect(parsed.success && parsed.data.note).toBe(note)
  })
})

describe('actions of an entry', () => {
  it('takes all of them and none', () => {
    expect(accepts(entryFieldsSchema, { ...validEntry, actions: [...ENTRY_ACTIONS] })).toBe(true)
    expect(accepts(entryFieldsSchema, { ...validEntry, actions: [] })).toBe(true)
  })

  it('refuses one it does not know', () => {
    expect(wrongPaths(entryFieldsSchema, { ...validEntry, actions: ['swirled', 'danced'] })).toEqual(['actions.1'])
  })

  it('refuses one twice, because they are a set', () => {
    expect(wrongPaths(entryFieldsSchema, { ...validEntry, actions: ['pruned', 'pruned'] })).toEqual(['actions'])
    expect(wrongPaths(entryFieldsSchema, { ...validEntry, actions: [...ENTRY_ACTIONS, 'pruned'] })).toEqual(['actions'])
  })
})

describe('shape of an entry', () => {
  it('needs every field', () => {
    for (const field of Object.keys(validEntry)) {
      const rest = Object.fromEntries(Object.entries(validEntry).filter(([name]) => name !== field))
      expect(wrongPaths(entryFieldsSchema, rest), field).toEqual([field])
    }
  })

  it('takes no field it does not know', () => {
    expect(accepts(entryFieldsSchema, { ...validEntry, ownerId: validEntry.plantId })).toBe(false)
  })

  it.each([null, undefined, [], 'entry', 7])('refuses %j', (value) => {
    expect(accepts(entryFieldsSchema, value)).toBe(false)
  })

  it('refuses a visit on 30 February', () => {
    expect(wrongPaths(entryFieldsSchema, { ...validEntry, occurredAt: '2026-02-30T05:40:00.000Z' })).toEqual(['occurredAt'])
  })
})

describe('patch of an entry', () => {
  it('takes any part, even none', () => {
    expect(accepts(entryPatchSchema, {})).toBe(true)
    expect(accepts(entryPatchSchema, { ph: 5.9 })).toBe(true)
  })

  it('never moves an entry to another plant nor rewrites when it was typed', () => {
    expect(accepts(entryPatchSchema, { plantId: validEntry.plantId })).toBe(false)
    expect(accepts(entryPatchSchema, { recordedAt: validEntry.recordedAt })).toBe(false)
  })

  it('keeps the limits', () => {
    expect(wrongPaths(entryPatchSchema, { ph: 14.1 })).toEqual(['ph'])
  })
})

describe('liesInFuture', () => {
  const now = Date.UTC(2026, 5, 9, 12)
  const ahead = (milliseconds: number) => new Date(now + milliseconds).toISOString()

  it('bears a clock up to a day ahead', () => {
    expect(FUTURE_TOLERANCE_MINUTES).toBe(24 * 60)
    expect(liesInFuture(ahead(0), now)).toBe(false)
    expect(liesInFuture(ahead(86_400_000), now)).toBe(false)
    expect(liesInFuture(ahead(86_400_001), now)).toBe(true)
  })
})
