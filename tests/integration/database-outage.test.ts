import { setTimeout as wait } from 'node:timers/promises'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Op } from '#shared/sync/protocol'
import { ApiClient } from '../support/api-client'
import type { Answer } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'
import { startPrivateDatabase } from '../support/private-database'
import type { PrivateDatabase } from '../support/private-database'

let database: PrivateDatabase
let app: RunningApp
let ada: ApiClient
let plant: Op

beforeAll(async () => {
  database = await startPrivateDatabase()
  app = await startApp({ databaseUrl: database.url })
  ada = await new ApiClient(app.origin).signUp('Ada')
  plant = ada.createPlant()
  await ada.done(plant)
})
afterAll(async () => {
  await app?.dispose()
  await database?.dispose()
})

/** Sends again what was not confirmed, as a phone does, until all is; gives how often each was confirmed as new. */
async function sendUntilConfirmed(ops: Op[], confirmed: Set<string>, patience = 60): Promise<void> {
  for (let round = 0; round < patience; round += 1) {
    const left = ops.filter(op => !confirmed.has(op.opId))
    if (left.length === 0) return
    const answer = await ada.post('/api/sync/push', { ops: left })
    noteConfirmed(answer, confirmed)
    if (answer.status !== 200) await wait(250)
  }
  throw new Error('the server did not come back')
}

function noteConfirmed(answer: Answer, confirmed: Set<string>): void {
  if (answer.status !== 200) return
  for (const result of answer.body.results) if (['applied', 'duplicate', 'merged'].includes(result.status)) confirmed.add(result.opId)
}

describe('while the database is away', () => {
  const entry = () => ada.createEntry(plant.entityId, { note: 'written during the outage' })

  it('every request is answered with "later", and what was sent is done once it is back', async () => {
    const op = entry()
    await database.kill()
    for (const answer of [await ada.post('/api/sync/push', { ops: [op] }), await ada.get(`/api/sync/pull?scope=${ada.userFeed}&since=0&limit=10`)]) {
      expect({ status: answer.status, code: answer.body.code }).toEqual({ status: 503, code: 'unavailable' })
      expect(Number(answer.headers.get('retry-after'))).toBeGreaterThan(0)
    }
    await database.start()
    await sendUntilConfirmed([op], new Set())
    expect(await ada.row(op.entityId)).toMatchObject({ ver: 1, state: 'live' })
  })

  it('a database killed under load loses nothing it confirmed and does nothing twice', async () => {
    const groups = Array.from({ length: 8 }, () => [entry(), entry(), entry(), entry(), entry()])
    const all = groups.flat()
    const confirmed = new Set<string>()
    const sending = groups.map(async ops => noteConfirmed(await ada.post('/api/sync/push', { ops }), confirmed))
    await wait(150)
    await database.kill()
    await Promise.all(sending)
    const before = new Set(confirmed)
    await database.start()
    await sendUntilConfirmed(all.filter(op => before.has(op.opId)), new Set())
    await sendUntilConfirmed(all, confirmed)

    const rows = new Map((await ada.feed()).map(row => [row.id, row]))
    for (const op of all) expect(rows.get(op.entityId)).toMatchObject({ ver: 1, state: 'live' })
    const page = await ada.pullPage(ada.userFeed)
    expect(page.rows.filter(row => row.type === 'entry')).toHaveLength(all.length + 1)
    expect(rows.get(plant.entityId)?.ver).toBe(all.length + 2)
  })

  it('a server killed under load does nothing twice either', async () => {
    const ops = Array.from({ length: 20 }, entry)
    const confirmed = new Set<string>()
    const before = (await ada.row(plant.entityId))?.ver ?? 0
    const sending = ops.map(op => ada.post('/api/sync/push', { ops: [op] }).then(answer => noteConfirmed(answer, confirmed), () => undefined))
    await wait(100)
    await app.kill()
    await Promise.all(sending)
    await app.restart()
    await sendUntilConfirmed(ops, new Set())
    expect((await ada.row(plant.entityId))?.ver).toBe(before + ops.length)
  })
})
