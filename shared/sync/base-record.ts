import type { FeedRow, RecordState, RecordType } from './protocol'

/** A record as the server last showed it to this phone. */
export type BaseRecord = {
  type: RecordType
  id: string
  ver: number
  /**
   * The version up to which this phone was told everything, on the record and
   * below it. An answer to a push raises `ver` but not this: it brings the
   * record and not, say, the comment that raised its version.
   */
  seen: number
  state: 'live' | 'deleted'
  data: Record<string, unknown> | null
  /** The feeds through which this phone may see it. */
  scopes: string[]
}

/** Version of a record that was kept through a restore of the server: any answer replaces it. */
export const UNSURE_VERSION = 0

/**
 * A row of a feed laid on what the phone holds. An older version never
 * replaces a newer one; a record that no feed shows any more is null.
 */
export function withFeedRow(base: BaseRecord | null, scope: string, row: FeedRow): BaseRecord | null {
  if (row.state === 'revoked') return base ? withoutScope(base, scope) : null
  const next = withState(base, scope, row)
  return next && { ...next, seen: Math.max(next.seen, row.seen) }
}

/** What an answer says of a record, laid on what the phone holds. */
export function withState(base: BaseRecord | null, scope: string, told: RecordState): BaseRecord | null {
  if (told.state === 'revoked') return base
  const scopes = base ? [...new Set([...base.scopes, scope])] : [scope]
  if (base && base.ver >= told.ver) return { ...base, scopes }
  return { type: told.type, id: told.id, ver: told.ver, seen: base?.seen ?? 0, state: told.state, data: told.data, scopes }
}

/** The record without one of its feeds; null when it was the last. */
export function withoutScope(base: BaseRecord, scope: string): BaseRecord | null {
  const scopes = base.scopes.filter(other => other !== scope)
  return scopes.length > 0 ? { ...base, scopes } : null
}
