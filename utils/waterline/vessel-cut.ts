import type { Point } from './paths'

/** Inside measures of a vessel as they are drawn; a vessel nobody measured is drawn as a common bucket. */
export type CutMeasures = {
  topCm: number
  bottomCm: number
  heightCm: number
  cupRimCm: number
  cupDepthCm: number
}

/** Drawn for a vessel without measures: the proportions of a 12 L bucket. Only a picture, never used in a sum. */
export const PICTURE_BUCKET: CutMeasures = { topCm: 27, bottomCm: 22, heightCm: 26, cupRimCm: 8, cupDepthCm: 6.5 }

/** The drawing's own units: the vessel stands in here, with room above for the plant. */
export const CUT_VIEW = { width: 220, height: 256, top: 86, bottom: 250, widest: 180 }

export type CutGeometry = {
  scale: number
  topY: number
  floorY: number
  cupFloorY: number
  /** The inside as a closed shape, the cup, and the water. */
  inside: Point[]
  cup: Point[]
  yOf: (cm: number) => number
  /** Left and right wall at a height of the drawing. */
  wallsAt: (y: number) => [number, number]
}

/** Places a vessel in the drawing: as large as fits, standing on the floor, in its own proportions. */
export function cutGeometry(measures: CutMeasures): CutGeometry {
  const widestCm = Math.max(measures.topCm, measures.bottomCm)
  const room = CUT_VIEW.bottom - CUT_VIEW.top
  // A flat tote is drawn a little taller, a bottle a little wider, or nothing could be read in it.
  const widthScale = Math.min(CUT_VIEW.widest / widestCm, room * 1.6 / measures.heightCm)
  const scale = Math.min(room / measures.heightCm, widthScale * 1.6)
  const floorY = CUT_VIEW.bottom
  const topY = floorY - measures.heightCm * scale
  const centre = CUT_VIEW.width / 2
  const wallsAt = (y: number): [number, number] => {
    const share = (floorY - y) / (floorY - topY)
    const half = (measures.bottomCm + (measures.topCm - measures.bottomCm) * share) * widthScale / 2
    return [centre - half, centre + half]
  }
  const [topLeft, topRight] = wallsAt(topY)
  const [floorLeft, floorRight] = wallsAt(floorY)
  const cupFloorY = topY + measures.cupDepthCm * scale
  const rim = Math.min(measures.cupRimCm * widthScale, (topRight - topLeft) * 0.6) / 2
  return {
    scale,
    topY,
    floorY,
    cupFloorY,
    inside: [{ x: topLeft, y: topY }, { x: topRight, y: topY }, { x: floorRight, y: floorY }, { x: floorLeft, y: floorY }],
    cup: [{ x: centre - rim, y: topY }, { x: centre + rim, y: topY }, { x: centre + rim * 0.74, y: cupFloorY }, { x: centre - rim * 0.74, y: cupFloorY }],
    yOf: cm => floorY - Math.min(measures.heightCm, Math.max(0, cm)) * scale,
    wallsAt,
  }
}

/** The part of the inside between two heights of the drawing. */
export function layer(geometry: CutGeometry, upperY: number, lowerY: number): Point[] {
  const [upperLeft, upperRight] = geometry.wallsAt(upperY)
  const [lowerLeft, lowerRight] = geometry.wallsAt(lowerY)
  return [{ x: upperLeft, y: upperY }, { x: upperRight, y: upperY }, { x: lowerRight, y: lowerY }, { x: lowerLeft, y: lowerY }]
}

/** Rounds after which labels that pushed each other have come to rest. */
const SPREAD_ROUNDS = 40

/** Moves labels apart so that none covers the next: both of a pair give way by half, so all stay near their places. */
export function spreadApart(places: readonly number[], distance: number): number[] {
  const order = places.map((place, index) => ({ place, index })).sort((a, b) => a.place - b.place || a.index - b.index)
  for (let round = 0; round < SPREAD_ROUNDS; round++) {
    order.forEach((lower, index) => {
      const upper = order[index - 1]
      const missing = upper ? distance - (lower.place - upper.place) : 0
      if (!upper || missing <= 0) return
      upper.place -= missing / 2
      lower.place += missing / 2
    })
  }
  const result = [...places]
  for (const { place, index } of order) result[index] = place
  return result
}
