import { mkdir, mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { afterEach, beforeEach, describe, expect, it } from 'vitest'
import { PHOTO_WORKER_FILE, findPhotoWorker } from '#server/photos/photo-worker-file'
import { importsOf, parseProjectFile } from '~/tests/support/syntax'

let server: string
beforeEach(async () => {
  server = await mkdtemp(join(tmpdir(), 'built-server-'))
  await mkdir(join(server, 'chunks', 'routes'), { recursive: true })
})
afterEach(() => rm(server, { recursive: true }))

describe('the photo worker’s file', () => {
  it.each(['index.mjs', 'chunks/nitro.mjs', 'chunks/routes/photo.put.mjs'])('is found from %s', async (caller) => {
    await writeFile(join(server, PHOTO_WORKER_FILE), '')
    expect(findPhotoWorker(pathToFileURL(join(server, caller)).href)).toBe(join(server, PHOTO_WORKER_FILE))
  })

  it('is missed aloud', () => {
    expect(() => findPhotoWorker(pathToFileURL(join(server, 'index.mjs')).href)).toThrow(PHOTO_WORKER_FILE)
  })
})

describe('the photo worker', () => {
  it('imports nothing of the server, which would otherwise run a second time in its thread', () => {
    const imported = ['server/photos/photo-worker.ts', 'server/photos/make-renditions.ts']
      .flatMap(path => parseProjectFile(path).scripts.flatMap(importsOf))
      .map(({ specifier }) => specifier)
    expect(imported.sort()).toEqual(['./make-renditions', './make-renditions', 'jimp'])
  })
})
