import { fill, group, makeSheet, rectangle } from './sheet.mjs'
import { blur } from './filters.mjs'
import { curve, smooth, ribbon } from './geometry.mjs'
import { makeRandom } from './random.mjs'
import { vary } from './colour.mjs'
import { finished } from './finish.mjs'
import { softTerrace } from './backdrop.mjs'
import { closeLeaf } from './leaf-close.mjs'
import { outline } from './leaf-outline.mjs'

export const LEAF_COLOURS = {
  tomato: { green: [0.5, 0.115, 135], between: [0.83, 0.15, 108], veinColour: [0.66, 0.1, 125], gloss: 0.35 },
  basil: { green: [0.55, 0.145, 134], between: [0.87, 0.155, 107], veinColour: [0.68, 0.13, 128], gloss: 0.9 },
  aubergine: { green: [0.47, 0.075, 143], between: [0.8, 0.12, 110], veinColour: [0.6, 0.05, 350], gloss: 0.3 },
  pepper: { green: [0.5, 0.13, 138], between: [0.84, 0.15, 108], veinColour: [0.66, 0.12, 130], gloss: 0.8 },
}

/** A leaf close up, its neighbours out of focus behind it. */
export function leafScene({ kind, seed, yellow = 0, light = 'morning', dew = 0, bend, neighbours = yellow }) {
  const sheet = makeSheet(1280, 960)
  const line = curve(...(bend ?? [[130, 900], [420, 640], [760, 520], [1160, 120]]), 30)
  const length = Math.hypot(line.at(-1)[0] - line[0][0], line.at(-1)[1] - line[0][1]) * 1.02
  const colours = LEAF_COLOURS[kind]
  const picture = group({},
    softTerrace(sheet, { seed, light, floorAt: 0.95, horizon: 0.3 }),
    crowd(sheet, { kind, seed, colours, yellow: neighbours }),
    rectangle(0, 0, 1280, 960, [0.2, 0.04, 150, 0.16]),
    stalk(line, colours),
    closeLeaf(sheet, { kind, seed, bend: line, length, yellow, dew, ...colours }),
  )
  return finished(sheet, picture, { seed: seed.length, warmth: 0.16, light: [0.15, 0] })
}

function stalk(line, { veinColour }) {
  const [x, y] = line[0]
  const points = [[x - 190, y + 130], [x - 90, y + 70], [x + 4, y - 4]]
  return group(
    {}, fill(ribbon(points, () => 22), [veinColour[0] - 0.14, veinColour[1], veinColour[2]]),
    fill(ribbon(points.map(([px, py]) => [px - 3, py - 5]), () => 8), veinColour),
  )
}

/** Blurred leaves of the same plant, two depths of them. */
function crowd(sheet, { kind, seed, colours, yellow }) {
  const random = makeRandom(seed, 'crowd')
  const leaf = (size) => {
    const [x, y, turn] = [random.between(-100, 1380), random.between(-60, 1020), random.between(0, 6.28)]
    const [left, right] = outline(kind, random.next(), 20)
    const place = ([u, v]) => [x + Math.cos(turn) * u * size - Math.sin(turn) * v * size, y + Math.sin(turn) * u * size + Math.cos(turn) * v * size]
    const tone = vary(random, yellow > 0 && random.chance(yellow * 0.6) ? colours.between : colours.green, 2)
    const points = [...left.map(place), ...right.slice().reverse().map(place)]
    return group(
      {}, fill(smooth(points, true), [tone[0] * 0.86, tone[1], tone[2]]),
      fill(smooth(left.map(place).concat([place([0, 0])]), true), [tone[0] + 0.05, tone[1], tone[2], 0.8]),
    )
  }
  return [
    group({ filter: blur(sheet, 24) }, Array.from({ length: 13 }, () => leaf(random.between(320, 560)))),
    group({ filter: blur(sheet, 11) }, Array.from({ length: 7 }, () => leaf(random.between(260, 480)))),
  ]
}
