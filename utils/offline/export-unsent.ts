import { keys, prefixes } from './keys'
import type { JournalStorage } from './ports'
import { readAttention, readOutbox, readUploads } from './stored-shapes'

/** Everything that is on this phone and nowhere else, in a form that a person can keep. */
export type UnsentExport = {
  about: string
  savedAt: string
  changes: unknown[]
  refused: unknown[]
  drafts: unknown[]
  photos: { photoId: string, sha256: string, jpegBase64: string | null }[]
}

const DRAFTS = 'draft/'

/** Reads what was never sent, pictures included. */
export async function readUnsent(storage: JournalStorage, savedAt: string): Promise<UnsentExport> {
  const snapshot = await storage.read({ prefixes: [prefixes.outbox, prefixes.attention, prefixes.upload, DRAFTS] })
  const uploads = readUploads(snapshot)
  const bytes = await storage.read({ keys: uploads.map(item => keys.bytes(item.sha256)) })
  return {
    about: 'What Stillroot had on one phone and had not sent yet. Pictures are JPEG files in base64.',
    savedAt,
    changes: readOutbox(snapshot),
    refused: readAttention(snapshot),
    drafts: snapshot.under(DRAFTS).map(([, value]) => value),
    photos: uploads.map(({ photoId, sha256 }) => {
      const picture = bytes.get(keys.bytes(sha256))
      return { photoId, sha256, jpegBase64: picture instanceof ArrayBuffer ? base64Of(picture) : null }
    }),
  }
}

/** How many forms were begun and not saved. */
export async function countDrafts(storage: JournalStorage): Promise<number> {
  return (await storage.read({ prefixes: [DRAFTS] })).under(DRAFTS).length
}

/** Calls with more arguments than this overflow the stack of some browsers. */
const CHUNK_BYTES = 32_768

function base64Of(buffer: ArrayBuffer): string {
  const bytes = new Uint8Array(buffer)
  let binary = ''
  for (let start = 0; start < bytes.length; start += CHUNK_BYTES) {
    binary += String.fromCharCode(...bytes.subarray(start, start + CHUNK_BYTES))
  }
  return btoa(binary)
}
