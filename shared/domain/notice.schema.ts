import * as z from 'zod/mini'
import { instantSchema } from './primitives'

/** What a notice tells its reader. */
export const NOTICE_CODES = [
  'comment-added', 'both-kept', 'delete-refused', 'restored-by-edit', 'comment-on-deleted',
] as const
export type NoticeCode = (typeof NOTICE_CODES)[number]

/** The reader may only say that it was seen. */
export const noticePatchSchema = z.strictObject({ seenAt: z.nullable(instantSchema) })

/** A line for one person about a record of theirs. Made by the server, never by a phone. */
export type Notice = {
  id: string
  accountId: string
  code: NoticeCode
  plantId: string | null
  entryId: string | null
  /** The record it speaks of, for example the comment. */
  subjectId: string
  byAccountId: string | null
  at: string
  seenAt: string | null
}
