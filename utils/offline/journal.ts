import { baseVersionFor } from '#shared/sync/outbox'
import type { ChangeRequest } from '#shared/sync/outbox'
import { SYNC_SCHEMA } from '#shared/sync/protocol'
import type { Op } from '#shared/sync/protocol'
import { keys, prefixes } from './keys'
import type { JournalStorage, StoredPair, StoreChanges, Surroundings } from './ports'
import { readBase, readDevice, readOutbox } from './stored-shapes'
import type { Device, UploadItem } from './stored-shapes'

/** Bytes of a photo that is saved together with its entry. */
export type NewPhotoBytes = { photoId: string, sha256: string, bytes: ArrayBuffer }

/**
 * Writes a person's changes on the phone.
 *
 * Guarantees: a change, its number, the bytes of its photos and the end of the
 * draft it came from are one transaction on disk, or nothing of it is; numbers
 * rise without gaps however many tabs write.
 */
export async function saveChanges(
  storage: JournalStorage,
  around: Surroundings,
  requests: ChangeRequest[],
  extras: { photos?: NewPhotoBytes[], endDraftOf?: string } = {},
): Promise<Op[]> {
  const baseKeys = requests.map(request => keys.base(request.entityType, request.entityId))
  return storage.transact({ keys: [keys.device, ...baseKeys], prefixes: [prefixes.outbox] }, (snapshot) => {
    const device = readDevice(snapshot) ?? { deviceId: around.newId(), nextSeq: 1 }
    const pending = readOutbox(snapshot).map(item => item.op)
    const ops: Op[] = []
    for (const request of requests) {
      const base = readBase(snapshot, keys.base(request.entityType, request.entityId))
      // Whoever deletes must have been told everything; whoever changes a field only needs to have seen that.
      const version = (request.kind === 'delete' ? base?.seen : base?.ver) ?? 0
      ops.push(numbered(request, device, ops.length, baseVersionFor(request.entityId, version, [...pending, ...ops]), around))
    }
    return {
      result: ops,
      put: [
        [keys.device, { ...device, nextSeq: device.nextSeq + ops.length }],
        ...ops.map((op): StoredPair => [keys.outbox(op.deviceSeq, op.opId), { op, savedAt: isoOf(around.now()) }]),
        ...(extras.photos ?? []).flatMap(photoPairs),
      ],
      remove: extras.endDraftOf ? [keys.draft(extras.endDraftOf)] : [],
    }
  })
}

function numbered(request: ChangeRequest, device: Device, offset: number, baseVer: number, around: Surroundings): Op {
  return {
    opId: around.newId(),
    deviceId: device.deviceId,
    deviceSeq: device.nextSeq + offset,
    schema: SYNC_SCHEMA,
    kind: request.kind,
    entityType: request.entityType,
    entityId: request.entityId,
    baseVer,
    fields: request.fields,
  }
}

function photoPairs(photo: NewPhotoBytes): StoredPair[] {
  const waiting: UploadItem = { photoId: photo.photoId, sha256: photo.sha256, code: null, message: null }
  return [[keys.bytes(photo.sha256), photo.bytes], [keys.upload(photo.photoId), waiting]]
}

/**
 * Sends a refused change again under a new number, as it was or with other
 * fields. Its place is behind everything that waits.
 */
export async function sendAgain(
  storage: JournalStorage, around: Surroundings, refused: Op, fields: Record<string, unknown> = refused.fields,
): Promise<void> {
  await storage.transact({ keys: [keys.device] }, (snapshot): StoreChanges & { result: null } => {
    const device = readDevice(snapshot) ?? { deviceId: refused.deviceId, nextSeq: refused.deviceSeq + 1 }
    const op: Op = { ...refused, fields, opId: around.newId(), deviceSeq: device.nextSeq }
    return {
      result: null,
      put: [
        [keys.device, { ...device, nextSeq: device.nextSeq + 1 }],
        [keys.outbox(op.deviceSeq, op.opId), { op, savedAt: isoOf(around.now()) }],
      ],
      remove: [keys.attention(refused.opId)],
    }
  })
}

/** Gives a refused change up for good. Only a person may ask for that. */
export async function discardRefused(storage: JournalStorage, opId: string): Promise<void> {
  await storage.transact({}, () => ({ result: null, remove: [keys.attention(opId)] }))
}

/** A clock that shows the year 200,000 must not keep anybody from saving. */
export function isoOf(milliseconds: number): string {
  const latest = Date.UTC(9_999, 11, 31)
  return new Date(Math.min(Math.max(milliseconds, 0), latest)).toISOString()
}
