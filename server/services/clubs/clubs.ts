import type { ClubFields } from '#shared/domain/club.schema'
import type { RecordState } from '#shared/sync/protocol'
import { clubScope } from '#shared/sync/protocol'
import { presentRecord } from '#server/presenters/record'
import { findClubIdByName } from '#server/repositories/clubs'
import type { StoredRecord, SyncDependencies } from '../sync/ports'
import { changeClub } from './club-change'
import { findMembership, membershipFeeds } from './memberships'

/** A club and the asker's place in it, as the feeds will bring them. */
export type ClubPlace = { club: RecordState, membership: RecordState }

/**
 * Makes a club with its maker as steward. Asked again for a club of a name that
 * the maker runs already, it answers with that one: an answer that got lost on
 * the way must not make a second club.
 */
export async function makeClub(dependencies: SyncDependencies, accountId: string, fields: ClubFields): Promise<ClubPlace> {
  const name = fields.name.trim()
  const clubId = dependencies.newId()
  const feeds = membershipFeeds(clubId, accountId)
  return changeClub(dependencies, accountId, feeds, async (unit) => {
    const standing = await findClubIdByName(accountId, 'steward', name)
    if (standing) return placeIn(dependencies, standing, accountId)
    await unit.insert(newRecord('club', clubId, { name, createdAt: unit.at }), [clubScope(clubId)])
    await unit.insert(newRecord('membership', dependencies.newId(), {
      clubId, accountId, role: 'steward', joinedAt: unit.at,
    }), feeds)
    return placeIn(dependencies, clubId, accountId)
  })
}

/** What one account has in a club. The club and the membership must be there. */
export async function placeIn(dependencies: SyncDependencies, clubId: string, accountId: string): Promise<ClubPlace> {
  const club = await dependencies.repository.find('club', clubId)
  const membership = await findMembership(dependencies, clubId, accountId)
  if (!club || !membership) throw new Error('a club or a membership vanished while its feeds were held')
  return { club: presentRecord(club), membership: presentRecord(membership) }
}

export function newRecord(type: StoredRecord['type'], id: string, data: Record<string, unknown>): StoredRecord {
  return { type, id, ver: 1, deleted: false, data }
}
