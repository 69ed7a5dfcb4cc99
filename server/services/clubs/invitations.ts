import { randomBytes } from 'node:crypto'
import type { ClubRole, Invitation, InvitationRequest } from '#shared/domain/club.schema'
import { INVITATION_DAYS } from '#shared/domain/club.schema'
import { clubScope } from '#shared/sync/protocol'
import { isInvitationGood } from '#server/policies/clubs'
import { presentInvitation } from '#server/presenters/invitation'
import { findGoodInvitations, findInvitationByToken, insertInvitation, revokeInvitation } from '#server/repositories/invitations'
import { notFound } from '#server/utils/errors'
import { sha256Of } from '#server/utils/sha256'
import type { SyncDependencies } from '../sync/ports'
import { changeClub, requireMay } from './club-change'

const TOKEN_BYTES = 32
const DAY = 24 * 60 * 60 * 1_000
export const INVITATION_MILLISECONDS = INVITATION_DAYS * DAY

/** Makes an invitation. Its token is in this answer and nowhere else; the table keeps the checksum. */
export async function invite(
  dependencies: SyncDependencies, actorId: string, clubId: string, request: InvitationRequest,
): Promise<{ invitation: Invitation, token: string }> {
  const token = randomBytes(TOKEN_BYTES).toString('base64url')
  return changeClub(dependencies, actorId, [clubScope(clubId)], async () => {
    await requireMay(dependencies, 'invite', clubId, actorId)
    const row = {
      ...request,
      id: dependencies.newId(),
      clubId,
      tokenSha256: sha256Of(token),
      expiresAt: new Date(dependencies.now().getTime() + INVITATION_MILLISECONDS),
      createdBy: actorId,
      revokedAt: null,
    }
    await insertInvitation(row)
    return { invitation: presentInvitation(row), token }
  })
}

/** Invitations that still work. */
export async function listInvitations(dependencies: SyncDependencies, actorId: string, clubId: string): Promise<Invitation[]> {
  await requireMay(dependencies, 'invite', clubId, actorId)
  return (await findGoodInvitations(clubId, dependencies.now())).map(presentInvitation)
}

/** Ends an invitation; ending it again changes nothing. */
export async function withdrawInvitation(
  dependencies: SyncDependencies, actorId: string, clubId: string, invitationId: string,
): Promise<void> {
  await changeClub(dependencies, actorId, [clubScope(clubId)], async () => {
    await requireMay(dependencies, 'invite', clubId, actorId)
    if (!await revokeInvitation(clubId, invitationId, dependencies.now())) throw notFound()
  })
}

export type InvitationView = { clubName: string, role: ClubRole, expiresAt: string }

/**
 * What somebody who holds the link may know before joining.
 *
 * @throws ApiError not_found for a wrong, expired, withdrawn or used-up link alike
 */
export async function viewInvitation(dependencies: SyncDependencies, token: string): Promise<InvitationView> {
  const invitation = await findInvitationByToken(sha256Of(token))
  if (!invitation || !isInvitationGood(invitation, dependencies.now())) throw notFound()
  const club = await dependencies.repository.find('club', invitation.clubId)
  if (!club || club.deleted) throw notFound()
  return { clubName: String(club.data.name), role: invitation.role, expiresAt: invitation.expiresAt.toISOString() }
}
