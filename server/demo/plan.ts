import type { EntryFields } from '#shared/domain/entry.schema'
import { SYNC_SCHEMA } from '#shared/sync/protocol'
import type { Op, RecordType } from '#shared/sync/protocol'
import { demoId } from './demo-id'
import { dayAfter, dayBefore, instantAt } from './local-time'
import type { DemoEntry, DemoPlant } from './types'

const HOUR = 60 * 60 * 1_000
/** The latest moment that a demo entry may lie at: now, less a little. */
const JUST_NOW = 5 * 60 * 1_000

const nothingTaken: Omit<EntryFields, 'plantId' | 'recordedAt' | 'occurredAt'> = {
  lookedNoChange: false, note: null, ph: null, ecMilliSiemensPerCm: null, waterLevelCm: null, airGapCm: null, waterCelsius: null,
  airCelsius: null, relativeHumidityPercent: null, actions: [], topUpLitres: null, topUpWith: null, changeLitres: null,
  harvestGrams: null, harvestCount: null,
}

export type PlannedPhoto = { id: string, file: string, fields: Omit<Record<string, unknown>, 'sha256'> }
export type PlannedComment = { by: string, op: Op }
export type PlannedPlant = { owner: string, ops: Op[], photos: PlannedPhoto[], comments: PlannedComment[] }

/** Everything a demo plant is made of, as the operations its people's phones would have sent. */
export function planPlant(plant: DemoPlant, clubId: string, now: Date): PlannedPlant {
  const name = plant.fields.name
  const plantId = demoId(`plant/${plant.owner}/${name}`)
  const vesselId = demoId(`vessel/${plant.owner}/${name}`)
  const setUpOn = dayBefore(now, plant.setUpDaysAgo, plant.fields.timeZone)
  const ops = [
    op('vessel', vesselId, { ...plant.vessel }),
    op('plant', plantId, {
      ...plant.fields,
      vesselId,
      setUpOn,
      sownOn: plant.sownDaysBeforeSetUp === null ? null : dayAfter(setUpOn, -plant.sownDaysBeforeSetUp),
      endedOn: plant.endedOnDay === null ? null : dayAfter(setUpOn, plant.endedOnDay),
      clubId: plant.fields.visibility === 'club' ? clubId : null,
    }),
  ]
  const visits = plant.entries.map((entry, index) => planVisit(entry, {
    plantId, entryId: demoId(`entry/${plantId}/${index}`), setUpOn, timeZone: plant.fields.timeZone, now,
  }))
  return {
    owner: plant.owner,
    ops: [...ops, ...visits.map(visit => visit.op)],
    photos: visits.flatMap(visit => visit.photos),
    comments: visits.flatMap(visit => visit.comments),
  }
}

type Place = { plantId: string, entryId: string, setUpOn: string, timeZone: string, now: Date }

function planVisit(entry: DemoEntry, { plantId, entryId, setUpOn, timeZone, now }: Place) {
  const latest = now.getTime() - JUST_NOW
  const at = Math.min(instantAt(dayAfter(setUpOn, entry.day), entry.time, timeZone).getTime(), latest)
  const later = (hours: number) => new Date(Math.min(at + hours * HOUR, latest)).toISOString()
  return {
    op: op('entry', entryId, {
      ...nothingTaken, ...entry.fields, plantId, occurredAt: later(0), recordedAt: later(entry.typedHoursLater ?? 0),
    }),
    photos: (entry.photos ?? []).map(({ file, subject }, index): PlannedPhoto => ({
      id: demoId(`photo/${entryId}/${index}`), file, fields: { plantId, entryId, subject, takenAt: later(0) },
    })),
    comments: (entry.comments ?? []).map(({ by, text, hoursLater }, index): PlannedComment => ({
      by, op: op('comment', demoId(`comment/${entryId}/${index}`), { plantId, entryId, text, writtenAt: later(hoursLater) }),
    })),
  }
}

/** An operation as the demo's own device makes it. */
export function op(entityType: RecordType, entityId: string, fields: Record<string, unknown>): Op {
  return {
    opId: demoId(`op/${entityId}`), deviceId: demoId('device'), deviceSeq: 1, schema: SYNC_SCHEMA, kind: 'create', entityType, entityId, baseVer: 0, fields,
  }
}
