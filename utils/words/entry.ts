import type { EntryAction, EntryFields } from '#shared/domain/entry.schema'
import { READING_FIELD_NAMES } from '#shared/domain/entry.schema'
import type { PhotoSubject } from '#shared/domain/photo.schema'
import { ACTION_WORDS, SUBJECT_WORDS, TOP_UP_WORDS } from './names'
import { counted, litres, number } from './numbers'

/** "Roots", "Roots and leaf", "Roots, leaf and fruit": the first word keeps its capital. */
export function listed(words: string[]): string {
  const rest = words.map((word, index) => index === 0 ? word : word.charAt(0).toLocaleLowerCase() + word.slice(1))
  if (rest.length < 2) return rest.join('')
  return `${rest.slice(0, -1).join(', ')} and ${rest.at(-1)}`
}

/** What an entry is called in one line: what was done, else what was seen. */
export function entryTitle(
  entry: Partial<EntryFields> & { actions: EntryAction[], lookedNoChange: boolean },
  subjects: readonly PhotoSubject[] = [],
): string {
  if (entry.actions.length > 0) return listed(entry.actions.map(action => ACTION_WORDS[action]))
  if (subjects.length > 0) return listed([...new Set(subjects)].map(subject => SUBJECT_WORDS[subject]))
  if (entry.lookedNoChange) return 'Looked, no change'
  if (READING_FIELD_NAMES.some(field => typeof entry[field] === 'number')) return 'Readings'
  return 'Note'
}

/** The amounts that belong to what was done, each as its own short sentence part. */
export function amountWords(entry: Partial<EntryFields>, locale?: string): string[] {
  const parts: string[] = []
  if (typeof entry.topUpLitres === 'number') {
    const what = entry.topUpWith ? ` ${TOP_UP_WORDS[entry.topUpWith].toLowerCase()}` : ''
    parts.push(`${litres(entry.topUpLitres, locale)}${what} added`)
  } else if (entry.topUpWith) parts.push(`topped up with ${TOP_UP_WORDS[entry.topUpWith].toLowerCase()}`)
  if (typeof entry.changeLitres === 'number') parts.push(`${litres(entry.changeLitres, locale)} new solution`)
  if (typeof entry.harvestGrams === 'number') parts.push(`${number(entry.harvestGrams, 0, locale)} g picked`)
  if (typeof entry.harvestCount === 'number') parts.push(`${counted(entry.harvestCount, 'piece', 'pieces', locale)} picked`)
  return parts
}
