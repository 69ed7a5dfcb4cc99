import { describe, expect, it } from 'vitest'
import { daysToStopLine, meanLitresPerDay, tomatoLitres } from '#shared/science/water/water-use'

const LITRES_PER_GALLON = 3.785411784

describe('water use', () => {
  // A lettuce on a US gallon of water in 40 days: 3.785 L / 40, computed by hand.
  it('of one lettuce on 3.785 L over 40 days is 0.0946 L a day', () => {
    expect(Math.abs(meanLitresPerDay(3.785, 40) - 0.0946)).toBeLessThan(0.001)
  })

  // (13.25 − 1.325) / 0.8, computed by hand; the tenth is Kratky's (2004). 0.8 L a day is a value from memory.
  it('lets a pepper at 0.8 L a day live 14.9 days on 13.25 L', () => {
    expect(Math.abs(daysToStopLine(13.25, 13.25, 0.8) - 14.9)).toBeLessThan(0.1)
  })

  it('leaves no days at or below the line', () => {
    expect(daysToStopLine(1.325, 13.25, 0.8)).toBe(0)
    expect(daysToStopLine(0, 13.25, 0.8)).toBe(0)
  })

  // Kratky and others 2005: 2.68 kg a plant, 25 to 40 L/kg as quoted; litres and US gallons computed by hand.
  it('for 2.68 kg of tomatoes is 67.0 to 107.2 L, 17.70 to 28.32 US gal', () => {
    const { low, high } = tomatoLitres(2.68)
    expect(Math.abs(low - 67.0)).toBeLessThan(0.1)
    expect(Math.abs(high - 107.2)).toBeLessThan(0.1)
    expect(Math.abs(low / LITRES_PER_GALLON - 17.7)).toBeLessThan(0.1)
    expect(Math.abs(high / LITRES_PER_GALLON - 28.32)).toBeLessThan(0.1)
  })

  it('refuses what cannot be', () => {
    expect(() => meanLitresPerDay(1, 0)).toThrow(/days/)
    expect(() => meanLitresPerDay(-1, 1)).toThrow(/litresDrunk/)
    expect(() => daysToStopLine(1, 1, 0)).toThrow(/litresPerDay/)
    expect(() => daysToStopLine(Number.NaN, 1, 1)).toThrow(/litresNow/)
    expect(() => tomatoLitres(-1)).toThrow(/fruitKg/)
  })
})
