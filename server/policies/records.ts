import type { OpKind } from '#shared/sync/protocol'
import type { StoredRecord } from '../services/sync/ports'

/** What a decision about a record rests on. */
export type RecordSituation = {
  actorId: string
  /** The record itself; null while it is being created. */
  record: StoredRecord | null
  /** The plant that it is or belongs to. */
  plant: StoredRecord | null
  /** The club the plant is shared with, when the actor is a member of it. */
  actorSharesClub: boolean
}

export type Verdict = 'allowed' | 'not_found' | 'not_allowed'

/** The club that may see a plant; null while it is private or gone. */
export function sharedClubOf(plant: StoredRecord | null): string | null {
  if (!plant || plant.data.visibility !== 'club') return null
  return typeof plant.data.clubId === 'string' ? plant.data.clubId : null
}

/** May this person do this to this record? What they may not see is "not found". */
export function mayChange(type: StoredRecord['type'], kind: OpKind, situation: RecordSituation): Verdict {
  const { actorId, record, plant } = situation
  const ownsPlant = plant?.data.ownerId === actorId
  const seesPlant = ownsPlant || situation.actorSharesClub
  switch (type) {
    case 'vessel':
      if (kind === 'create' || record?.data.ownerId === actorId) return 'allowed'
      return situation.actorSharesClub ? 'not_allowed' : 'not_found'
    case 'plant':
      if (kind === 'create' || ownsPlant) return 'allowed'
      return seesPlant ? 'not_allowed' : 'not_found'
    case 'entry':
    case 'photo':
      if (ownsPlant) return 'allowed'
      return seesPlant ? 'not_allowed' : 'not_found'
    case 'comment':
      if (kind === 'create') return seesPlant ? 'allowed' : 'not_found'
      if (record?.data.authorId === actorId) return 'allowed'
      return seesPlant ? 'not_allowed' : 'not_found'
    case 'conflict':
      return record?.data.ownerId === actorId ? 'allowed' : 'not_found'
    case 'notice':
      return record?.data.accountId === actorId ? 'allowed' : 'not_found'
    default:
      return 'not_found'
  }
}

/**
 * May a record be seen through this feed? `plant` is the plant it belongs to,
 * `vesselIsShared` tells whether a plant in the vessel is shared with the club.
 */
export function isVisibleInScope(
  scope: string, record: StoredRecord, plant: StoredRecord | null, vesselIsShared: boolean,
): boolean {
  const [kind, id] = scope.split(':')
  const { data } = record
  if (kind === 'user') return personsOf(record, plant).includes(id)
  if (record.type === 'club') return record.id === id
  if (record.type === 'membership') return data.clubId === id
  if (record.type === 'vessel') return vesselIsShared
  if (record.type === 'conflict' || record.type === 'notice') return false
  return sharedClubOf(plant) === id
}

/** Whose own record it is. */
function personsOf({ type, data }: StoredRecord, plant: StoredRecord | null): unknown[] {
  switch (type) {
    case 'vessel':
    case 'plant': return [data.ownerId]
    case 'entry':
    case 'photo': return [plant?.data.ownerId]
    case 'comment': return [plant?.data.ownerId, data.authorId]
    case 'conflict': return [data.ownerId, data.byAccountId]
    case 'notice':
    case 'membership': return [data.accountId]
    case 'club': return []
  }
}
