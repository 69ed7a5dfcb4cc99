import type { ClubRole, Invitation } from '#shared/domain/club.schema'

type InvitationState = { id: string, role: ClubRole, usesLeft: number, expiresAt: Date }

/** An invitation as a steward sees it; its link was shown once and is not kept. */
export function presentInvitation({ id, role, usesLeft, expiresAt }: InvitationState): Invitation {
  return { id, role, usesLeft, expiresAt: expiresAt.toISOString() }
}
