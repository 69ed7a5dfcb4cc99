import { withState } from '#shared/sync/base-record'
import { accountScope } from '#shared/sync/protocol'
import type { RecordState } from '#shared/sync/protocol'
import { keys, prefixes } from './keys'
import type { Answer, JournalStorage } from './ports'
import { readAttention, readBase, readOutbox, readUploads } from './stored-shapes'
import type { UploadItem } from './stored-shapes'

/** The way for the bytes of photos. Never throws. */
export interface PhotoTransport {
  upload(accountId: string, photoId: string, sha256: string, bytes: ArrayBuffer): Promise<Answer<RecordState>>
}

export type PhotoLaneContext = {
  storage: JournalStorage
  transport: PhotoTransport
  accountId: string
  sha256Of: (bytes: ArrayBuffer) => Promise<string>
}

export type PhotoLaneOutcome = { kind: 'done' } | { kind: 'wait', retryAfterSeconds: number | null }

/**
 * Sends the bytes of photos whose entries the server has. The phone keeps its
 * copy until the server says that the picture is there; a photo that cannot be
 * sent never holds the others up, nor any text.
 */
export async function runPhotoLane(context: PhotoLaneContext): Promise<PhotoLaneOutcome> {
  for (const item of await readyUploads(context.storage)) {
    const outcome = await sendOne(context, item)
    if (outcome.kind === 'wait') return outcome
  }
  return { kind: 'done' }
}

/** Photos whose own record is with the server, and which nobody refused. */
async function readyUploads(storage: JournalStorage): Promise<UploadItem[]> {
  const snapshot = await storage.read({ prefixes: [prefixes.upload, prefixes.outbox, prefixes.attention] })
  const unsent = new Set([
    ...readOutbox(snapshot).map(item => item.op.entityId), ...readAttention(snapshot).map(item => item.op.entityId),
  ])
  return readUploads(snapshot).filter(item => item.code === null && !unsent.has(item.photoId))
}

async function sendOne(context: PhotoLaneContext, item: UploadItem): Promise<PhotoLaneOutcome> {
  const { storage, transport, accountId } = context
  const snapshot = await storage.read({ keys: [keys.bytes(item.sha256), keys.base('photo', item.photoId)] })
  const base = readBase(snapshot, keys.base('photo', item.photoId))
  if (base?.data?.stored === true || base?.state === 'deleted') return finish(storage, item)
  const bytes = snapshot.get(keys.bytes(item.sha256))
  if (!(bytes instanceof ArrayBuffer) || await context.sha256Of(bytes) !== item.sha256) {
    return setFailed(storage, item, 'bytes_lost', 'The browser no longer has this picture, or has damaged it. The entry is safe; take the photo again if you can.')
  }
  const answer = await transport.upload(accountId, item.photoId, item.sha256, bytes)
  if (answer.kind === 'answered') return settle(storage, accountId, item, answer.body)
  if (answer.kind === 'refused' && [404, 413, 415, 422].includes(answer.status)) {
    return setFailed(storage, item, answer.code ?? 'refused', answer.message ?? 'The server could not take this picture. The entry is safe.')
  }
  return { kind: 'wait', retryAfterSeconds: answer.kind === 'refused' ? answer.retryAfterSeconds : null }
}

async function settle(storage: JournalStorage, accountId: string, item: UploadItem, record: RecordState): Promise<PhotoLaneOutcome> {
  const key = keys.base('photo', item.photoId)
  return storage.transact({ keys: [key] }, (snapshot) => {
    const base = withState(readBase(snapshot, key), accountScope(accountId), record)
    return { result: { kind: 'done' as const }, put: base ? [[key, base]] : [], remove: [keys.upload(item.photoId)] }
  })
}

async function finish(storage: JournalStorage, item: UploadItem): Promise<PhotoLaneOutcome> {
  return storage.transact({}, () => ({ result: { kind: 'done' as const }, remove: [keys.upload(item.photoId)] }))
}

async function setFailed(storage: JournalStorage, item: UploadItem, code: string, message: string): Promise<PhotoLaneOutcome> {
  return storage.transact({}, () => ({
    result: { kind: 'done' as const }, put: [[keys.upload(item.photoId), { ...item, code, message }]],
  }))
}
