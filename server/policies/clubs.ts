import type { ClubRole } from '#shared/domain/club.schema'
import type { Verdict } from './records'

/** What a person may want to do in a club. */
export type ClubAct = 'invite' | 'change-roles' | 'remove-members' | 'leave'

/** May somebody with this role do that? A club that one does not belong to is "not found". */
export function mayInClub(act: ClubAct, role: ClubRole | null): Verdict {
  if (role === null) return 'not_found'
  return role === 'steward' || act === 'leave' ? 'allowed' : 'not_allowed'
}

/** True when the club would be without a steward once this member's role is `next`; null for leaving. */
export function leavesNoSteward(current: ClubRole, next: ClubRole | null, stewards: number): boolean {
  return current === 'steward' && next !== 'steward' && stewards <= 1
}

export type InvitationState = { usesLeft: number, expiresAt: Date, revokedAt: Date | null }

export function isInvitationGood(invitation: InvitationState, now: Date): boolean {
  return invitation.revokedAt === null && invitation.usesLeft > 0 && invitation.expiresAt > now
}
