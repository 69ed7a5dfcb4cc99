import { fileURLToPath } from 'node:url'
import { afterEach, describe, expect, it } from 'vitest'
import { createPhotoPool } from '#server/photos/photo-pool'
import type { PhotoPool } from '#server/photos/photo-pool'

const FROM_PHONE = { widthPx: 2_048, heightPx: 2_048 }
const LARGER = { widthPx: 6_000, heightPx: 4_000 }
const QUICK = 1

const patience = { timeout: 60_000 }
let pool: PhotoPool

function open(worker: string, options: { timeLimitMs?: number, waitingMax?: number, heapMaxMb?: number } = {}): void {
  pool = createPhotoPool({ workerFile: fileURLToPath(new URL(`../../support/photos/workers/${worker}.mjs`, import.meta.url)), ...options })
}

function run(firstByte: number, size = FROM_PHONE) {
  return pool.run({ bytes: Uint8Array.of(firstByte), sides: [24], pixelsMax: 100 }, size)
}

afterEach(() => pool.close())

describe('a decoder that does not finish', patience, () => {
  it('is ended, and the next photo gets a thread of its own', async () => {
    open('endless', { timeLimitMs: 1_500 })
    await expect(run(0, LARGER)).rejects.toMatchObject({ status: 422, code: 'photo_took_too_long' })
    expect(await run(QUICK)).toEqual([{ side: 24, widthPx: 24, heightPx: 24, bytes: Uint8Array.of(9) }])
  })

  it('means with a photo of ordinary size that the server is overloaded: the phone tries again', async () => {
    open('endless', { timeLimitMs: 300 })
    await expect(run(0, FROM_PHONE)).rejects.toMatchObject({ status: 503, code: 'photos_busy', retryAfterSeconds: expect.any(Number) })
  })

  it('does not hold up the rest of the server', async () => {
    open('endless', { timeLimitMs: 1_500 })
    const stuck = run(0, LARGER).catch(() => 'ended')
    let turns = 0
    const clock = setInterval(() => turns++, 10)
    expect(await stuck).toBe('ended')
    clearInterval(clock)
    expect(turns).toBeGreaterThan(20)
  })
})

describe('photos that arrive together', patience, () => {
  it('wait without their own time running', async () => {
    open('endless', { timeLimitMs: 1_500 })
    const outcomes = await Promise.allSettled([run(0, LARGER), run(0, LARGER), run(QUICK)])
    expect(outcomes.map(({ status }) => status)).toEqual(['rejected', 'rejected', 'fulfilled'])
  })

  it('are sent away to come back later when too many wait, and are welcome again afterwards', async () => {
    open('endless', { timeLimitMs: 400, waitingMax: 2 })
    const waiting = [run(0), run(0)].map(turn => turn.catch(() => 'ended'))
    await expect(run(QUICK)).rejects.toMatchObject({ status: 503, code: 'photos_busy' })
    expect(await Promise.all(waiting)).toEqual(['ended', 'ended'])
    await expect(run(0)).rejects.toMatchObject({ code: 'photos_busy' })
  })
})

describe('a decoder that fails', patience, () => {
  it('says that the photo is damaged', async () => {
    open('failing')
    await expect(run(1)).rejects.toMatchObject({ status: 422, code: 'photo_undecodable' })
  })

  it('does not blame the photo for a fault of the worker', async () => {
    open('failing')
    await expect(run(2)).rejects.toThrow('the worker itself is broken')
    await expect(run(2)).rejects.not.toHaveProperty('status')
  })

  it('is ended when it asks for too much memory, and the server goes on', async () => {
    open('failing', { timeLimitMs: 30_000, heapMaxMb: 32 })
    await expect(run(3)).rejects.toMatchObject({ status: 422, code: 'photo_undecodable' })
    await expect(run(1)).rejects.toMatchObject({ code: 'photo_undecodable' })
  })
})
