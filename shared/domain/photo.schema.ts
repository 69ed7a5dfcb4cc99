import * as z from 'zod/mini'
import { idSchema, instantSchema, sha256Schema } from './primitives'

/** What a photo shows; photos of one subject are compared day by day. */
export const PHOTO_SUBJECTS = ['roots', 'leaf', 'whole', 'fruit', 'set-up', 'label'] as const
export type PhotoSubject = (typeof PHOTO_SUBJECTS)[number]

/** Longest side a phone sends, px. */
export const PHOTO_SIDE_MAX_PX = 2_048
/** Longest side the server reads from a header before it refuses to decode, px. */
export const PHOTO_HEADER_SIDE_MAX_PX = 8_000
/** Most pixels the server decodes. */
export const PHOTO_PIXELS_MAX = 24_000_000
/** Most bytes of one photo. */
export const PHOTO_BYTES_MAX = 8 * 1024 * 1024
/** Most photos of one entry. */
export const PHOTOS_PER_ENTRY_MAX = 12
/** Widths that the server makes, px. */
export const PHOTO_WIDTHS = [1_280, 640, 320] as const
export type PhotoWidth = (typeof PHOTO_WIDTHS)[number]

/** What the phone says of a photo; the bytes travel on their own. */
export const photoFieldsSchema = z.strictObject({
  plantId: idSchema,
  entryId: idSchema,
  subject: z.enum(PHOTO_SUBJECTS),
  /** Of exactly the bytes the phone will send. */
  sha256: sha256Schema,
  byteLength: z.int().check(z.gte(1), z.lte(PHOTO_BYTES_MAX)),
  widthPx: z.int().check(z.gte(1), z.lte(PHOTO_SIDE_MAX_PX)),
  heightPx: z.int().check(z.gte(1), z.lte(PHOTO_SIDE_MAX_PX)),
  takenAt: z.nullable(instantSchema),
})
export type PhotoFields = z.infer<typeof photoFieldsSchema>

export const photoPatchSchema = z.partial(z.strictObject({ subject: z.enum(PHOTO_SUBJECTS) }))

/** A photo as everybody allowed to see it gets it. */
export type Photo = PhotoFields & {
  id: string
  authorId: string
  /** True once the server holds the bytes. */
  stored: boolean
  /** A tiny JPEG as base64, shown until the picture is there. */
  placeholder: string | null
}
