import { ellipse, fill, group, makeSheet } from './sheet.mjs'
import { blur } from './filters.mjs'
import { finished } from './finish.mjs'
import { LIGHTS, softTerrace } from './backdrop.mjs'
import { bucket, cupInLid, floorTiles, VESSEL_TONES } from './vessel.mjs'
import { basilPlant } from './basil.mjs'
import { bushPlant, tomatoPlant } from './plants-tall.mjs'

const PLANTS = { tomato: tomatoPlant, basil: basilPlant, aubergine: bushPlant, pepper: bushPlant }

/** A whole plant in its vessel on the terrace, upright, from the same spot every time. */
export function wholeScene({ kind, seed, light = 'morning', vessel = {}, plant, at = [480, 880] }) {
  const sheet = makeSheet(960, 1280)
  const { top = 188, bottom = 164, height = 322, tone = 'slate', cup = 92, lid = true, band = true } = vessel
  const [x, y] = at
  const grow = PLANTS[kind]
  const picture = group({},
    softTerrace(sheet, { seed, light, horizon: 0.46, floorAt: 0.74 }),
    group({ filter: blur(sheet, 1.2) }, floorTiles(sheet, 990, LIGHTS[light].floor)),
    castShadow(sheet, x, y + height, bottom),
    bucket(sheet, { x, y, top, bottom, height, lid, band, tone: VESSEL_TONES[tone] }),
    cupInLid(sheet, { x, y: y - 2, radius: cup, seed }),
    leafShade(sheet, x, y, top),
    grow(sheet, { kind, seed, foot: [x, y + 4], ...plant }),
  )
  return finished(sheet, picture, { seed: 4, warmth: light === 'cloudy' ? 0.05 : 0.22, light: light === 'evening' ? [0.9, 0.1] : [0.12, 0] })
}

function castShadow(sheet, x, y, half) {
  return group(
    { filter: blur(sheet, 22) },
    fill(
      `M${x - half * 0.6} ${y}L${x + half * 0.9} ${y - 10}L${x + half * 3.2} ${y + 30}L${x + half * 2.4} ${y + 70}Z`, [0.1, 0.03, 260, 0.4],
    ),
  )
}

/** The plant's own shade on the lid. */
function leafShade(sheet, x, y, top) {
  const onLid = sheet.clip(ellipse(x, y, top * 1.04, top * 0.135, '#fff'))
  return group({ 'clip-path': onLid }, ellipse(x + top * 0.22, y + 10, top * 0.72, top * 0.1, [0.08, 0.04, 160, 0.5], { filter: blur(sheet, 12) }))
}
