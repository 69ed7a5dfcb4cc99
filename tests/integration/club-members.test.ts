import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ApiClient, newId } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'

let app: RunningApp
let ada: ApiClient
let ben: ApiClient
let cem: ApiClient
let outsider: ApiClient
let clubId: string

beforeAll(async () => {
  app = await startApp()
  ada = await new ApiClient(app.origin).signUp('Ada')
  ben = await new ApiClient(app.origin).signUp('Ben')
  cem = await new ApiClient(app.origin).signUp('Cem')
  outsider = await new ApiClient(app.origin).signUp('Outsider')
  clubId = await ada.club('Roof terrace', ben, cem)
})
afterAll(() => app.dispose())

function member(person: ApiClient, id = clubId) {
  return `/api/clubs/${id}/members/${person.account.id}`
}

async function roleOf(person: ApiClient) {
  const rows = await ada.feed(`club:${clubId}`)
  return rows.find(row => row.data?.accountId === person.account.id)?.data?.role
}

describe('changing a role', () => {
  it('is told to everybody, and again changes nothing', async () => {
    const { status, body } = await ada.patch(member(ben), { role: 'mentor' })
    expect(status).toBe(200)
    expect(body.membership).toMatchObject({ state: 'live', ver: 2, data: { role: 'mentor', displayName: 'Ben' } })
    expect((await ada.patch(member(ben), { role: 'mentor' })).body.membership.ver).toBe(2)
    expect((await ben.row(body.membership.id))?.data?.role).toBe('mentor')
    expect((await cem.row(body.membership.id, `club:${clubId}`))?.data?.role).toBe('mentor')
  })

  it('is for stewards of this club', async () => {
    expect(await ben.patch(member(cem), { role: 'steward' })).toMatchObject({ status: 403, body: { code: 'not_allowed' } })
    expect(await ben.patch(member(ben), { role: 'steward' })).toMatchObject({ status: 403 })
    expect(await outsider.patch(member(cem), { role: 'grower' })).toMatchObject({ status: 404, body: { code: 'not_found' } })
    expect(await ada.patch(member(outsider), { role: 'grower' })).toMatchObject({ status: 404 })
    expect(await ada.patch(member(cem, newId()), { role: 'grower' })).toMatchObject({ status: 404 })
    expect(await roleOf(cem)).toBe('grower')
  })

  it.each([[{ role: 'queen' }], [{}]])('refuses %j', async (body) => {
    const answer = await ada.patch(member(ben), body)
    expect(answer.status).toBe(422)
    expect(answer.body.issues.map((issue: { path: string }) => issue.path)).toEqual(['role'])
  })

  it('keeps the last steward', async () => {
    expect(await ada.patch(member(ada), { role: 'grower' })).toMatchObject({ status: 409, body: { code: 'last_steward' } })
    expect(await ada.delete(member(ada))).toMatchObject({ status: 409, body: { code: 'last_steward' } })
    expect(await roleOf(ada)).toBe('steward')
  })

  it('keeps one of two stewards who step down at the same moment', async () => {
    await ada.patch(member(ben), { role: 'steward' })
    const answers = await Promise.all([ada, ben].map(person => person.patch(member(person), { role: 'grower' })))
    expect(answers.map(answer => answer.status).toSorted()).toEqual([200, 409])
    const [steward, other] = await roleOf(ada) === 'steward' ? [ada, ben] : [ben, ada]
    await steward.patch(member(other), { role: 'steward' })
    await ada.patch(member(ben), { role: 'grower' })
    expect([await roleOf(ada), await roleOf(ben)]).toEqual(['steward', 'grower'])
  })
})

describe('leaving', () => {
  it('takes back what the person shared, and shuts the feed', async () => {
    const vessel = ben.createVessel()
    const shared = ben.createPlant({ visibility: 'club', clubId, vesselId: vessel.entityId })
    const entry = ben.createEntry(shared.entityId, { note: 'mine' })
    await ben.push(vessel, shared, entry)
    const others = ada.createPlant({ visibility: 'club', clubId })
    await ada.push(others)
    expect((await ada.row(entry.entityId, `club:${clubId}`))?.state).toBe('live')

    const { status, body } = await ben.delete(member(ben))
    expect(status).toBe(200)
    expect(body.membership).toMatchObject({ state: 'deleted', data: null })

    for (const op of [vessel, shared, entry]) {
      expect(await ada.row(op.entityId, `club:${clubId}`)).toMatchObject({ state: 'revoked', data: null })
    }
    expect((await ada.row(others.entityId, `club:${clubId}`))?.state).toBe('live')
    expect(await ada.row(body.membership.id, `club:${clubId}`)).toMatchObject({ state: 'deleted', data: null })
    expect(await ben.row(body.membership.id)).toMatchObject({ state: 'deleted', data: null })
    expect((await ben.row(shared.entityId))?.data).toMatchObject({ visibility: 'private', clubId: null })
    expect((await ben.row(entry.entityId))?.data?.note).toBe('mine')
    expect((await ben.get(`/api/sync/pull?scope=club:${clubId}&since=0&limit=10`)).status).toBe(404)
    expect((await ben.push(ben.createComment(ada.createEntry(others.entityId))))[0]).toMatchObject({ status: 'rejected', code: 'not_found' })
  })

  it('a second time finds no club', async () => {
    expect(await ben.delete(member(ben))).toMatchObject({ status: 404, body: { code: 'not_found' } })
  })

  it('and coming back is the same membership again, with what others share', async () => {
    const before = (await ben.feed()).find(row => row.type === 'membership')
    const { status, body } = await ada.letIn(clubId, ben, 'mentor')
    expect(status).toBe(200)
    expect(body.membership).toMatchObject({ id: before?.id, state: 'live', data: { role: 'mentor' } })
    expect((await ben.feed(`club:${clubId}`)).some(row => row.type === 'plant' && row.state === 'live')).toBe(true)
  })

  it('does not share anew what was taken back', async () => {
    const shared = (await ben.feed()).filter(row => row.type === 'plant' && row.data?.visibility === 'club')
    expect(shared).toEqual([])
  })
})

describe('removing a member', () => {
  it('is for stewards', async () => {
    expect(await cem.delete(member(ben))).toMatchObject({ status: 403, body: { code: 'not_allowed' } })
    expect(await outsider.delete(member(ben))).toMatchObject({ status: 404 })
    expect(await ada.delete(member(outsider))).toMatchObject({ status: 404 })
  })

  it('takes a new link to undo: one from before does not let them in again', async () => {
    const { body: { token } } = await ada.post(`/api/clubs/${clubId}/invitations`, { role: 'grower', usesLeft: 9 })
    for (let time = 0; time < 2; time += 1) {
      expect(await ada.delete(member(cem))).toMatchObject({ status: 200, body: { membership: { state: 'deleted' } } })
    }
    expect((await cem.get(`/api/sync/pull?scope=club:${clubId}&since=0&limit=10`)).status).toBe(404)
    expect(await cem.post(`/api/invitations/${token}/accept`)).toMatchObject({ status: 410 })
    expect(await ada.letIn(clubId, cem)).toMatchObject({ status: 200 })
  })

  it('wins or loses against sharing at the same moment, but leaves nothing shared', async () => {
    const plants = Array.from({ length: 6 }, () => cem.createPlant({ visibility: 'club', clubId }))
    await Promise.all([...plants.map(plant => cem.push(plant)), ada.delete(member(cem))])
    const live = (await ada.feed(`club:${clubId}`)).filter(row => row.data?.ownerId === cem.account.id && row.state === 'live')
    expect(live).toEqual([])
    expect((await cem.feed()).filter(row => row.data?.visibility === 'club')).toEqual([])
  })
})
