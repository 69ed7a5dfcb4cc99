import { describe, expect, it } from 'vitest'
import { emailSchema, signInSchema, signUpSchema } from '#shared/domain/account.schema'
import { clubFieldsSchema, invitationRequestSchema, memberRoleSchema } from '#shared/domain/club.schema'
import { accepts, wrongPaths } from '~/tests/support/schema-checks'

const signUp = { email: 'ada@example.org', displayName: 'Ada', password: 'ten letter' }

describe('e-mail address', () => {
  it.each(['ada@example.org', 'a.b+c@sub.example.org', 'märz@bücher.example'])('takes %s', (email) => {
    expect(accepts(emailSchema, email)).toBe(true)
  })

  it.each([
    '', 'ada', '@example.org', 'ada@', 'ada@example', 'ada@@example.org', 'ada@example.org, eve@example.org', 'ada @example.org',
    'Ada <ada@example.org>', 'ada@example.org\nBcc: eve@example.org', null,
  ])('refuses %j', (email) => {
    expect(accepts(emailSchema, email)).toBe(false)
  })

  it('ends at 254 characters', () => {
    const host = '@example.org'
    expect(accepts(emailSchema, 'a'.repeat(254 - host.length) + host)).toBe(true)
    expect(accepts(emailSchema, 'a'.repeat(255 - host.length) + host)).toBe(false)
  })
})

describe('sign-up and sign-in', () => {
  it('takes a password of 10 to 256 characters', () => {
    for (const length of [10, 256]) expect(wrongPaths(signUpSchema, { ...signUp, password: 'p'.repeat(length) })).toEqual([])
    for (const length of [0, 9, 257]) expect(wrongPaths(signUpSchema, { ...signUp, password: 'p'.repeat(length) })).toEqual(['password'])
  })

  it('takes a name of 1 to 80 characters', () => {
    for (const length of [1, 80]) expect(wrongPaths(signUpSchema, { ...signUp, displayName: 'n'.repeat(length) })).toEqual([])
    for (const wrong of ['', ' ', 'n'.repeat(81)]) expect(wrongPaths(signUpSchema, { ...signUp, displayName: wrong })).toContain('displayName')
  })

  it('makes nobody a steward by asking', () => {
    expect(accepts(signUpSchema, { ...signUp, role: 'steward' })).toBe(false)
  })

  it('lets an old short password still sign in, but not a flood of text', () => {
    expect(accepts(signInSchema, { email: 'ada@example.org', password: 'short' })).toBe(true)
    expect(wrongPaths(signInSchema, { email: 'a'.repeat(255), password: 'p'.repeat(257) })).toEqual(['email', 'password'])
  })
})

describe('club', () => {
  it('has a name of 1 to 80 characters', () => {
    expect(accepts(clubFieldsSchema, { name: 'n'.repeat(80) })).toBe(true)
    for (const wrong of ['', ' ', 'n'.repeat(81)]) expect(accepts(clubFieldsSchema, { name: wrong })).toBe(false)
  })

  it('invites 1 to 50 growers or mentors, never a steward', () => {
    for (const usesLeft of [1, 50]) expect(accepts(invitationRequestSchema, { role: 'grower', usesLeft })).toBe(true)
    for (const usesLeft of [0, 51, 1.5, null]) expect(wrongPaths(invitationRequestSchema, { role: 'mentor', usesLeft })).toEqual(['usesLeft'])
    expect(wrongPaths(invitationRequestSchema, { role: 'steward', usesLeft: 1 })).toEqual(['role'])
  })

  it('knows three roles', () => {
    for (const role of ['grower', 'mentor', 'steward']) expect(accepts(memberRoleSchema, { role })).toBe(true)
    for (const role of ['owner', '', null]) expect(accepts(memberRoleSchema, { role })).toBe(false)
  })
})
