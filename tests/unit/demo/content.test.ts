import { readdirSync, statSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { describe, expect, it } from 'vitest'
import { signUpSchema } from '#shared/domain/account.schema'
import { CLUB_ROLES, clubFieldsSchema } from '#shared/domain/club.schema'
import { commentFieldsSchema } from '#shared/domain/comment.schema'
import { entryFieldsSchema } from '#shared/domain/entry.schema'
import { PHOTOS_PER_ENTRY_MAX, PHOTO_SUBJECTS } from '#shared/domain/photo.schema'
import { plantFieldsSchema } from '#shared/domain/plant.schema'
import { vesselFieldsSchema } from '#shared/domain/vessel.schema'
import { litresAtLevel } from '#shared/science/vessel/level-to-litres'
import { measuresOfVessel } from '#shared/science/vessel/measures-of-vessel'
import { cupBottomCm } from '#shared/science/vessel/net-cup'
import { refillLimitCm } from '#shared/science/vessel/refill-limit'
import accounts from '~/server/demo/accounts.json'
import { demoClub } from '~/server/demo/content'
import type { DemoEntry, DemoPlant } from '~/server/demo/types'

const PLANTED_ON = '2026-06-20'
const ID = '018f3a5c-0000-7000-8000-000000000001'
const PHOTO_FOLDER = fileURLToPath(new URL('../../../server/assets/demo/', import.meta.url))
const PHOTO_BYTES_ALL = 2_500_000
/** A tape measure is read to half a centimetre at either end. */
const TAPE_CM = 0.55

const plants = demoClub.plants.map(plant => [plant.fields.name, plant] as const)
const visits = demoClub.plants.flatMap(plant => plant.entries.map(entry => ({ plant, entry })))
const members = new Set(demoClub.members.map(member => member.email))

function dayOf(plant: DemoPlant, day: number): string {
  return new Date(Date.parse(`${PLANTED_ON}T00:00:00.000Z`) + (day - plant.setUpDaysAgo) * 86_400_000).toISOString().slice(0, 10)
}

function momentOf(plant: DemoPlant, entry: DemoEntry): number {
  return Date.parse(`${dayOf(plant, entry.day)}T${entry.time}:00.000Z`)
}

function wholeEntry(plant: DemoPlant, entry: DemoEntry) {
  const at = new Date(momentOf(plant, entry)).toISOString()
  return {
    plantId: ID, recordedAt: at, occurredAt: at, lookedNoChange: false, note: null,
    ph: null, ecMilliSiemensPerCm: null, waterLevelCm: null, airGapCm: null,
    waterCelsius: null, airCelsius: null, relativeHumidityPercent: null,
    actions: [], topUpLitres: null, topUpWith: null, changeLitres: null, harvestGrams: null, harvestCount: null,
    ...entry.fields,
  }
}

function levelsOf(plant: DemoPlant) {
  return plant.entries.flatMap((entry) => {
    const { waterLevelCm, airGapCm } = entry.fields
    return typeof waterLevelCm === 'number' && typeof airGapCm === 'number'
      ? [{ entry, atMs: momentOf(plant, entry), levelCm: waterLevelCm, gapCm: airGapCm }]
      : []
  })
}

describe('accounts of the demo', () => {
  it('can sign up, with roles that exist', () => {
    for (const { email, password, displayName, role } of accounts) {
      expect(signUpSchema.parse({ email, password, displayName }).email).toBe(email)
      expect(CLUB_ROLES).toContain(role)
    }
    expect(new Set(accounts.map(account => account.email)).size).toBe(accounts.length)
  })

  it('are the members of the club, with the same roles', () => {
    expect(demoClub.members).toEqual(accounts.map(({ email, role }) => ({ email, role })))
  })

  it('hold three growers or more, a mentor and a steward, the main grower first', () => {
    const roles = accounts.map(account => account.role)
    expect(roles.filter(role => role === 'grower').length).toBeGreaterThanOrEqual(3)
    expect(roles.filter(role => role === 'mentor')).toHaveLength(1)
    expect(roles.filter(role => role === 'steward')).toHaveLength(1)
    expect(accounts[0]?.email).toBe(demoClub.plants[0]?.owner)
  })
})

describe('records of the demo', () => {
  it('has a valid club', () => {
    expect(clubFieldsSchema.safeParse({ name: demoClub.name }).success).toBe(true)
  })

  it.each(plants)('%s: plant and vessel are valid', (_name, plant) => {
    const { setUpDaysAgo, sownDaysBeforeSetUp, endedOnDay } = plant
    const shared = plant.fields.visibility === 'club'
    expect(plantFieldsSchema.parse({
      ...plant.fields, setUpOn: dayOf(plant, 0), vesselId: ID, clubId: shared ? ID : null,
      sownOn: sownDaysBeforeSetUp === null ? null : dayOf(plant, -sownDaysBeforeSetUp),
      endedOn: endedOnDay === null ? null : dayOf(plant, endedOnDay),
    }).name).toBe(plant.fields.name)
    expect(vesselFieldsSchema.parse(plant.vessel)).toEqual(plant.vessel)
    expect(members).toContain(plant.owner)
    expect(plant.fields.endReason === null).toBe(endedOnDay === null)
    expect(endedOnDay ?? 0).toBeLessThanOrEqual(setUpDaysAgo)
  })

  it.each(plants)('%s: every entry is valid', (_name, plant) => {
    for (const entry of plant.entries) {
      const result = entryFieldsSchema.safeParse(wholeEntry(plant, entry))
      expect(result.error?.issues ?? [], `day ${entry.day}`).toEqual([])
      expect(entry.time).toMatch(/^(0[6-9]|1\d|2[01]):[0-5]\d$/)
    }
  })

  it.each(plants)('%s: visits are in order, none after the last day or after today', (_name, plant) => {
    const moments = plant.entries.map(entry => momentOf(plant, entry))
    expect(moments).toEqual([...moments].sort((a, b) => a - b))
    expect(new Set(moments).size).toBe(moments.length)
    expect(plant.entries.at(-1)?.day).toBeLessThanOrEqual(plant.endedOnDay ?? plant.setUpDaysAgo)
    expect(plant.entries[0]?.fields.actions).toContain('set-up')
  })

  it('looks after plants at believable gaps: never more than four days between visits', () => {
    for (const plant of demoClub.plants) {
      const days = plant.entries.map(entry => entry.day)
      days.slice(1).forEach((day, index) => expect(day - (days[index] ?? 0), `${plant.fields.name}, day ${day}`).toBeLessThanOrEqual(4))
    }
  })

  it('names an amount with every top-up, change and harvest, and no amount without', () => {
    for (const { plant, entry } of visits) {
      const { actions = [], topUpLitres = null, topUpWith = null, changeLitres = null, harvestGrams = null } = entry.fields
      const where = `${plant.fields.name}, day ${entry.day}`
      expect(topUpLitres !== null && topUpWith !== null, where).toBe(actions.includes('topped-up'))
      expect(changeLitres !== null, where).toBe(actions.includes('changed-solution'))
      expect(harvestGrams !== null, where).toBe(actions.includes('harvested'))
    }
  })
})

describe('water of the demo', () => {
  it.each(plants)('%s: level and air gap add up to the bottom of the cup', (_name, plant) => {
    const levels = levelsOf(plant)
    const hanging = levels.filter(reading => reading.gapCm > 0)
    const { heightCm, netCupDepthCm } = plant.vessel
    const bottom = heightCm !== null && netCupDepthCm !== null
      ? cupBottomCm(heightCm, netCupDepthCm)
      : Math.min(...levels.filter(reading => reading.gapCm === 0).map(reading => reading.levelCm))
    for (const reading of hanging) expect(reading.levelCm + reading.gapCm).toBeCloseTo(bottom, 6)
    for (const reading of levels) expect(reading.gapCm > 0).toBe(reading.levelCm < bottom)
    expect(plant.entries.every(entry => (entry.fields.waterLevelCm === undefined) === (entry.fields.airGapCm === undefined))).toBe(true)
  })

  it.each(plants)('%s: no air roots are drowned', (_name, plant) => {
    const { heightCm, netCupDepthCm } = plant.vessel
    const options = { cupBottomCm: heightCm !== null && netCupDepthCm !== null ? cupBottomCm(heightCm, netCupDepthCm) : null }
    const levels = levelsOf(plant)
    levels.forEach((reading, index) => {
      const limit = refillLimitCm(levels.slice(0, index), options)
      if (limit !== null) expect(reading.levelCm, `day ${reading.entry.day}`).toBeLessThanOrEqual(limit)
    })
  })

  it.each(plants)('%s: the level rises only when water came in', (_name, plant) => {
    const levels = levelsOf(plant)
    levels.slice(1).forEach((reading, index) => {
      const actions = reading.entry.fields.actions ?? []
      const fed = actions.some(action => ['topped-up', 'changed-solution', 'rained-in'].includes(action))
      if (!fed) expect(reading.levelCm, `day ${reading.entry.day}`).toBeLessThanOrEqual(levels[index]?.levelCm ?? 0)
    })
  })

  it.each(plants)('%s: litres fit the vessel', (_name, plant) => {
    const measures = measuresOfVessel(plant.vessel)
    if (!measures) return expect(plant.vessel.shape).toBe('unmeasured')
    for (const { entry, levelCm } of levelsOf(plant)) {
      const { changeLitres, topUpLitres } = entry.fields
      if (typeof changeLitres === 'number') expect(changeLitres, `day ${entry.day}`).toBeCloseTo(litresAtLevel(measures, levelCm), 0)
      if (typeof topUpLitres === 'number') {
        const lowest = litresAtLevel(measures, levelCm) - topUpLitres
        expect(lowest, `day ${entry.day}`).toBeGreaterThan(litresAtLevel(measures, levelCm - 2 - TAPE_CM))
      }
    }
  })
})

describe('photos of the demo', () => {
  const used = visits.flatMap(({ entry }) => entry.photos ?? [])

  it('are all there, and all used once', () => {
    const files = readdirSync(PHOTO_FOLDER).sort()
    expect(files.length).toBeGreaterThanOrEqual(30)
    expect(used.map(photo => photo.file).sort()).toEqual(files)
  })

  it('have known subjects and fit the entry', () => {
    for (const photo of used) expect(PHOTO_SUBJECTS).toContain(photo.subject)
    for (const { entry } of visits) expect(entry.photos?.length ?? 0).toBeLessThanOrEqual(PHOTOS_PER_ENTRY_MAX)
  })

  it('are light enough to ship', () => {
    const bytes = readdirSync(PHOTO_FOLDER).map(file => statSync(`${PHOTO_FOLDER}${file}`).size)
    expect(bytes.reduce((sum, one) => sum + one, 0)).toBeLessThan(PHOTO_BYTES_ALL)
  })
})

describe('comments of the demo', () => {
  const comments = visits.flatMap(({ plant, entry }) => (entry.comments ?? []).map(comment => ({ plant, entry, comment })))

  it('are by members, on plants the members may see', () => {
    expect(comments.length).toBeGreaterThan(20)
    for (const { plant, comment } of comments) {
      expect(members).toContain(comment.by)
      expect(plant.fields.visibility).toBe('club')
    }
  })

  it('are valid, in order, and written before today', () => {
    for (const { plant, entry, comment } of comments) {
      const writtenMs = momentOf(plant, entry) + comment.hoursLater * 3_600_000
      const fields = { plantId: ID, entryId: ID, text: comment.text, writtenAt: new Date(writtenMs).toISOString() }
      expect(commentFieldsSchema.safeParse(fields).success).toBe(true)
      expect(comment.hoursLater).toBeGreaterThan(0)
      expect(writtenMs, comment.text).toBeLessThan(Date.parse(`${PLANTED_ON}T00:00:00.000Z`))
    }
    for (const { entry } of visits) {
      const hours = (entry.comments ?? []).map(comment => comment.hoursLater)
      expect(hours).toEqual([...hours].sort((a, b) => a - b))
    }
  })

  it('hold one question that a mentor answered and the grower took up', () => {
    const mentor = accounts.find(account => account.role === 'mentor')?.email
    const talks = visits.filter(({ plant, entry }) => {
      const writers = (entry.comments ?? []).map(comment => comment.by)
      return entry.fields.note?.endsWith('?') === true && mentor !== undefined && writers.includes(mentor) && writers.includes(plant.owner)
    })
    expect(talks.length).toBeGreaterThan(0)
  })
})

describe('the stories of the demo', () => {
  it('keeps one plant private, ends one that died and one that was eaten', () => {
    const reasons = demoClub.plants.map(plant => plant.fields.endReason)
    expect(demoClub.plants.filter(plant => plant.fields.visibility === 'private').length).toBeGreaterThan(0)
    expect(reasons).toEqual(expect.arrayContaining(['died', 'finished']))
  })

  it('leaves some plants visited today and others not', () => {
    const growing = demoClub.plants.filter(plant => plant.endedOnDay === null)
    const sinceLast = growing.map(plant => plant.setUpDaysAgo - (plant.entries.at(-1)?.day ?? 0))
    expect(sinceLast).toContain(0)
    expect(sinceLast.some(days => days >= 2)).toBe(true)
  })
})
