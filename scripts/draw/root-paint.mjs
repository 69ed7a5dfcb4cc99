import { fill, group, stroke } from './sheet.mjs'
import { blend, lighter } from './colour.mjs'
import { at, ribbon, smooth } from './geometry.mjs'
import { branch, growRoots, hairs, SIDE_STEP } from './root-growth.mjs'

/** Root colours: [shade, body, light]. */
export const ROOT_COLOURS = {
  white: [[0.62, 0.035, 85], [0.9, 0.032, 90], [0.985, 0.012, 95]],
  cream: [[0.55, 0.05, 78], [0.83, 0.055, 86], [0.95, 0.03, 92]],
  tan: [[0.42, 0.06, 62], [0.66, 0.075, 70], [0.82, 0.06, 80]],
  brown: [[0.24, 0.04, 50], [0.4, 0.06, 55], [0.55, 0.06, 65]],
}

/** A root system of one day, ready to be painted above and below the water. */
export function rootSystem({ seed, day, count, cupRadius, floor, halfWidthAt, water, fuzz = 0, bushy = 1, cmPerDay, lastBirth }) {
  const mains = growRoots({ seed, day, count, cupRadius, floor, halfWidthAt, cmPerDay, lastBirth })
  return mains.map((main) => {
    const sides = branch(main, { spacing: 0.7 / bushy, longest: 5.4, floor })
    const fine = sides.flatMap(side => branch(side, { spacing: 0.55, longest: 1.6, bareTip: 0.5, level: 2, pull: 0.06, step: SIDE_STEP, floor }))
    const fringe = fuzz > 0
      ? [main, ...sides].flatMap(root => hairs(root, { every: 0.075 / fuzz, longest: 0.3 + 0.12 * fuzz, until: water }))
      : []
    return { main, sides, fine, fringe, depth: main.depth }
  }).sort((a, b) => a.depth - b.depth)
}

/** Paints the system, the far half out of focus; `toPx` turns centimetres into a point of the picture. */
export function paintRoots(system, style, farFocus) {
  const near = system.findIndex(({ depth }) => depth > 0.45)
  const cut = near < 0 ? system.length : near
  return [group({ filter: farFocus }, strands(system.slice(0, cut), style)), ...strands(system.slice(cut), style)]
}

function strands(system, { scale, toPx, colour, newColour = colour, newShare = 0, tint, clump = 1 }) {
  return system.map(({ main, sides, fine, fringe, depth }) => {
    const distance = (1 - depth) * 0.55
    const [shade, body, light] = colour.map(tone => blend(tone, tint, distance))
    const fresh = newColour.map(tone => blend(tone, tint, distance))
    const line = root => smooth(root.points.map(toPx))
    const thin = fine.map(line).join('')
    return group({},
      stroke(fringe.map(([a, b]) => `M${at(toPx(a))}L${at(toPx(b))}`).join(''), light, 1.3, { opacity: 0.2 }),
      stroke(thin, shade, 2, { opacity: 0.35 }),
      stroke(thin, body, 1.15, { opacity: 0.72 }),
      sides.map(side => taper(side, scale, toPx, [shade, body, light], 0.9)),
      taper(main, scale * clump, toPx, [shade, body, light], 1),
      newShare > 0 && depth > 1 - newShare ? freshTips(main, scale, toPx, fresh) : '',
    )
  })
}

function taper(root, scale, toPx, [shade, body, light], opacity) {
  const points = root.points.map(toPx)
  if (points.length < 2) return ''
  const width = root.width * scale
  const thickness = share => Math.max(1.1, width * (1 - 0.62 * share))
  const lit = points.map(([x, y]) => [x - width * 0.16, y - width * 0.06])
  return group({ opacity },
    fill(ribbon(points.map(([x, y]) => [x + width * 0.16, y]), share => thickness(share) * 1.25), shade),
    fill(ribbon(points, thickness), body),
    fill(ribbon(lit, share => thickness(share) * 0.38), light, { opacity: 0.9 }),
  )
}

/** Clean white ends on a stained root: the sign that it grows again. */
function freshTips(main, scale, toPx, colour) {
  const tip = main.points.slice(-Math.min(main.points.length, 9))
  return taper({ points: tip, width: main.width * 0.85 }, scale, toPx, colour.map((tone, index) => lighter(tone, index * 0.01)), 1)
}
