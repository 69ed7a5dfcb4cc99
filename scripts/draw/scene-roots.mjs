import { ellipse, fill, group, makeSheet, stroke } from './sheet.mjs'
import { blur } from './filters.mjs'
import { mid, smooth } from './geometry.mjs'
import { finished } from './finish.mjs'
import { softTerrace } from './backdrop.mjs'
import { droplets, farWall, lid, nearEdges, netCup } from './inside-vessel.mjs'
import { paintRoots, ROOT_COLOURS, rootSystem } from './root-paint.mjs'
import { body, surfaceBehind, WATER_COLOURS, waterBody, waterInFront } from './water.mjs'

/**
 * Roots in their vessel, drawn to scale from the readings: `gap` is the centimetres of air under the cup.
 * The frame depends on the vessel alone, so pictures of one plant line up day after day.
 */
export function rootsScene({
  seed, day, gap, vessel, count, colour = 'white', newColour, newShare = 0, water = 'clear', fuzz = 0, bushy = 1,
  cmPerDay, lastBirth, tone = [0.36, 0.035, 205], light = 'morning', clump = 1, soak = 0,
}) {
  const sheet = makeSheet(1280, 960)
  const middle = 640
  const cupY = 214
  const scale = (902 - cupY) / vessel.cupBottom
  const lip = 24
  const halfAt = cm => mid(vessel.top, vessel.bottom, (cm + vessel.cupDepth) / (vessel.cupBottom + vessel.cupDepth)) / 2
  const wall = {
    middle, lip, topY: 40, topHalf: halfAt(-(cupY - 40) / scale) * scale, floorY: cupY + vessel.cupBottom * scale,
    floorHalf: halfAt(vessel.cupBottom) * scale,
  }
  const surfaceY = cupY + (gap - soak) * scale
  const basin = { ...wall, y: surfaceY, half: halfAt(gap - soak) * scale }
  const tones = WATER_COLOURS[water]
  const system = rootSystem({
    seed, day, count, fuzz, bushy, cmPerDay, lastBirth, water: gap - soak, floor: vessel.cupBottom - 0.2,
    cupRadius: vessel.cupBottomRadius, halfWidthAt: halfAt,
  })
  const straightAhead = ([x, y]) => [middle + x * scale, cupY + y * scale]
  const bentByWater = ([x, y]) => {
    const depth = Math.max(0, y - gap + soak)
    return [middle + 6 + x * scale * 1.045 + Math.sin(y * 2.1 + x) * Math.min(depth, 3) * 0.9, cupY + y * scale]
  }
  const paintWith = (tint, toPx) => ({ scale, colour: ROOT_COLOURS[colour], newColour: ROOT_COLOURS[newColour ?? colour], newShare, tint, clump, toPx })
  const lidY = 40
  const rimHalf = mid(vessel.cupBottomRadius, vessel.cupRim / 2, Math.min(1, (cupY - lidY) / scale / vessel.cupDepth))
  const { cup, foot } = netCup(sheet, { middle, seed, topY: lidY, bottomY: cupY, topHalf: rimHalf * scale, bottomHalf: vessel.cupBottomRadius * scale })
  const inside = sheet.clip(fill(`M${middle - wall.topHalf} 0H${middle + wall.topHalf}L${middle + basin.half} ${surfaceY}H${middle - basin.half}Z`, '#fff'))
  const drowned = sheet.clip(fill(body(basin), '#fff'))
  const farFocus = blur(sheet, 1.5)
  const picture = group({},
    softTerrace(sheet, { seed, light, dim: 0.06 }),
    farWall(sheet, wall, { seed, tone }),
    surfaceBehind(sheet, basin, tones),
    droplets(wall, { seed, fromY: 90, toY: surfaceY - 6, count: 170 }),
    waterBody(sheet, basin, tones),
    mirror(sheet, basin, system, [middle, cupY, scale]),
    group({ 'clip-path': inside }, cup, paintRoots(system, paintWith([0.3, 0.03, 205], straightAhead), farFocus), foot),
    group({ 'clip-path': drowned }, group({ filter: blur(sheet, 0.8) },
      soak > 0 ? group({ transform: `translate(${middle * -0.045 + 5} 0) scale(1.045 1)` }, cup) : '',
      paintRoots(system, paintWith(tones[1], bentByWater), farFocus), soak > 0 ? foot : '')),
    waterInFront(sheet, basin, tones, { seed }),
    nearEdges(sheet, wall, tone),
    lid(sheet, wall, lidY, tone),
  )
  return finished(sheet, picture, { seed: day + 1, warmth: 0.2 })
}

/** Roots that hang over the surface show in it, upside down and flattened. */
function mirror(sheet, basin, system, [middle, cupY, scale]) {
  const pool = sheet.clip(ellipse(middle, basin.y, basin.half, basin.lip, '#fff'))
  const flip = ([x, y]) => [middle + x * scale, basin.y - (basin.y - cupY - y * scale) * -0.16]
  const line = system
    .map(({ main }) => main.points.filter(([, y]) => cupY + y * scale < basin.y + 4).map(flip))
    .filter(points => points.length > 1)
    .map(points => smooth(points))
  return group({ 'clip-path': pool, 'opacity': 0.4 }, stroke(line.join(''), [0.92, 0.02, 100, 0.5], 4))
}
