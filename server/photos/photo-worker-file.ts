import { existsSync } from 'node:fs'
import { dirname, join } from 'node:path'
import { fileURLToPath } from 'node:url'

/** Where the build puts the worker, seen from the folder of the server's entry. */
export const PHOTO_WORKER_FILE = 'photo-worker.mjs'

/**
 * The worker's file, looked for from the calling module's address upwards, so
 * that it is found in a build, in a build that was moved and in development.
 */
export function findPhotoWorker(moduleUrl: string): string {
  let folder = dirname(fileURLToPath(moduleUrl))
  while (!existsSync(join(folder, PHOTO_WORKER_FILE))) {
    const parent = dirname(folder)
    if (parent === folder) throw new Error(`${PHOTO_WORKER_FILE} is not beside the server; build it again`)
    folder = parent
  }
  return join(folder, PHOTO_WORKER_FILE)
}
