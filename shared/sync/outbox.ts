import type { FieldIssue, Op, OpKind, RecordType } from './protocol'

/** An operation waiting on the phone. It leaves only with the server's answer. */
export type OutboxItem = { op: Op, savedAt: string }

/** An operation the server refused. It stays until a person decides. */
export type AttentionItem = {
  op: Op
  code: string
  message: string
  issues: FieldIssue[]
  at: string
}

/** An operation the server acknowledged, kept for a while in case the server is restored from a backup. */
export type AckedItem = { op: Op, ackedAt: string }

/** A change as a screen asks for it, before it gets its number. */
export type ChangeRequest = {
  kind: OpKind
  entityType: RecordType
  entityId: string
  fields: Record<string, unknown>
}

/** Days an acknowledged operation is kept. */
export const ACKED_DAYS = 30

/**
 * The version a new operation may claim to have seen: the record's, but never a
 * later one than the operations on it that still wait. While they lie on top of
 * the record they hide from the person what the server sent meanwhile.
 */
export function baseVersionFor(entityId: string, recordVersion: number, pending: Op[]): number {
  return pending
    .filter(op => op.entityId === entityId)
    .reduce((least, op) => Math.min(least, op.baseVer), recordVersion)
}

/** Everything an operation needs to be there before it. */
function namesOf(op: Op): unknown[] {
  return [op.entityId, op.fields.plantId, op.fields.entryId, op.fields.vesselId]
}

/**
 * Operations that may be sent now. Behind a refused change wait later changes
 * of the same record, and, if its making was refused, all that builds on it;
 * everything else flows past.
 */
export function sendable(items: OutboxItem[], attention: AttentionItem[]): OutboxItem[] {
  const refused = new Set(attention.map(item => item.op.entityId))
  const unmade = new Set(attention.filter(item => item.op.kind === 'create').map(item => item.op.entityId))
  return items.filter(({ op }) => {
    const held = refused.has(op.entityId) || namesOf(op).some(id => typeof id === 'string' && unmade.has(id))
    if (held && op.kind === 'create') unmade.add(op.entityId)
    return !held
  })
}

/** The next operations for one request: as many as fit, in order, at least one. */
export function batchOf(items: OutboxItem[], opsMax: number, bytesMax: number): OutboxItem[] {
  const batch: OutboxItem[] = []
  let bytes = 0
  for (const item of items) {
    bytes += utf8Length(JSON.stringify(item.op)) + 1
    if (batch.length > 0 && (batch.length >= opsMax || bytes > bytesMax)) break
    batch.push(item)
  }
  return batch
}

/** Bytes of a text as UTF-8. */
function utf8Length(text: string): number {
  let bytes = 0
  for (const character of text) {
    const code = character.codePointAt(0) ?? 0
    bytes += code < 0x80 ? 1 : code < 0x800 ? 2 : code < 0x10000 ? 3 : 4
  }
  return bytes
}
