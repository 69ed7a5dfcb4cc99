import type { CommentFields } from '#shared/domain/comment.schema'
import type { EntryFields } from '#shared/domain/entry.schema'
import type { PhotoFields } from '#shared/domain/photo.schema'
import type { PlantFields } from '#shared/domain/plant.schema'
import { emptyVesselFields, type VesselFields } from '#shared/domain/vessel.schema'

/** Record ids for tests; each a lower-case UUID of version 7. */
export const ids = {
  plant: '01970000-0000-7000-8000-000000000001',
  entry: '01970000-0000-7000-8000-000000000002',
  vessel: '01970000-0000-7000-8000-000000000003',
  club: '01970000-0000-7000-8000-000000000004',
}

/** One valid record of each kind, for tests that change one field of it. */
export const validVessel: VesselFields = { ...emptyVesselFields, name: 'Blue bucket' }

export const validPlant: PlantFields = {
  name: 'Pepper by the door', cropId: 'pepper', cultivar: null, origin: null, sownOn: null, setUpOn: '2026-04-28',
  timeZone: 'Europe/Lisbon', vesselId: ids.vessel, place: null, visibility: 'private', clubId: null, endedOn: null, endReason: null,
}

export const validEntry: EntryFields = {
  plantId: ids.plant, recordedAt: '2026-06-09T05:41:00.000Z', occurredAt: '2026-06-09T05:40:00.000Z',
  lookedNoChange: false, note: null, ph: null, ecMilliSiemensPerCm: null, waterLevelCm: null, airGapCm: null,
  waterCelsius: null, airCelsius: null, relativeHumidityPercent: null, actions: [], topUpLitres: null, topUpWith: null,
  changeLitres: null, harvestGrams: null, harvestCount: null,
}

export const validPhoto: PhotoFields = {
  plantId: ids.plant, entryId: ids.entry, subject: 'roots', sha256: 'ab'.repeat(32), byteLength: 630_000,
  widthPx: 2_048, heightPx: 1_536, takenAt: null,
}

export const validComment: CommentFields = {
  plantId: ids.plant, entryId: ids.entry, text: 'Roots look well.', writtenAt: '2026-06-09T08:00:00.000Z',
}
