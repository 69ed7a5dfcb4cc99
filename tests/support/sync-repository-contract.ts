import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import type { FeedRef, RecordRef, StoredRecord, StoredResult, SyncRepository } from '#server/services/sync/ports'
import { accountScope } from '#shared/sync/protocol'
import { newId } from './api-client'
import { at, record, samples } from './sample-records'
import { validComment, validEntry, validPhoto, validPlant } from './valid-fields'

export type RepositoryUnderTest = { repository: SyncRepository, dispose: () => Promise<void> }

/**
 * What everything that keeps the server's records must do, however it keeps them.
 */
export function describeSyncRepository(name: string, make: () => Promise<RepositoryUnderTest>): void {
  describe(`records kept in ${name}`, () => {
    let under: RepositoryUnderTest
    let repository: SyncRepository
    beforeAll(async () => {
      under = await make()
      repository = under.repository
    })
    afterAll(() => under.dispose())

    const inTransaction = <T>(work: () => Promise<T>) => repository.transaction(work)
    const keep = (...records: StoredRecord[]) => inTransaction(async () => {
      for (const one of records) await repository.insert(one)
    })

    describe('a transaction', () => {
      it('gives what its work gives', async () => {
        expect(await inTransaction(async () => 'done')).toBe('done')
      })

      it('that fails leaves nothing behind, of whatever kind', async () => {
        const plant = record('plant', { ...validPlant, ownerId: newId() })
        const standing = record('plant', { ...validPlant, ownerId: newId() })
        const [account, opId, scope] = [newId(), newId(), accountScope(newId())]
        await keep(standing)
        await expect(inTransaction(async () => {
          await repository.claimReceipt(account, opId, 'ab'.repeat(32), at)
          await repository.lockScopes([scope])
          await repository.insert(plant)
          await repository.update({ ...standing, ver: 2, data: { ...standing.data, name: 'Changed' } })
          await repository.appendChange({
            entityType: 'plant', entityId: plant.id, ver: 1, kind: 'create', accountId: account, deviceId: newId(), opId, fields: {}, at,
          })
          await repository.appendFeed(scope, [plant])
          throw new Error('half way')
        })).rejects.toThrow('half way')
        expect(await repository.find('plant', plant.id)).toBeNull()
        expect(await repository.find('plant', standing.id)).toEqual(standing)
        expect(await repository.changesAfter(plant.id, 0)).toEqual([])
        expect(await repository.feedAfter(scope, 0, 10)).toEqual([])
        expect(await inTransaction(() => repository.claimReceipt(account, opId, 'ab'.repeat(32), at))).toBeNull()
      })
    })

    describe('a receipt', () => {
      const claim = (account: string, opId: string, payload = 'ab'.repeat(32)) => repository.claimReceipt(account, opId, payload, at)
      const result: StoredResult = {
        opId: newId(), status: 'rejected', code: 'invalid', message: 'Größe 🌱', issues: [{ path: 'ph', message: 'is above 14' }],
      }

      it('is new once for an account, and then gives the stored answer as it was', async () => {
        const [account, opId] = [newId(), newId()]
        expect(await inTransaction(async () => {
          const first = await claim(account, opId)
          await repository.completeReceipt(account, opId, result)
          return first
        })).toBeNull()
        expect(await inTransaction(() => claim(account, opId, 'cd'.repeat(32)))).toEqual({ payloadSha256: 'ab'.repeat(32), result })
      })

      it('of the same number for another account is another receipt', async () => {
        const opId = newId()
        expect(await inTransaction(() => claim(newId(), opId))).toBeNull()
        expect(await inTransaction(() => claim(newId(), opId))).toBeNull()
      })

      it('is given to one of eight that come at once; the others wait for its answer', async () => {
        const [account, opId] = [newId(), newId()]
        const answers = await Promise.all(Array.from({ length: 8 }, () => inTransaction(async () => {
          const receipt = await claim(account, opId)
          if (!receipt) await repository.completeReceipt(account, opId, result)
          return receipt
        })))
        expect(answers.filter(answer => answer === null)).toHaveLength(1)
        for (const answer of answers) if (answer) expect(answer.result).toEqual(result)
      })
    })

    describe('a feed', () => {
      const ref = (): FeedRef => ({ type: 'entry', id: newId(), ver: 3 })

      it('that nobody wrote to is empty and lost nothing', async () => {
        const scope = accountScope(newId())
        expect(await repository.feedAfter(scope, 0, 10)).toEqual([])
        expect(await repository.feedMinimum(scope)).toBe(0)
      })

      it('numbers its rows from 1 without a gap, in the order in which they came', async () => {
        const scope = accountScope(newId())
        const refs = [ref(), ref(), ref()]
        await inTransaction(() => repository.appendFeed(scope, refs.slice(0, 2)))
        await inTransaction(() => repository.appendFeed(scope, []))
        await inTransaction(() => repository.appendFeed(scope, refs.slice(2)))
        const rows = refs.map((row, index) => ({ ...row, seq: index + 1 }))
        expect(await repository.feedAfter(scope, 0, 10)).toEqual(rows)
        expect(await repository.feedAfter(scope, 1, 1)).toEqual([rows[1]])
        expect(await repository.feedAfter(scope, 3, 10)).toEqual([])
      })

      it('knows nothing of other feeds', async () => {
        const [one, other] = [accountScope(newId()), accountScope(newId())]
        await inTransaction(async () => {
          await repository.appendFeed(one, [ref()])
          await repository.appendFeed(other, [ref()])
        })
        expect((await repository.feedAfter(other, 0, 10)).map(row => row.seq)).toEqual([1])
      })

      it('has no gap and no double number when thirty write at once, some of whom give up', async () => {
        const scopes = [accountScope(newId()), accountScope(newId())].toSorted()
        const writes = Array.from({ length: 30 }, (_, index) => inTransaction(async () => {
          await repository.lockScopes(scopes)
          for (const scope of scopes) await repository.appendFeed(scope, [ref(), ref()])
          if (index % 5 === 0) throw new Error('gave up')
        }))
        const outcomes = await Promise.allSettled(writes)
        expect(outcomes.filter(outcome => outcome.status === 'rejected')).toHaveLength(6)
        for (const scope of scopes) {
          const rows = await repository.feedAfter(scope, 0, 100)
          expect(rows.map(row => row.seq)).toEqual(Array.from({ length: 48 }, (_, index) => index + 1))
        }
      })

      it('never shows a reader a number before all lower ones', async () => {
        const scope = accountScope(newId())
        let writing = true
        const writers = Promise.all(Array.from({ length: 20 }, () => inTransaction(async () => {
          await repository.lockScopes([scope])
          await repository.appendFeed(scope, [ref()])
        }))).finally(() => { writing = false })
        const read: number[] = []
        while (writing || read.length < 20) {
          const rows = await repository.snapshot(() => repository.feedAfter(scope, read.at(-1) ?? 0, 100))
          read.push(...rows.map(row => row.seq))
        }
        await writers
        expect(read).toEqual(Array.from({ length: 20 }, (_, index) => index + 1))
      })

      it('that is held makes others wait, who then see what was done', async () => {
        const scope = accountScope(newId())
        const plant = record('plant', { ...validPlant, ownerId: newId() })
        await keep(plant)
        await Promise.all(Array.from({ length: 12 }, () => inTransaction(async () => {
          await repository.lockScopes([scope])
          const now = await repository.find('plant', plant.id)
          if (now) await repository.update({ ...now, ver: now.ver + 1 })
        })))
        expect((await repository.find('plant', plant.id))?.ver).toBe(13)
      })
    })

    it('tells one epoch all the time', async () => {
      const epoch = await repository.epoch()
      expect(epoch).toMatch(/^[0-9a-f]{8}(?:-[0-9a-f]{4}){3}-[0-9a-f]{12}$/)
      expect(await repository.epoch()).toBe(epoch)
    })

    describe('a record', () => {
      it.each(samples.map(sample => [sample.type, JSON.stringify(sample.data.otherValue) ?? '', sample] as const))('of kind %s %s comes back as it was put in', async (type, _value, sample) => {
        await keep(sample)
        expect(await repository.find(type, sample.id)).toEqual(sample)
      })

      it('is changed, deleted and brought back', async () => {
        const entry = record('entry', { ...validEntry, authorId: newId() })
        await keep(entry)
        const states = [
          { ...entry, ver: 2, data: { ...entry.data, note: 'more', ph: 6.1 } },
          { ...entry, ver: 3, deleted: true },
          { ...entry, ver: 4, deleted: false },
        ]
        for (const state of states) {
          await inTransaction(() => repository.update(state))
          expect(await repository.find('entry', entry.id)).toEqual(state)
        }
      })

      it('is not what the caller holds: changing that changes nothing', async () => {
        const entry = record('entry', { ...validEntry, authorId: newId(), actions: ['swirled'] })
        await keep(entry)
        const held = await repository.find('entry', entry.id)
        if (held && Array.isArray(held.data.actions)) held.data.actions.push('covered')
        expect((await repository.find('entry', entry.id))?.data.actions).toEqual(['swirled'])
      })

      it('is found under its own kind only', async () => {
        const entry = record('entry', { ...validEntry, authorId: newId() })
        await keep(entry)
        expect(await repository.find('plant', entry.id)).toBeNull()
        expect(await repository.find('entry', newId())).toBeNull()
      })

      it('is found among others, deleted ones too, and those that are not there are left out', async () => {
        const entry = record('entry', { ...validEntry, authorId: newId() })
        const comment = { ...record('comment', { ...validComment, authorId: newId() }), deleted: true }
        await keep(entry, comment)
        const found = await repository.findMany([entry, comment, { type: 'plant', id: newId() }])
        expect(found.toSorted((left, right) => left.type < right.type ? -1 : 1)).toEqual([comment, entry])
        expect(await repository.findMany([])).toEqual([])
      })

      it('cannot be put in twice', async () => {
        const entry = record('entry', { ...validEntry, authorId: newId() })
        await keep(entry)
        await expect(keep(entry)).rejects.toThrow()
      })
    })

    it('a history is read from a version on, in order, as it was written', async () => {
      const entityId = newId()
      const change = (ver: number, fields = {}) => ({
        entityType: 'entry', entityId, ver, kind: 'patch', accountId: newId(), deviceId: newId(), opId: ver === 2 ? null : newId(), fields, at,
      } as const)
      const changes = [change(1), change(2, { note: { from: null, to: 'Größe 🌱 "x"' } }), change(3, { actions: { from: [], to: ['swirled'] }, ph: { from: 6, to: null } })]
      await inTransaction(async () => {
        for (const one of [changes[2], changes[0], changes[1]]) if (one) await repository.appendChange(one)
      })
      expect(await repository.changesAfter(entityId, 1)).toEqual(changes.slice(1))
      expect(await repository.changesAfter(entityId, 3)).toEqual([])
      expect(await repository.changesAfter(newId(), 0)).toEqual([])
    })

    describe('what hangs together', () => {
      it('a role is that of a membership that has not ended', async () => {
        const [clubId, accountId, former] = [newId(), newId(), newId()]
        await keep(
          record('membership', { clubId, accountId, role: 'mentor', joinedAt: at }),
          { ...record('membership', { clubId, accountId: former, role: 'steward', joinedAt: at }), deleted: true },
        )
        expect(await repository.roleIn(clubId, accountId)).toBe('mentor')
        expect(await repository.roleIn(clubId, former)).toBeNull()
        expect(await repository.roleIn(newId(), accountId)).toBeNull()
      })

      it('a plant’s story is its comments, photos and entries, deleted ones too', async () => {
        const plantId = newId()
        const [entryId, authorId] = [newId(), newId()]
        const story = [
          record('entry', { ...validEntry, plantId, authorId }),
          { ...record('entry', { ...validEntry, plantId, authorId }), deleted: true },
          record('photo', { ...validPhoto, plantId, entryId, authorId, storedAt: null, placeholder: null, files: null }),
          record('comment', { ...validComment, plantId, entryId, authorId }),
        ]
        await keep(...story, record('entry', { ...validEntry, plantId: newId(), authorId }))
        const byId = (refs: RecordRef[]) => refs.map(({ type, id }) => `${type}/${id}`).toSorted()
        expect(byId(await repository.descendantsOf(plantId))).toEqual(byId(story))
        // What is below comes first, so that a feed never tells a record before what it holds.
        expect((await repository.descendantsOf(plantId)).map(({ type }) => type)).toEqual(['comment', 'photo', 'entry', 'entry'])
        expect(await repository.descendantsOf(newId())).toEqual([])
      })

      it('a vessel’s plants are those that were not deleted', async () => {
        const vesselId = newId()
        const plants = [record('plant', { ...validPlant, vesselId, ownerId: newId() }), record('plant', { ...validPlant, vesselId, ownerId: newId() })]
        const gone = { ...record('plant', { ...validPlant, vesselId, ownerId: newId() }), deleted: true }
        await keep(...plants, gone, record('plant', { ...validPlant, vesselId: null, ownerId: newId() }))
        expect((await repository.plantsInVessel(vesselId)).map(plant => plant.id).toSorted()).toEqual(plants.map(plant => plant.id).toSorted())
      })

      it('a conversation is everybody with a comment that stands, once each, up to a limit', async () => {
        const entryId = newId()
        const [ada, ben, cem] = [newId(), newId(), newId()]
        const by = (authorId: string, deleted = false) => ({ ...record('comment', { ...validComment, entryId, authorId }), deleted })
        await keep(by(ada), by(ada), by(ben), by(cem, true))
        expect((await repository.commentersOn(entryId, 10)).toSorted()).toEqual([ada, ben].toSorted())
        expect(await repository.commentersOn(entryId, 1)).toHaveLength(1)
        expect(await repository.commentersOn(newId(), 10)).toEqual([])
      })
    })

    it('a snapshot sees one moment, whatever is committed meanwhile', async () => {
      const scope = accountScope(newId())
      const append = () => inTransaction(() => repository.appendFeed(scope, [{ type: 'entry', id: newId(), ver: 1 }]))
      await append()
      let later: Promise<unknown> = Promise.resolve()
      const seen = await repository.snapshot(async () => {
        const first = (await repository.feedAfter(scope, 0, 10)).length
        later = append()
        await new Promise(resolve => setTimeout(resolve, 50))
        return [first, (await repository.feedAfter(scope, 0, 10)).length]
      })
      await later
      expect(seen).toEqual([1, 1])
      expect(await repository.feedAfter(scope, 0, 10)).toHaveLength(2)
    })
  })
}
