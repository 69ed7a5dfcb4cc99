import { createHash } from 'node:crypto'
import { readdir } from 'node:fs/promises'
import { join } from 'node:path'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { readJpegSize } from '#shared/utils/image-size'
import { ApiClient, clubScope, newId } from '../support/api-client'
import type { Answer } from '../support/api-client'
import { startApp } from '../support/app-server'
import type { RunningApp } from '../support/app-server'
import { exifSegment } from '../support/photos/build-exif'
import { headerOnlyJpeg, LEAK, withLeaks, withSegments } from '../support/photos/build-jpeg'
import { pngHeader, pngOf } from '../support/photos/build-png'
import { ascii, containsText, joinBytes, uint32 } from '../support/photos/bytes'
import { gradient, jpegOf } from '../support/photos/encode-picture'

let app: RunningApp
let ada: ApiClient
let ben: ApiClient
let plantId: string
let picture: Uint8Array<ArrayBuffer>

beforeAll(async () => {
  app = await startApp()
  ada = await new ApiClient(app.origin).signUp('Ada')
  ben = await new ApiClient(app.origin).signUp('Ben')
  const plant = ada.createPlant()
  await ada.done(plant)
  plantId = plant.entityId
  picture = await jpegOf(gradient(700, 500))
})
afterAll(() => app.dispose())

function sha256(bytes: Uint8Array): string {
  return createHash('sha256').update(bytes).digest('hex')
}

/** The same picture to the eye, other bytes to the server. */
function variant(name: string): Uint8Array<ArrayBuffer> {
  return joinBytes(picture, ascii(name))
}

/** A photo's record without its bytes, as a phone sends it first. */
async function announce(bytes: Uint8Array, plant = plantId): Promise<string> {
  const entry = ada.createEntry(plant)
  const photo = ada.op('create', 'photo', newId(), 0, {
    plantId: plant, entryId: entry.entityId, subject: 'roots', sha256: sha256(bytes), byteLength: bytes.length,
    widthPx: 700, heightPx: 500, takenAt: null,
  })
  const results = await ada.push(entry, photo)
  expect(results.map(({ status }) => status)).toEqual(['applied', 'applied'])
  return photo.entityId
}

async function put(client: ApiClient, photoId: string, bytes: Uint8Array<ArrayBuffer>, fieldName = 'photo'): Promise<Answer> {
  const body = new FormData()
  body.append(fieldName, new Blob([bytes], { type: 'image/jpeg' }), 'photo.jpg')
  const headers = { 'sec-fetch-site': 'same-origin', 'cookie': client.cookie, 'x-acting-user': client.account.id }
  const response = await fetch(`${app.origin}/api/photos/${photoId}/content`, { method: 'PUT', headers, body })
  return { status: response.status, body: await response.json(), headers: response.headers }
}

function get(client: ApiClient, photoId: string, width: number, headers: Record<string, string> = {}): Promise<Response> {
  return fetch(`${app.origin}/api/photos/${photoId}/${width}`, { headers: { cookie: client.cookie, ...headers } })
}

async function filesOf(bytes: Uint8Array): Promise<string[]> {
  const names = await readdir(app.uploadsDir, { recursive: true })
  return names.filter(name => name.includes(sha256(bytes)))
}

describe('the bytes of a photo', () => {
  it('are kept in every width, and the record says so to its owner', async () => {
    const photoId = await announce(picture)
    expect((await ada.row(photoId))?.data).toMatchObject({ stored: false, placeholder: null })
    const { status } = await put(ada, photoId, picture)
    expect(status).toBe(200)
    expect((await ada.row(photoId))?.data).toMatchObject({ stored: true, placeholder: expect.stringMatching(/^\/9j\//) })
    for (const [width, heightPx] of [[320, 229], [640, 457]] as const) {
      const bytes = new Uint8Array(await (await get(ada, photoId, width)).arrayBuffer())
      expect(readJpegSize(bytes)).toEqual({ widthPx: width, heightPx })
    }
  })

  it('may come again and change nothing', async () => {
    const photoId = await announce(variant('again'))
    await put(ada, photoId, variant('again'))
    const before = await ada.row(photoId)
    const { status } = await put(ada, photoId, variant('again'))
    expect(status).toBe(200)
    expect(await ada.row(photoId)).toEqual(before)
  })

  it('may come three times at once', async () => {
    const photoId = await announce(variant('at once'))
    const answers = await Promise.all([1, 2, 3].map(() => put(ada, photoId, variant('at once'))))
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200])
  })

  it('survive the end of the server', async () => {
    const photoId = await announce(variant('restart'))
    await put(ada, photoId, variant('restart'))
    await app.kill()
    await app.restart()
    expect((await get(ada, photoId, 640)).status).toBe(200)
  })

  it('lose the place and everything else that is not the picture', async () => {
    const telling = withSegments(withLeaks(picture), exifSegment({ place: [[38, 43, 12.5], [9, 8, 1]], maker: LEAK }))
    const photoId = await announce(telling)
    expect((await put(ada, photoId, telling)).status).toBe(200)
    for (const width of [1_280, 640, 320]) {
      const bytes = new Uint8Array(await (await get(ada, photoId, width)).arrayBuffer())
      expect(bytes.length).toBeGreaterThan(1_000)
      expect(containsText(bytes, LEAK) || containsText(bytes, 'Exif')).toBe(false)
    }
  })
})

describe('a photo on its way to the screen', () => {
  it('is asked for again each time and sent only when it changed', async () => {
    const photoId = await announce(variant('tag'))
    await put(ada, photoId, variant('tag'))
    const first = await get(ada, photoId, 640)
    expect(first.headers.get('content-type')).toBe('image/jpeg')
    expect(first.headers.get('x-content-type-options')).toBe('nosniff')
    expect(first.headers.get('content-security-policy')).toContain('sandbox')
    expect(first.headers.get('cache-control')).toMatch(/private|no-store/)
    const again = await get(ada, photoId, 640, { 'if-none-match': first.headers.get('etag') ?? '' })
    expect({ status: again.status, body: await again.text() }).toEqual({ status: 304, body: '' })
  })

  it('exists in its own widths alone', async () => {
    const photoId = await announce(variant('widths'))
    expect((await get(ada, photoId, 640)).status).toBe(404)
    await put(ada, photoId, variant('widths'))
    expect((await get(ada, photoId, 24)).status).toBe(404)
    expect((await get(ada, photoId, 641)).status).toBe(404)
  })
})

describe('a photo that is somebody else’s', () => {
  it('can be neither sent nor seen, and the stranger cannot tell that it exists', async () => {
    const photoId = await announce(variant('private'))
    await put(ada, photoId, variant('private'))
    expect(await put(ben, photoId, variant('private'))).toMatchObject({ status: 404, body: { code: 'not_found' } })
    expect((await get(ben, photoId, 640)).status).toBe(404)
    expect((await get(ben, newId(), 640)).status).toBe(404)
    expect((await get(new ApiClient(app.origin), photoId, 640)).status).toBe(401)
  })

  it('can be seen but not sent by members of the club in which its plant is shared', async () => {
    const clubId = await ada.club('Roof', ben)
    const plant = ada.createPlant({ visibility: 'club', clubId })
    await ada.done(plant)
    const photoId = await announce(variant('shared'), plant.entityId)
    expect((await put(ben, photoId, variant('shared'))).status).toBe(404)
    await put(ada, photoId, variant('shared'))
    expect((await ben.row(photoId, clubScope(clubId)))?.data).toMatchObject({ stored: true })
    expect((await get(ben, photoId, 320)).status).toBe(200)
  })
})

describe('an upload that is refused', () => {
  const heic = joinBytes(uint32(24), ascii('ftypheic'), uint32(0), ascii('mif1heic'))

  it.each<[string, () => Uint8Array<ArrayBuffer>, number, string]>([
    ['text', () => joinBytes(ascii('no picture at all')), 415, 'photo_not_a_picture'],
    ['HEIC', () => heic, 415, 'photo_heic'],
    ['a picture of 30,000 × 30,000', () => pngOf(pngHeader(30_000, 30_000)), 413, 'photo_too_many_pixels'],
    ['a picture without its end', () => picture.slice(0, -300), 422, 'photo_cut_off'],
    ['a picture that is none inside', () => headerOnlyJpeg(700, 500), 422, 'photo_undecodable'],
  ])('because it is %s leaves no file and an answer in words', async (_what, make, status, code) => {
    const bytes = make()
    const photoId = await announce(bytes)
    const answer = await put(ada, photoId, bytes)
    expect(answer).toMatchObject({ status, body: { code, message: expect.stringContaining('The text of your entry is safe.') } })
    expect(await filesOf(bytes)).toEqual([])
    expect((await ada.row(photoId))?.data).toMatchObject({ stored: false })
  })

  it('because it is not what was announced leaves no file, and the right bytes are still welcome', async () => {
    const photoId = await announce(variant('announced'))
    expect(await put(ada, photoId, variant('something else'))).toMatchObject({ status: 422, body: { code: 'photo_checksum_mismatch' } })
    expect(await filesOf(variant('something else'))).toEqual([])
    expect((await put(ada, photoId, variant('announced'))).status).toBe(200)
  })

  it('because it has too many bytes is told so', async () => {
    const photoId = await announce(variant('large'))
    expect(await put(ada, photoId, new Uint8Array(9 * 1024 * 1024))).toMatchObject({ status: 413, body: { code: 'photo_too_large' } })
  })

  it('because the form is another leaves the temporary folder empty', async () => {
    const photoId = await announce(variant('form'))
    expect(await put(ada, photoId, variant('form'), 'picture')).toMatchObject({ status: 400, body: { code: 'photo_form_unreadable' } })
    expect(await readdir(join(app.uploadsDir, 'tmp'))).toEqual([])
  })
})
