import { fill, group, stroke } from './sheet.mjs'
import { blend, lighter, vary } from './colour.mjs'
import { along, away, curve, headingAt, mid, ribbon, smooth } from './geometry.mjs'
import { makeRandom } from './random.mjs'
import { LEAF_SHAPES, outline } from './leaf-outline.mjs'

/**
 * A leaf of a whole plant. `angle` is the way it leaves the stem, `droop` how far its tip sinks,
 * `tilt` (-1..1) how far the blade turns its left or right side to us; the light comes from the upper left.
 */
export function smallLeaf({
  kind, seed, from, angle, length, droop = 0.3, tilt = 0.2, colour, veinColour, yellow = 0, yellowColour = [0.83, 0.15, 106], gloss = 0.4,
  width = 1,
}) {
  const random = makeRandom(seed, 'small')
  // A leaf that hangs far down covers less ground: its length stays its length.
  const reach = length * (1 - Math.max(0, droop - 0.5) * 0.5)
  const tip = away(from, angle, reach)
  const sag = length * droop
  const line = curve(from, away(from, angle, reach * 0.36), [mid(from[0], tip[0], 0.72), mid(from[1], tip[1], 0.72) + sag * 0.12], [tip[0], tip[1] + sag], 18)
  const edges = outline(kind, seed, 26)
  const sides = [-1, 1].map((side, index) => {
    const narrow = width * (1 - Math.max(0, tilt * side) * 0.75)
    return edges[index].map(([u, v]) => edgePoint(line, u, v * length * narrow))
  })
  const tone = vary(random, blend(colour, yellowColour, yellow * random.between(0.5, 1)), 1)
  const up = -Math.sin(angle)
  return group({}, [0, 1].map((index) => {
    const facing = lightOn(angle, index === 0 ? -1 : 1)
    return half(sides[index], line, lighter(tone, facing * 0.075 + up * 0.02), gloss, facing)
  }), veins({ kind, line, length, width, tilt, edges, tone, veinColour }))
}

/** The side of a leaf that looks to the upper left is the bright one. */
function lightOn(angle, side) {
  const across = angle + side * Math.PI / 2
  return (-Math.cos(across) - Math.sin(across)) / Math.SQRT2
}

function edgePoint(line, u, v) {
  const index = Math.round(u * (line.length - 1))
  return away(along(line, u), headingAt(line, index) + Math.PI / 2, v)
}

function half(edge, line, tone, gloss, facing) {
  const shape = `${smooth(edge)}L${line.slice().reverse().map(([x, y]) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`
  const inner = edge.map((point, index) => {
    const centre = along(line, index / (edge.length - 1))
    return [mid(centre[0], point[0], 0.62), mid(centre[1], point[1], 0.62)]
  })
  const sheen = `${smooth(inner)}L${line.slice().reverse().map(([x, y]) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`
  return group({},
    fill(shape, tone),
    fill(sheen, lighter(tone, facing > 0 ? 0.05 : -0.035), { opacity: 0.7 }),
    facing > 0.1 ? fill(
      smooth(inner.slice(4, -7).concat(inner.slice(4, -7).reverse().map(([x, y]) => [x + 3, y + 5])), true), [1, 0.02, 110, 0.32 * gloss],
    ) : '',
    stroke(smooth(edge), lighter(tone, facing > 0 ? 0.1 : -0.09), 1.3, { opacity: 0.8 }),
  )
}

function veins({ kind, line, length, width, tilt, edges, tone, veinColour }) {
  const colour = veinColour ?? lighter(tone, 0.13)
  const count = length > 60 ? LEAF_SHAPES[kind].veins : 4
  const ribs = [-1, 1].flatMap((side, which) => {
    const narrow = width * (1 - Math.max(0, tilt * side) * 0.75)
    return Array.from({ length: count }, (_, index) => {
      const start = 0.06 + index / count * 0.78
      const end = Math.min(0.97, start + (1 - start) * 0.34)
      const reach = edges[which][Math.round(end * 26)][1] * 0.86 * length * narrow
      return smooth([along(line, start), edgePoint(line, mid(start, end, 0.45), reach * 0.55), edgePoint(line, end, reach)])
    })
  })
  return group({},
    stroke(ribs.join(''), lighter(tone, -0.12), Math.max(0.8, length * 0.012), { opacity: 0.35, transform: 'translate(1 1.4)' }),
    stroke(ribs.join(''), colour, Math.max(0.7, length * 0.009), { opacity: 0.6 }),
    fill(ribbon(line, share => Math.max(0.8, length * 0.024 * (1 - share * 0.8))), colour, { opacity: 0.9 }),
  )
}

/** A stem or leaf stalk with a lit and a shaded side. */
export function stem(points, from, to, colour) {
  const thickness = share => mid(from, to, share)
  return group({},
    fill(ribbon(points, thickness), lighter(colour, -0.1)),
    fill(ribbon(points.map(([x, y]) => [x - from * 0.14, y]), share => thickness(share) * 0.66), colour),
    fill(ribbon(points.map(([x, y]) => [x - from * 0.26, y]), share => thickness(share) * 0.2), lighter(colour, 0.12), { opacity: 0.8 }),
  )
}
