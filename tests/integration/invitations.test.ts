import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ApiClient, newId } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'
import { runOn } from '../support/database'

let app: RunningApp
let steward: ApiClient
let grower: ApiClient
let outsider: ApiClient
let clubId: string
let invitations: string

beforeAll(async () => {
  app = await startApp()
  steward = await new ApiClient(app.origin).signUp('Steward')
  grower = await new ApiClient(app.origin).signUp('Grower')
  outsider = await new ApiClient(app.origin).signUp('Outsider')
  clubId = await steward.club('Roof terrace', grower)
  invitations = `/api/clubs/${clubId}/invitations`
})
afterAll(() => app.dispose())

async function invite(usesLeft = 5, role = 'grower') {
  const { body } = await steward.post(invitations, { role, usesLeft })
  return { id: String(body.invitation.id), token: String(body.token) }
}

function wrongToken(token: string) {
  return (token.startsWith('A') ? 'B' : 'A') + token.slice(1)
}

describe('making an invitation', () => {
  it('shows its link once and keeps only a checksum of it', async () => {
    const { status, body } = await steward.post(invitations, { role: 'mentor', usesLeft: 3 })
    expect(status).toBe(200)
    expect(body.token).toMatch(/^[\w-]{43}$/)
    expect(body.invitation).toMatchObject({ role: 'mentor', usesLeft: 3 })
    const days = (Date.parse(body.invitation.expiresAt) - Date.now()) / 86_400_000
    expect(days).toBeGreaterThan(13.9)
    expect(days).toBeLessThanOrEqual(14)
    expect(JSON.stringify((await steward.get(invitations)).body)).not.toContain(body.token)
    const stored = await runOn(app.databaseUrl, 'SELECT * FROM invitation WHERE id = ?', [body.invitation.id])
    expect(JSON.stringify(stored)).toContain('token_sha256')
    expect(JSON.stringify(stored)).not.toContain(body.token)
  })

  it('gives another link each time', async () => {
    expect((await invite()).token).not.toBe((await invite()).token)
  })

  it.each([
    [{ role: 'steward', usesLeft: 1 }, ['role']],
    [{ role: 'grower', usesLeft: 0 }, ['usesLeft']],
    [{ role: 'grower', usesLeft: 51 }, ['usesLeft']],
    [{ role: 'grower', usesLeft: 1.5 }, ['usesLeft']],
    [{}, ['role', 'usesLeft']],
  ])('refuses %j at %j', async (body, expected) => {
    const answer = await steward.post(invitations, body)
    expect(answer.status).toBe(422)
    expect(answer.body.issues.map((issue: { path: string }) => issue.path)).toEqual(expected)
  })

  it('is for stewards: a member is told so, everybody else finds nothing', async () => {
    const request = { role: 'grower', usesLeft: 1 }
    expect(await grower.post(invitations, request)).toMatchObject({ status: 403, body: { code: 'not_allowed' } })
    expect(await outsider.post(invitations, request)).toMatchObject({ status: 404, body: { code: 'not_found' } })
    expect(await steward.post(`/api/clubs/${newId()}/invitations`, request)).toMatchObject({ status: 404 })
    expect(await steward.post('/api/clubs/1/invitations', request)).toMatchObject({ status: 404 })
  })
})

describe('the list of invitations', () => {
  it('holds those that still work', async () => {
    const first = await invite()
    const second = await invite()
    await steward.delete(`${invitations}/${first.id}`)
    const { status, body } = await steward.get(invitations)
    expect(status).toBe(200)
    const listed = body.invitations.map((invitation: { id: string }) => invitation.id)
    expect(listed).toContain(second.id)
    expect(listed).not.toContain(first.id)
  })

  it('is for stewards', async () => {
    expect((await grower.get(invitations)).status).toBe(403)
    expect((await outsider.get(invitations)).status).toBe(404)
  })
})

describe('withdrawing an invitation', () => {
  it('works, and again', async () => {
    const { id, token } = await invite()
    for (let time = 0; time < 2; time += 1) {
      expect(await steward.delete(`${invitations}/${id}`)).toMatchObject({ status: 200, body: { withdrawn: true } })
    }
    expect((await new ApiClient(app.origin).get(`/api/invitations/${token}`)).status).toBe(404)
    expect(await outsider.post(`/api/invitations/${token}/accept`)).toMatchObject({ status: 410, body: { code: 'invitation_spent' } })
  })

  it('is for the club’s own stewards', async () => {
    const { id, token } = await invite()
    expect((await grower.delete(`${invitations}/${id}`)).status).toBe(403)
    expect((await outsider.delete(`${invitations}/${id}`)).status).toBe(404)
    const otherClub = await outsider.club('Another club')
    expect((await outsider.delete(`/api/clubs/${otherClub}/invitations/${id}`)).status).toBe(404)
    expect((await new ApiClient(app.origin).get(`/api/invitations/${token}`)).status).toBe(200)
  })
})

describe('looking at an invitation', () => {
  it('needs no account and tells the club’s name and the role, nothing more', async () => {
    const { token } = await invite(1, 'mentor')
    const { status, body, headers } = await new ApiClient(app.origin).get(`/api/invitations/${token}`)
    expect(status).toBe(200)
    expect(Object.keys(body).toSorted()).toEqual(['clubName', 'expiresAt', 'role'])
    expect(body).toMatchObject({ clubName: 'Roof terrace', role: 'mentor' })
    expect(headers.get('cache-control')).toBe('no-store')
  })

  it('answers the same for a link that is wrong, too old, withdrawn or used up', async () => {
    const { id: oldId, token: old } = await invite()
    await runOn(app.databaseUrl, 'UPDATE invitation SET expires_at = ? WHERE id = ?', [new Date(Date.now() - 1_000), oldId])
    const { id: withdrawnId, token: withdrawn } = await invite()
    await steward.delete(`${invitations}/${withdrawnId}`)
    const { id: usedId, token: used } = await invite()
    await runOn(app.databaseUrl, 'UPDATE invitation SET uses_left = 0 WHERE id = ?', [usedId])
    for (const token of [wrongToken(old), old, withdrawn, used, 'short', `${old}x`]) {
      const { status, body } = await new ApiClient(app.origin).get(`/api/invitations/${token}`)
      expect({ status, code: body.code }).toEqual({ status: 404, code: 'not_found' })
    }
    expect(await outsider.post(`/api/invitations/${old}/accept`)).toMatchObject({ status: 410 })
  })
})

describe('accepting an invitation', () => {
  it('makes a member, who learns of the club by their own feed; again changes nothing', async () => {
    const dana = await new ApiClient(app.origin).signUp('Dana')
    const { id, token } = await invite(2, 'mentor')
    const { status, body } = await dana.post(`/api/invitations/${token}/accept`)
    expect(status).toBe(200)
    expect(body.club.data).toEqual({ id: clubId, name: 'Roof terrace' })
    expect(body.membership.data).toMatchObject({ clubId, accountId: dana.account.id, displayName: 'Dana', role: 'mentor' })
    expect((await dana.row(body.membership.id))?.data).toEqual(body.membership.data)
    expect((await steward.row(body.membership.id, `club:${clubId}`))?.data).toEqual(body.membership.data)
    expect((await dana.post(`/api/invitations/${token}/accept`)).body).toEqual(body)
    const listed = (await steward.get(invitations)).body.invitations.find((invitation: { id: string }) => invitation.id === id)
    expect(listed.usesLeft).toBe(1)
  })

  it('leaves a member what they are', async () => {
    const { token } = await invite(1, 'grower')
    const { body } = await steward.post(`/api/invitations/${token}/accept`)
    expect(body.membership.data.role).toBe('steward')
    expect((await new ApiClient(app.origin).get(`/api/invitations/${token}`)).status).toBe(200)
  })

  it('lets one of two in by a link for one, however close they come', async () => {
    const [eva, fay] = await Promise.all(['Eva', 'Fay'].map(name => new ApiClient(app.origin).signUp(name)))
    const { token } = await invite(1)
    const answers = await Promise.all([eva, fay].map(person => person?.post(`/api/invitations/${token}/accept`)))
    expect(answers.map(answer => answer?.status).toSorted()).toEqual([200, 410])
  })

  it('answers 404 to a link that never was', async () => {
    const { token } = await invite()
    expect(await outsider.post(`/api/invitations/${wrongToken(token)}/accept`)).toMatchObject({ status: 404, body: { code: 'not_found' } })
  })
})
