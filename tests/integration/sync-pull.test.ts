import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ApiClient, newId } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'

let app: RunningApp
let ada: ApiClient
let ben: ApiClient
let plantId: string

beforeAll(async () => {
  app = await startApp()
  ada = await new ApiClient(app.origin).signUp('Ada')
  ben = await new ApiClient(app.origin).signUp('Ben')
  const plant = ada.createPlant()
  plantId = plant.entityId
  await ada.push(plant, ...Array.from({ length: 7 }, () => ada.createEntry(plantId)))
})
afterAll(() => app.dispose())

/** get('/api/sync/pull') */
function pull(client: ApiClient, query: string, headers: Record<string, string | null> = {}) {
  return client.get(`/api/sync/pull?${query}`, { headers })
}

describe('reading a feed', () => {
  it('gives each record once, as it is now, at its last place', async () => {
    const { rows, more, next } = await ada.pullPage(ada.userFeed)
    expect(rows.map(row => row.id)).toHaveLength(8)
    expect(new Set(rows.map(row => row.id)).size).toBe(8)
    expect(rows.find(row => row.id === plantId)).toMatchObject({ type: 'plant', ver: 8, state: 'live' })
    expect({ more, next }).toEqual({ more: false, next: Math.max(...rows.map(row => row.seq)) })
  })

  it('comes to the same in pages of three', async () => {
    const bySize = (rows: { id: string, ver: number }[]) => rows.map(({ id, ver }) => `${id} ${ver}`).toSorted()
    expect(bySize(await ada.feed(ada.userFeed, 3))).toEqual(bySize(await ada.feed()))
  })

  it('gives nothing twice to who asks from where the last answer ended, and the same to who asks again', async () => {
    const first = await ada.pullPage(ada.userFeed)
    expect(await ada.pullPage(ada.userFeed, first.next)).toMatchObject({ rows: [], next: first.next, more: false })
    expect((await ada.pullPage(ada.userFeed)).rows).toEqual(first.rows)
  })

  it('tells the server’s time and its epoch', async () => {
    const { serverTime, epoch, minSchema } = await ada.pullPage(ada.userFeed)
    expect(Math.abs(Date.parse(serverTime) - Date.now())).toBeLessThan(60_000)
    expect(epoch).toMatch(/^[0-9a-f-]{36}$/)
    expect(minSchema).toBe(1)
  })
})

describe('a feed that is not theirs', () => {
  it('is not there', async () => {
    const club = await ada.club('Roof terrace')
    for (const scope of [ada.userFeed, `club:${club}`, `club:${newId()}`, `user:${newId()}`]) {
      const { status, body } = await pull(ben, `scope=${scope}&since=0&limit=10`)
      expect({ scope, status, code: body.code }).toEqual({ scope, status: 404, code: 'not_found' })
    }
  })
})

describe('a question that makes no sense', () => {
  it.each([
    ['scope=all&since=0&limit=10', ['scope']],
    ['scope=user:1&since=-1&limit=501', ['limit', 'scope', 'since']],
    ['since=0&limit=0', ['limit', 'scope']],
    ['scope=user:01970000-0000-7000-8000-00000000ffff&since=1e3&limit=ten', ['limit', 'since']],
  ])('%s is refused at %j', async (query, expected) => {
    const { status, body } = await pull(ada, query)
    expect(status).toBe(422)
    expect([...new Set(body.issues.map((issue: { path: string }) => issue.path))].toSorted()).toEqual(expected)
  })

  it('needs the name of the account it means', async () => {
    const { status } = await pull(ada, `scope=${ada.userFeed}&since=0&limit=10`, { 'x-acting-user': null })
    expect(status).toBe(409)
  })
})
