import { makeRenditions } from './make-renditions'
import type { RenditionResult, RenditionTask } from './make-renditions'

/** Runs in a thread of its own, in which a decoder may take its time or be ended. */
export default function photoWorker(task: RenditionTask): Promise<RenditionResult> {
  return makeRenditions(task)
}
