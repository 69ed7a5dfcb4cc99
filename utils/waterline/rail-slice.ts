import type { LevelLine, Piece } from './level-line'
import { levelOn } from './level-line'
import { curveAt } from './monotone'
import type { Point } from './paths'
import { areaPath, linePath } from './paths'
import { rootLengthShare, rootStrand } from './roots'

/** One slice: the vessel on its side, floor at the left, time running down from `toDay` to `fromDay`. */
export type SliceFrame = {
  fromDay: number
  toDay: number
  widthPx: number
  heightPx: number
  /** Level at the right edge. */
  topCm: number
  /** Level at which the net cup ends; null when nobody measured it. */
  cupFloorCm: number | null
}

export type RailSlice = {
  water: string[]
  deep: string[]
  guess: string[]
  surface: string[]
  jumps: string[]
  dots: Point[]
  rootsInAir: string[]
  rootsInWater: string[]
  cupX: number
}

/** Distance of two points of a sampled curve, px. */
const SAMPLE_PX = 5
/** Distance of two drawn roots, px. */
const STRAND_PX = 58
/** The deeper water is drawn darker, as on a chart of depths. */
const DEEP_SHARE = 0.58
/** Areas overlap by this, so that no hairline of ground shows between them, px. */
const SEAM_PX = 1

export function railSlice(line: LevelLine, frame: SliceFrame): RailSlice {
  const pieces = line.pieces
    .filter(piece => piece.toDay > frame.fromDay && piece.fromDay < frame.toDay)
    .map(piece => ({ kind: piece.kind, points: surfacePoints(piece, frame) }))
  const between = pieces.filter(piece => piece.kind === 'between')
  const cupX = xAt(frame, frame.cupFloorCm ?? frame.topCm)
  return {
    water: between.map(piece => areaPath(band(piece.points))),
    deep: between.map(piece => areaPath(toFloor(deepEdge(piece.points)))),
    guess: pieces.filter(piece => piece.kind === 'guess').map(piece => areaPath(toFloor(piece.points))),
    surface: between.map(piece => linePath(piece.points)),
    jumps: line.jumps.filter(jump => inFrame(jump.day, frame)).map(jump => linePath([
      { x: xAt(frame, jump.fromCm), y: yAt(frame, jump.day) },
      { x: xAt(frame, jump.toCm), y: yAt(frame, jump.day) },
    ])),
    dots: line.readings.filter(reading => inFrame(reading.day, frame))
      .map(reading => ({ x: xAt(frame, reading.levelCm), y: yAt(frame, reading.day) })),
    ...strands(line, frame, cupX),
    cupX,
  }
}

export function xAt(frame: SliceFrame, cm: number): number {
  return Math.min(frame.widthPx, Math.max(0, cm / frame.topCm * frame.widthPx))
}

export function yAt(frame: SliceFrame, day: number): number {
  return (frame.toDay - day) / (frame.toDay - frame.fromDay) * frame.heightPx
}

function inFrame(day: number, frame: SliceFrame): boolean {
  return day >= frame.fromDay && day < frame.toDay
}

function surfacePoints(piece: Piece, frame: SliceFrame): Point[] {
  const from = Math.max(piece.fromDay, frame.fromDay)
  const to = Math.min(piece.toDay, frame.toDay)
  const count = Math.max(1, Math.ceil((yAt(frame, from) - yAt(frame, to)) / SAMPLE_PX))
  return Array.from({ length: count + 1 }, (_, index) => {
    const day = to - (to - from) * index / count
    return { x: xAt(frame, curveAt(piece.curve, day)), y: yAt(frame, day) }
  })
}

function deepEdge(points: readonly Point[]): Point[] {
  return points.map(point => ({ ...point, x: point.x * DEEP_SHARE }))
}

/** The lighter water only: were it drawn under the deep water too, a hairline of it would show at each seam. */
function band(points: readonly Point[]): Point[] {
  const last = points.at(-1)
  if (!last) return []
  const surface = [...points, { x: last.x, y: last.y + SEAM_PX }]
  const inner = deepEdge(surface).map(point => ({ ...point, x: Math.max(0, point.x - SEAM_PX) }))
  return [...surface, ...inner.reverse()]
}

function toFloor(points: readonly Point[]): Point[] {
  const first = points[0]
  const last = points.at(-1)
  if (!first || !last) return []
  const end = { x: last.x, y: last.y + SEAM_PX }
  return [{ x: 0, y: first.y }, ...points, end, { x: 0, y: end.y }]
}

function strands(line: LevelLine, frame: SliceFrame, cupX: number): Pick<RailSlice, 'rootsInAir' | 'rootsInWater'> {
  const inAir: string[] = []
  const inWater: string[] = []
  const count = Math.floor(frame.heightPx / STRAND_PX)
  for (let index = 0; index < count; index++) {
    const y = (index + 0.5) * frame.heightPx / count
    const day = frame.toDay - (frame.toDay - frame.fromDay) * y / frame.heightPx
    const level = levelOn(line, day)
    if (level === null || day < 0) continue
    const surfaceX = xAt(frame, level)
    const reach = Math.max(cupX * rootLengthShare(day), cupX - surfaceX + 4)
    const strand = rootStrand({ startX: cupX, y, reach, seed: Math.round(frame.fromDay * 7) + index })
    inAir.push(linePath(strand.filter(point => point.x >= surfaceX)))
    inWater.push(linePath(strand.filter(point => point.x <= surfaceX + 2)))
  }
  return { rootsInAir: inAir.filter(Boolean), rootsInWater: inWater.filter(Boolean) }
}
