import { describe, expect, it } from 'vitest'
import { isInvitationGood, leavesNoSteward, mayInClub } from '#server/policies/clubs'
import type { ClubAct } from '#server/policies/clubs'
import { CLUB_ROLES } from '#shared/domain/club.schema'

const forStewards: ClubAct[] = ['invite', 'change-roles', 'remove-members']

describe('what somebody may do in a club', () => {
  it('is nothing without a membership, and does not tell that the club is there', () => {
    for (const act of [...forStewards, 'leave'] as const) expect(mayInClub(act, null)).toBe('not_found')
  })

  it('is running it for stewards alone', () => {
    for (const act of forStewards) {
      expect(CLUB_ROLES.map(role => mayInClub(act, role))).toEqual(['not_allowed', 'not_allowed', 'allowed'])
    }
  })

  it('is leaving for everybody', () => {
    for (const role of CLUB_ROLES) expect(mayInClub('leave', role)).toBe('allowed')
  })
})

describe('a club is left without a steward', () => {
  it.each([
    ['steward', 'grower', 1, true],
    ['steward', null, 1, true],
    ['steward', 'steward', 1, false],
    ['steward', 'mentor', 2, false],
    ['steward', null, 2, false],
    ['mentor', 'grower', 1, false],
    ['grower', null, 1, false],
  ] as const)('%s becomes %s, of %i: %s', (current, next, stewards, expected) => {
    expect(leavesNoSteward(current, next, stewards)).toBe(expected)
  })
})

describe('an invitation', () => {
  const now = new Date('2026-06-09T12:00:00.000Z')
  const good = { usesLeft: 1, expiresAt: new Date('2026-06-09T12:00:00.001Z'), revokedAt: null }

  it('works until it is used up, withdrawn or too old, to the millisecond', () => {
    expect(isInvitationGood(good, now)).toBe(true)
    expect(isInvitationGood({ ...good, usesLeft: 0 }, now)).toBe(false)
    expect(isInvitationGood({ ...good, revokedAt: now }, now)).toBe(false)
    expect(isInvitationGood({ ...good, expiresAt: now }, now)).toBe(false)
  })
})
