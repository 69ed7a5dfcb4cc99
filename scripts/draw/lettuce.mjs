import { el, ellipse, fill, group, stroke } from './sheet.mjs'
import { blur } from './filters.mjs'
import { blend, lighter, vary } from './colour.mjs'
import { smooth } from './geometry.mjs'
import { makeRandom } from './random.mjs'

/** A loose lettuce seen from above at a slant: ruffled leaves from the outside in. */
export function lettucePlant(sheet, { seed, centre, radius, leaves, colour = [0.7, 0.155, 126], squash = 0.72, blush = 0 }) {
  const random = makeRandom(seed, 'lettuce')
  const shade = ellipse(
    centre[0] + radius * 0.06, centre[1] + radius * 0.09, radius * 0.9, radius * squash * 0.9, [0.1, 0.04, 160, 0.55],
    { filter: blur(sheet, radius * 0.08) },
  )
  const turnAtStart = random.between(0, 6)
  const layers = Array.from({ length: leaves }, (_, index) => {
    const ring = 1 - index / leaves
    const angle = turnAtStart + index * 2.399963 + random.around(0, 0.25)
    const reach = radius * (0.24 + 0.76 * ring ** 0.7) * random.between(0.9, 1.06)
    const tone = lighter(vary(random, colour, 0.9), -0.13 + (1 - ring) * 0.17)
    return ruffledLeaf(`${seed}${index}`, { centre, angle, reach, squash, tone, blush: blush * ring, lift: (1 - ring) * 0.3 })
  })
  return group({}, shade, group({ filter: crinkled(sheet, radius) }, layers))
}

/** Puckers the blades between their veins and lights them from the upper left. */
function crinkled(sheet, radius) {
  const size = (3.6 / radius).toFixed(4)
  return sheet.filter([
    el('feTurbulence', { type: 'fractalNoise', baseFrequency: size, numOctaves: 2, seed: Math.round(radius), result: 'bumps' }),
    el('feColorMatrix', { in: 'bumps', type: 'matrix', values: '0 0 0 0 0  0 0 0 0 0  0 0 0 0 0  1.4 0.4 0 0 -0.4', result: 'height' }),
    el(
      'feDiffuseLighting',
      { 'in': 'height', 'surfaceScale': radius * 0.06, 'diffuseConstant': 1.02, 'lighting-color': '#fff', 'result': 'lit' },
      el('feDistantLight', { azimuth: 225, elevation: 52 }),
    ),
    el('feBlend', { in: 'lit', in2: 'SourceGraphic', mode: 'soft-light', result: 'mixed' }),
    el('feComposite', { in: 'mixed', in2: 'SourceGraphic', operator: 'in' }),
  ])
}

/** A fan whose rim has more length than room: it waves in and out and turns its edge up. */
function ruffledLeaf(seed, { centre: [cx, cy], angle, reach, squash, tone, blush, lift }) {
  const random = makeRandom(seed, 'frill')
  const spread = random.between(0.7, 0.9)
  const [p1, p2, p3] = [random.between(0, 6), random.between(0, 6), random.between(0, 6)]
  const place = (out, turn) => [
    cx + Math.cos(angle + turn * spread) * reach * out,
    cy + Math.sin(angle + turn * spread) * reach * out * squash - reach * lift * out ** 2,
  ]
  const rimAt = turn => 0.9 - 0.1 * turn ** 2 + 0.05 * Math.sin(turn * 5.3 + p1) + 0.035 * Math.sin(turn * 12 + p2) + 0.022 * Math.sin(turn * 27 + p3)
  const turns = Array.from({ length: 73 }, (_, step) => step / 36 - 1)
  const edge = turns.map(turn => place(rimAt(turn) - (Math.abs(turn) > 0.86 ? (Math.abs(turn) - 0.86) * 2.2 : 0), turn + 0.05 * Math.sin(turn * 17 + p2)))
  const inner = share => turns.map(turn => place(rimAt(turn) * share + 0.02 * Math.sin(turn * 15 + p1), turn * 0.97))
  const body = smooth([place(0.06, -0.6), ...edge, place(0.06, 0.6)], true)
  const facing = (-Math.cos(angle) - Math.sin(angle)) / Math.SQRT2
  const lit = lighter(tone, facing * 0.04)
  const waves = turns.filter((_, index) => index % 5 === 2).map((turn, index) => {
    const out = rimAt(turn)
    const width = reach * random.between(0.03, 0.06)
    const line = smooth([place(out * random.between(0.6, 0.72), turn * 0.93), place(out * 0.85, turn + 0.03 * (index % 2 ? 1 : -1)), place(out * 0.99, turn)])
    return stroke(line, lighter(lit, index % 2 ? 0.09 : -0.085), width, { opacity: 0.55 })
  })
  const ribs = [
    -0.72, -0.46, -0.2, 0.2, 0.46, 0.72,
  ].map(turn => smooth([place(0.12 + Math.abs(turn) * 0.12, turn * 0.12), place(0.46, turn * 0.55), place(0.8, turn * 1.12)]))
  const shadow = smooth([place(0.1, -0.6), ...edge, place(0.1, 0.6)].map(([x, y]) => [x + reach * 0.025, y + reach * 0.05]), true)
  return group({},
    fill(shadow, [0.18, 0.08, 145, 0.38]),
    fill(body, lighter(lit, -0.025)),
    fill(smooth([place(0.06, -0.5), ...inner(0.84), place(0.06, 0.5)], true), lighter(lit, 0.035), { opacity: 0.8 }),
    waves,
    stroke(ribs.join(''), lighter(lit, 0.1), Math.max(1, reach * 0.014), { opacity: 0.6 }),
    fill(
      smooth([place(0.03, -0.6), place(0.36, -0.085), place(0.84, 0), place(0.36, 0.085), place(0.03, 0.6)], true),
      blend(lighter(lit, 0.16), [0.94, 0.05, 115], 0.5), { opacity: 0.85 },
    ),
    blush > 0 ? stroke(smooth(edge), [0.42, 0.11, 15], reach * 0.09, { opacity: 0.5 * blush }) : '',
    stroke(smooth(edge), lighter(lit, 0.13), Math.max(1.3, reach * 0.018), { opacity: 0.6 }),
  )
}
