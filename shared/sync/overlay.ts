import type { BaseRecord } from './base-record'
import type { Op } from './protocol'

/** A record as its person sees it: the server's version with the unsent changes laid on top. */
export type OverlaidRecord = {
  id: string
  ver: number
  data: Record<string, unknown>
  unsent: boolean
  attention: boolean
}

/**
 * Lays waiting operations on a record, oldest first. A record whose making was
 * refused stays visible, marked, so that nobody's words vanish from the screen.
 *
 * @param pending operations on this record that wait to be sent, oldest first
 * @param refused operations on this record that the server refused
 * @returns null when there is nothing to see
 */
export function overlay(base: BaseRecord | null, pending: Op[], refused: Op[], accountId: string): OverlaidRecord | null {
  const attention = refused.length > 0
  let data = base?.state === 'live' && base.data ? { ...base.data } : null
  const makings = data ? [] : refused.filter(op => op.kind === 'create')
  for (const op of [...makings, ...pending]) data = applyOp(data, op, accountId)
  const id = base?.id ?? pending[0]?.entityId ?? refused[0]?.entityId
  if (!data || id === undefined) return null
  return { id, ver: base?.ver ?? 0, data, unsent: pending.length > 0, attention }
}

function applyOp(data: Record<string, unknown> | null, op: Op, accountId: string): Record<string, unknown> | null {
  switch (op.kind) {
    case 'create': return { ...op.fields, id: op.entityId, ...fieldsServerAdds(op, accountId) }
    case 'patch': return data ? { ...data, ...op.fields } : null
    case 'delete': return null
    case 'resolve': return data ? { ...data, resolvedAt: 'unsent' } : null
  }
}

function fieldsServerAdds(op: Op, accountId: string): Record<string, unknown> {
  if (op.entityType === 'vessel' || op.entityType === 'plant') return { ownerId: accountId }
  if (op.entityType === 'photo') return { authorId: accountId, stored: false, placeholder: null }
  return { authorId: accountId }
}
