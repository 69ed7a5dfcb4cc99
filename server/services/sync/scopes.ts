import { accountScope, clubScope } from '#shared/sync/protocol'
import { sharedClubOf } from '#server/policies/records'
import type { StoredRecord } from './ports'

/** The feeds that see a record of this plant, or a vessel of its owner. */
export function scopesOfRecord(record: StoredRecord, plant: StoredRecord | null): string[] {
  const owner = accountScope(String(plant?.data.ownerId ?? record.data.ownerId))
  const club = sharedClubOf(plant)
  const author = record.type === 'comment' ? [accountScope(String(record.data.authorId))] : []
  return [...new Set([owner, ...author, ...club ? [clubScope(club)] : []])]
}
