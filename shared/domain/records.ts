import * as z from 'zod/mini'
import { CLUB_ROLES, clubFieldsSchema } from './club.schema'
import { commentFieldsSchema } from './comment.schema'
import { entryFieldsSchema } from './entry.schema'
import { NOTICE_CODES } from './notice.schema'
import { photoFieldsSchema } from './photo.schema'
import { plantFieldsSchema } from './plant.schema'
import { idSchema } from './primitives'
import { vesselFieldsSchema } from './vessel.schema'

const owned = { id: idSchema, ownerId: idSchema }
const authored = { id: idSchema, authorId: idSchema }
const nullableId = z.nullable(idSchema)

const schemas = {
  club: z.object({ ...clubFieldsSchema.shape, id: idSchema }),
  membership: z.object({
    id: idSchema, clubId: idSchema, accountId: idSchema, displayName: z.string(), role: z.enum(CLUB_ROLES),
  }),
  vessel: z.object({ ...vesselFieldsSchema.shape, ...owned }),
  plant: z.object({ ...plantFieldsSchema.shape, ...owned }),
  entry: z.object({ ...entryFieldsSchema.shape, ...authored }),
  photo: z.object({ ...photoFieldsSchema.shape, ...authored, stored: z.boolean(), placeholder: z.nullable(z.string()) }),
  comment: z.object({ ...commentFieldsSchema.shape, ...authored }),
  conflict: z.object({
    id: idSchema,
    entityType: z.string(),
    entityId: idSchema,
    plantId: nullableId,
    field: z.string(),
    otherValue: z.unknown(),
    byAccountId: idSchema,
    deviceId: idSchema,
    at: z.string(),
    resolvedAt: z.nullable(z.string()),
  }),
  notice: z.object({
    id: idSchema,
    accountId: idSchema,
    code: z.enum(NOTICE_CODES),
    plantId: nullableId,
    entryId: nullableId,
    subjectId: idSchema,
    byAccountId: nullableId,
    at: z.string(),
    seenAt: z.nullable(z.string()),
  }),
}

export type RecordOf = { [T in keyof typeof schemas]: z.output<(typeof schemas)[T]> }

/**
 * Every record as a phone holds it. What was stored by an older or a newer
 * version of the app is checked with these before a screen sees it; fields that
 * are not named here are left aside.
 */
export const recordSchemas: { [T in keyof RecordOf]: z.ZodMiniType<RecordOf[T]> } = schemas
