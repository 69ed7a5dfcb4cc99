import { describe, expect, it } from 'vitest'
import {
  calendarDaySchema, idSchema, instantSchema, optionalCount, optionalNumber, optionalText, requiredText, sha256Schema, timeZoneSchema,
} from '#shared/domain/primitives'
import { accepts } from '~/tests/support/schema-checks'

describe('idSchema', () => {
  const id = '01970000-0000-7000-8000-000000000001'

  it('takes a lower-case UUID', () => {
    expect(accepts(idSchema, id)).toBe(true)
  })

  it.each([
    id.toUpperCase().replace('01970000', 'ABCDEF00'), ` ${id}`, `${id}\n`, id.replaceAll('-', ''), `{${id}}`, '', '1', null, 7,
    '01970000-0000-7000-c000-000000000001', '01970000-0000-0000-8000-000000000001', '../../etc/passwd',
  ])('refuses %j', (value) => {
    expect(accepts(idSchema, value)).toBe(false)
  })
})

describe('instantSchema', () => {
  it.each(['2026-06-09T05:40:00.000Z', '2024-02-29T23:59:59.999Z', '1970-01-01T00:00:00.000Z'])('takes %s', (text) => {
    expect(accepts(instantSchema, text)).toBe(true)
  })

  it.each([
    '2026-06-09', '2026-06-09T05:40:00Z', '2026-06-09T05:40:00.000', '2026-06-09T05:40:00.000+01:00', '2026-13-09T05:40:00.000Z',
    '2026-06-09T25:40:00.000Z', '2026-06-09 05:40:00.000Z', '+012026-06-09T05:40:00.000Z', 'now', '', '1969-12-31T23:59:59.999Z', 1_781_000_000_000,
  ])('refuses %j', (value) => {
    expect(accepts(instantSchema, value)).toBe(false)
  })

  // The engine reads both as a moment of the next day or month: another visit than the one that was sent.
  it.each(['2026-02-30T05:40:00.000Z', '2026-06-09T24:00:00.000Z'])('refuses %s, which the calendar does not have', (text) => {
    expect(accepts(instantSchema, text)).toBe(false)
  })
})

describe('calendarDaySchema', () => {
  it.each(['2026-06-09', '2024-02-29', '2000-02-29', '1970-01-01'])('takes %s', (text) => {
    expect(accepts(calendarDaySchema, text)).toBe(true)
  })

  it.each([
    '2026-02-30', '2026-02-29', '1900-02-29', '2026-04-31', '2026-13-01', '2026-00-10', '2026-06-00', '2026-6-9', '09.06.2026', '', 'today', '1969-12-31',
  ])('refuses %j', (value) => {
    expect(accepts(calendarDaySchema, value)).toBe(false)
  })
})

describe('timeZoneSchema', () => {
  it.each(['Europe/Lisbon', 'UTC', 'America/Argentina/Buenos_Aires'])('takes %s', (text) => {
    expect(accepts(timeZoneSchema, text)).toBe(true)
  })

  it.each(['', 'Mars/Olympus', 'GMT+2', `Europe/${'L'.repeat(80)}`, null])('refuses %j', (value) => {
    expect(accepts(timeZoneSchema, value)).toBe(false)
  })
})

describe('sha256Schema', () => {
  it('takes 64 lower-case hexadecimal digits and nothing else', () => {
    expect(accepts(sha256Schema, '0f'.repeat(32))).toBe(true)
    for (const wrong of ['0F'.repeat(32), '0f'.repeat(31), `${'0f'.repeat(32)}0`, 'xy'.repeat(32), '']) {
      expect(accepts(sha256Schema, wrong)).toBe(false)
    }
  })
})

describe('texts', () => {
  it('must say something where they are required', () => {
    for (const empty of ['', '   ', '\n\t', '\u00a0']) expect(accepts(requiredText(5), empty)).toBe(false)
    expect(accepts(requiredText(5), null)).toBe(false)
    expect(accepts(requiredText(5), 'a')).toBe(true)
  })

  it('end at their limit', () => {
    for (const schema of [requiredText(5), optionalText(5)]) {
      expect(accepts(schema, 'abcde')).toBe(true)
      expect(accepts(schema, 'abcdef')).toBe(false)
    }
  })

  // MariaDB counts a column's characters the same way, so what a form takes fits the column.
  it('count an emoji as one character, as the column does', () => {
    expect(accepts(optionalText(3), '🌶🌱🪣')).toBe(true)
    expect(accepts(optionalText(3), '🌶🌱🪣🌿')).toBe(false)
  })

  it('may be missing or empty where they are optional, never another kind of value', () => {
    expect(accepts(optionalText(5), null)).toBe(true)
    expect(accepts(optionalText(5), '')).toBe(true)
    for (const wrong of [undefined, 5, [], {}]) expect(accepts(optionalText(5), wrong)).toBe(false)
  })
})

describe('numbers', () => {
  it('take both ends and nothing beyond', () => {
    const schema = optionalNumber(-5, 60)
    for (const right of [-5, 0, 60, 59.999, null]) expect(accepts(schema, right)).toBe(true)
    for (const wrong of [-5.001, 60.001, Number.NaN, Number.POSITIVE_INFINITY, Number.NEGATIVE_INFINITY, '6', true, undefined]) {
      expect(accepts(schema, wrong)).toBe(false)
    }
  })

  it('are whole where they count', () => {
    const schema = optionalCount(1, 200)
    for (const right of [1, 200, null]) expect(accepts(schema, right)).toBe(true)
    for (const wrong of [0, 201, 1.5, Number.NaN, '1']) expect(accepts(schema, wrong)).toBe(false)
  })
})
