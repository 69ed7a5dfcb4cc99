import { describe, expect, it } from 'vitest'
import type { RecordState } from '#shared/sync/protocol'
import { saveChanges } from '~/utils/offline/journal'
import { keys, prefixes } from '~/utils/offline/keys'
import { runPhotoLane } from '~/utils/offline/photo-lane'
import type { PhotoTransport } from '~/utils/offline/photo-lane'
import type { Answer } from '~/utils/offline/ports'
import { settlePush } from '~/utils/offline/settle'
import { readBase, readUploads } from '~/utils/offline/stored-shapes'
import { countingIds } from '../../simulation/support/ids'
import { createMemoryStorage } from '../../support/memory-storage'

const sha256 = 'a'.repeat(64)
const bytes = new Uint8Array([1, 2, 3]).buffer

async function setUp(answers: Answer<RecordState>[], options: { checksum?: string, entrySent?: boolean } = {}) {
  const newId = countingIds()
  const around = { now: () => Date.UTC(2026, 5, 9), random: () => 0.5, newId }
  const storage = createMemoryStorage()
  const accountId = newId()
  const photoId = newId()
  const ops = await saveChanges(storage, around, [{ kind: 'create', entityType: 'photo', entityId: photoId, fields: { sha256 } }], {
    photos: [{ photoId, sha256, bytes }],
  })
  if (options.entrySent !== false) {
    const results = ops.map(op => ({ opId: op.opId, status: 'applied' as const, record: null }))
    await settlePush(storage, around, accountId, { results, serverTime: '2026-06-09T00:00:00.000Z' })
  }
  const sent: string[] = []
  const transport: PhotoTransport = {
    async upload(_account, id) {
      sent.push(id)
      return answers.shift() ?? { kind: 'unreachable' }
    },
  }
  const run = () => runPhotoLane({ storage, transport, accountId, sha256Of: async () => options.checksum ?? sha256 })
  const waiting = async () => readUploads(await storage.read({ prefixes: [prefixes.upload] }))
  const kept = async () => (await storage.read({ keys: [keys.bytes(sha256)] })).get(keys.bytes(sha256))
  return { storage, photoId, sent, run, waiting, kept }
}

const stored: Answer<RecordState> = { kind: 'answered', body: { type: 'photo', id: 'the photo', ver: 2, state: 'live', data: { stored: true } } }
const refusal = (status: number): Answer<RecordState> => ({ kind: 'refused', status, code: 'photo_undecodable', message: 'It is damaged.', retryAfterSeconds: null })

describe('the photo lane', () => {
  it('does not send a picture before the server has its record', async () => {
    const lane = await setUp([], { entrySent: false })
    expect(await lane.run()).toEqual({ kind: 'done' })
    expect(lane.sent).toEqual([])
    expect(await lane.waiting()).toHaveLength(1)
  })

  it('lets go of the wait once the server has the picture, and shows it as stored', async () => {
    const lane = await setUp([stored])
    expect(await lane.run()).toEqual({ kind: 'done' })
    expect(await lane.waiting()).toEqual([])
    const key = keys.base('photo', lane.photoId)
    expect(readBase(await lane.storage.read({ keys: [key] }), key)?.data?.stored).toBe(true)
  })

  it('keeps a picture through a dropped connection and sends it again', async () => {
    const lane = await setUp([{ kind: 'unreachable' }])
    expect(await lane.run()).toEqual({ kind: 'wait', retryAfterSeconds: null })
    expect(await lane.waiting()).toHaveLength(1)
    expect(await lane.kept()).toBeInstanceOf(ArrayBuffer)
    await lane.run()
    expect(lane.sent).toHaveLength(2)
  })

  it.each([413, 415, 422])('keeps a picture that was refused with %i, with the reason, and does not send it for ever', async (status) => {
    const lane = await setUp([refusal(status)])
    expect(await lane.run()).toEqual({ kind: 'done' })
    await lane.run()
    expect(lane.sent).toHaveLength(1)
    expect(await lane.waiting()).toMatchObject([{ code: 'photo_undecodable', message: 'It is damaged.' }])
    expect(await lane.kept()).toBeInstanceOf(ArrayBuffer)
  })

  it('does not send bytes that changed on the phone', async () => {
    const lane = await setUp([], { checksum: 'b'.repeat(64) })
    await lane.run()
    expect(lane.sent).toEqual([])
    expect(await lane.waiting()).toMatchObject([{ code: 'bytes_lost' }])
  })
})
