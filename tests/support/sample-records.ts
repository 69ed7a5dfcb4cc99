import type { StoredRecord } from '#server/services/sync/ports'
import { newId } from './api-client'
import { validComment, validEntry, validPhoto, validPlant, validVessel } from './valid-fields'

export const at = '2026-06-09T05:40:00.123Z'

export function record(type: StoredRecord['type'], data: Record<string, unknown>): StoredRecord {
  return { type, id: newId(), ver: 1, deleted: false, data }
}

/** One record of each kind with every field of it filled. */
export const samples: StoredRecord[] = [
  record('club', { name: 'Dachterrasse 🌿', createdAt: at }),
  record('vessel', { ...validVessel, ownerId: newId(), topLengthCm: 28.5, lightProof: true, plantCount: 2 }),
  record('vessel', { ...validVessel, ownerId: newId(), lightProof: false, plantCount: null }),
  record('plant', { ...validPlant, ownerId: newId(), sownOn: '2026-02-28', place: 'نافذة "south"\n<b>' }),
  record('entry', { ...validEntry, authorId: newId(), ph: 5.85, ecMilliSiemensPerCm: 1.234567, note: '', actions: ['swirled', 'covered'], lookedNoChange: true }),
  record('photo', { ...validPhoto, authorId: newId(), storedAt: null, placeholder: null, files: null }),
  record('photo', { ...validPhoto, authorId: newId(), takenAt: at, storedAt: at, placeholder: 'AAAA', files: { 320: { sha256: 'cd'.repeat(32), bytes: 7 } } }),
  record('comment', { ...validComment, authorId: newId() }),
  record('notice', { accountId: newId(), code: 'both-kept', plantId: newId(), entryId: null, subjectId: newId(), byAccountId: newId(), at, seenAt: null }),
  ...['text', '12', 'null', '{"a":1}', '', 5.8, 0, true, false, null, ['swirled'], []].map(otherValue => record('conflict', {
    entityType: 'entry', entityId: newId(), plantId: newId(), field: 'note', otherValue, ownerId: newId(), byAccountId: newId(), deviceId: newId(),
    at, resolvedAt: null,
  })),
]
