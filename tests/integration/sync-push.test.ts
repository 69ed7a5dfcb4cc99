import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { OpResult } from '#shared/sync/protocol'
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
  await ada.done(plant)
  plantId = plant.entityId
})
afterAll(() => app.dispose())

function paths(result: OpResult | undefined): string[] {
  return [...new Set(result?.issues?.map(issue => issue.path))].toSorted()
}

describe('a request to post("/api/sync/push")', () => {
  it('needs the name of the account it means', async () => {
    const { status, body } = await ada.post('/api/sync/push', { ops: [ada.createPlant()] }, { headers: { 'x-acting-user': null } })
    expect({ status, code: body.code }).toEqual({ status: 409, code: 'account_mismatch' })
  })

  it('takes 50 operations and no more, and at least one', async () => {
    const ops = Array.from({ length: 51 }, () => ada.createEntry(plantId))
    expect((await ada.post('/api/sync/push', { ops })).status).toBe(422)
    expect((await ada.post('/api/sync/push', { ops: [] })).status).toBe(422)
    expect((await ada.push(...ops.slice(0, 50))).map(result => result.status)).toEqual(Array(50).fill('applied'))
  })

  it('answers each operation in its order, and one that is wrong does not hold up the others', async () => {
    const ops = [ada.createEntry(plantId), { nonsense: true }, ada.createEntry(plantId, { ph: 15 }), ada.createEntry(plantId)]
    const results = await ada.push(...ops)
    expect(results.map(result => result.status)).toEqual(['applied', 'rejected', 'rejected', 'applied'])
    expect(results.map(result => result.code)).toEqual([undefined, 'unreadable', 'invalid', undefined])
  })

  it('makes what builds on a rejected record wait', async () => {
    const plant = ada.createPlant({ cropId: 'moon-cheese' })
    const [rejected, waiting] = await ada.push(plant, ada.createEntry(plant.entityId))
    expect(rejected?.status).toBe('rejected')
    expect(waiting).toMatchObject({ status: 'retry', code: 'waits' })
  })
})

describe('a plant', () => {
  it('comes back as it was sent, with its owner', async () => {
    const plant = ada.createPlant({ name: 'Tomate 🍅 البندورة', cultivar: '', sownOn: '2026-02-28', place: 'Ecke "links"\n<b>oben</b>' })
    const { record } = await ada.done(plant)
    const expected = { ...plant.fields, id: plant.entityId, ownerId: ada.account.id }
    expect(record).toEqual({ type: 'plant', id: plant.entityId, ver: 1, state: 'live', data: expected })
    expect(await ada.row(plant.entityId)).toMatchObject({ ver: 1, state: 'live', data: expected })
  })

  it.each([
    [{ cropId: 'moon-cheese' }, ['cropId']],
    [{ name: '   ' }, ['name']],
    [{ name: 'x'.repeat(81) }, ['name']],
    [{ setUpOn: '2026-02-30' }, ['setUpOn']],
    [{ setUpOn: null, timeZone: 'Europe/Atlantis' }, ['setUpOn', 'timeZone']],
    [{ visibility: 'public' }, ['visibility']],
    [{ visibility: 'club', clubId: null }, ['clubId']],
    [{ visibility: 'club', clubId: '01970000-0000-7000-8000-00000000ffff' }, ['clubId']],
    [{ vesselId: '01970000-0000-7000-8000-00000000ffff' }, ['vesselId']],
    [{ ownerId: '01970000-0000-7000-8000-00000000ffff' }, ['']],
  ])('with %j is refused at %j', async (fields, expected) => {
    const plant = ada.createPlant(fields)
    const [result] = await ada.push(plant)
    expect(result).toMatchObject({ status: 'rejected', code: 'invalid', record: null })
    expect(paths(result)).toEqual(expected)
    expect(await ada.row(plant.entityId)).toBeUndefined()
  })

  it('may not stand in somebody else’s vessel', async () => {
    const vessel = ben.createVessel()
    await ben.done(vessel)
    expect(paths((await ada.push(ada.createPlant({ vesselId: vessel.entityId })))[0])).toEqual(['vesselId'])
  })
})

describe('an entry', () => {
  it('comes back with every reading as it was typed', async () => {
    const entry = ada.createEntry(plantId, {
      occurredAt: '2026-06-09T05:40:00.123Z', note: 'Wurzeln weiß 🌿👩‍🌾 שורש <3 a<b "quoted" \\ \u0000end', ph: 5.85, ecMilliSiemensPerCm: 1.234567,
      waterLevelCm: 0, airGapCm: 12.5, waterCelsius: -1.5, airCelsius: 31.2, relativeHumidityPercent: 100, actions: ['topped-up', 'swirled'],
      topUpLitres: 0.1, topUpWith: 'plain-water', harvestCount: 3, lookedNoChange: true,
    })
    await ada.done(entry)
    expect((await ada.row(entry.entityId))?.data).toEqual({ ...entry.fields, id: entry.entityId, authorId: ada.account.id })
  })

  it('keeps a note of 10,000 characters, also when each takes four bytes', async () => {
    for (const note of ['n'.repeat(10_000), '🌱'.repeat(5_000)]) {
      const entry = ada.createEntry(plantId, { note })
      await ada.done(entry)
      expect((await ada.row(entry.entityId))?.data?.note).toBe(note)
    }
  })

  it.each([
    [{ ph: 15 }, ['ph']],
    [{ ph: -0.1 }, ['ph']],
    [{ ph: '6' }, ['ph']],
    [{ ecMilliSiemensPerCm: -1 }, ['ecMilliSiemensPerCm']],
    [{ note: 'n'.repeat(100_000) }, ['note']],
    [{ relativeHumidityPercent: 101, waterCelsius: 61 }, ['relativeHumidityPercent', 'waterCelsius']],
    [{ harvestCount: 1.5 }, ['harvestCount']],
    [{ actions: ['danced'] }, ['actions.0']],
    [{ occurredAt: '2026-06-09' }, ['occurredAt']],
    [{ occurredAt: '1969-12-31T23:59:59.999Z' }, ['occurredAt']],
    [{ surprise: 1 }, ['']],
  ])('with %o is refused at %j', async (fields, expected) => {
    const [result] = await ada.push(ada.createEntry(plantId, fields))
    expect(result).toMatchObject({ status: 'rejected', code: 'invalid' })
    expect(paths(result)).toEqual(expected)
  })

  it('of a visit the day after tomorrow is refused, one within a day of the clock is not', async () => {
    const inHours = (hours: number) => new Date(Date.now() + hours * 3_600_000).toISOString()
    const [late, near] = await ada.push(ada.createEntry(plantId, { occurredAt: inHours(25) }), ada.createEntry(plantId, { occurredAt: inHours(23) }))
    expect(late).toMatchObject({ status: 'rejected', code: 'invalid' })
    expect(paths(late)).toEqual(['occurredAt'])
    expect(near?.status).toBe('applied')
  })

  it('on a plant that nobody has is refused', async () => {
    expect((await ada.push(ada.createEntry(newId())))[0]).toMatchObject({ status: 'rejected', code: 'not_found' })
  })
})

describe('somebody else’s private record', () => {
  it('is not there, whatever is done to it', async () => {
    const entry = ada.createEntry(plantId)
    const vessel = ada.createVessel()
    await ada.push(entry, vessel)
    const attempts = [
      ben.op('patch', 'plant', plantId, 1, { name: 'Mine now' }),
      ben.op('delete', 'plant', plantId, 1),
      ben.createEntry(plantId),
      ben.op('patch', 'entry', entry.entityId, 1, { note: 'x' }),
      ben.op('delete', 'entry', entry.entityId, 1),
      ben.createComment(entry),
      ben.op('patch', 'vessel', vessel.entityId, 1, { name: 'x' }),
      ben.op('delete', 'vessel', vessel.entityId, 1),
    ]
    for (const result of await ben.push(...attempts)) {
      expect(result).toMatchObject({ status: 'rejected', code: 'not_found', record: null })
      expect(JSON.stringify(result)).not.toContain('Pepper')
    }
    expect(await ada.row(vessel.entityId)).toMatchObject({ ver: 1, state: 'live' })
    expect((await ben.feed()).filter(row => row.data?.ownerId !== ben.account.id)).toEqual([])
  })

  it('cannot be overwritten by making it again under its id', async () => {
    const again = { ...ben.createPlant({ name: 'Mine now' }), entityId: plantId }
    const [result] = await ben.push(again)
    expect(result).toMatchObject({ status: 'rejected', record: null })
    expect((await ada.row(plantId))?.data?.name).toBe('Pepper by the door')
  })
})

describe('what phones may not make', () => {
  it('is refused', async () => {
    for (const type of ['club', 'membership', 'conflict', 'notice'] as const) {
      const [result] = await ada.push(ada.op('create', type, newId(), 0, { name: 'x' }))
      expect(result).toMatchObject({ status: 'rejected', code: 'invalid' })
      expect(paths(result)).toEqual(['kind'])
    }
  })

  it('is refused for a newer shape of operations', async () => {
    expect((await ada.push({ ...ada.createPlant(), schema: 99 }))[0]).toMatchObject({ status: 'rejected', code: 'unreadable' })
  })
})
