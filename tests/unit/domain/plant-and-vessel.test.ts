import { describe, expect, it } from 'vitest'
import { plantFieldsSchema, plantPatchSchema } from '#shared/domain/plant.schema'
import { emptyVesselFields, vesselFieldsSchema, vesselPatchSchema } from '#shared/domain/vessel.schema'
import { accepts, wrongPaths } from '~/tests/support/schema-checks'
import { ids, validPlant, validVessel } from '~/tests/support/valid-fields'

describe('plant', () => {
  it('takes a whole record', () => {
    expect(wrongPaths(plantFieldsSchema, validPlant)).toEqual([])
    expect(wrongPaths(plantFieldsSchema, {
      ...validPlant, cultivar: 'Padrón', visibility: 'club', clubId: ids.club, endedOn: '2026-10-01', endReason: 'finished',
    })).toEqual([])
  })

  it.each([
    ['name', ''], ['name', '  '], ['name', 'a'.repeat(81)], ['name', null],
    ['cropId', 'banana'], ['cropId', 'Pepper'], ['cropId', null],
    ['cultivar', 'a'.repeat(121)], ['origin', 'a'.repeat(121)], ['place', 'a'.repeat(121)],
    ['setUpOn', '2026-02-30'], ['setUpOn', '1969-12-31'], ['setUpOn', null], ['sownOn', '2026-02-30'], ['endedOn', 'tomorrow'],
    ['timeZone', 'Mars/Olympus'], ['vesselId', 'bucket'], ['clubId', ''], ['visibility', 'public'], ['endReason', 'eaten'],
  ])('refuses %s = %j', (field, value) => {
    expect(wrongPaths(plantFieldsSchema, { ...validPlant, [field]: value })).toEqual([field])
  })

  it.each([
    ['name', 80], ['cultivar', 120], ['origin', 120], ['place', 120],
  ])('takes %s of %d characters', (field, length) => {
    expect(wrongPaths(plantFieldsSchema, { ...validPlant, [field]: 'ä'.repeat(length) })).toEqual([])
  })

  it.each(['فلفل الشرفة', 'Paprika 🌶️', '辣椒一号', 'Ñora d\u2019avó'])('keeps the name %s as it is', (name) => {
    const parsed = plantFieldsSchema.safeParse({ ...validPlant, name })
    expect(parsed.success && parsed.data.name).toBe(name)
  })

  it('is patched in part, within the same limits, and never given away', () => {
    expect(accepts(plantPatchSchema, { name: 'New name' })).toBe(true)
    expect(wrongPaths(plantPatchSchema, { cropId: 'banana' })).toEqual(['cropId'])
    expect(accepts(plantPatchSchema, { ownerId: ids.plant })).toBe(false)
  })
})

describe('vessel', () => {
  it('takes one that nobody measured once it has a name', () => {
    expect(wrongPaths(vesselFieldsSchema, emptyVesselFields)).toEqual(['name'])
    expect(wrongPaths(vesselFieldsSchema, validVessel)).toEqual([])
  })

  const sides = ['topLengthCm', 'topWidthCm', 'bottomLengthCm', 'bottomWidthCm', 'heightCm']
  const limits: [field: string, min: number, max: number][] = [
    ...sides.map((side): [string, number, number] => [side, 0.1, 500]),
    ['capacityLitres', 0.05, 5_000],
    ['netCupRimCm', 0.5, 100],
    ['netCupDepthCm', 0.5, 100],
  ]

  it.each(limits)('%s goes from %d to %d', (field, min, max) => {
    for (const right of [min, max, null]) expect(wrongPaths(vesselFieldsSchema, { ...validVessel, [field]: right })).toEqual([])
    for (const wrong of [0, -1, min / 2, max + 0.01, Number.NaN, '30']) {
      expect(wrongPaths(vesselFieldsSchema, { ...validVessel, [field]: wrong })).toEqual([field])
    }
  })

  it('holds 1 to 200 plants', () => {
    for (const right of [1, 200, null]) expect(accepts(vesselFieldsSchema, { ...validVessel, plantCount: right })).toBe(true)
    for (const wrong of [0, 201, 1.5]) expect(wrongPaths(vesselFieldsSchema, { ...validVessel, plantCount: wrong })).toEqual(['plantCount'])
  })

  it.each([['kind', 'barrel'], ['shape', 'oval'], ['lightProof', 'yes'], ['name', 'a'.repeat(81)]])('refuses %s = %j', (field, value) => {
    expect(wrongPaths(vesselFieldsSchema, { ...validVessel, [field]: value })).toEqual([field])
  })

  it('is patched in part, within the same limits', () => {
    expect(accepts(vesselPatchSchema, { lightProof: true })).toBe(true)
    expect(wrongPaths(vesselPatchSchema, { heightCm: 501 })).toEqual(['heightCm'])
  })
})
