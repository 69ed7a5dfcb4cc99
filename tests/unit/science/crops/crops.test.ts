import { describe, expect, it } from 'vitest'
import { CROP_IDS } from '#shared/science/crops/crop-ids'
import { allCrops, cropOf } from '#shared/science/crops/crops'

describe('crops', () => {
  it('names a crop as a label, in the plural and by its other names', () => {
    expect(cropOf('pak-choi')).toEqual({ id: 'pak-choi', name: 'Pak choi', plural: 'Pak choi plants', alsoCalled: 'bok choy' })
    expect(cropOf('aubergine').alsoCalled).toContain('eggplant')
  })

  it('lists every id once, by name, with "Another crop" last', () => {
    const crops = allCrops()
    expect(crops.map(crop => crop.id).toSorted()).toEqual([...CROP_IDS].toSorted())
    const names = crops.map(crop => crop.name)
    expect(names.at(-1)).toBe('Another crop')
    expect(names.slice(0, -1)).toEqual(names.slice(0, -1).toSorted((one, other) => one.localeCompare(other)))
  })

  it('calls no two crops the same', () => {
    const names = allCrops().map(crop => crop.name.toLowerCase())
    expect(new Set(names).size).toBe(names.length)
  })
})
