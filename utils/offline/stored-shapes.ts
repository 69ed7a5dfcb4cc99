import * as z from 'zod/mini'
import { idSchema, instantSchema, sha256Schema } from '#shared/domain/primitives'
import type { BaseRecord } from '#shared/sync/base-record'
import type { AckedItem, AttentionItem, OutboxItem } from '#shared/sync/outbox'
import { opSchema, RECORD_TYPES } from '#shared/sync/protocol'
import type { Snapshot } from './ports'

const issueSchema = z.object({ path: z.string(), message: z.string() })

export const deviceSchema = z.object({ deviceId: idSchema, nextSeq: z.int() })
export type Device = z.infer<typeof deviceSchema>

const outboxItemSchema = z.object({ op: opSchema, savedAt: instantSchema })

const attentionItemSchema = z.object({
  op: opSchema, code: z.string(), message: z.string(), issues: z.array(issueSchema), at: instantSchema,
})

const ackedItemSchema = z.object({ op: opSchema, ackedAt: z.string() })

const baseRecordSchema = z.object({
  type: z.enum(RECORD_TYPES),
  id: z.string(),
  ver: z.int(),
  // Rows of the first build had none; 0 claims the least.
  seen: z._default(z.int(), 0),
  state: z.enum(['live', 'deleted']),
  data: z.nullable(z.record(z.string(), z.unknown())),
  scopes: z.array(z.string()),
})

/** A photo whose bytes wait; with a `code` it was refused and waits for a person. */
export const uploadItemSchema = z.object({
  photoId: idSchema, sha256: sha256Schema, code: z.nullable(z.string()), message: z.nullable(z.string()),
})
export type UploadItem = z.infer<typeof uploadItemSchema>

/**
 * What a page of the store holds, checked: it may have been written by an older
 * version of the app. What cannot be read is passed over and left where it is.
 */
function readUnder<T>(snapshot: Snapshot, prefix: string, schema: z.ZodMiniType<T>): T[] {
  return snapshot.under(prefix).flatMap(([, value]) => {
    const parsed = schema.safeParse(value)
    return parsed.success ? [parsed.data] : []
  })
}

export const readOutbox = (snapshot: Snapshot): OutboxItem[] => readUnder(snapshot, 'outbox/', outboxItemSchema)
export const readAttention = (snapshot: Snapshot): AttentionItem[] => readUnder(snapshot, 'attention/', attentionItemSchema)
export const readAcked = (snapshot: Snapshot): AckedItem[] => readUnder(snapshot, 'acked/', ackedItemSchema)
/** `prefix` is the one that was asked for when the snapshot was read. */
export const readBases = (snapshot: Snapshot, prefix = 'base/'): BaseRecord[] => readUnder(snapshot, prefix, baseRecordSchema)
export const readUploads = (snapshot: Snapshot): UploadItem[] => readUnder(snapshot, 'upload/', uploadItemSchema)

export function readBase(snapshot: Snapshot, key: string): BaseRecord | null {
  return baseRecordSchema.safeParse(snapshot.get(key)).data ?? null
}

export function readDevice(snapshot: Snapshot): Device | null {
  return deviceSchema.safeParse(snapshot.get('device')).data ?? null
}

export function readCursor(snapshot: Snapshot, key: string): number {
  return z.object({ since: z.int() }).safeParse(snapshot.get(key)).data?.since ?? 0
}
