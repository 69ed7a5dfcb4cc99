import * as z from 'zod/mini'
import { VISIBILITIES } from '#shared/domain/plant.schema'
import { VESSEL_KINDS, VESSEL_SHAPES } from '#shared/domain/vessel.schema'
import { CROP_IDS } from '#shared/science/crops/crop-ids'
import { cropOf } from '#shared/science/crops/crops'
import type { FieldIssue, Op } from '#shared/sync/protocol'
import { entryFieldName } from '~/utils/log/issue-words'
import { entryValueWords } from './conflict'
import { PLANT_FIELD_WORDS, VESSEL_FIELD_WORDS } from './fields'
import { calendarDay } from './moments'
import { VESSEL_KIND_WORDS, VESSEL_SHAPE_WORDS, VISIBILITY_WORDS } from './names'

/** Names of records and details that only programs read. */
const INTERNAL = ['plantId', 'entryId', 'vesselId', 'clubId', 'recordedAt', 'writtenAt', 'sha256', 'byteLength', 'widthPx', 'heightPx', 'takenAt', 'timeZone', 'seenAt']
const CREATED: Record<string, string> = { entry: 'A visit', plant: 'A new plant', vessel: 'A new vessel', comment: 'A comment', photo: 'A photo' }
const CHANGED: Record<string, string> = {
  entry: 'A change to a visit', plant: 'A change to the plant', vessel: 'A change to the vessel', comment: 'A change to a comment', photo: 'A change to a photo',
}
const DELETED: Record<string, string> = { entry: 'Deleting a visit', plant: 'Deleting the plant', vessel: 'Deleting the vessel', comment: 'Deleting a comment', photo: 'Deleting a photo' }

/** What a change was about: "A visit to Juniper". */
export function changeTitle(op: Pick<Op, 'kind' | 'entityType'>, about: string | null): string {
  const words: Record<string, string> = { create: CREATED, patch: CHANGED, delete: DELETED, resolve: {} }[op.kind]
  const what = words[op.entityType] ?? 'A choice between two values'
  return about ? `${what}: ${about}` : what
}

/** What a field of any record is called on the screen. */
export function fieldName(entityType: string, field: string): string {
  switch (entityType) {
    case 'entry': return entryFieldName(field)
    case 'plant': return PLANT_FIELD_WORDS[field] ?? 'Something'
    case 'vessel': return VESSEL_FIELD_WORDS[field] ?? 'Something'
    case 'comment': return 'Comment'
    case 'photo': return 'What it shows'
    default: return 'Choice'
  }
}

const coded = [
  [z.enum(VISIBILITIES), 'visibility', VISIBILITY_WORDS], [z.enum(VESSEL_KINDS), 'kind', VESSEL_KIND_WORDS], [z.enum(VESSEL_SHAPES), 'shape', VESSEL_SHAPE_WORDS],
] as const

/** A value of any record's field as a person would say it. */
export function valueWords(entityType: string, field: string, value: unknown, options: { timeZone?: string, locale?: string } = {}): string {
  if (entityType === 'plant' && typeof value === 'string') {
    const crop = z.enum(CROP_IDS).safeParse(value)
    if (field === 'cropId' && crop.success) return cropOf(crop.data).name
    if (/On$/.test(field)) return calendarDay(value, options.locale)
  }
  for (const [schema, name, words] of coded) {
    const known = schema.safeParse(value)
    if (name === field && known.success) return Object.entries(words).find(([code]) => code === known.data)?.[1] ?? known.data
  }
  return entryValueWords(entityType === 'entry' ? field : '', value, options)
}

/** The values that a refused change carries, in words; what was left empty is left out. */
export function changeValues(op: Pick<Op, 'entityType' | 'fields' | 'kind'>, options: { timeZone?: string, locale?: string } = {}): { label: string, text: string }[] {
  return Object.entries(op.fields).flatMap(([field, value]) => {
    const empty = value === null || value === '' || value === false || (Array.isArray(value) && value.length === 0)
    if (INTERNAL.includes(field) || (op.kind === 'create' && empty)) return []
    return [{ label: fieldName(op.entityType, field), text: valueWords(op.entityType, field, value, options) }]
  })
}

/** What is wrong with which field, as sentences. */
export function issueSentences(op: Pick<Op, 'entityType'>, issues: readonly FieldIssue[]): string[] {
  return issues.map(({ path, message }) => `${INTERNAL.includes(path) ? linkName(path) : fieldName(op.entityType, path)} ${message}.`)
}

function linkName(path: string): string {
  return { plantId: 'The plant', entryId: 'The visit', vesselId: 'The vessel', clubId: 'The club' }[path] ?? 'Something in it'
}
