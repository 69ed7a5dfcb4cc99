import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { Op } from '#shared/sync/protocol'
import { ApiClient } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'
import { runOn } from '../support/database'
import { startPrivateDatabase } from '../support/private-database'
import type { PrivateDatabase } from '../support/private-database'

const many = (count: number) => Array.from({ length: count })

/** A busy server may say "later", as a phone expects; it must not come to that for ever. */
async function sendUntilDone(person: ApiClient, op: Op): Promise<void> {
  for (let time = 0; time < 5; time += 1) {
    const [result] = await person.push(op)
    if (result?.status !== 'retry') return expect(result?.status).toMatch(/^(?:applied|duplicate)$/)
  }
  throw new Error('the server answered "later" five times')
}

// From 11.6 on MariaDB checks by itself that a row did not change under a reader; before, that is a setting.
describe.each(['OFF', 'ON'])('many at once, with snapshot isolation %s', (isolation) => {
  let database: PrivateDatabase
  let app: RunningApp
  let ada: ApiClient

  beforeAll(async () => {
    database = await startPrivateDatabase([`SET GLOBAL innodb_snapshot_isolation = ${isolation}`])
    app = await startApp({ databaseUrl: database.url })
    ada = await new ApiClient(app.origin).signUp('Ada')
  })
  afterAll(async () => {
    await app?.dispose()
    await database?.dispose()
  })

  it('runs under that setting', async () => {
    expect(await runOn(database.url, 'SELECT @@innodb_snapshot_isolation AS isolation')).toEqual([{ isolation: isolation === 'ON' ? 1n : 0n }])
  })

  it('the same operation eight times has one effect, and everybody is told of it', async () => {
    const plant = ada.createPlant()
    const entry = ada.createEntry(plant.entityId)
    await ada.done(plant)
    const results = (await Promise.all(many(8).map(() => ada.push(entry)))).flat()
    expect(results.map(result => result.status).toSorted()).toEqual(['applied', ...Array(7).fill('duplicate')])
    for (const result of results) expect(result.record).toMatchObject({ id: entry.entityId, ver: 1, state: 'live' })
    expect(await runOn(app.databaseUrl, 'SELECT COUNT(*) AS n FROM entry WHERE id = ?', [entry.entityId])).toEqual([{ n: 1n }])
    expect(await runOn(app.databaseUrl, 'SELECT COUNT(*) AS n FROM op_receipt WHERE op_id = ?', [entry.opId])).toEqual([{ n: 1n }])
    expect((await ada.row(plant.entityId))?.ver).toBe(2)
  })

  it('a comment sent again and again is one comment and one notice', async () => {
    const ben = await new ApiClient(app.origin).signUp('Ben')
    const clubId = await ada.club('Roof terrace', ben)
    const plant = ada.createPlant({ visibility: 'club', clubId })
    const entry = ada.createEntry(plant.entityId)
    await ada.push(plant, entry)
    const comment = ben.createComment(entry)
    await Promise.all(many(5).map(() => ben.push(comment)))
    await ben.push(comment)
    expect((await ada.notices('comment-added')).filter(row => row.data?.subjectId === comment.entityId)).toHaveLength(1)
  })

  it('another operation under a number that was used is refused', async () => {
    const plant = ada.createPlant()
    await ada.done(plant)
    const [result] = await ada.push({ ...plant, fields: { ...plant.fields, name: 'Something else' } })
    expect(result).toMatchObject({ status: 'rejected', code: 'key_reused', record: null })
    expect((await ada.row(plant.entityId))?.data?.name).toBe(plant.fields.name)
  })

  it('a rejected operation stays rejected, word for word', async () => {
    const op = ada.createPlant({ cropId: 'moon-cheese' })
    const [first] = await ada.push(op)
    expect((await ada.push(op))[0]).toEqual(first)
  })

  it('the fields in another order are the same operation', async () => {
    const plant = ada.createPlant()
    await ada.done(plant)
    const fields = Object.fromEntries(Object.entries(plant.fields).toReversed())
    expect((await ada.push({ ...plant, fields }))[0]?.status).toBe('duplicate')
  })

  it('writers on three phones leave a feed without gaps, and a reader beside them misses nothing', async () => {
    const plant = ada.createPlant()
    await ada.done(plant)
    const phones = [ada, ada.otherPhone(), ada.otherPhone()]
    const ops = phones.flatMap(phone => many(12).map(() => phone.createEntry(plant.entityId)))
    let writing = true
    const writers = Promise.all(ops.map(op => ada.push(op))).finally(() => {
      writing = false
    })
    const seen = new Set<string>()
    let since = 0
    for (let last = false; !last;) {
      last = !writing
      const page = await ada.pullPage(ada.userFeed, since, 7)
      for (const row of page.rows) seen.add(row.id)
      since = page.next
      if (page.more) last = false
    }
    expect((await writers).flat().map(result => result.status)).toEqual(Array(ops.length).fill('applied'))
    for (const op of ops) expect(seen).toContain(op.entityId)
    const numbers = await runOn(app.databaseUrl, 'SELECT seq FROM feed_row WHERE scope = ? ORDER BY seq', [ada.userFeed]) as { seq: bigint }[]
    expect(numbers.map(({ seq }) => Number(seq))).toEqual(numbers.map((_, index) => index + 1))
    expect((await ada.row(plant.entityId))?.ver).toBe(ops.length + 1)
  })

  it('two people’s changes that touch each other’s feeds do not block each other for good', async () => {
    const [cem, dora] = [await new ApiClient(app.origin).signUp('Cem'), await new ApiClient(app.origin).signUp('Dora')]
    const clubId = await cem.club('Courtyard', dora)
    const plants = [cem.createPlant({ visibility: 'club', clubId }), dora.createPlant({ visibility: 'club', clubId })]
    const entries = [cem.createEntry(plants[0]?.entityId ?? ''), dora.createEntry(plants[1]?.entityId ?? '')]
    await cem.push(plants[0], entries[0])
    await dora.push(plants[1], entries[1])
    const comments = many(6).flatMap(() => entries.flatMap(entry => [cem, dora].map(person => ({ person, op: person.createComment(entry) }))))
    await Promise.all(comments.map(({ person, op }) => sendUntilDone(person, op)))
    const rows = (await cem.feed(`club:${clubId}`)).filter(row => row.type === 'comment')
    expect(rows.map(row => row.id).toSorted()).toEqual(comments.map(({ op }) => op.entityId).toSorted())
  })
})
