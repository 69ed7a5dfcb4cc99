const MILLISECONDS_PER_DAY = 86_400_000

/** Making a formatter costs far more than using it, and a timeline asks hundreds of times for one zone. */
const formatters = new Map<string, Intl.DateTimeFormat>()

/**
 * The calendar day on which an instant falls in a zone, YYYY-MM-DD.
 *
 * @param instant ISO 8601 in UTC, for example 2026-06-09T05:40:00.000Z
 * @param timeZone IANA name, for example Europe/Lisbon
 * @throws RangeError when the instant or the zone cannot be read
 * @source common practice, no source
 */
export function localDay(instant: string, timeZone: string): string {
  // A text without a zone would be read in the zone of the machine.
  const milliseconds = /T.*(?:Z|[+-]\d\d:\d\d)$/.test(instant) ? Date.parse(instant) : Number.NaN
  if (Number.isNaN(milliseconds)) throw new RangeError('instant must be a point in time as ISO 8601')
  const parts = formatterOf(timeZone).formatToParts(milliseconds)
  const digits = (type: Intl.DateTimeFormatPartTypes) => parts.find(part => part.type === type)?.value ?? ''
  return `${digits('year').padStart(4, '0')}-${digits('month')}-${digits('day')}`
}

/**
 * Day of a plant's life on which an instant falls: calendar days in the plant's
 * own zone from the day it was set up, which is day 0; negative before it.
 * Days are counted by the calendar, never in spans of 24 hours, so the nights on
 * which clocks change count like any other.
 *
 * @param occurredAt ISO 8601 in UTC
 * @param setUpOn day 0 as YYYY-MM-DD
 * @param timeZone IANA name of the plant's zone
 * @throws RangeError when the instant, the day or the zone cannot be read
 * @source common practice, no source
 */
export function dayNumber(occurredAt: string, setUpOn: string, timeZone: string): number {
  return dayCount(localDay(occurredAt, timeZone)) - dayCount(setUpOn)
}

/** Calendar days since 1970-01-01. Both ends are read as UTC, where no day is shorter than another. */
function dayCount(day: string): number {
  const milliseconds = Date.parse(`${day}T00:00:00.000Z`)
  // 30 February would roll over into March.
  if (Number.isNaN(milliseconds) || !new Date(milliseconds).toISOString().startsWith(`${day}T`)) {
    throw new RangeError('setUpOn must be a day of the calendar as YYYY-MM-DD')
  }
  return milliseconds / MILLISECONDS_PER_DAY
}

function formatterOf(timeZone: string): Intl.DateTimeFormat {
  const known = formatters.get(timeZone)
  if (known) return known
  const formatter = new Intl.DateTimeFormat('en', {
    calendar: 'gregory', numberingSystem: 'latn', timeZone, year: 'numeric', month: '2-digit', day: '2-digit',
  })
  formatters.set(timeZone, formatter)
  return formatter
}
