import { fileURLToPath } from 'node:url'
import type { Rollup } from 'vite'
import { PHOTO_WORKER_FILE } from '../photos/photo-worker-file'

const [entry, logic] = [sourceOf('photo-worker.ts'), sourceOf('make-renditions.ts')]

function sourceOf(name: string): string {
  return fileURLToPath(new URL(`../photos/${name}`, import.meta.url))
}

/** Emits the photo worker as a file of its own beside the server, under a name by which the server finds it. */
export function photoWorkerPlugin(): Rollup.Plugin {
  return {
    name: 'photo-worker',
    buildStart() {
      this.emitFile({ type: 'chunk', id: entry, fileName: PHOTO_WORKER_FILE })
    },
    outputOptions(options) {
      if (!options.inlineDynamicImports) return null
      // A development server is a single file, the worker's code included: the
      // worker's thread would start a second server with its plugins and jobs.
      // So all but the worker goes into one file, and the worker into its own.
      return { ...options, inlineDynamicImports: false, manualChunks: id => id === entry || id === logic ? undefined : 'server' }
    },
  }
}
