import { makeRandom } from './random.mjs'
import { clamp } from './geometry.mjs'

/**
 * Grows a root system in centimetres: x from the middle of the net cup, y down from its bottom.
 * Every root has a randomness of its own, so the same seed on a later day gives the same roots, only longer.
 */

const STEP = 0.45
/** Side roots are drawn in finer steps, because they curl more. */
const SIDE_STEP = 0.24

/** The step side roots hand on to their own side roots. */
export { SIDE_STEP }

/** Main roots leave the cup one after another and grow by the day; the floor turns them aside. */
export function growRoots({ seed, day, count, cupRadius, floor, halfWidthAt, cmPerDay = 1.15, lastBirth = 20 }) {
  return Array.from({ length: count }, (_, index) => {
    const random = makeRandom(seed, 'root', index)
    const age = day + 4 - lastBirth * (index / count) ** 1.6
    const side = (index % 2 ? 1 : -1) * random.between(0.03, 1)
    const length = cmPerDay * random.between(0.75, 1.25) * age * 30 / (30 + Math.max(0, age) * 0.25)
    const fromSlot = random.chance(0.16)
    const start = fromSlot
      ? [Math.sign(side) * cupRadius * 1.03, -random.between(0.6, 2.4)]
      : [side * cupRadius * 0.92, -random.between(0.5, 0.9)]
    const depth = random.next()
    const ownFloor = floor + (depth - 0.6) * 1.3
    return { ...primary({ random, start, length, floor: ownFloor, halfWidthAt, lean: side }), depth, seed: `${seed}${index}`, width: random.between(0.1, 0.17) }
  }).filter(root => root.length > 0.6)
}

function primary({ random, start, length, floor, halfWidthAt, lean }) {
  const points = [start]
  const steps = Math.floor(length / STEP)
  let angle = Math.PI / 2 - lean * random.between(0.1, 0.6)
  let drift = 0
  const coil = random.sign()
  for (let step = 0; step < steps; step += 1) {
    drift = drift * 0.84 + random.around(0, 0.1)
    angle += drift + (Math.PI / 2 - angle) * 0.13
    const [x, y] = points.at(-1)
    if (y > floor - 1.2) angle += ((coil > 0 ? -0.25 : Math.PI + 0.25) - angle) * 0.42
    const limit = halfWidthAt(y) - 0.3
    points.push([clamp(x + Math.cos(angle) * STEP, -limit, limit), Math.min(y + Math.sin(angle) * STEP, floor - 0.1 - 0.5 * random.next())])
  }
  return { points, length }
}

/** Side roots of one root. The youngest end stays bare, as in life. */
export function branch(root, { spacing, longest, bareTip = 3, level = 1, pull = 0.09, step = STEP, floor }) {
  const random = makeRandom(root.seed, 'side', level)
  const sides = []
  let next = random.between(0.3, spacing * 2)
  for (let index = 1; index < root.points.length; index += 1) {
    const position = index * step
    while (next < position) {
      const age = root.length - next - bareTip
      const share = random.between(0.3, 1) * (random.chance(0.12) ? 1.7 : 1)
      const length = Math.min(longest, age * 0.55) * share
      const side = sideRoot(random, root, index, length, pull, floor)
      if (length > SIDE_STEP) sides.push({ ...side, seed: `${root.seed}.${sides.length}`, depth: root.depth, width: root.width * random.between(0.32, 0.5) })
      next += spacing * random.between(0.4, 1.6)
    }
  }
  return sides
}

function sideRoot(random, root, index, length, pull, floor) {
  const from = root.points[index]
  const before = root.points[index - 1]
  let angle = Math.atan2(from[1] - before[1], from[0] - before[0]) + random.sign() * random.between(0.55, 1.25)
  const points = [from]
  let drift = 0
  for (let step = 0; step * SIDE_STEP < length; step += 1) {
    drift = drift * 0.8 + random.around(0, 0.13)
    angle += drift + (Math.PI / 2 - angle) * pull
    const [x, y] = points.at(-1)
    points.push([x + Math.cos(angle) * SIDE_STEP, Math.min(floor - 0.1, y + Math.sin(angle) * SIDE_STEP)])
  }
  return { points, length }
}

/** The fuzz of roots that breathe air: short hairs square to the root, as pairs of points. */
export function hairs(root, { every = 0.07, longest = 0.34, until }) {
  const random = makeRandom(root.seed, 'hairs')
  const strokes = []
  for (let index = 1; index < root.points.length; index += 1) {
    const [from, to] = [root.points[index - 1], root.points[index]]
    const angle = Math.atan2(to[1] - from[1], to[0] - from[0])
    const step = Math.hypot(to[0] - from[0], to[1] - from[1])
    for (let share = 0; share < 1; share += every / Math.max(step, every)) {
      const base = [from[0] + (to[0] - from[0]) * share, from[1] + (to[1] - from[1]) * share]
      const turn = angle + random.sign() * random.between(1.1, 1.9)
      const reach = longest * random.between(0.35, 1)
      if (base[1] < until) strokes.push([base, [base[0] + Math.cos(turn) * reach, base[1] + Math.sin(turn) * reach]])
    }
  }
  return strokes
}
