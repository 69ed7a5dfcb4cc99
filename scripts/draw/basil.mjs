import { group } from './sheet.mjs'
import { along, away, curve, degrees, mid } from './geometry.mjs'
import { makeRandom } from './random.mjs'
import { smallLeaf, stem } from './small-leaf.mjs'

const BASIL_STEM = [0.58, 0.1, 128]

/** Basil: pairs of cupped leaves, each pair crosswise over the last, side shoots in their axils. */
export function basilPlant(sheet, { stems = 3, seed, foot, height, ...rest }) {
  const places = [[-0.17, 0.8, 0], [0.18, 0.86, 1], [0.01, 1, 2]].slice(3 - stems)
  return group({}, places.map(([lean, tall, index]) => basilStem({
    seed: `${seed}${index}`, foot: [foot[0] + lean * height * 0.22, foot[1] - (index < 2 ? 4 : 0)], lean: lean * height * 1.2, height: height * tall, ...rest,
  })))
}

function basilStem({ seed, foot, lean, height, pairs, shoots = true, yellowTop = 0, cut = false, leafSize = 0.36 }) {
  const random = makeRandom(seed, 'basil')
  const trunk = curve(
    foot, [foot[0] + lean * 0.3 + random.around(0, 10), foot[1] - height * 0.4],
    [foot[0] + lean * 0.75 + random.around(0, 14), foot[1] - height * 0.7], [foot[0] + lean, foot[1] - height], 20,
  )
  const back = []
  const front = []
  for (let pair = 0; pair < pairs; pair += 1) {
    const share = 0.12 + 0.88 * (pair + 0.5) / pairs
    const node = along(trunk, share)
    const sideways = pair % 2 === 0
    const size = height * leafSize * mid(1.05, 0.72, share) * random.between(0.92, 1.1)
    const yellow = yellowTop * Math.max(0, (share - 0.45) / 0.55)
    for (const side of [-1, 1]) {
      const angle = sideways ? -Math.PI / 2 + side * degrees(mid(
        88, 52, share,
      )) : -Math.PI / 2 + side * degrees(mid(38, 18, share)) + (side < 0 ? 0 : Math.PI * 0.86 + random.around(0, 0.4))
      const art = smallLeaf({
        kind: 'basil', seed: `${seed}${pair}${side}`, from: away(node, angle, size * 0.12), angle, length: size * (sideways ? 1 : 0.84),
        droop: sideways ? 0.28 : 0.16, tilt: sideways ? side * random.between(-0.4, 0.25) : random.around(0, 0.3),
        width: sideways ? 1 : 1.12, colour: [0.58, 0.15, 133], yellow, gloss: 0.9,
      })
      if (sideways || side > 0) front.push(art)
      else back.push(art)
      if (shoots && sideways && share < 0.85) front.push(sideShoot(random, `${seed}s${pair}${side}`, node, side, height, yellow))
    }
  }
  return group(
    {}, back, stem(trunk, Math.max(4, height * 0.03), Math.max(2.5, height * 0.016), BASIL_STEM), front,
    cut ? '' : crown(seed, trunk.at(-1), height * leafSize, yellowTop),
  )
}

function sideShoot(random, seed, node, side, height, yellow) {
  const tip = away(node, -Math.PI / 2 + side * degrees(random.between(34, 52)), height * random.between(0.14, 0.26))
  const line = curve(node, away(node, -Math.PI / 2 + side * 0.9, height * 0.07), [tip[0], tip[1] + height * 0.06], tip, 8)
  const leaves = [
    -1, 1,
  ].map(turn => smallLeaf({
    kind: 'basil', seed: `${seed}${turn}`, from: tip, angle: -Math.PI / 2 + side * 0.4 + turn * 0.95,
    length: height * random.between(0.12, 0.17), droop: 0.2, tilt: turn * 0.2, colour: [0.62, 0.155, 131], yellow, gloss: 0.9,
  }))
  return group({}, stem(line, 3.4, 2.2, BASIL_STEM), leaves, crown(seed, tip, height * 0.11, yellow))
}

function crown(seed, tip, size, yellow) {
  return [
    -0.55, 0.6, 0.02,
  ].map((turn, index) => smallLeaf({
    kind: 'basil', seed: `${seed}c${index}`, from: tip, angle: -Math.PI / 2 + turn, length: size * [0.62, 0.58, 0.44][index], droop: 0.05,
    tilt: turn, colour: [0.68, 0.16, 127], yellow: yellow * 0.9, gloss: 0.8,
  }))
}
