import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Op } from '#shared/sync/protocol'
import { ApiClient } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'

let app: RunningApp
let ada: ApiClient
let ben: ApiClient
let clubId: string
let club: string
let vessel: Op
let plant: Op
let entry: Op

beforeAll(async () => {
  app = await startApp()
  ada = await new ApiClient(app.origin).signUp('Ada')
  ben = await new ApiClient(app.origin).signUp('Ben')
  clubId = await ada.club('Roof terrace', ben)
  club = `club:${clubId}`
  vessel = ada.createVessel()
  plant = ada.createPlant({ vesselId: vessel.entityId })
  entry = ada.createEntry(plant.entityId, { note: 'private until shared' })
  await ada.push(vessel, plant, entry)
})
afterAll(() => app.dispose())

async function state(op: Op) {
  return (await ben.row(op.entityId, club))?.state
}

let version = 2

/** The owner changes the plant, having seen everything. */
async function change(fields: Record<string, unknown>) {
  version = (await ada.row(plant.entityId))?.ver ?? version
  return ada.done(ada.op('patch', 'plant', plant.entityId, version, fields))
}

describe('a plant', () => {
  it('that is private never stands in the club’s feed', async () => {
    const ids = (await ben.feed(club)).map(row => row.id)
    for (const op of [vessel, plant, entry]) expect(ids).not.toContain(op.entityId)
  })

  it('brings its whole story along when it is shared', async () => {
    await change({ visibility: 'club', clubId })
    for (const op of [vessel, plant, entry]) expect(await state(op)).toBe('live')
    expect((await ben.row(entry.entityId, club))?.data?.note).toBe('private until shared')
  })

  it('that is shared may be commented on, but not changed', async () => {
    const attempts = [
      ben.op('patch', 'plant', plant.entityId, 9, { name: 'x' }),
      ben.op('delete', 'plant', plant.entityId, 9),
      ben.op('patch', 'entry', entry.entityId, 9, { note: 'x' }),
      ben.op('delete', 'entry', entry.entityId, 9),
      ben.createEntry(plant.entityId),
      ben.op('patch', 'vessel', vessel.entityId, 9, { name: 'x' }),
    ]
    for (const result of await ben.push(...attempts)) expect(result).toMatchObject({ status: 'rejected', code: 'not_allowed' })
    expect((await ben.done(ben.createComment(entry))).status).toBe('applied')
  })

  it('takes the old vessel out of sight and brings the new one when it moves', async () => {
    const second = ada.createVessel({ name: 'Grey tub' })
    await ada.push(second)
    await change({ vesselId: second.entityId })
    expect(await state(second)).toBe('live')
    expect(await state(vessel)).toBe('revoked')
    await change({ vesselId: vessel.entityId })
    expect(await state(vessel)).toBe('live')
  })

  it('is called back with its whole story when it is private again', async () => {
    const answer = ben.createComment(entry, { text: 'Nice roots' })
    await ben.done(answer)
    await change({ visibility: 'private' })
    const { rows } = await ben.pullPage(club)
    for (const op of [vessel, plant, entry, answer]) {
      expect(rows.find(row => row.id === op.entityId)).toMatchObject({ state: 'revoked', data: null })
    }
    expect((await ben.row(answer.entityId))?.data?.text).toBe('Nice roots')
    expect((await ada.row(answer.entityId))?.data?.text).toBe('Nice roots')
  })

  it('is not there for the others once it is private again', async () => {
    const attempts = [ben.createComment(entry), ben.op('patch', 'plant', plant.entityId, 9, { name: 'x' }), ben.op('delete', 'entry', entry.entityId, 9)]
    for (const result of await ben.push(...attempts)) expect(result).toMatchObject({ status: 'rejected', code: 'not_found', record: null })
  })

  it('can be shared anew with the club it was shared with', async () => {
    await change({ visibility: 'club' })
    for (const op of [vessel, plant, entry]) expect(await state(op)).toBe('live')
  })
})

describe('a repeated operation', () => {
  it('tells its sender nothing of a record that is no longer theirs to see', async () => {
    const comment = ben.createComment(entry, { text: 'Still there?' })
    await ben.done(comment)
    await change({ visibility: 'private' })
    const [again] = await ben.push(comment)
    expect(again).toMatchObject({ status: 'duplicate', record: { data: { text: 'Still there?' } } })
    await change({ visibility: 'club' })
  })
})

describe('somebody outside the club', () => {
  it('sees nothing of it', async () => {
    const cem = await new ApiClient(app.origin).signUp('Cem')
    expect((await cem.get(`/api/sync/pull?scope=${club}&since=0&limit=10`)).status).toBe(404)
    for (const result of await cem.push(cem.createComment(entry), cem.op('patch', 'plant', plant.entityId, 1, { name: 'x' }))) {
      expect(result).toMatchObject({ status: 'rejected', code: 'not_found' })
    }
  })
})
