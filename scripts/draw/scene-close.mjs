import { fill, group, makeSheet, rectangle } from './sheet.mjs'
import { blur } from './filters.mjs'
import { curve, smooth } from './geometry.mjs'
import { finished } from './finish.mjs'
import { softTerrace } from './backdrop.mjs'
import { makeRandom } from './random.mjs'
import { smallLeaf, stem } from './small-leaf.mjs'
import { starFlower, tomatoFruit } from './fruit-and-flower.mjs'

const GREENS = { tomato: [0.5, 0.115, 135], aubergine: [0.5, 0.08, 143] }
const STALKS = { tomato: [0.58, 0.1, 130], aubergine: [0.44, 0.06, 340] }

function leafCloud(sheet, { kind, seed, count, size, soft, up = 0 }) {
  const random = makeRandom(seed, 'cloud', soft)
  return group({ filter: blur(sheet, soft) }, Array.from({ length: count }, (_, index) => smallLeaf({
    kind, seed: `${seed}${soft}${index}`, from: [random.between(-80, 1360), random.between(-100, 940 - up)], angle: random.between(-0.6, 3.6),
    length: size * random.between(0.8, 1.25), droop: 0.25, tilt: random.around(0, 0.6), colour: GREENS[kind], gloss: 0.3,
    veinColour: kind === 'aubergine' ? [0.55, 0.055, 345] : undefined,
  })))
}

/** One truss close up: flowers (ripe missing) or fruits from green 0 to red 1. */
export function trussScene({ seed, fruits = [], flowers = 0, light = 'morning' }) {
  const sheet = makeSheet(1280, 960)
  const random = makeRandom(seed, 'truss')
  const line = curve([-30, 150], [360, 90], [760, 150], [1010, 560], 20)
  const spots = fruits.length + flowers
  const things = Array.from({ length: spots }, (_, index) => {
    const share = 0.28 + 0.72 * index / Math.max(1, spots - 1)
    const [x, y] = line[Math.round(share * 20)]
    const side = index % 2 ? 1 : -1
    const at = [x + side * random.between(34, 62) - 20, y + (side > 0 ? random.between(96, 120) : random.between(190, 230))]
    const stalk = curve([x, y], [x + side * 16, y + 40], [at[0], at[1] - 110], [at[0], at[1] - (index < fruits.length ? 60 : 10)], 8)
    if (index < fruits.length) {
      const radius = random.between(92, 112) * (0.72 + 0.28 * Math.min(1, fruits[index] * 2 + 0.4))
      return {
        stalk: stem(stalk, 11, 9, STALKS.tomato),
        thing: tomatoFruit(sheet, { at: [at[0], at[1] + 30], radius, ripe: fruits[index], seed: `${seed}${index}` }),
      }
    }
    return {
      stalk: stem(stalk, 9, 7, STALKS.tomato),
      thing: starFlower(
        sheet,
        {
          at, size: random.between(82, 108), petal: [0.88, 0.17, 98], heart: [0.76, 0.16, 82], turn: random.next() * 2,
          squash: random.between(0.68, 0.92), seed: `${seed}f${index}`, cone: true,
        },
      ),
    }
  })
  const picture = group({},
    softTerrace(sheet, { seed, light, horizon: 0.3, floorAt: 0.95 }),
    leafCloud(sheet, { kind: 'tomato', seed, count: 16, size: 380, soft: 18 }),
    rectangle(0, 0, 1280, 960, [0.18, 0.05, 145, 0.2]),
    leafCloud(sheet, { kind: 'tomato', seed, count: 6, size: 330, soft: 6, up: 300 }),
    things.map(one => one.stalk), stem(line, 17, 9, STALKS.tomato), things.map(one => one.thing),
  )
  return finished(sheet, picture, { seed: 7, warmth: 0.2, light: [0.12, 0] })
}

/** An aubergine flower nodding before its leaves. */
export function flowerScene({ seed, light = 'evening' }) {
  const sheet = makeSheet(1280, 960)
  const stalk = curve([1220, -30], [1060, 120], [900, 160], [600, 460], 16)
  const small = curve([1060, 110], [1060, 240], [1010, 400], [1000, 540], 10)
  const mauve = [0.66, 0.13, 312]
  const picture = group({},
    softTerrace(sheet, { seed, light, horizon: 0.3, floorAt: 0.95 }),
    leafCloud(sheet, { kind: 'aubergine', seed, count: 13, size: 470, soft: 20 }),
    rectangle(0, 0, 1280, 960, [0.2, 0.05, 150, 0.2]),
    leafCloud(sheet, { kind: 'aubergine', seed, count: 5, size: 430, soft: 5, up: 240 }),
    stem(small, 15, 12, STALKS.aubergine),
    group(
      { filter: blur(sheet, 2) },
      starFlower(
        sheet,
        {
          at: [1000, 560], size: 105, petal: [0.6, 0.13, 312], heart: [0.8, 0.16, 90], petals: 5, turn: 0.4, squash: 0.6, seed: `${seed}b`,
        },
      ),
    ),
    stem(stalk, 22, 17, STALKS.aubergine),
    sepals([560, 500], 300),
    starFlower(sheet, { at: [560, 500], size: 300, petal: lightPetal(mauve), heart: [0.82, 0.165, 90], petals: 6, turn: -0.3, squash: 0.86, seed }),
  )
  return finished(sheet, picture, { seed: 7, warmth: 0.22, light: [0.85, 0] })
}

/** The thorny green cup behind the petals. */
function sepals([x, y], size) {
  return Array.from({ length: 6 }, (_, index) => {
    const angle = -0.3 + Math.PI / 6 + index / 6 * Math.PI * 2
    const tip = [x + Math.cos(angle) * size * 0.82, y + Math.sin(angle) * size * 0.7]
    const [left, right] = [-0.34, 0.34].map(turn => [x + Math.cos(angle + turn) * size * 0.42, y + Math.sin(angle + turn) * size * 0.36])
    return fill(smooth([[x, y], left, tip, right], true), [0.4, 0.06, 145]) + fill(smooth([[x, y], left, tip], true), [0.5, 0.07, 140])
  })
}

const lightPetal = ([l, c, h]) => [l + 0.06, c, h]
