import { describe, expect, it } from 'vitest'
import type { ColourName } from '../../../assets/design-tokens'
import {
  channels, day, markOnGround, MARK_CONTRAST_MIN, night, TEXT_CONTRAST_MIN, textOnGround,
} from '../../../assets/design-tokens'

/** Relative luminance of an sRGB colour. Source: WCAG 2.2, "relative luminance". */
function luminance(hex: string): number {
  const [red = 0, green = 0, blue = 0] = channels(hex).split(' ').map((channel) => {
    const value = Number(channel) / 255
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4
  })
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue
}

/** Contrast ratio of two colours. Source: WCAG 2.2, "contrast ratio". */
function contrast(one: string, other: string): number {
  const [darker = 0, lighter = 0] = [luminance(one), luminance(other)].sort((a, b) => a - b)
  return (lighter + 0.05) / (darker + 0.05)
}

function pairs(list: Partial<Record<ColourName, readonly ColourName[]>>): [ColourName, ColourName][] {
  return (Object.keys(list) as ColourName[]).flatMap(ground =>
    (list[ground] ?? []).map((name): [ColourName, ColourName] => [name, ground]))
}

describe('contrast', () => {
  it('agrees with the values WCAG gives for black, white and #777777', () => {
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 5)
    // W3C, "Understanding Success Criterion 1.4.3": #777777 on white is 4.48, just short of 4.5 (value from memory).
    expect(contrast('#777777', '#ffffff')).toBeCloseTo(4.48, 2)
  })

  const palettes = [['day', day], ['night', night]] as const
  it('has pairs to judge', () => {
    expect(pairs(textOnGround).length).toBeGreaterThan(15)
  })

  for (const [theme, palette] of palettes) {
    it.each(pairs(textOnGround))(`${theme}: text in %s reads on %s`, (name, ground) => {
      expect(contrast(palette[name], palette[ground])).toBeGreaterThanOrEqual(TEXT_CONTRAST_MIN)
    })
    it.each(pairs(markOnGround))(`${theme}: a mark in %s is seen on %s`, (name, ground) => {
      expect(contrast(palette[name], palette[ground])).toBeGreaterThanOrEqual(MARK_CONTRAST_MIN)
    })
  }
})
