const HOUR_MS = 3_600_000

/** Typed so much later than seen that the reader should know. */
export const TYPED_LATER_HOURS = 12

/** "9 June, 07:40" in the reader's own order and the plant's own time zone; with the year when it is not this one. */
export function dayAndTime(iso: string, options: { timeZone?: string, now?: Date, locale?: string } = {}): string {
  const date = new Date(iso)
  const { timeZone, locale, now } = options
  const otherYear = now !== undefined && yearIn(date, timeZone) !== yearIn(now, timeZone)
  return new Intl.DateTimeFormat(locale, {
    day: 'numeric', month: 'long', hour: hourForm(locale), minute: '2-digit', timeZone, ...(otherYear ? { year: 'numeric' } : {}),
  }).format(date)
}

/** "07:40" where the day has 24 hours, "7:40 AM" where it has twice twelve. */
function hourForm(locale?: string): 'numeric' | '2-digit' {
  return new Intl.DateTimeFormat(locale, { hour: 'numeric' }).resolvedOptions().hour12 ? 'numeric' : '2-digit'
}

function yearIn(date: Date, timeZone?: string): string {
  return new Intl.DateTimeFormat('en', { year: 'numeric', timeZone }).format(date)
}

/** "9 June 2026" for a calendar day without a time. */
export function calendarDay(day: string, locale?: string): string {
  return new Intl.DateTimeFormat(locale, { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })
    .format(new Date(`${day}T00:00:00.000Z`))
}

/** "Tuesday 9 June" in the reader's own zone and order. */
export function weekdayAndDay(date: Date, locale?: string): string {
  return new Intl.DateTimeFormat(locale, { weekday: 'long', day: 'numeric', month: 'long' }).format(date)
}

/** "today", "yesterday", "4 days ago", "in 2 days". */
export function daysAgo(days: number): string {
  if (days === 0) return 'today'
  if (days === 1) return 'yesterday'
  if (days === -1) return 'tomorrow'
  return days > 0 ? `${days} days ago` : `in ${-days} days`
}

/** "just now", "5 minutes ago", "3 hours ago", then days. */
export function timeAgo(iso: string, now: Date): string {
  const minutes = Math.floor((now.getTime() - Date.parse(iso)) / 60_000)
  if (minutes < 1) return 'just now'
  if (minutes < 60) return minutes === 1 ? '1 minute ago' : `${minutes} minutes ago`
  const hours = Math.floor(minutes / 60)
  if (hours < 24) return hours === 1 ? '1 hour ago' : `${hours} hours ago`
  return daysAgo(Math.floor(hours / 24))
}

/** True when an entry was typed in long after the visit it tells of. */
export function typedInLater(occurredAt: string, recordedAt: string): boolean {
  return Date.parse(recordedAt) - Date.parse(occurredAt) > TYPED_LATER_HOURS * HOUR_MS
}

/** "Day 15"; days before set-up count down. */
export function dayWords(day: number | null): string {
  return day === null ? '' : `Day ${day < 0 ? `\u2212${-day}` : day}`
}
