import type { ClubRole } from '#shared/domain/club.schema'

/** What a role may do, told to whoever gets or gives it. */
export const ROLE_MEANING: Record<ClubRole, string> = {
  grower: 'shares plants and comments on what others share',
  mentor: 'the same, with “Mentor” beside the name, so that growers know whose advice it is',
  steward: 'the same, and invites people, gives roles and ends memberships',
}
