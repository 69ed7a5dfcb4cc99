const MINUTE = 60_000
const DAY = 24 * 60 * MINUTE

/** The calendar day that lies `days` before `now` in a time zone, YYYY-MM-DD. */
export function dayBefore(now: Date, days: number, timeZone: string): string {
  const today = new Intl.DateTimeFormat('en-CA', { timeZone, dateStyle: 'short' }).format(now)
  return new Date(Date.parse(`${today}T12:00:00.000Z`) - days * DAY).toISOString().slice(0, 10)
}

export function dayAfter(day: string, days: number): string {
  return new Date(Date.parse(`${day}T12:00:00.000Z`) + days * DAY).toISOString().slice(0, 10)
}

/** The instant at which clocks in a zone show this day and time. Clocks that skip it show the time after. */
export function instantAt(day: string, time: string, timeZone: string): Date {
  const wanted = Date.parse(`${day}T${time}:00.000Z`)
  const guess = new Date(wanted - offsetAt(new Date(wanted), timeZone))
  return new Date(wanted - offsetAt(guess, timeZone))
}

/** How far the zone's clocks are ahead of UTC, ms. */
function offsetAt(instant: Date, timeZone: string): number {
  const parts = new Intl.DateTimeFormat('en', {
    timeZone, hourCycle: 'h23', year: 'numeric', month: '2-digit', day: '2-digit', hour: '2-digit', minute: '2-digit', second: '2-digit',
  }).formatToParts(instant)
  const part = (type: string) => Number(parts.find(piece => piece.type === type)?.value)
  const shown = Date.UTC(part('year'), part('month') - 1, part('day'), part('hour'), part('minute'), part('second'))
  return shown - Math.floor(instant.getTime() / 1_000) * 1_000
}
