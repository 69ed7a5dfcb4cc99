import * as z from 'zod/mini'
import { idSchema, instantSchema, NOTE_MAX, optionalCount, optionalNumber, optionalText } from './primitives'

/** What a grower may have done during one visit. */
export const ENTRY_ACTIONS = [
  'set-up', 'topped-up', 'changed-solution', 'swirled', 'covered', 'pruned', 'harvested', 'moved', 'rained-in',
] as const
export type EntryAction = (typeof ENTRY_ACTIONS)[number]

/** What a vessel was topped up with. */
export const TOP_UP_KINDS = ['plain-water', 'half-strength', 'full-strength', 'other'] as const
export type TopUpKind = (typeof TOP_UP_KINDS)[number]

/** The pH scale of dilute solutions; a reading outside it is a typing slip. */
export const PH_MIN = 0
export const PH_MAX = 14
/** Highest strength that is stored, mS/cm. Sea water is about 50. */
export const EC_MAX_MS_PER_CM = 60
/** Deepest water and widest air gap that are stored, cm. */
export const LEVEL_MAX_CM = 500
export const WATER_CELSIUS_MIN = -5
export const WATER_CELSIUS_MAX = 60
export const AIR_CELSIUS_MIN = -50
export const AIR_CELSIUS_MAX = 70
/** How far an entry may lie ahead of the clock that judges it, so that two clocks a little apart do not refuse each other. */
export const FUTURE_TOLERANCE_MINUTES = 24 * 60

/** The readings of a visit, each missing when it was not taken. */
export const readingFields = {
  ph: optionalNumber(PH_MIN, PH_MAX),
  ecMilliSiemensPerCm: optionalNumber(0, EC_MAX_MS_PER_CM),
  /** Depth of the solution above the vessel's floor. */
  waterLevelCm: optionalNumber(0, LEVEL_MAX_CM),
  /** From the bottom of the net cup down to the water. */
  airGapCm: optionalNumber(0, LEVEL_MAX_CM),
  waterCelsius: optionalNumber(WATER_CELSIUS_MIN, WATER_CELSIUS_MAX),
  airCelsius: optionalNumber(AIR_CELSIUS_MIN, AIR_CELSIUS_MAX),
  relativeHumidityPercent: optionalNumber(0, 100),
}
export const READING_FIELD_NAMES = [
  'ph', 'ecMilliSiemensPerCm', 'waterLevelCm', 'airGapCm', 'waterCelsius', 'airCelsius', 'relativeHumidityPercent',
] as const
export type ReadingField = (typeof READING_FIELD_NAMES)[number]

const changeableFields = {
  /** When the visit happened. */
  occurredAt: instantSchema,
  /** True for "Looked, no change": a visit that is worth recording because nothing was odd. */
  lookedNoChange: z.boolean(),
  note: optionalText(NOTE_MAX),
  ...readingFields,
  /** A set without order or repeats. */
  actions: z.array(z.enum(ENTRY_ACTIONS)).check(
    z.refine(actions => new Set(actions).size === actions.length, 'holds an action twice'),
  ),
  topUpLitres: optionalNumber(0, 5_000),
  topUpWith: z.nullable(z.enum(TOP_UP_KINDS)),
  /** Litres of new solution after a change. */
  changeLitres: optionalNumber(0, 5_000),
  harvestGrams: optionalNumber(0, 1_000_000),
  harvestCount: optionalCount(0, 100_000),
}

/** One visit to one plant. */
export const entryFieldsSchema = z.strictObject({
  plantId: idSchema,
  /** When it was typed, by the phone's clock: shown when it differs from the visit, never used to decide anything. */
  recordedAt: instantSchema,
  ...changeableFields,
})
export type EntryFields = z.infer<typeof entryFieldsSchema>

/** A visit about which nothing is said yet. */
export const emptyEntryFields: Omit<EntryFields, 'plantId' | 'occurredAt' | 'recordedAt'> = {
  lookedNoChange: false,
  note: null,
  ph: null,
  ecMilliSiemensPerCm: null,
  waterLevelCm: null,
  airGapCm: null,
  waterCelsius: null,
  airCelsius: null,
  relativeHumidityPercent: null,
  actions: [],
  topUpLitres: null,
  topUpWith: null,
  changeLitres: null,
  harvestGrams: null,
  harvestCount: null,
}

export const entryPatchSchema = z.partial(z.strictObject(changeableFields))

/** An entry as everybody allowed to see it gets it. */
export type Entry = EntryFields & { id: string, authorId: string }

/** True when the visit lies further ahead of `nowMilliseconds` than clocks may differ. */
export function liesInFuture(occurredAt: string, nowMilliseconds: number): boolean {
  return Date.parse(occurredAt) > nowMilliseconds + FUTURE_TOLERANCE_MINUTES * 60_000
}
