import type { Point } from './paths'
import { steadyNoise } from './paths'

/**
 * How far down the drawn roots reach, as a share of the way from the net cup
 * to the floor. A drawing that grows with the days, not a measurement.
 */
export function rootLengthShare(day: number): number {
  return 0.1 + 0.82 * (1 - Math.exp(-Math.max(0, day) / 16))
}

const STRAND_POINTS = 14

/** One root of the rail, lying on its side: from the net cup leftwards. */
export function rootStrand({ startX, y, reach, seed }: { startX: number, y: number, reach: number, seed: number }): Point[] {
  const phase = steadyNoise(seed) * Math.PI * 2
  const sway = 3 + steadyNoise(seed + 0.5) * 4
  return Array.from({ length: STRAND_POINTS + 1 }, (_, index) => {
    const t = index / STRAND_POINTS
    const wave = Math.sin(phase + t * 4.2) + 0.45 * Math.sin(phase * 2 + t * 9)
    return { x: Math.max(2, startX - reach * t), y: y + wave * sway * (0.25 + 0.75 * t) }
  })
}

export type DrawnRoot = { points: Point[], width: number }
export type RootBed = {
  /** Middle and half width of the net cup's floor, and its height in the drawing. */
  centreX: number
  halfWidth: number
  topY: number
  /** Deepest a root may reach, and the widest the mass may spread to either side. */
  floorY: number
  spread: number
  /** Roots reach at least here: into the water. */
  atLeastY: number
  day: number
}

/** The upright root mass: main roots with side roots, more and longer with the days. */
export function rootMass(bed: RootBed): DrawnRoot[] {
  const count = Math.min(9, 4 + Math.floor(bed.day / 6))
  return Array.from({ length: count }, (_, index) => mainRoot(bed, index, count)).flatMap(root =>
    [root, ...sideRoots(root, bed)])
}

function mainRoot(bed: RootBed, index: number, count: number): DrawnRoot {
  const place = count === 1 ? 0 : index / (count - 1) * 2 - 1
  const own = steadyNoise(index * 3.7 + 1)
  const full = bed.floorY - bed.topY
  const wanted = full * rootLengthShare(bed.day) * (0.72 + 0.28 * own)
  const length = Math.min(full, Math.max(wanted, bed.atLeastY - bed.topY + 6 + 10 * own))
  const phase = own * Math.PI * 2
  const points = Array.from({ length: 13 }, (_, step) => {
    const t = step / 12
    const drift = place * (bed.halfWidth + (bed.spread - bed.halfWidth) * t * rootLengthShare(bed.day))
    return { x: bed.centreX + drift + Math.sin(phase + t * 6) * 3.2 * t, y: bed.topY + length * t }
  })
  return { points, width: 2.1 - own * 0.5 }
}

function sideRoots(root: DrawnRoot, bed: RootBed): DrawnRoot[] {
  const count = Math.min(3, Math.floor(bed.day / 5))
  return Array.from({ length: count }, (_, index) => {
    // Side roots start low on the root: the upper part only grows fuzz.
    const start = root.points[6 + index * 2]
    if (!start) return { points: [], width: 0 }
    const own = steadyNoise(start.x + index * 5.3)
    const side = own > 0.5 ? 1 : -1
    const length = 7 + own * Math.min(16, bed.day * 0.8)
    const points = Array.from({ length: 5 }, (_, step) => {
      const t = step / 4
      return { x: start.x + side * length * t * 0.8, y: Math.min(bed.floorY, start.y + length * t * (0.35 + 0.6 * t)) }
    })
    return { points, width: 1 }
  }).filter(one => one.points.length > 0)
}

/** The short fuzz of roots that have learnt to breathe: only above the water. */
export function airRootFuzz(roots: readonly DrawnRoot[], surfaceY: number): [Point, Point][] {
  return roots.filter(root => root.width > 1).flatMap((root, index) => root.points
    .filter((point, step) => step > 1 && (step + index) % 2 === 0 && point.y < surfaceY - 5)
    .flatMap((point, step): [Point, Point][] => {
      const tilt = steadyNoise(index * 11 + step) - 0.5
      return [
        [point, { x: point.x - 3.4, y: point.y + 1.5 + tilt * 3 }],
        [point, { x: point.x + 3.4, y: point.y + 1.5 - tilt * 3 }],
      ]
    }))
}
