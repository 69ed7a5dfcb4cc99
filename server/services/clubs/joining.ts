import { isInvitationGood } from '#server/policies/clubs'
import { findInvitationByToken, takeInvitationUse } from '#server/repositories/invitations'
import type { InvitationRow } from '#server/repositories/invitations'
import { invitationSpent, notFound } from '#server/utils/errors'
import { sha256Of } from '#server/utils/sha256'
import type { StoredRecord, SyncDependencies } from '../sync/ports'
import type { WorkUnit } from '../sync/work-unit'
import { changeClub } from './club-change'
import { newRecord, placeIn } from './clubs'
import type { ClubPlace } from './clubs'
import { INVITATION_MILLISECONDS } from './invitations'
import { findMembership, membershipFeeds } from './memberships'

/**
 * Joins the club that an invitation is for. Who is a member already stays what
 * they are and uses nothing up; who left comes back on the old membership.
 *
 * @throws ApiError not_found for a link that never was, invitation_spent for one that no longer works
 */
export async function joinClub(dependencies: SyncDependencies, accountId: string, token: string): Promise<ClubPlace> {
  const tokenSha256 = sha256Of(token)
  const clubId = (await findInvitationByToken(tokenSha256))?.clubId
  if (!clubId) throw notFound()
  return changeClub(dependencies, accountId, membershipFeeds(clubId, accountId), async (unit) => {
    const invitation = await findInvitationByToken(tokenSha256)
    const before = await findMembership(dependencies, clubId, accountId)
    if (before && !before.deleted) return placeIn(dependencies, clubId, accountId)
    if (!invitation || !isInvitationGood(invitation, dependencies.now())) throw invitationSpent()
    if (before && await wasRemovedAfter(dependencies, before, invitation)) throw invitationSpent()
    await takeInvitationUse(invitation.id)
    await becomeMember(dependencies, unit, before, { clubId, accountId, role: invitation.role, joinedAt: unit.at })
    return placeIn(dependencies, clubId, accountId)
  })
}

type NewMembership = { clubId: string, accountId: string, role: string, joinedAt: string }

async function becomeMember(
  dependencies: SyncDependencies, unit: WorkUnit, before: StoredRecord | null, membership: NewMembership,
): Promise<void> {
  const { clubId, accountId, role, joinedAt } = membership
  const feeds = membershipFeeds(clubId, accountId)
  if (before) await unit.update(before, 'restore', { role, joinedAt }, feeds, false)
  else await unit.insert(newRecord('membership', dependencies.newId(), membership), feeds)
}

/** Whoever a steward removed does not come back by a link from before: that takes a new one. */
async function wasRemovedAfter(dependencies: SyncDependencies, membership: StoredRecord, invitation: InvitationRow): Promise<boolean> {
  const [end] = await dependencies.repository.changesAfter(membership.id, membership.ver - 1)
  const issuedAt = invitation.expiresAt.getTime() - INVITATION_MILLISECONDS
  return end !== undefined && end.accountId !== membership.data.accountId && Date.parse(end.at) >= issuedAt
}
