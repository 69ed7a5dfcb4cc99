import { READING_FIELD_NAMES } from '#shared/domain/entry.schema'
import { READING_WORDS } from '~/utils/words/readings'

const FIELD_WORDS: Record<string, string> = {
  occurredAt: 'Day and time of the visit',
  note: 'Note',
  actions: 'What was done',
  topUpLitres: 'How much was added',
  topUpWith: 'Of what',
  changeLitres: 'How much new solution',
  harvestGrams: 'Weight picked',
  harvestCount: 'Pieces picked',
  lookedNoChange: 'Looked, no change',
}

/** What a field of an entry is called on the screen. */
export function entryFieldName(path: string): string {
  const reading = READING_FIELD_NAMES.find(field => field === path)
  return reading ? READING_WORDS[reading].label : FIELD_WORDS[path] ?? 'Something'
}

/** "pH is above 14." */
export function issueSentence(path: string, message: string): string {
  return `${entryFieldName(path)} ${message}.`
}
