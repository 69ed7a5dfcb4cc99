import type { ClubRole } from '#shared/domain/club.schema'
import type { EntryFields } from '#shared/domain/entry.schema'
import type { PhotoSubject } from '#shared/domain/photo.schema'
import type { PlantFields } from '#shared/domain/plant.schema'
import type { VesselFields } from '#shared/domain/vessel.schema'

/** One of the accounts in accounts.json; everything else names people by their e-mail. */
export type DemoAccount = {
  email: string
  password: string
  displayName: string
  role: ClubRole
  about: string
}

/** `file` lies in server/assets/demo. */
export type DemoPhoto = { file: string, subject: PhotoSubject }

export type DemoComment = {
  by: string
  text: string
  /** Hours after the visit. */
  hoursLater: number
}

/** What one visit left in the journal; a field that is not named was not taken. */
export type DemoEntryFields = Partial<Omit<EntryFields, 'plantId' | 'recordedAt' | 'occurredAt'>>

/** One visit. A level is how the vessel was left: after a top-up, a change or rain. */
export type DemoEntry = {
  /** Days since set-up, in the plant's own zone. */
  day: number
  /** Local time, HH:MM. */
  time: string
  fields: DemoEntryFields
  photos?: DemoPhoto[]
  comments?: DemoComment[]
  /** Hours from the visit until it was typed, when that was not at once. */
  typedHoursLater?: number
}

/** Dates are counted back from the day the demo is planted, so that it is never out of date. */
export type DemoPlant = {
  owner: string
  setUpDaysAgo: number
  sownDaysBeforeSetUp: number | null
  /** Day number of its last day; null while it grows. */
  endedOnDay: number | null
  fields: Omit<PlantFields, 'setUpOn' | 'sownOn' | 'endedOn' | 'vesselId' | 'clubId'>
  vessel: VesselFields
  /** In the order of the visits. */
  entries: DemoEntry[]
}

export type DemoMember = { email: string, role: ClubRole }

export type DemoClub = {
  name: string
  members: DemoMember[]
  plants: DemoPlant[]
}
