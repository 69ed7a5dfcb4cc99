import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ApiClient } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'

let app: RunningApp
let ada: ApiClient

beforeAll(async () => {
  app = await startApp()
  ada = await new ApiClient(app.origin).signUp('Ada')
})
afterAll(() => app.dispose())

describe('making a club: post(/api/clubs)', () => {
  it('makes its maker the steward, and tells both feeds', async () => {
    const { status, body } = await ada.post('/api/clubs', { name: '  Dachterrasse 🌿 سطح  ' })
    expect(status).toBe(200)
    expect(body.club).toMatchObject({ type: 'club', ver: 1, state: 'live', data: { name: 'Dachterrasse 🌿 سطح' } })
    expect(body.membership.data).toMatchObject({ clubId: body.club.id, accountId: ada.account.id, displayName: 'Ada', role: 'steward' })
    expect((await ada.row(body.membership.id))?.data).toEqual(body.membership.data)
    const inClub = await ada.feed(`club:${body.club.id}`)
    expect(inClub.map(row => [row.type, row.data])).toEqual([['club', body.club.data], ['membership', body.membership.data]])
  })

  it('again under the same name gives the same club, also eight times at once', async () => {
    const answers = await Promise.all(Array.from({ length: 8 }, () => ada.post('/api/clubs', { name: 'Courtyard' })))
    expect(new Set(answers.map(answer => answer.status))).toEqual(new Set([200]))
    expect(new Set(answers.map(answer => answer.body.club.id)).size).toBe(1)
    expect((await ada.feed()).filter(row => row.type === 'membership')).toHaveLength(2)
  })

  it.each([
    [{}, ['name']],
    [{ name: '' }, ['name']],
    [{ name: ' \n' }, ['name']],
    [{ name: 'x'.repeat(81) }, ['name']],
    [{ name: 5 }, ['name']],
    [{ name: 'Fine', id: 'mine' }, ['']],
    [[], ['']],
  ])('refuses %j at %j', async (body, expected) => {
    const answer = await ada.post('/api/clubs', body)
    expect({ status: answer.status, code: answer.body.code }).toEqual({ status: 422, code: 'invalid' })
    expect(answer.body.issues.map((issue: { path: string }) => issue.path)).toEqual(expected)
  })
})
