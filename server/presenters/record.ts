import type { RecordState, RecordType } from '#shared/sync/protocol'
import type { StoredRecord } from '../services/sync/ports'

/** What leaves the server of each record; anything not named here stays. */
const visibleFields: Record<RecordType, readonly string[]> = {
  club: ['name'],
  membership: ['clubId', 'accountId', 'displayName', 'role'],
  vessel: [
    'ownerId', 'name', 'kind', 'shape', 'topLengthCm', 'topWidthCm', 'bottomLengthCm', 'bottomWidthCm', 'heightCm',
    'capacityLitres', 'netCupRimCm', 'netCupDepthCm', 'lightProof', 'plantCount',
  ],
  plant: [
    'ownerId', 'name', 'cropId', 'cultivar', 'origin', 'sownOn', 'setUpOn', 'timeZone', 'vesselId', 'place',
    'visibility', 'clubId', 'endedOn', 'endReason',
  ],
  entry: [
    'plantId', 'authorId', 'occurredAt', 'recordedAt', 'lookedNoChange', 'note', 'ph', 'ecMilliSiemensPerCm',
    'waterLevelCm', 'airGapCm', 'waterCelsius', 'airCelsius', 'relativeHumidityPercent', 'actions', 'topUpLitres',
    'topUpWith', 'changeLitres', 'harvestGrams', 'harvestCount',
  ],
  photo: [
    'plantId', 'entryId', 'authorId', 'subject', 'sha256', 'byteLength', 'widthPx', 'heightPx', 'takenAt',
    'placeholder',
  ],
  comment: ['plantId', 'entryId', 'authorId', 'text', 'writtenAt'],
  conflict: ['entityType', 'entityId', 'plantId', 'field', 'otherValue', 'byAccountId', 'deviceId', 'at', 'resolvedAt'],
  notice: ['accountId', 'code', 'plantId', 'entryId', 'subjectId', 'byAccountId', 'at', 'seenAt'],
}

/** A record as its readers get it; a deleted one without what it held. */
export function presentRecord(record: StoredRecord): RecordState {
  const { type, id, ver } = record
  if (record.deleted) return { type, id, ver, state: 'deleted', data: null }
  const data: Record<string, unknown> = { id }
  for (const field of visibleFields[type]) data[field] = record.data[field] ?? null
  if (type === 'photo') data.stored = record.data.storedAt !== null && record.data.storedAt !== undefined
  return { type, id, ver, state: 'live', data }
}
