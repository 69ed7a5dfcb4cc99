import { createHash, randomBytes } from 'node:crypto'
import { once } from 'node:events'
import { existsSync } from 'node:fs'
import { mkdtemp, readFile, readdir, rm } from 'node:fs/promises'
import { createServer, request as httpRequest } from 'node:http'
import type { Server } from 'node:http'
import type { AddressInfo } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { PHOTO_BYTES_MAX } from '#shared/domain/photo.schema'
import { uploadTempDir } from '#server/photos/photo-files'
import { withReceivedUpload } from '#server/photos/receive-upload'
import { ApiError } from '#server/utils/errors'

let uploads: string
let server: Server
let origin: string
/** What the receiver was handed, and what it threw. */
let received: { sha256: string, byteLength: number, bytes: Buffer, filePath: string } | undefined
let failure: unknown

beforeEach(async () => {
  uploads = await mkdtemp(join(tmpdir(), 'receive-upload-'))
  received = failure = undefined
  server = createServer((request, response) => {
    withReceivedUpload(request, uploads, async (upload) => {
      received = { ...upload, bytes: await readFile(upload.filePath) }
      if (request.url === '/failing') throw new Error('the disk is full')
      return upload
    }).then(() => response.writeHead(200).end(), (error: unknown) => {
      failure = error
      response.writeHead(error instanceof ApiError ? error.status : 500).end()
    })
  }).listen(0, '127.0.0.1')
  await once(server, 'listening')
  origin = `http://127.0.0.1:${(server.address() as AddressInfo).port}`
})

afterEach(async () => {
  server.closeAllConnections()
  server.close()
  await rm(uploads, { recursive: true })
})

function form(...files: [string, Uint8Array<ArrayBuffer>][]): FormData {
  const body = new FormData()
  for (const [name, bytes] of files) body.append(name, new Blob([bytes], { type: 'image/jpeg' }), '../../photo.jpg')
  return body
}

async function send(body: BodyInit, path = '/', headers: Record<string, string> = {}): Promise<number> {
  const init: RequestInit & { duplex?: 'half' } = { method: 'PUT', body, headers, duplex: 'half' }
  const { status } = await fetch(origin + path, init)
  return status
}

const bytes = new Uint8Array(randomBytes(300_000))

async function temporaryFiles(): Promise<string[]> {
  return existsSync(uploadTempDir(uploads)) ? await readdir(uploadTempDir(uploads)) : []
}

describe('an upload', () => {
  it('arrives whole, with its checksum, inside the uploads folder, and is removed afterwards', async () => {
    expect(await send(form(['photo', bytes]))).toBe(200)
    expect(received?.bytes.equals(bytes)).toBe(true)
    expect(received).toMatchObject({ byteLength: bytes.length, sha256: createHash('sha256').update(bytes).digest('hex') })
    expect(received?.filePath.startsWith(uploadTempDir(uploads))).toBe(true)
    expect(await temporaryFiles()).toEqual([])
  })

  it('may have exactly the largest size', async () => {
    expect(await send(form(['photo', new Uint8Array(PHOTO_BYTES_MAX)]))).toBe(200)
    expect(received?.byteLength).toBe(PHOTO_BYTES_MAX)
  })

  it('is removed when what was to be done with it fails', async () => {
    expect(await send(form(['photo', bytes]), '/failing')).toBe(500)
    expect(failure).toMatchObject({ message: 'the disk is full' })
    expect(await temporaryFiles()).toEqual([])
  })
})

describe('an upload that is refused', () => {
  const boundary = 'frontier'
  const head = `--${boundary}\r\nContent-Disposition: form-data; name="photo"; filename="a.jpg"\r\nContent-Type: image/jpeg\r\n\r\n`
  const type = { 'content-type': `multipart/form-data; boundary=${boundary}` }

  function endlessForm(megabytes: number): ReadableStream<Uint8Array> {
    let sent = -1
    return new ReadableStream({
      pull(controller) {
        sent += 1
        if (sent > megabytes) controller.close()
        else controller.enqueue(sent === 0 ? new TextEncoder().encode(head) : new Uint8Array(1024 * 1024))
      },
    })
  }

  it.each<[string, () => Promise<number>, number, string]>([
    ['one byte too many', () => send(form(['photo', new Uint8Array(PHOTO_BYTES_MAX + 1)])), 413, 'photo_too_large'],
    ['far too many bytes', () => send(form(['photo', new Uint8Array(3 * PHOTO_BYTES_MAX)])), 413, 'photo_too_large'],
    ['far too many bytes of which no length was announced', () => send(endlessForm(20), '/', type), 413, 'photo_too_large'],
    ['an empty file', () => send(form(['photo', new Uint8Array()])), 400, 'photo_empty'],
    ['two photos', () => send(form(['photo', bytes], ['photo', bytes])), 400, 'photo_form_unreadable'],
    ['a file of another name', () => send(form(['picture', bytes])), 400, 'photo_form_unreadable'],
    ['a photo and another file', () => send(form(['photo', bytes], ['extra', bytes])), 400, 'photo_form_unreadable'],
    ['a form without a file', () => send(form()), 400, 'photo_form_unreadable'],
    ['bare bytes', () => send(bytes, '/', { 'content-type': 'image/jpeg' }), 400, 'photo_form_unreadable'],
    ['no body at all', () => send('', '/', type), 400, 'photo_form_unreadable'],
    ['a form that ends in the middle', () => send(`${head}half of a`, '/', type), 400, 'photo_form_unreadable'],
    ['a form without a boundary', () => send('x', '/', { 'content-type': 'multipart/form-data' }), 400, 'photo_form_unreadable'],
  ])('because of %s gets a plain answer and leaves nothing', async (_what, sending, status, code) => {
    expect(await sending()).toBe(status)
    expect(failure).toMatchObject({ status, code })
    expect(received).toBeUndefined()
    await expect.poll(temporaryFiles).toEqual([])
  })

  it('because text stands beside the photo gets a plain answer', async () => {
    const body = form(['photo', bytes])
    body.append('note', 'hello')
    expect(await send(body)).toBe(400)
    expect(await temporaryFiles()).toEqual([])
  })

  it('because the phone lost its signal leaves nothing', async () => {
    const sending = httpRequest(origin, { method: 'PUT', headers: { ...type, 'content-length': '500000' } })
    sending.on('error', () => undefined)
    sending.write(head + 'x'.repeat(100_000))
    await expect.poll(temporaryFiles).toHaveLength(1)
    sending.destroy()
    await expect.poll(() => failure).toMatchObject({ code: 'photo_form_unreadable' })
    await expect.poll(temporaryFiles).toEqual([])
    expect(received).toBeUndefined()
  })
})
