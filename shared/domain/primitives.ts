import * as z from 'zod/mini'

/** Longest name of a plant, vessel, club or person, in characters. */
export const NAME_MAX = 80
/** Longest short text such as a cultivar, a place or an origin. */
export const SHORT_TEXT_MAX = 120
/** Longest note on an entry. */
export const NOTE_MAX = 10_000
/** First day that a record may name; earlier ones are a clock that lost its battery. */
export const EARLIEST_DAY = '1970-01-01'
/** Longest comment. */
export const COMMENT_MAX = 4_000

/**
 * Identifier of any record: a lower-case UUID. Made on the phone, so never a
 * secret and never an order. Version 8 is left out because MariaDB's UUID
 * columns refuse it (seen with 10.11).
 */
export const idSchema = z.string().check(
  z.regex(/^[0-9a-f]{8}-[0-9a-f]{4}-[1-7][0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/, 'is not a record id'),
)

/** A point in time as ISO 8601 in UTC with milliseconds, for example 2026-06-09T05:40:00.000Z. */
export const instantSchema = z.string().check(
  z.regex(/^\d{4}-\d\d-\d\dT\d\d:\d\d:\d\d\.\d{3}Z$/, 'is not a point in time'),
  z.refine(isInstant, 'is not a point in time'),
  z.refine(isSinceEarliest, 'is before 1970'),
)

/** Some engines read 30 February as a day of March; a time that does not come back as it went in is none. */
function isInstant(text: string): boolean {
  const time = Date.parse(text)
  return !Number.isNaN(time) && new Date(time).toISOString() === text
}

function isSinceEarliest(text: string): boolean {
  return text >= EARLIEST_DAY
}

/** A calendar day without a time, YYYY-MM-DD. */
export const calendarDaySchema = z.string().check(
  z.regex(/^\d{4}-\d\d-\d\d$/, 'is not a date'),
  z.refine(isCalendarDay, 'is not a day of the calendar'),
  z.refine(isSinceEarliest, 'is before 1970'),
)

function isCalendarDay(text: string): boolean {
  const time = Date.parse(`${text}T00:00:00.000Z`)
  return !Number.isNaN(time) && new Date(time).toISOString().startsWith(text)
}

/** SHA-256 as 64 lower-case hexadecimal digits. */
export const sha256Schema = z.string().check(z.regex(/^[0-9a-f]{64}$/, 'is not a SHA-256 checksum'))

/** An IANA time zone this machine knows, for example Europe/Lisbon. */
export const timeZoneSchema = z.string().check(
  z.maxLength(64, 'is too long'),
  z.refine(isTimeZone, 'is not a known time zone'),
)

function isTimeZone(text: string): boolean {
  try {
    return new Intl.DateTimeFormat('en', { timeZone: text }).resolvedOptions().timeZone.length > 0
  } catch {
    return false
  }
}

/** Text that must say something: trimmed length from 1 to `max`. */
export function requiredText(max: number) {
  return z.string().check(
    z.refine(text => text.trim().length > 0, 'is empty'),
    z.maxLength(max, `is longer than ${max} characters`),
  )
}

/** Text that may be missing. */
export function optionalText(max: number) {
  return z.nullable(z.string().check(z.maxLength(max, `is longer than ${max} characters`)))
}

/** A finite number from `min` to `max`, both included, that may be missing. */
export function optionalNumber(min: number, max: number) {
  return z.nullable(z.number('is not a number').check(
    z.gte(min, `is below ${min}`),
    z.lte(max, `is above ${max}`),
  ))
}

/** A whole number from `min` to `max`, both included, that may be missing. */
export function optionalCount(min: number, max: number) {
  return z.nullable(z.int('is not a whole number').check(
    z.gte(min, `is below ${min}`),
    z.lte(max, `is above ${max}`),
  ))
}
