import type { FieldIssue, Op } from '#shared/sync/protocol'
import type { StoredRecord, StoredResult, SyncDependencies } from './ports'
import type { Situation } from './situation'
import type { WorkUnit } from './work-unit'

/** What an operation came to: an outcome to keep on the receipt, and the record as it is now. */
export type Performed = { result: StoredResult, record: StoredRecord | null }

/** What the steps of one operation share. */
export type Step = {
  dependencies: SyncDependencies
  actorId: string
  op: Op
  /** The operation's fields as the schema read them. */
  fields: Record<string, unknown>
  situation: Situation
  unit: WorkUnit
}

export function refuse(op: Op, code: string, message: string, issues?: FieldIssue[]): Performed {
  return { result: { opId: op.opId, status: 'rejected', code, message, ...(issues ? { issues } : {}) }, record: null }
}

export function done(op: Op, status: 'applied' | 'merged' | 'kept_both', record: StoredRecord | null, code?: string): Performed {
  return { result: { opId: op.opId, status, ...(code ? { code } : {}) }, record }
}
