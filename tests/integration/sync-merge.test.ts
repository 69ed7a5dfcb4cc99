import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest'
import type { Op } from '#shared/sync/protocol'
import { ApiClient } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'

let app: RunningApp
let phone: ApiClient
let tablet: ApiClient
let mentor: ApiClient
let clubId: string
let plant: Op
let entry: Op

beforeAll(async () => {
  app = await startApp()
  phone = await new ApiClient(app.origin).signUp('Ada')
  tablet = phone.otherPhone()
  mentor = await new ApiClient(app.origin).signUp('Mentor')
  clubId = await phone.club('Roof terrace', mentor)
})
afterAll(() => app.dispose())

beforeEach(async () => {
  plant = phone.createPlant({ visibility: 'club', clubId })
  entry = phone.createEntry(plant.entityId, { note: 'as written', ph: 6, actions: ['swirled', 'covered'] })
  await phone.push(plant, entry)
})

function change(client: ApiClient, baseVer: number, fields: Record<string, unknown>) {
  return client.done(client.op('patch', 'entry', entry.entityId, baseVer, fields))
}

async function conflictsOnEntry(client: ApiClient) {
  return (await client.feed()).filter(row => row.type === 'conflict' && row.data?.entityId === entry.entityId)
}

describe('two phones that change one entry', () => {
  it('in different fields: both changes stand', async () => {
    expect(await change(phone, 1, { ph: 5.8 })).toMatchObject({ status: 'applied', record: { ver: 2 } })
    expect(await change(tablet, 1, { note: 'from the tablet' })).toMatchObject({ status: 'merged', record: { ver: 3 } })
    expect((await phone.row(entry.entityId))?.data).toMatchObject({ ph: 5.8, note: 'from the tablet' })
  })

  it.each([
    ['text', 'note', 'phone wrote 🌱', 'tablet wrote "x"'],
    ['text that looks like a number', 'note', '12', '7'],
    ['text that looks like JSON', 'note', 'null', '{"a":1}'],
    ['nothing', 'note', 'phone wrote', null],
    ['numbers', 'ph', 5.8, 6.2],
    ['no number', 'ph', 5.8, null],
    ['yes and no', 'lookedNoChange', true, true],
  ])('in the same field (%s): the first stands, the other is kept', async (_what, field, first, second) => {
    await change(phone, 1, { [field]: first })
    const result = await change(tablet, 1, { [field]: second })
    expect((await phone.row(entry.entityId))?.data?.[field]).toEqual(first)
    if (first === second) {
      expect(result.status).toBe('merged')
      expect(await conflictsOnEntry(phone)).toEqual([])
      return
    }
    expect(result).toMatchObject({ status: 'kept_both', record: { data: { [field]: first } } })
    const [conflict, ...more] = await conflictsOnEntry(phone)
    expect(more).toEqual([])
    expect(conflict?.data).toMatchObject({ entityType: 'entry', field, otherValue: second, deviceId: tablet.deviceId, resolvedAt: null })
    expect((await phone.notices('both-kept')).map(row => row.data?.subjectId)).toContain(conflict?.id)
  })

  it('in the set of actions: what each added and removed counts', async () => {
    await change(phone, 1, { actions: ['swirled', 'pruned'] })
    expect((await change(tablet, 1, { actions: ['swirled', 'covered', 'harvested'] })).status).toBe('merged')
    const actions = (await phone.row(entry.entityId))?.data?.actions
    expect(new Set(Array.isArray(actions) ? actions : [])).toEqual(new Set(['swirled', 'pruned', 'harvested']))
  })

  it('one after the other, having seen each other: the later stands', async () => {
    await change(phone, 1, { note: 'first' })
    expect((await change(tablet, 2, { note: 'second' })).status).toBe('applied')
    expect((await phone.row(entry.entityId))?.data?.note).toBe('second')
  })

  it('the same phone never disagrees with itself', async () => {
    await change(phone, 1, { note: 'first' })
    expect((await change(phone, 1, { note: 'second' })).status).toBe('applied')
    expect((await phone.row(entry.entityId))?.data?.note).toBe('second')
  })
})

describe('choosing between two kept values', () => {
  async function disagree() {
    await change(phone, 1, { note: 'phone wrote' })
    await change(tablet, 1, { note: 'tablet wrote' })
    const [conflict] = await conflictsOnEntry(phone)
    return conflict?.id ?? ''
  }

  it('takes the other one, once', async () => {
    const id = await disagree()
    expect((await phone.done(phone.op('resolve', 'conflict', id, 1, { choice: 'other' }))).status).toBe('applied')
    expect((await phone.row(entry.entityId))?.data?.note).toBe('tablet wrote')
    expect((await phone.row(id))?.data?.resolvedAt).toMatch(/Z$/)
    expect(await phone.done(phone.op('resolve', 'conflict', id, 1, { choice: 'standing' }))).toMatchObject({ code: 'resolved_before' })
    expect((await phone.row(entry.entityId))?.data?.note).toBe('tablet wrote')
  })

  it('leaves the standing one', async () => {
    const id = await disagree()
    await phone.done(phone.op('resolve', 'conflict', id, 1, { choice: 'standing' }))
    expect((await phone.row(entry.entityId))?.data?.note).toBe('phone wrote')
  })

  it('is nobody else’s business, and does not reach the club', async () => {
    const id = await disagree()
    expect((await mentor.push(mentor.op('resolve', 'conflict', id, 1, { choice: 'other' })))[0]).toMatchObject({ status: 'rejected', code: 'not_found' })
    expect(await mentor.row(id, `club:${clubId}`)).toBeUndefined()
  })
})

describe('deleting an entry', () => {
  const remove = (client: ApiClient, baseVer: number) => client.done(client.op('delete', 'entry', entry.entityId, baseVer))

  it('leaves a mark without what it held', async () => {
    expect(await remove(phone, 1)).toMatchObject({ status: 'applied', record: { ver: 2, state: 'deleted', data: null } })
    expect(await phone.row(entry.entityId)).toMatchObject({ state: 'deleted', data: null })
    expect(await mentor.row(entry.entityId, `club:${clubId}`)).toMatchObject({ state: 'deleted', data: null })
  })

  it('twice is fine', async () => {
    await remove(phone, 1)
    expect((await remove(tablet, 1)).status).toBe('applied')
  })

  it('is refused when somebody commented unseen, and the person is told', async () => {
    await mentor.done(mentor.createComment(entry, { text: 'Look at the roots first' }))
    expect(await remove(phone, 1)).toMatchObject({ status: 'merged', code: 'delete_refused', record: { state: 'live' } })
    expect((await phone.row(entry.entityId))?.state).toBe('live')
    expect((await phone.notices('delete-refused')).map(row => row.data?.subjectId)).toContain(entry.entityId)
  })

  it('is refused over an unseen comment even when its sender passes for the owner’s phone', async () => {
    await mentor.done({ ...mentor.createComment(entry, { text: 'Who wrote this?' }), deviceId: phone.deviceId })
    expect(await remove(phone, 1)).toMatchObject({ status: 'merged', code: 'delete_refused' })
  })

  it('is refused when another phone changed it unseen', async () => {
    await change(tablet, 1, { note: 'more to say' })
    expect(await remove(phone, 1)).toMatchObject({ code: 'delete_refused' })
    expect((await phone.row(entry.entityId))?.data?.note).toBe('more to say')
  })

  it('goes through once the comment was seen', async () => {
    await mentor.done(mentor.createComment(entry))
    const seen = (await phone.row(entry.entityId))?.ver ?? 0
    expect(await remove(phone, seen)).toMatchObject({ status: 'applied', record: { state: 'deleted' } })
  })

  it('is undone by another phone that changed it without knowing, and the owner is told', async () => {
    await remove(phone, 1)
    expect(await change(tablet, 1, { note: 'still of use' })).toMatchObject({ record: { state: 'live', data: { note: 'still of use', ph: 6 } } })
    expect((await phone.row(entry.entityId))?.state).toBe('live')
    expect((await phone.notices('restored-by-edit')).map(row => row.data?.subjectId)).toContain(entry.entityId)
  })

  it('does not swallow a comment that comes after it: both sides are told', async () => {
    await remove(phone, 1)
    const comment = mentor.createComment(entry, { text: 'Written on the bus' })
    expect((await mentor.done(comment)).status).toBe('applied')
    expect((await phone.row(entry.entityId))?.state).toBe('deleted')
    for (const person of [phone, mentor]) {
      expect((await person.notices('comment-on-deleted')).map(row => row.data?.subjectId)).toContain(comment.entityId)
      expect((await person.row(comment.entityId))?.data?.text).toBe('Written on the bus')
    }
  })
})

describe('deleting a plant', () => {
  it('is refused when another phone wrote an entry unseen', async () => {
    await tablet.done(tablet.createEntry(plant.entityId))
    const seen = 2
    expect(await phone.done(phone.op('delete', 'plant', plant.entityId, seen))).toMatchObject({ code: 'delete_refused' })
    expect((await phone.row(plant.entityId))?.state).toBe('live')
  })

  it('is undone by an entry from a phone that did not know', async () => {
    await phone.done(phone.op('delete', 'plant', plant.entityId, 2))
    const late = tablet.createEntry(plant.entityId, { note: 'from the roof' })
    await tablet.done(late)
    expect((await phone.row(plant.entityId))?.state).toBe('live')
    expect((await phone.row(late.entityId))?.data?.note).toBe('from the roof')
    expect((await phone.notices('restored-by-edit')).map(row => row.data?.subjectId)).toContain(plant.entityId)
  })
})

describe('comments', () => {
  it('tell the plant’s owner and those in the conversation, but not their writer', async () => {
    const first = mentor.createComment(entry, { text: 'How warm is the water?' })
    await mentor.done(first)
    const reply = phone.createComment(entry, { text: '24 °C' })
    await phone.done(reply)
    const about = async (client: ApiClient) => (await client.notices('comment-added')).map(row => row.data?.subjectId)
    expect(await about(phone)).toContain(first.entityId)
    expect(await about(phone)).not.toContain(reply.entityId)
    expect(await about(mentor)).toContain(reply.entityId)
    expect(await about(mentor)).not.toContain(first.entityId)
  })

  it('are changed and deleted by their writer alone', async () => {
    const comment = mentor.createComment(entry)
    await mentor.done(comment)
    const attempts = [phone.op('patch', 'comment', comment.entityId, 1, { text: 'x' }), phone.op('delete', 'comment', comment.entityId, 1)]
    for (const result of await phone.push(...attempts)) expect(result).toMatchObject({ status: 'rejected', code: 'not_allowed' })
    expect((await mentor.done(mentor.op('patch', 'comment', comment.entityId, 1, { text: 'better' }))).status).toBe('applied')
    expect((await phone.row(comment.entityId, `club:${clubId}`))?.data?.text).toBe('better')
  })

  it('must say something, in 4,000 characters at most', async () => {
    const ops = [mentor.createComment(entry, { text: ' ' }), mentor.createComment(entry, { text: 'c'.repeat(4_001) })]
    for (const result of await mentor.push(...ops)) {
      expect(result.status).toBe('rejected')
      expect(result.issues?.map(issue => issue.path)).toEqual(['text'])
    }
    expect((await mentor.done(mentor.createComment(entry, { text: 'c'.repeat(4_000) }))).status).toBe('applied')
  })
})

describe('a notice', () => {
  it('is marked as seen by its reader, and by nobody else', async () => {
    await mentor.done(mentor.createComment(entry))
    const [notice] = (await phone.notices('comment-added')).filter(row => row.data?.entryId === entry.entityId)
    const seenAt = '2026-06-10T06:00:00.000Z'
    const id = notice?.id ?? ''
    expect((await mentor.push(mentor.op('patch', 'notice', id, 1, { seenAt })))[0]).toMatchObject({ status: 'rejected', code: 'not_found' })
    expect((await phone.done(phone.op('patch', 'notice', id, 1, { seenAt }))).record?.data?.seenAt).toBe(seenAt)
  })
})
