import { el, group, path, rectangle } from './sheet.mjs'
import { brushed } from './filters.mjs'

/** The last coats over every picture: brushed edges, warm light from a corner, darker corners, paper grain. */
export function finished(sheet, picture, { seed = 1, wobble = 0, light = [0.2, 0.05], warmth = 0.2, vignette = 0.3 } = {}) {
  const { width, height } = sheet
  const reach = Math.hypot(width, height)
  const glow = sheet.radial([width * light[0], height * light[1]], reach * 0.75, [
    [0, [0.97, 0.06, 90, warmth]], [0.5, [0.95, 0.05, 85, warmth * 0.25]], [1, [0.9, 0.05, 85, 0]],
  ])
  const corners = sheet.radial([width / 2, height * 0.47], reach * 0.66, [
    [0.35, [0.1, 0.02, 230, 0]], [0.6, [0.1, 0.02, 230, vignette * 0.16]], [0.8, [0.1, 0.02, 230, vignette * 0.5]], [1, [0.1, 0.02, 230, vignette]],
  ])
  return sheet.finish(
    group({ filter: wobble > 0 ? brushed(sheet, wobble, 0.018, seed) : undefined }, rectangle(-40, -40, width + 80, height + 80, [0.3, 0.02, 220]), picture),
    rectangle(0, 0, width, height, glow, { style: 'mix-blend-mode:soft-light' }),
    rectangle(0, 0, width, height, glow),
    rectangle(0, 0, width, height, corners),
    grain(sheet, seed),
  )
}

function grain(sheet, seed) {
  const paper = sheet.filter([
    el('feTurbulence', { type: 'fractalNoise', baseFrequency: 0.11, numOctaves: 2, seed }),
    el('feColorMatrix', { type: 'matrix', values: '0.33 0.33 0.33 0 0  0.33 0.33 0.33 0 0  0.33 0.33 0.33 0 0  0 0 0 0 1' }),
  ])
  return path(`M0 0H${sheet.width}V${sheet.height}H0Z`, { filter: paper, opacity: 0.06, style: 'mix-blend-mode:soft-light' })
}
