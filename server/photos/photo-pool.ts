import { Piscina } from 'piscina'
import { PHOTO_SIDE_MAX_PX } from '#shared/domain/photo.schema'
import type { ImageSize } from '#shared/utils/image-size'
import type { Rendition, RenditionResult, RenditionTask } from './make-renditions'
import { photoTookTooLong, photoUndecodable, photosBusy } from './photo-errors'

/**
 * One worker thread and a short queue before it. A decoder that exceeds its
 * time or its memory takes its thread down and nothing else; the next picture
 * gets a new thread.
 */
export type PhotoPool = {
  run: (task: MovableTask, size: ImageSize) => Promise<Rendition[]>
  close: () => Promise<void>
}

type MovableTask = RenditionTask & { bytes: Uint8Array<ArrayBuffer> }
type PoolOptions = {
  workerFile: string
  /** A thread that has not finished a picture by then is ended. */
  timeLimitMs?: number
  /** Beyond this many waiting pictures a phone would give up before its turn came. */
  waitingMax?: number
  /** Objects of the decoder; its pixels lie outside of this and are bounded by the size of the picture. */
  heapMaxMb?: number
}

/** One thread: a decoder holds up to 1 GB, and the other core answers requests. */
const THREADS = { minThreads: 0, maxThreads: 1, idleTimeout: 30_000 }

export function createPhotoPool({ workerFile, timeLimitMs = 10_000, waitingMax = 24, heapMaxMb = 768 }: PoolOptions): PhotoPool {
  const threads = new Piscina({ filename: workerFile, ...THREADS, resourceLimits: { maxOldGenerationSizeMb: heapMaxMb } })
  let waiting = 0
  let last: Promise<unknown> = Promise.resolve()

  async function runNow(task: MovableTask, size: ImageSize): Promise<Rendition[]> {
    const signal = AbortSignal.timeout(timeLimitMs)
    try {
      const result: RenditionResult = await threads.run(task, { signal, transferList: [task.bytes.buffer] })
      if (!result.ok) throw photoUndecodable()
      return result.renditions
    } catch (error) {
      if (signal.aborted) throw outOfTime(size)
      if (isOutOfMemory(error)) throw photoUndecodable()
      throw error
    }
  }

  return {
    async run(task, size) {
      if (waiting >= waitingMax) throw photosBusy()
      waiting += 1
      // Own turns instead of the pool's queue: its time limit would count the waiting.
      const turn = last.then(() => runNow(task, size))
      last = turn.catch(() => undefined)
      return turn.finally(() => {
        waiting -= 1
      })
    },
    close: () => threads.destroy(),
  }
}

/** A picture as phones send it takes 1 to 2 s: if that is not done in time, the server is overloaded. */
function outOfTime({ widthPx, heightPx }: ImageSize): Error {
  return widthPx * heightPx > PHOTO_SIDE_MAX_PX ** 2 ? photoTookTooLong() : photosBusy()
}

function isOutOfMemory(error: unknown): boolean {
  return error instanceof Error && 'code' in error && error.code === 'ERR_WORKER_OUT_OF_MEMORY'
}
