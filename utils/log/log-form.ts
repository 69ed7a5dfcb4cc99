import * as z from 'zod/mini'
import type { Entry, EntryFields, ReadingField } from '#shared/domain/entry.schema'
import { ENTRY_ACTIONS, READING_FIELD_NAMES, TOP_UP_KINDS } from '#shared/domain/entry.schema'
import { PHOTO_SUBJECTS } from '#shared/domain/photo.schema'
import { instantOf, localTime } from '~/utils/plant/zoned-time'
import type { Readings } from '~/utils/words/readings'

const typed = z.nullable(z.number())

/**
 * The form of one visit, as it is kept between two touches. Numbers may lie out
 * of range and a visit may be empty: a draft keeps what was typed, whatever it is.
 */
export const logFormSchema = z.strictObject({
  readings: z.strictObject({
    ph: typed, ecMilliSiemensPerCm: typed, waterLevelCm: typed, airGapCm: typed,
    waterCelsius: typed, airCelsius: typed, relativeHumidityPercent: typed,
  }),
  actions: z.array(z.enum(ENTRY_ACTIONS)),
  amounts: z.strictObject({
    topUpLitres: typed, topUpWith: z.nullable(z.enum(TOP_UP_KINDS)), changeLitres: typed, harvestGrams: typed, harvestCount: typed,
  }),
  note: z.string(),
  /** When it was, by the clock beside the plant; null means now. */
  moment: z.nullable(z.string()),
  lookedNoChange: z.boolean(),
  /** Photos that are ready; their bytes are kept beside the draft. */
  photos: z.array(z.strictObject({
    key: z.string(), subject: z.enum(PHOTO_SUBJECTS), sha256: z.string(),
    widthPx: z.number(), heightPx: z.number(), takenAt: z.nullable(z.string()),
  })),
})
export type LogForm = z.infer<typeof logFormSchema>
export type DraftPhoto = LogForm['photos'][number]

export function emptyLogForm(): LogForm {
  return {
    readings: noReadings(),
    actions: [],
    amounts: { topUpLitres: null, topUpWith: null, changeLitres: null, harvestGrams: null, harvestCount: null },
    note: '',
    moment: null,
    lookedNoChange: false,
    photos: [],
  }
}

function noReadings(): Readings {
  return {
    ph: null, ecMilliSiemensPerCm: null, waterLevelCm: null, airGapCm: null,
    waterCelsius: null, airCelsius: null, relativeHumidityPercent: null,
  }
}

/** True while nothing is in it that would be worth keeping. */
export function isEmptyForm({ readings, actions, note, lookedNoChange, photos }: LogForm): boolean {
  return actions.length === 0 && note.trim() === '' && !lookedNoChange && photos.length === 0
    && READING_FIELD_NAMES.every(field => readings[field] === null)
}

type Visit = { plantId: string, timeZone: string, now: string }

/** The entry a form means. Amounts of what was not done are left out; a time that cannot be read stays as it was typed, for the schema to name. */
export function toEntryFields(form: LogForm, { plantId, timeZone, now }: Visit): EntryFields {
  const did = new Set(form.actions)
  const { topUpLitres, topUpWith, changeLitres, harvestGrams, harvestCount } = form.amounts
  return {
    plantId,
    recordedAt: now,
    occurredAt: form.moment === null ? now : instantOf(form.moment, timeZone) ?? form.moment,
    lookedNoChange: form.lookedNoChange,
    note: form.note.trim() || null,
    ...form.readings,
    actions: ENTRY_ACTIONS.filter(action => did.has(action)),
    topUpLitres: did.has('topped-up') ? topUpLitres : null,
    topUpWith: did.has('topped-up') ? topUpWith : null,
    changeLitres: did.has('changed-solution') ? changeLitres : null,
    harvestGrams: did.has('harvested') ? harvestGrams : null,
    harvestCount: did.has('harvested') ? harvestCount : null,
  }
}

/** The form that shows an entry again. */
export function fromEntry(entry: Entry, timeZone: string): LogForm {
  const { topUpLitres, topUpWith, changeLitres, harvestGrams, harvestCount } = entry
  const readings = noReadings()
  for (const field of READING_FIELD_NAMES) readings[field] = entry[field]
  return {
    readings,
    actions: [...entry.actions],
    amounts: { topUpLitres, topUpWith, changeLitres, harvestGrams, harvestCount },
    note: entry.note ?? '',
    moment: localTime(entry.occurredAt, timeZone),
    lookedNoChange: entry.lookedNoChange,
    photos: [],
  }
}

/**
 * Only what differs, so that a change of one field cannot undo what another
 * phone did to the rest. The time is compared as the form shows it, to the
 * minute: seconds it never showed are no change.
 */
export function changedFields(entry: Entry, form: LogForm, visit: Visit): Partial<EntryFields> {
  const shown = fromEntry(entry, visit.timeZone)
  const before = new Map<string, unknown>(Object.entries(toEntryFields(shown, visit)))
  // An emptied time is no wish to move the visit to now.
  const next = toEntryFields({ ...form, moment: form.moment ?? shown.moment }, visit)
  return Object.fromEntries(Object.entries(next)
    .filter(([field, value]) => JSON.stringify(value) !== JSON.stringify(before.get(field))))
}

/** Where a field of an entry stands on the form. */
export function fieldIdOf(path: string): string {
  const reading = READING_FIELD_NAMES.find(field => field === path)
  return reading ? readingFieldId(reading) : path
}

export function readingFieldId(field: ReadingField): string {
  return `reading-${field}`
}
