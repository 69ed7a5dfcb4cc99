import * as z from 'zod/mini'
import { NAME_MAX, requiredText } from './primitives'

/** What a member is in one club. */
export const CLUB_ROLES = ['grower', 'mentor', 'steward'] as const
export type ClubRole = (typeof CLUB_ROLES)[number]

export const clubFieldsSchema = z.strictObject({ name: requiredText(NAME_MAX) })
export type ClubFields = z.infer<typeof clubFieldsSchema>
export type Club = ClubFields & { id: string }

/** One person's place in one club, as the other members see it. */
export type Membership = {
  id: string
  clubId: string
  accountId: string
  displayName: string
  role: ClubRole
}

export const memberRoleSchema = z.strictObject({ role: z.enum(CLUB_ROLES) })

/** Days an invitation link works. */
export const INVITATION_DAYS = 14
/** Most people who may join with one invitation. */
export const INVITATION_USES_MAX = 50

export const invitationRequestSchema = z.strictObject({
  role: z.enum(['grower', 'mentor']),
  usesLeft: z.int().check(z.gte(1, 'is below 1'), z.lte(INVITATION_USES_MAX, `is above ${INVITATION_USES_MAX}`)),
})
export type InvitationRequest = z.infer<typeof invitationRequestSchema>

/** What a steward sees of an invitation. The link itself is shown once, when it is made. */
export type Invitation = {
  id: string
  role: ClubRole
  usesLeft: number
  expiresAt: string
}
