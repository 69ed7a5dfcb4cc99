import { makeRandom } from './random.mjs'

/**
 * The net of small veins in a close-up. Auxin sources are strewn over the blade; the nearest vein grows
 * towards each until it gets there (after Runions and others 2005, "Modeling and visualization of leaf venation patterns").
 */
export function growVeinlets({ inside, bounds, roots, seed, spread, step, most }) {
  const random = makeRandom(seed, 'veinlets')
  const nodes = roots.map(point => ({ point, parent: null, weight: 1 }))
  const cells = new Map()
  const cellOf = ([x, y]) => `${Math.floor(x / REACH)},${Math.floor(y / REACH)}`
  const add = (node) => {
    const key = cellOf(node.point)
    cells.set(key, [...(cells.get(key) ?? []), node])
  }
  nodes.forEach(add)
  let sources = strew(random, inside, bounds, spread)
  for (let round = 0; round < 60 && sources.length > 0 && nodes.length < most + roots.length; round += 1) {
    const pulls = new Map()
    sources = sources.filter((source) => {
      const nearest = nearestNode(cells, source)
      if (!nearest) return true
      if (nearest.gap < step * 1.35) return false
      const pull = pulls.get(nearest.node) ?? { sum: [0, 0], closest: null, gap: Infinity }
      const [x, y] = [(source[0] - nearest.node.point[0]) / nearest.gap, (source[1] - nearest.node.point[1]) / nearest.gap]
      pull.sum = [pull.sum[0] + x, pull.sum[1] + y]
      if (nearest.gap < pull.gap) Object.assign(pull, { closest: [x, y], gap: nearest.gap })
      pulls.set(nearest.node, pull)
      return true
    })
    for (const [parent, { sum, closest }] of pulls) {
      // Sources on both sides cancel out: then the closest one wins, or the vein would stand still for ever.
      const free = [sum, closest].map(pull => stepFrom(parent.point, pull, step)).find(point => !(nearestNode(cells, point)?.gap < step * 0.5))
      if (!free) continue
      const node = { point: free, parent, weight: 1 }
      parent.grown = true
      nodes.push(node)
      add(node)
    }
  }
  const grown = nodes.filter(node => node.parent)
  return [...grown, ...closeLoops(grown, cells)]
}

function stepFrom([x, y], [dx, dy], step) {
  const length = Math.hypot(dx, dy) || 1
  return [x + dx / length * step, y + dy / length * step]
}

/** Blind ends reach for a neighbour, which closes the meshes of the net. */
function closeLoops(grown, cells) {
  return grown.filter(node => !node.grown).flatMap((node) => {
    const family = new Set()
    for (let one = node; one && family.size < 7; one = one.parent) family.add(one)
    const found = nearestNode(cells, node.point, other => !family.has(other))
    return found && found.gap < 17 ? [{ point: node.point, parent: found.node, weight: 0, loop: true }] : []
  })
}

const REACH = 44

function nearestNode(cells, [x, y], accept = () => true) {
  let best = null
  const [column, row] = [Math.floor(x / REACH), Math.floor(y / REACH)]
  for (let dx = -1; dx <= 1; dx += 1) {
    for (let dy = -1; dy <= 1; dy += 1) {
      for (const node of cells.get(`${column + dx},${row + dy}`) ?? []) {
        const gap = Math.hypot(node.point[0] - x, node.point[1] - y)
        if (gap < REACH && (!best || gap < best.gap) && accept(node)) best = { node, gap }
      }
    }
  }
  return best
}

/** Cross veins from one side vein to the next, like the rungs of a crooked ladder. */
export function rungs(seed, veins, along) {
  const random = makeRandom(seed, 'rungs')
  return veins.slice(1).flatMap((vein, index) => Array.from({ length: 10 }, (_, step) => {
    const last = step === 9
    const share = last ? 1 : (step + random.between(0.3, 0.9)) / 9.5
    const [from, to] = [along(veins[index], share), along(vein, share * (last ? 0.8 : random.between(0.82, 0.98)))]
    const [sag, lean] = [last ? random.between(0.02, 0.1) : random.around(0, 0.1), random.between(0.35, 0.65)]
    return Array.from({ length: 7 }, (__, piece) => {
      const t = piece / 6
      const bow = Math.sin(t * Math.PI) * sag + (t > lean ? 0.04 : -0.02) * Math.sin(t * Math.PI)
      return [from[0] + (to[0] - from[0]) * t - (to[1] - from[1]) * bow, from[1] + (to[1] - from[1]) * t + (to[0] - from[0]) * bow]
    })
  }))
}

function strew(random, inside, [left, top, right, bottom], spread) {
  const sources = []
  for (let x = left; x < right; x += spread) {
    for (let y = top; y < bottom; y += spread) {
      const point = [x + random.between(0, spread), y + random.between(0, spread)]
      if (inside(point)) sources.push(point)
    }
  }
  return sources
}
