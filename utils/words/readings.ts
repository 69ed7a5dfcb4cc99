import type { EntryFields, ReadingField } from '#shared/domain/entry.schema'
import { READING_FIELD_NAMES } from '#shared/domain/entry.schema'
import type { Tone, Verdict } from '~/types/ui'
import { fixed, number } from './numbers'

export type Readings = Pick<EntryFields, ReadingField>
export type Verdicts = Partial<Record<ReadingField, Verdict>>

type FieldWords = { label: string, unit: string, short: (value: string) => string, decimals: number, step: number }

/** How each reading is asked for and told. `short` is its form on a chip. */
export const READING_WORDS: Record<ReadingField, FieldWords> = {
  ph: { label: 'pH', unit: '', short: value => `pH ${value}`, decimals: 1, step: 0.1 },
  ecMilliSiemensPerCm: { label: 'Strength (EC)', unit: 'mS/cm', short: value => `EC ${value}`, decimals: 1, step: 0.1 },
  waterLevelCm: { label: 'Water level', unit: 'cm', short: value => `level ${value} cm`, decimals: 1, step: 0.5 },
  airGapCm: { label: 'Air gap', unit: 'cm', short: value => `air gap ${value} cm`, decimals: 1, step: 0.5 },
  waterCelsius: { label: 'Water temperature', unit: '°C', short: value => `water ${value} °C`, decimals: 0, step: 1 },
  airCelsius: { label: 'Air temperature', unit: '°C', short: value => `air ${value} °C`, decimals: 0, step: 1 },
  relativeHumidityPercent: { label: 'Humidity', unit: '%', short: value => `humidity ${value} %`, decimals: 0, step: 1 },
}

/** A reading with the decimals it is usually read to, and more where it was read finer. */
function readingNumber(field: ReadingField, value: number, locale?: string): string {
  const { decimals } = READING_WORDS[field]
  const usual = Number(value.toFixed(decimals)) === value
  if (field === 'ph' || field === 'ecMilliSiemensPerCm') return usual ? fixed(value, decimals, locale) : number(value, 2, locale)
  return number(value, usual ? decimals : 2, locale)
}

export function readingText(field: ReadingField, value: number, locale?: string): string {
  return READING_WORDS[field].short(readingNumber(field, value, locale))
}

/** What a verdict is called, in a word and a colour. */
export function verdictWords(verdict: Verdict): { text: string, tone: Tone } {
  if (verdict.side === 'in') return { text: 'in range', tone: 'leaf' }
  const below = verdict.side === 'below'
  if (verdict.far) return { text: below ? 'far too low' : 'far too high', tone: 'chilli' }
  return { text: below ? 'below' : 'above', tone: 'amber' }
}

export type ReadingItem = { field: ReadingField, text: string, tone: Tone, side: Verdict['side'] | undefined, state: string }

/** The readings of a visit in their usual order, missing ones left out. */
export function readingItems(readings: Partial<Readings>, verdicts: Verdicts = {}, locale?: string): ReadingItem[] {
  return READING_FIELD_NAMES.flatMap((field): ReadingItem[] => {
    const value = readings[field]
    if (value === null || value === undefined) return []
    const verdict = verdicts[field]
    const text = readingText(field, value, locale)
    if (!verdict) return [{ field, text, tone: field === 'waterLevelCm' || field === 'airGapCm' ? 'water' : 'plain', side: undefined, state: '' }]
    const words = verdictWords(verdict)
    return [{ field, text, tone: words.tone, side: verdict.side, state: words.text }]
  })
}
