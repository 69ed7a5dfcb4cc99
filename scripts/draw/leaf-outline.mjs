import { makeRandom } from './random.mjs'

/**
 * Leaf shapes as half outlines: for a share of the way from stalk to tip (0..1), how far the edge
 * lies from the midrib, as a share of the length. The two halves differ a little, as in life.
 */
const bulge = (share, fullest, base, tip) => (share < fullest
  ? Math.sin(share / fullest * Math.PI / 2) ** base
  : Math.sin((1 - share) / (1 - fullest) * Math.PI / 2) ** tip)

/** Lobes that point to the tip, 0 in the notches and 1 on the points. */
function lobes(share, count) {
  const place = (share * count) % 1
  return place < 0.72 ? (place / 0.72) ** 0.7 : (1 - place) / 0.28
}

export const LEAF_SHAPES = {
  basil: { width: 0.31, veins: 7, arch: 0.3, edge: share => bulge(share, 0.4, 0.7, 1.25), teeth: 0.006, toothCount: 24 },
  pepper: { width: 0.25, veins: 7, arch: 0.35, edge: share => bulge(share, 0.38, 0.95, 1.45), teeth: 0, toothCount: 10 },
  aubergine: { width: 0.36, veins: 6, arch: 0.2, edge: share => bulge(share, 0.36, 0.6, 1.1) * (0.93 + 0.12 * Math.cos(share * 19)), teeth: 0, toothCount: 8 },
  tomato: {
    width: 0.31, veins: 7, arch: 0.3, edge: share => bulge(share, 0.3, 0.75, 1.2) * (0.76 + 0.28 * lobes(share + 0.06, 4.6)), teeth: 0.014,
    toothCount: 16,
  },
}

/** Both edges from stalk to tip as [u, v]: u along the midrib, v across it (negative is left). */
export function outline(kind, seed, steps = 46) {
  const shape = LEAF_SHAPES[kind]
  return [-1, 1].map((side) => {
    const random = makeRandom(seed, 'edge', side)
    const [phase, slow] = [random.between(0, 6), random.between(0.9, 1.1)]
    return Array.from({ length: steps + 1 }, (_, index) => {
      const share = index / steps
      const tooth = (share * shape.toothCount + phase) % 1
      const jag = shape.teeth * (tooth < 0.75 ? tooth : (1 - tooth) * 3) * Math.sin(share * Math.PI)
      const wave = 1 + 0.045 * Math.sin(share * 9 * slow + phase)
      return [share, side * (shape.width * shape.edge(share) * wave + jag * 1.5)]
    })
  })
}

/** Side veins of one half: each a list of [u, v] that bows towards the tip and ends short of the edge. */
export function sideVeins(kind, seed, side, edge) {
  const shape = LEAF_SHAPES[kind]
  const random = makeRandom(seed, 'veins', side)
  return Array.from({ length: shape.veins }, (_, index) => {
    const start = 0.02 + (index + random.between(-0.16, 0.16) + 0.1) / shape.veins * 0.84
    const end = Math.min(0.985, start + (1 - start) * random.between(0.3, 0.42))
    const reach = Math.abs(edge[Math.round(end * (edge.length - 1))][1]) * 0.93
    return Array.from({ length: 13 }, (__, step) => {
      const t = step / 12
      return [start + (end - start) * t ** (1 + shape.arch), side * reach * t ** (1 - shape.arch * 0.4)]
    })
  })
}
