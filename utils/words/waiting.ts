import type { Op, RecordType } from '#shared/sync/protocol'
import { listed } from './entry'
import { counted } from './numbers'

const NOUNS: Partial<Record<RecordType, readonly [one: string, many: string]>> = {
  entry: ['visit', 'visits'],
  plant: ['plant', 'plants'],
  vessel: ['vessel', 'vessels'],
  comment: ['comment', 'comments'],
  photo: ['photo', 'photos'],
}

/**
 * What waits, by what it is about: "2 visits, 1 comment and 3 photos". Each
 * record counts once, however often it was changed; what was only marked as
 * seen is nobody's work and is not told. Null when there is nothing to tell.
 */
export function waitingByKind(ops: readonly Pick<Op, 'entityType' | 'entityId'>[], photoIds: readonly string[], locale?: string): string | null {
  const seen = new Map<RecordType, Set<string>>([['photo', new Set(photoIds)]])
  for (const { entityType, entityId } of ops) {
    const ids = seen.get(entityType) ?? new Set()
    seen.set(entityType, ids.add(entityId))
  }
  const order: RecordType[] = ['entry', 'photo', 'comment', 'plant', 'vessel']
  const parts = order.flatMap((type) => {
    const nouns = NOUNS[type]
    const count = seen.get(type)?.size ?? 0
    return nouns && count > 0 ? [counted(count, nouns[0], nouns[1], locale)] : []
  })
  return parts.length > 0 ? listed(parts) : null
}
