import * as z from 'zod/mini'
import { idSchema } from '../domain/primitives'

/** Version of the shape of operations. The server answers the two versions before it as well. */
export const SYNC_SCHEMA = 1
export const SYNC_SCHEMA_OLDEST = 1
/** Most operations in one push. */
export const PUSH_OPS_MAX = 50
/** Most bytes of one push body. */
export const PUSH_BYTES_MAX = 256 * 1024
/** Most rows in one pull. */
export const PULL_LIMIT_MAX = 500

/** Records that phones make and change. */
export const WRITABLE_TYPES = ['vessel', 'plant', 'entry', 'photo', 'comment'] as const
export type WritableType = (typeof WRITABLE_TYPES)[number]

/** Records that travel in the feed, in an order in which none stands before what it refers to. */
export const RECORD_TYPES = ['club', 'membership', ...WRITABLE_TYPES, 'conflict', 'notice'] as const
export type RecordType = (typeof RECORD_TYPES)[number]

/** What an operation does to its record. */
export const OP_KINDS = ['create', 'patch', 'delete', 'resolve'] as const
export type OpKind = (typeof OP_KINDS)[number]

/**
 * One change made on one phone. It keeps its `opId` through every repetition,
 * so that the server can tell a repetition from a new change.
 */
export const opSchema = z.strictObject({
  opId: idSchema,
  deviceId: idSchema,
  /** 1, 2, 3 … in the order in which the phone made its changes. */
  deviceSeq: z.int().check(z.gte(1)),
  schema: z.int().check(z.gte(SYNC_SCHEMA_OLDEST), z.lte(SYNC_SCHEMA)),
  kind: z.enum(OP_KINDS),
  entityType: z.enum(RECORD_TYPES),
  entityId: idSchema,
  /** The version of the record that the writer was shown; 0 when it is new. */
  baseVer: z.int().check(z.gte(0)),
  fields: z.record(z.string(), z.unknown()),
})
export type Op = z.infer<typeof opSchema>

export const pushRequestSchema = z.strictObject({
  ops: z.array(z.unknown()).check(z.minLength(1), z.maxLength(PUSH_OPS_MAX)),
})

/** Every feed row speaks of one record as it is now, for one scope. */
export type FeedRow = {
  seq: number
  /**
   * The version at which the row was told. Everything that happened to the
   * record and below it up to here stands at or before this place of the feed;
   * `ver` may be later, because readers get the record as it is now.
   */
  seen: number
  type: RecordType
  id: string
  ver: number
  /** `revoked`: this scope may no longer see it; that is not a deletion. */
  state: 'live' | 'deleted' | 'revoked'
  /** The record as its readers may see it; null when it is gone. */
  data: Record<string, unknown> | null
}

/** A record as the push answer returns it, without a place in a feed. */
export type RecordState = Omit<FeedRow, 'seq' | 'seen'>

/** Where in what was sent a problem sits, and what it is. */
export type FieldIssue = { path: string, message: string }

/**
 * What became of one operation.
 * - `applied`, `merged` (other fields had changed meanwhile), `kept_both` (the
 *   same field had: both values are kept), `duplicate` (was done before): done.
 * - `rejected`: will never be done as it is; a person has to look.
 * - `retry`: nothing happened; send it again later.
 */
export type OpResult = {
  opId: string
  status: 'applied' | 'merged' | 'kept_both' | 'duplicate' | 'rejected' | 'retry'
  /** The record after the operation, when there is one the sender may see. */
  record: RecordState | null
  code?: string
  message?: string
  issues?: FieldIssue[]
}

export type PushResponse = {
  serverTime: string
  epoch: string
  minSchema: number
  results: OpResult[]
}

export type PullResponse = {
  serverTime: string
  /** Changes when the database was restored from a backup. */
  epoch: string
  minSchema: number
  rows: FeedRow[]
  /** The cursor to ask with next. */
  next: number
  more: boolean
}

/** The feed of one person's own records. */
export function accountScope(accountId: string): string {
  return `user:${accountId}`
}

/** The feed of what one club shares. */
export function clubScope(clubId: string): string {
  return `club:${clubId}`
}

export const scopeSchema = z.string().check(
  z.regex(/^(?:user|club):[0-9a-f]{8}-[0-9a-f]{4}-[1-7][0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/, 'is not a feed'),
)

export const pullQuerySchema = z.strictObject({
  scope: scopeSchema,
  since: z.int().check(z.gte(0)),
  limit: z.int().check(z.gte(1), z.lte(PULL_LIMIT_MAX)),
})
export type PullQuery = z.infer<typeof pullQuerySchema>
