/**
 * Clock times in a plant's own zone, as a date field of the browser writes
 * them: YYYY-MM-DDTHH:MM without a zone.
 */
const formatters = new Map<string, Intl.DateTimeFormat>()

function formatterOf(timeZone: string): Intl.DateTimeFormat {
  const known = formatters.get(timeZone)
  if (known) return known
  const made = new Intl.DateTimeFormat('en', {
    calendar: 'gregory', numberingSystem: 'latn', hourCycle: 'h23', timeZone,
    year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit',
  })
  formatters.set(timeZone, made)
  return made
}

/** What the clock beside the plant shows at an instant. */
export function localTime(instant: string | number, timeZone: string): string {
  const parts = formatterOf(timeZone).formatToParts(typeof instant === 'number' ? instant : Date.parse(instant))
  const of = (type: Intl.DateTimeFormatPartTypes) => parts.find(part => part.type === type)?.value ?? ''
  return `${of('year').padStart(4, '0')}-${of('month')}-${of('day')}T${of('hour')}:${of('minute')}`
}

/** The part of the local day that has passed at an instant, from 0 up to, not including, 1. */
export function shareOfDay(instant: string | number, timeZone: string): number {
  const [hours, minutes] = localTime(instant, timeZone).slice(11).split(':').map(Number)
  return ((hours ?? 0) * 60 + (minutes ?? 0)) / 1_440
}

/**
 * The instant at which the clock beside the plant shows a time. A time that the
 * clocks skip in spring is taken as if they had not been put forward; of a time
 * that comes twice in autumn the first is taken. Null when it is no time.
 */
export function instantOf(local: string, timeZone: string): string | null {
  if (!/^\d{4}-\d\d-\d\dT\d\d:\d\d$/.test(local)) return null
  const wanted = Date.parse(`${local}:00.000Z`)
  if (Number.isNaN(wanted)) return null
  const offsetAt = (at: number): number => Date.parse(`${localTime(at, timeZone)}:00.000Z`) - Math.floor(at / 60_000) * 60_000
  // No zone is more than a day from UTC and no clock is changed twice within two days.
  const before = offsetAt(wanted - 86_400_000)
  const after = offsetAt(wanted + 86_400_000)
  const hits = [before, after].map(offset => wanted - offset).filter(at => localTime(at, timeZone) === local)
  return new Date(hits.length > 0 ? Math.min(...hits) : wanted - before).toISOString()
}
