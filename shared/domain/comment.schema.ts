import * as z from 'zod/mini'
import { COMMENT_MAX, idSchema, instantSchema, requiredText } from './primitives'

/** A comment on an entry. */
export const commentFieldsSchema = z.strictObject({
  plantId: idSchema,
  entryId: idSchema,
  text: requiredText(COMMENT_MAX),
  /** By the writer's clock; shown, never used to decide anything. */
  writtenAt: instantSchema,
})
export type CommentFields = z.infer<typeof commentFieldsSchema>

export const commentPatchSchema = z.partial(z.strictObject({ text: requiredText(COMMENT_MAX) }))

export type Comment = CommentFields & { id: string, authorId: string }
