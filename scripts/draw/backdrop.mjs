import { ellipse, fill, group, rectangle } from './sheet.mjs'
import { blur } from './filters.mjs'
import { makeRandom } from './random.mjs'
import { blend, lighter, vary } from './colour.mjs'

/** Skies, wall and floor of the terrace at different hours. */
export const LIGHTS = {
  morning: { sky: [0.9, 0.035, 220], low: [0.95, 0.04, 80], wall: [0.86, 0.03, 75], floor: [0.62, 0.06, 50], glow: [0.97, 0.06, 90] },
  noon: { sky: [0.86, 0.055, 230], low: [0.94, 0.025, 215], wall: [0.91, 0.015, 90], floor: [0.68, 0.055, 52], glow: [0.98, 0.03, 95] },
  evening: { sky: [0.8, 0.05, 265], low: [0.88, 0.09, 60], wall: [0.78, 0.06, 60], floor: [0.5, 0.075, 42], glow: [0.94, 0.1, 70] },
  cloudy: { sky: [0.85, 0.012, 230], low: [0.89, 0.01, 220], wall: [0.78, 0.012, 110], floor: [0.53, 0.03, 50], glow: [0.95, 0.01, 200] },
}

/** The terrace out of focus: sky, neighbours' roofs and chimneys, a parapet, a row of pots, warm floor. */
export function softTerrace(sheet, { seed, light = 'morning', dim = 0, horizon = 0.5, floorAt = 0.8 }) {
  const { width, height } = sheet
  const random = makeRandom(seed, 'terrace', light)
  const tones = LIGHTS[light]
  const sky = sheet.linear([0, 0], [0, height * horizon], [[0, tones.sky], [1, tones.low]])
  const [wallY, floorY] = [height * horizon, height * floorAt]
  const lights = Array.from({ length: 14 }, () => {
    const size = random.between(10, 34)
    return ellipse(random.between(0, width), random.between(height * 0.2, height * 0.75), size, size, tones.glow, { opacity: random.between(0.1, 0.3) })
  })
  const wall = sheet.linear([0, wallY], [0, floorY], [[0, lighter(tones.wall, 0.04)], [1, lighter(tones.wall, -0.07)]])
  const floor = sheet.linear([0, floorY], [0, height], [[0, tones.floor], [1, lighter(tones.floor, -0.1)]])
  return group({},
    rectangle(-50, -50, width + 100, height + 100, sky),
    clouds(sheet, random, tones, wallY),
    group({ filter: blur(sheet, 9) }, farRoofs(random, tones, width, wallY)),
    group({ filter: blur(sheet, 7) },
      rectangle(-60, wallY, width + 120, floorY - wallY + 20, wall),
      rectangle(-60, wallY - 16, width + 120, 30, tones.glow, { opacity: 0.85 }),
      rectangle(-60, wallY + 14, width + 120, 12, lighter(tones.wall, -0.16), { opacity: 0.5 }),
      rectangle(-60, floorY, width + 120, height, floor),
      rectangle(-60, floorY - 8, width + 120, 20, lighter(tones.floor, -0.14), { opacity: 0.5 }),
    ),
    group({ filter: blur(sheet, 10) }, pottedRow(random, tones, width, wallY, floorY)),
    group({ filter: blur(sheet, 4), style: 'mix-blend-mode:screen' }, lights),
    rectangle(-50, -50, width + 100, height + 100, [0.15, 0.03, 220, dim]),
  )
}

function clouds(sheet, random, tones, wallY) {
  return group({ filter: blur(sheet, 26), opacity: 0.55 }, Array.from({ length: 12 }, () => ellipse(
    random.between(0, sheet.width), wallY * random.between(0.1, 0.75), random.between(60, 190), random.between(14, 36), lighter(tones.low, 0.06))))
}

function farRoofs(random, tones, width, wallY) {
  return Array.from({ length: 10 }, (_, index) => {
    const tall = random.between(40, wallY * 0.36)
    const wide = random.between(100, 220)
    const x = index * width / 9 - 110
    const tone = vary(random, blend([0.7, 0.06, 48], tones.low, 0.4), 1.6)
    const stack = random.chance(0.6) ? rectangle(x + wide * random.between(0.2, 0.7), wallY - tall - 34, 22, 50, lighter(tone, -0.08)) : ''
    const windows = Array.from(
      { length: 3 }, (__, spot) => rectangle(x + 20 + spot * wide / 3.4, wallY - tall + 26, 18, 26, lighter(tone, -0.16), { opacity: 0.6 }),
    )
    return group({}, stack, rectangle(x, wallY - tall, wide, tall + 40, tone), rectangle(x, wallY - tall, wide, 12, lighter(tone, 0.08)), windows)
  })
}

function pottedRow(random, tones, width, wallY, floorY) {
  return Array.from({ length: 8 }, (_, index) => {
    const x = index * width / 7 + random.between(-50, 50)
    const size = random.between(34, 64)
    const y = floorY + random.between(-6, 26)
    const clay = vary(random, random.chance(0.65) ? [0.62, 0.11, 45] : [0.4, 0.04, 210], 1)
    const crown = Array.from({ length: 20 }, () => {
      const tone = vary(random, blend([0.58, 0.13, 135], tones.glow, 0.12), 2.4)
      return ellipse(
        x + random.around(0, size * 1.5), y - size * 1.5 - random.between(0, 1) ** 1.4 * (floorY - wallY) * 0.5,
        size * random.between(0.2, 0.55), size * random.between(0.2, 0.5), tone,
      )
    })
    return group({ opacity: 0.92 }, ellipse(x + size * 0.4, y, size * 1.3, size * 0.24, [0.2, 0.04, 50, 0.4]), crown,
      fill(
        `M${x - size} ${y - size * 1.4}h${size * 2}l${-size * 0.3} ${size * 1.4}h${-size * 1.4}Z`, clay,
      ), rectangle(x - size * 1.1, y - size * 1.5, size * 2.2, size * 0.34, lighter(clay, 0.07)))
  })
}
