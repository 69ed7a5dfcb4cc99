import { ellipse, fill, group, stroke } from './sheet.mjs'
import { blur, brushed } from './filters.mjs'
import { faded, lighter } from './colour.mjs'
import { makeRandom } from './random.mjs'
import { smooth } from './geometry.mjs'

/** Tone of the solution, from clear to tea-coloured. */
export const WATER_COLOURS = {
  clear: [[0.5, 0.07, 208], [0.27, 0.055, 215]],
  murky: [[0.45, 0.05, 130], [0.24, 0.045, 120]],
}

/** Half of the surface that lies behind the roots: darker, with a soft mirror of the wall. */
export function surfaceBehind(sheet, { middle, y, half, lip }, [[, chroma, hue]]) {
  const sheen = sheet.linear([middle - half, y], [middle + half, y], [
    [0, [0.4, chroma, hue, 0.9]], [0.32, [0.78, chroma * 0.8, hue, 0.9]], [0.6, [0.5, chroma, hue, 0.9]], [1, [0.33, chroma * 0.8, hue, 0.9]],
  ])
  return ellipse(middle, y, half, lip, sheen)
}

/** The body of water seen from the side. */
export function waterBody(sheet, { middle, y, half, floorY, floorHalf, lip }, tones) {
  const deep = sheet.linear([0, y], [0, floorY], [[0, [...tones[0], 0.86]], [0.55, [...tones[1], 0.92]], [1, [...tones[1].with(0, tones[1][0] * 0.72), 0.97]]])
  return fill(body({ middle, y, half, floorY, floorHalf, lip }), deep)
}

export function body({ middle, y, half, floorY, floorHalf, lip }) {
  return `M${middle - half} ${y}A${half} ${lip} 0 0 0 ${middle + half} ${y}L${middle + floorHalf} ${floorY}A${floorHalf} ${lip} 0 0 1 ${middle - floorHalf} ${floorY}Z`
}

/** What lies over the drowned roots: haze, light that wanders, bubbles and the bright rim of the surface. */
export function waterInFront(sheet, basin, tones, { seed, bubbles = 26 }) {
  const { middle, y, half, floorY, floorHalf, lip } = basin
  const random = makeRandom(seed, 'water')
  const surface = lighter(tones[0], 0.22)
  const haze = sheet.linear([0, y], [0, floorY], [[0, [...tones[0], 0.1]], [0.5, [...tones[1], 0.3]], [1, [...tones[1], 0.62]]])
  const side = sheet.linear(
    [middle - half, 0], [middle + half, 0],
    [[0, [0.1, 0.03, 220, 0.6]], [0.2, [0.1, 0.03, 220, 0]], [0.75, [0.1, 0.03, 220, 0]], [1, [0.1, 0.03, 220, 0.66]]],
  )
  const inside = sheet.clip(fill(body(basin), '#fff'))
  const front = `M${middle - half} ${y}A${half} ${lip} 0 0 0 ${middle + half} ${y}`
  return group({},
    fill(body(basin), haze),
    group({ 'clip-path': inside, 'style': 'mix-blend-mode:screen' }, shafts(sheet, basin, random), caustics(sheet, basin, random)),
    fill(body(basin), side),
    Array.from({ length: bubbles }, () => bubble(random, middle + random.around(0, floorHalf * 0.85), random.between(y + lip, floorY - 8))),
    fill(`${front}A${half} ${lip} 0 0 0 ${middle - half} ${y}Z`, sheet.linear([middle - half, 0], [middle + half, 0], [
      [0, faded(surface, 0.12)], [0.3, faded(lighter(surface, 0.2), 0.4)], [0.62, faded(surface, 0.16)], [1, faded(surface, 0.05)]])),
    ripples(basin, random),
    stroke(front, [0.94, 0.03, 195, 0.8], 2.4),
    stroke(`M${middle - half} ${y + 5}A${half} ${lip} 0 0 0 ${middle + half} ${y + 5}`, [0.2, 0.04, 215, 0.4], 4),
  )
}

function shafts(sheet, { middle, y, half, floorY, floorHalf }, random) {
  const soft = blur(sheet, 16)
  const paint = sheet.linear([0, y], [0, floorY], [[0, [0.9, 0.06, 190, 0.34]], [1, [0.8, 0.06, 190, 0]]])
  return group({ filter: soft }, Array.from({ length: 5 }, () => {
    const top = middle + random.around(-half * 0.25, half * 0.7)
    const width = random.between(14, 52)
    const lean = random.between(20, 90)
    return fill(
      `M${top} ${y}L${top + width} ${y}L${top + lean + width * 2} ${floorY}L${top + lean} ${floorY}Z`, paint,
      { opacity: Math.min(1, floorHalf / half) },
    )
  }))
}

function caustics(sheet, { middle, y, half, floorY }, random) {
  const wavy = brushed(sheet, 26, 0.012, 8)
  const depth = Math.min(floorY - y, 120)
  return group({ filter: wavy, opacity: 0.34 }, Array.from({ length: 9 }, (_, index) => {
    const line = y + 10 + depth * (index / 9) ** 1.4
    const points = Array.from({ length: 12 }, (__, step) => [middle - half + step * half / 5.5, line + random.around(0, 9)])
    return stroke(smooth(points), [0.95, 0.05, 190, 0.7 - index * 0.07], random.between(1.2, 3.4))
  }))
}

function ripples({ middle, y, half, lip }, random) {
  return Array.from({ length: 7 }, () => {
    const x = middle + random.around(0, half * 0.6)
    const width = random.between(40, 150)
    const line = y + random.around(0, lip * 0.55)
    return stroke(
      `M${x - width / 2} ${line}q${width / 2} ${random.between(3, 8)} ${width} 0`, [0.96, 0.02, 195, random.between(0.15, 0.45)],
      random.between(1, 2.4),
    )
  })
}

function bubble(random, x, y) {
  const size = random.between(1.4, 4.2)
  return group({ opacity: random.between(0.35, 0.8) },
    ellipse(x, y, size, size, [0.85, 0.03, 200, 0.25]),
    stroke(`M${x - size} ${y}a${size} ${size} 0 1 1 0 0.1`, [0.95, 0.02, 200, 0.6], 0.7),
    ellipse(x - size * 0.35, y - size * 0.4, size * 0.3, size * 0.3, [1, 0, 0, 0.95]),
  )
}
