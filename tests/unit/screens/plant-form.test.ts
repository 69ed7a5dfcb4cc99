import { describe, expect, it } from 'vitest'
import { changedFields, checkPlantForm, emptyPlantForm, freeName, plantFormOf, plantFormSchema } from '~/utils/plant/plant-form'
import type { PlantForm } from '~/utils/plant/plant-form'

const rest = { timeZone: 'Europe/Lisbon', endedOn: null, endReason: null }
const CLUB = '11111111-1111-4111-8111-111111111111'
const VESSEL = '22222222-2222-4222-8222-222222222222'

function form(changes: Partial<PlantForm> = {}, vessel: Partial<PlantForm['vessel']> = {}): PlantForm {
  const empty = emptyPlantForm('2026-06-01')
  return { ...empty, name: 'Juniper', cropId: 'tomato', ...changes, vessel: { ...empty.vessel, ...vessel } }
}
const check = (typed: PlantForm, withVessel = true) => checkPlantForm(typed, rest, 'Bucket', withVessel)

describe('the form of a plant', () => {
  it('needs a name, a crop and day 0, and says so at each', () => {
    const checked = check({ ...emptyPlantForm('2026-06-01'), setUpOn: null })
    expect(checked.ok ? [] : checked.issues).toEqual([
      { path: 'name', message: 'is empty' },
      { path: 'cropId', message: 'is missing: choose one' },
      { path: 'setUpOn', message: 'is missing' },
    ])
  })

  it('makes empty text nothing, and trims the rest', () => {
    const checked = check(form({ name: '  Juniper ', cultivar: '  ', place: ' roof ' }))
    expect(checked).toMatchObject({ ok: true, plant: { name: 'Juniper', cultivar: null, place: 'roof', vesselId: null } })
  })

  it('is private unless a club was chosen', () => {
    expect(check(form())).toMatchObject({ plant: { visibility: 'private', clubId: null } })
    expect(check(form({ seenBy: CLUB }))).toMatchObject({ plant: { visibility: 'club', clubId: CLUB } })
  })

  it('stands in the vessel that was chosen, and makes none then', () => {
    expect(check(form({ standsIn: VESSEL }), false)).toMatchObject({ ok: true, vessel: null, plant: { vesselId: VESSEL } })
    expect(check(form({ standsIn: 'none' }), false)).toMatchObject({ ok: true, vessel: null, plant: { vesselId: null } })
  })

  it('keeps only the measures that the shape has', () => {
    const measures = { topLengthCm: 28, topWidthCm: 20, bottomLengthCm: 23, bottomWidthCm: 18, heightCm: 26, capacityLitres: 12 }
    expect(check(form({}, { shape: 'round', ...measures }))).toMatchObject({
      vessel: { topLengthCm: 28, topWidthCm: null, bottomWidthCm: null, heightCm: 26, capacityLitres: null },
    })
    expect(check(form({}, { shape: 'unmeasured', ...measures }))).toMatchObject({
      vessel: { topLengthCm: null, heightCm: null, capacityLitres: 12 },
    })
  })

  it('names a vessel that was given no name', () => {
    expect(check(form({}, { name: ' ' }))).toMatchObject({ vessel: { name: 'Bucket' } })
  })

  it('refuses a net cup deeper than its vessel', () => {
    const checked = check(form({}, { shape: 'round', heightCm: 20, netCupDepthCm: 20.5 }))
    expect(checked.ok ? [] : checked.issues).toEqual([{ path: 'vessel.netCupDepthCm', message: 'is more than the height of the vessel' }])
    expect(check(form({}, { shape: 'round', heightCm: 20, netCupDepthCm: 20 })).ok).toBe(true)
  })

  it('comes back from a record as it went in', () => {
    const checked = check(form({ seenBy: CLUB, cultivar: 'Dwarf red' }, { shape: 'round', heightCm: 26 }))
    if (!checked.ok || !checked.vessel) throw new Error('the form should have been fine')
    const stored = { ...checked.vessel, id: VESSEL, ownerId: CLUB }
    const again = plantFormOf({ ...checked.plant, vesselId: VESSEL }, stored)
    expect(checkPlantForm(again, rest, 'Bucket', true)).toEqual({ ...checked, plant: { ...checked.plant, vesselId: VESSEL } })
  })

  it('takes no field from the record that the form asks for itself', () => {
    const record = { ...rest, endedOn: '2026-07-01', endReason: 'finished' as const, name: 'Before', place: 'before', id: VESSEL, ownerId: CLUB }
    const checked = checkPlantForm(form({ name: 'After', place: 'after' }), record, 'Bucket', false)
    expect(checked).toMatchObject({ ok: true, plant: { name: 'After', place: 'after', endedOn: '2026-07-01', endReason: 'finished' } })
  })

  it('keeps a draft with values that could not be saved', () => {
    const draft = form({ name: '', setUpOn: null }, { heightCm: 9_999 })
    expect(plantFormSchema.parse(JSON.parse(JSON.stringify(draft)))).toEqual(draft)
  })
})

describe('what was changed', () => {
  it('holds the fields that differ and no other', () => {
    expect(changedFields({ a: 1, b: null, c: 'x' }, { a: 1, b: 2, c: null })).toEqual({ b: 2, c: null })
    expect(changedFields({ a: 1 }, { a: 1 })).toEqual({})
  })
})

describe('a free name', () => {
  it.each([
    [[], 'Bucket'], [['Tub'], 'Bucket'], [['Bucket'], 'Bucket 2'], [['bucket ', 'Bucket 2'], 'Bucket 3'], [['Bucket 2'], 'Bucket'],
  ])('beside %j is %s', (taken, name) => {
    expect(freeName('Bucket', taken)).toBe(name)
  })
})
