import { group } from './sheet.mjs'
import { lighter } from './colour.mjs'
import { along, away, curve, degrees, headingAt, mid } from './geometry.mjs'
import { makeRandom } from './random.mjs'
import { smallLeaf, stem } from './small-leaf.mjs'
import { starFlower, tomatoFruit, longFruit } from './fruit-and-flower.mjs'

const STEM = { tomato: [0.56, 0.1, 130], aubergine: [0.42, 0.06, 340], pepper: [0.54, 0.11, 136] }
const LEAF = { tomato: [0.5, 0.115, 135], aubergine: [0.5, 0.08, 143], pepper: [0.52, 0.13, 138] }

function mainStem(random, foot, height, lean) {
  return curve(
    foot, [foot[0] + random.around(0, 14), foot[1] - height * 0.35], [foot[0] + lean * 0.5 + random.around(0, 18), foot[1] - height * 0.7],
    [foot[0] + lean, foot[1] - height], 24,
  )
}

/** A leaf made of leaflets in pairs along a drooping rachis. */
function compoundLeaf({ seed, from, angle, length, droop, yellow }) {
  const random = makeRandom(seed, 'compound')
  const tip = away(from, angle, length)
  const rachis = curve(
    from, away(from, angle, length * 0.4), [mid(from[0], tip[0], 0.8), mid(from[1], tip[1], 0.8) + droop * length * 0.3],
    [tip[0], tip[1] + droop * length], 16,
  )
  const leaflet = (share, turn, size, index) => {
    const base = along(rachis, share)
    const heading = headingAt(rachis, Math.round(share * 16))
    return smallLeaf({
      kind: 'tomato', seed: `${seed}${index}`, from: base, angle: heading + turn, length: size * random.between(0.88, 1.12),
      droop: 0.22 + droop * 0.3, tilt: random.around(0.1, 0.5), colour: LEAF.tomato, yellow, gloss: 0.3,
    })
  }
  const pairs = [
    0.24, 0.52, 0.78,
  ].flatMap((share, index) => [
    -1, 1,
  ].map(side => leaflet(share + side * 0.02, side * (1.15 - index * 0.13), length * [0.3, 0.44, 0.44][index], `${index}${side}`)))
  return group({}, stem(rachis, Math.max(2.4, length * 0.035), Math.max(1.4, length * 0.016), STEM.tomato), pairs, leaflet(0.98, 0, length * 0.5, 'end'))
}

/** A dwarf tomato: stout stem, dense compound leaves, trusses between them. */
export function tomatoPlant(sheet, { seed, foot, height, leaves, trusses = [], yellow = 0, droop = 0.3 }) {
  const random = makeRandom(seed, 'tomato')
  const trunk = mainStem(random, foot, height, 10)
  const items = Array.from({ length: leaves }, (_, index) => {
    const share = 0.1 + 0.88 * (index + 0.6) / leaves
    const side = index % 2 ? 1 : -1
    const out = mid(degrees(8), degrees(64), share) + random.around(0, 0.3)
    const towards = random.chance(0.3) ? 0.62 : 1
    const length = height * mid(0.64, 0.32, Math.abs(share - 0.42) * 1.5) * random.between(0.85, 1.1) * (0.4 + 0.6 * towards)
    const angle = -Math.PI / 2 + side * (Math.PI / 2 - out) * towards
    return {
      order: random.next() + (share > 0.8 ? 0.4 : 0),
      art: compoundLeaf({
        seed: `${seed}${index}`, from: along(trunk, share), angle, length, droop: droop * random.between(0.7, 1.3),
        yellow: share < 0.3 ? yellow : 0,
      }),
    }
  }).sort((a, b) => a.order - b.order).map(item => item.art)
  const cut = Math.ceil(items.length * 0.45)
  const crown = [
    -0.75, 0.7, -0.12,
  ].map((turn, index) => compoundLeaf({
    seed: `${seed}crown${index}`, from: along(trunk, 0.97), angle: -Math.PI / 2 + turn, length: height * [0.3, 0.27, 0.22][index],
    droop: 0.16 * Math.abs(turn) * 2, yellow: 0,
  }))
  return group(
    {}, items.slice(0, cut), crown, stem(trunk, Math.max(5, height * 0.042), Math.max(3, height * 0.016), STEM.tomato), items.slice(cut),
    trusses.map((truss, index) => tomatoTruss(sheet, { ...truss, seed: `${seed}t${index}`, from: along(trunk, truss.share), height })),
  )
}

export function tomatoTruss(sheet, { seed, from, height, side, flowers = 0, fruits = [], size = 0.046 }) {
  const random = makeRandom(seed, 'truss')
  const reach = height * 0.3
  const tip = [from[0] + side * reach, from[1] + reach * 0.42]
  const line = curve(from, [from[0] + side * reach * 0.5, from[1] - reach * 0.25], [tip[0], from[1] - reach * 0.1], tip, 14)
  const spot = index => along(line, 0.42 + 0.58 * index / Math.max(1, fruits.length + flowers - 1))
  const radius = height * size
  return group({},
    stem(line, Math.max(2.5, radius * 0.22), Math.max(1.6, radius * 0.12), STEM.tomato),
    fruits.map((ripe, index) => {
      const [x, y] = spot(index)
      const [dx, dy] = [random.around(0, radius * 0.7) + (index % 2 ? radius : -radius) * 0.75, radius * random.between(1.1, 1.7)]
      return tomatoFruit(
        sheet,
        {
          seed: `${seed}${index}`, at: [x + dx, y + dy], radius: radius * random.between(0.85, 1.1), ripe,
          calyxAngle: -Math.PI / 2 - dx * 0.012,
        },
      )
    }),
    Array.from({ length: flowers }, (_, index) => {
      const [x, y] = spot(fruits.length + index)
      return starFlower(
        sheet,
        {
          seed: `${seed}f${index}`, at: [x + random.around(0, 9), y + random.around(8, 12)], size: radius * random.between(0.75, 1),
          petal: [0.88, 0.17, 98], heart: [0.78, 0.16, 85], turn: random.next() * 2, squash: random.between(0.6, 0.95), cone: true,
        },
      )
    }),
  )
}

/** Aubergine and pepper: simple leaves on long stalks, a stem that forks above. */
export function bushPlant(sheet, { kind, seed, foot, height, leaves, flowers = [], fruits = [], droop = 0.25, yellow = 0, size = 0.4 }) {
  const random = makeRandom(seed, kind)
  const trunk = mainStem(random, foot, height * 0.6, -8)
  const fork = [
    -1, 1,
  ].map(side => curve(
    trunk.at(-1), [trunk.at(-1)[0] + side * height * 0.05, trunk.at(-1)[1] - height * 0.08],
    [foot[0] + side * height * 0.14, foot[1] - height * 0.78], [foot[0] + side * height * 0.17, foot[1] - height * 0.94], 10,
  ))
  const drawn = Array.from({ length: leaves }, (_, index) => {
    const share = 0.16 + 0.84 * (index + 0.5) / leaves
    const side = index % 2 ? 1 : -1
    const base = share > 0.6 ? along(fork[index % 2], (share - 0.6) * 2.4) : along(trunk, share / 0.6)
    const out = mid(degrees(8), degrees(62), share ** 1.3) + random.around(0, 0.28)
    const inward = random.chance(0.3) ? -0.35 : 1
    const angle = -Math.PI / 2 + side * (Math.PI / 2 - out) * inward
    const length = height * size * mid(1.1, 0.68, share) * random.between(0.85, 1.12)
    const stalk = curve(
      base, away(base, angle, length * 0.12), away(base, angle + side * droop * 0.2, length * 0.24),
      away(base, angle + side * droop * 0.35, length * 0.32), 6,
    )
    const blade = smallLeaf({
      kind, seed: `${seed}${index}`, from: stalk.at(-1), angle: angle + side * droop * 0.7, length, droop: droop * random.between(0.7, 1.3),
      tilt: random.around(side * 0.15, 0.5), colour: LEAF[kind], veinColour: kind === 'aubergine' ? [0.55, 0.055, 345] : undefined,
      gloss: kind === 'pepper' ? 0.9 : 0.25, yellow: share < 0.45 ? yellow : yellow * 0.3,
    })
    return {
      order: random.next() + (share > 0.75 ? 0.35 : 0),
      art: group(
        {},
        stem(
          stalk, Math.max(2.4, length * 0.045), Math.max(1.6, length * 0.03),
          kind === 'aubergine' ? lighter(STEM.aubergine, 0.06) : STEM[kind],
        ),
        blade,
      ),
    }
  }).sort((a, b) => a.order - b.order).map(item => item.art)
  const cut = Math.ceil(drawn.length * 0.5)
  return group({}, drawn.slice(0, cut), stem(
    trunk, Math.max(4, height * 0.032), Math.max(3, height * 0.02), STEM[kind],
  ), fork.map(line => stem(line, Math.max(3, height * 0.018), 2, STEM[kind])), drawn.slice(cut), fork.map((line, index) => shootTip(
    kind, `${seed}tip${index}`, line.at(-1), height * size * 0.5,
  )),
  fruits.map(fruit => longFruit(
    sheet,
    {
      ...fruit, at: [foot[0] + fruit.x * height, foot[1] - fruit.y * height], length: fruit.length * height, width: fruit.width * height,
    },
  )),
  flowers.map((flower, index) => starFlower(
    sheet,
    { seed: `${seed}f${index}`, ...flower, at: [foot[0] + flower.x * height, foot[1] - flower.y * height], size: flower.size * height },
  )))
}

function shootTip(kind, seed, tip, length) {
  return [
    -0.8, 0.75, -0.1, 0.3,
  ].map((turn, index) => smallLeaf({
    kind, seed: `${seed}${index}`, from: tip, angle: -Math.PI / 2 + turn, length: length * [1, 0.9, 0.75, 0.5][index], droop: 0.12,
    tilt: turn * 0.5, colour: lighter(LEAF[kind], 0.05), veinColour: kind === 'aubergine' ? [0.58, 0.06, 345] : undefined, gloss: 0.3,
  }))
}
