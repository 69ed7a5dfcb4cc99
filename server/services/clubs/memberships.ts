import { CLUB_ROLES } from '#shared/domain/club.schema'
import type { ClubRole } from '#shared/domain/club.schema'
import type { RecordState } from '#shared/sync/protocol'
import { accountScope, clubScope } from '#shared/sync/protocol'
import { leavesNoSteward } from '#server/policies/clubs'
import { presentRecord } from '#server/presenters/record'
import { countMembers, findMembershipId, findPlantsSharedBy } from '#server/repositories/clubs'
import { lastSteward, notFound } from '#server/utils/errors'
import { tellSharingChange } from '../sync/plant-sharing'
import type { StoredRecord, SyncDependencies } from '../sync/ports'
import type { WorkUnit } from '../sync/work-unit'
import { changeClub, requireMay } from './club-change'

/** The feeds that see a membership: the other members', and the person's own, which names their clubs. */
export function membershipFeeds(clubId: string, accountId: string): string[] {
  return [accountScope(accountId), clubScope(clubId)]
}

/** What an account's membership in a club is or was. */
export async function findMembership(dependencies: SyncDependencies, clubId: string, accountId: string): Promise<StoredRecord | null> {
  const id = await findMembershipId(clubId, accountId)
  return id ? dependencies.repository.find('membership', id) : null
}

/** @throws ApiError not_found, not_allowed, last_steward */
export async function changeRole(
  dependencies: SyncDependencies, actorId: string, place: { clubId: string, accountId: string }, role: ClubRole,
): Promise<RecordState> {
  const feeds = membershipFeeds(place.clubId, place.accountId)
  return changeClub(dependencies, actorId, feeds, async (unit) => {
    await requireMay(dependencies, 'change-roles', place.clubId, actorId)
    const membership = await findMembership(dependencies, place.clubId, place.accountId)
    if (!membership || membership.deleted) throw notFound()
    if (membership.data.role === role) return presentRecord(membership)
    await keepSteward(place.clubId, membership, role)
    return presentRecord(await unit.update(membership, 'patch', { role }, feeds))
  })
}

/**
 * Ends a membership, the actor's own or, by a steward, somebody else's. What
 * the person shared with the club is theirs alone again.
 *
 * @throws ApiError not_found, not_allowed, last_steward
 */
export async function endMembership(
  dependencies: SyncDependencies, actorId: string, place: { clubId: string, accountId: string },
): Promise<RecordState> {
  const feeds = membershipFeeds(place.clubId, place.accountId)
  return changeClub(dependencies, actorId, feeds, async (unit) => {
    const act = place.accountId === actorId ? 'leave' : 'remove-members'
    await requireMay(dependencies, act, place.clubId, actorId)
    const membership = await findMembership(dependencies, place.clubId, place.accountId)
    if (!membership) throw notFound()
    if (membership.deleted) return presentRecord(membership)
    await keepSteward(place.clubId, membership, null)
    for (const plant of await findPlantsSharedBy(place.accountId, place.clubId)) {
      await makePrivate(dependencies, unit, plant, feeds)
    }
    return presentRecord(await unit.update(membership, 'delete', {}, feeds, true))
  })
}

async function makePrivate(dependencies: SyncDependencies, unit: WorkUnit, plant: StoredRecord, feeds: string[]): Promise<void> {
  const after = await unit.update(plant, 'patch', { visibility: 'private', clubId: null }, feeds)
  await tellSharingChange(dependencies.repository, unit, plant, after)
}

async function keepSteward(clubId: string, membership: StoredRecord, next: ClubRole | null): Promise<void> {
  const current = CLUB_ROLES.find(role => role === membership.data.role)
  if (current && leavesNoSteward(current, next, await countMembers(clubId, 'steward'))) throw lastSteward()
}
