import * as z from 'zod/mini'
import type { EntryAction } from '#shared/domain/entry.schema'
import { ENTRY_ACTIONS, READING_FIELD_NAMES, TOP_UP_KINDS } from '#shared/domain/entry.schema'
import { dayAndTime } from './moments'
import { ACTION_WORDS, TOP_UP_WORDS } from './names'
import { listed } from './entry'
import { number } from './numbers'
import { readingText } from './readings'

const actionsSchema = z.array(z.enum(ENTRY_ACTIONS))
const topUpSchema = z.enum(TOP_UP_KINDS)

/** A value of an entry's field as a person would say it. */
export function entryValueWords(field: string, value: unknown, options: { timeZone?: string, locale?: string } = {}): string {
  if (value === null || value === undefined || value === '') return 'nothing'
  if (typeof value === 'boolean') return value ? 'yes' : 'no'
  const reading = READING_FIELD_NAMES.find(name => name === field)
  if (typeof value === 'number') {
    return reading ? readingText(reading, value, options.locale) : number(value, 2, options.locale)
  }
  if (field === 'note') return `"${String(value)}"`
  if (field === 'actions') return actionWords(value)
  if (field === 'occurredAt' && typeof value === 'string') return dayAndTime(value, options)
  const kind = topUpSchema.safeParse(value)
  return field === 'topUpWith' && kind.success ? TOP_UP_WORDS[kind.data] : String(value)
}

function actionWords(value: unknown): string {
  const actions = actionsSchema.safeParse(value)
  const known: EntryAction[] = actions.success ? actions.data : []
  return known.length > 0 ? listed(known.map(action => ACTION_WORDS[action])) : 'nothing'
}
