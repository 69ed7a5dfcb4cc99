import { ellipse, fill, group, rectangle, stroke } from './sheet.mjs'
import { blur, cloud } from './filters.mjs'
import { lighter } from './colour.mjs'
import { makeRandom } from './random.mjs'

export const VESSEL_TONES = {
  slate: [0.36, 0.035, 205],
  cream: [0.88, 0.025, 85],
  terracotta: [0.58, 0.11, 45],
  blue: [0.45, 0.08, 245],
  silver: [0.78, 0.008, 230],
}

/** A round bucket or tub seen a little from above, lid on; (x, y) is the middle of its rim. */
export function bucket(sheet, { x, y, top, bottom, height, tone, lid = true, band = true }) {
  const lip = top * 0.13
  const foot = bottom * 0.12
  const sides = sheet.linear(
    [x - top, 0], [x + top, 0],
    [
      [0, lighter(tone, -0.2)], [0.14, lighter(tone, -0.06)], [0.34, lighter(tone, 0.11)], [0.6, tone], [0.86, lighter(tone, -0.16)],
      [1, lighter(tone, -0.24)],
    ],
  )
  const shape = `M${x - top} ${y}A${top} ${lip} 0 0 0 ${x + top} ${y}L${x + bottom} ${y + height}A${bottom} ${foot} 0 0 1 ${x - bottom} ${y + height}Z`
  const ring = share => `M${x - (top + (bottom - top) * share)} ${y + height * share}A${top + (bottom - top) * share} ${lip} 0 0 0 ${x + (top + (bottom - top) * share)} ${y + height * share}`
  const shadow = group({ filter: blur(sheet, 16) }, ellipse(x + bottom * 0.34, y + height + foot * 0.7, bottom * 1.3, foot * 1.3, [0.1, 0.03, 60, 0.55]))
  return group({}, shadow,
    fill(shape, sides),
    fill(shape, lighter(tone, 0.15), { filter: cloud(sheet, '0.006 0.03', 9, 1.8), opacity: 0.16 }),
    band ? [
      0.1, 0.2,
    ].map(share => stroke(ring(share), lighter(tone, -0.13), 4, { opacity: 0.7 }) + stroke(
      ring(share + 0.012), lighter(tone, 0.13), 2, { opacity: 0.6 },
    )) : '',
    lid ? lidTop(sheet, { x, y, top, lip, tone }) : opening(sheet, { x, y, top, lip, tone }))
}

function lidTop(sheet, { x, y, top, lip, tone }) {
  const wide = top * 1.04
  const face = sheet.linear([x - wide, y - lip], [x + wide, y + lip], [[0, lighter(tone, 0.16)], [0.5, lighter(tone, 0.05)], [1, lighter(tone, -0.08)]])
  const skirt = top * 0.1
  const side = sheet.linear(
    [x - wide, 0], [x + wide, 0],
    [[0, lighter(tone, -0.16)], [0.33, lighter(tone, 0.14)], [0.7, lighter(tone, -0.04)], [1, lighter(tone, -0.22)]],
  )
  return group({},
    fill(`M${x - wide} ${y}v${skirt}A${wide} ${lip} 0 0 0 ${x + wide} ${y + skirt}v${-skirt}A${wide} ${lip} 0 0 1 ${x - wide} ${y}Z`, side),
    ellipse(x, y, wide, lip, face),
    stroke(`M${x - wide * 0.9} ${y}a${wide * 0.9} ${lip * 0.86} 0 1 1 0 0.1`, lighter(tone, -0.1), 3, { opacity: 0.6 }),
    stroke(`M${x - wide} ${y}A${wide} ${lip} 0 0 0 ${x + wide} ${y}`, lighter(tone, 0.2), 2.4, { opacity: 0.7 }))
}

function opening(sheet, { x, y, top, lip, tone }) {
  const inner = sheet.linear([x - top, 0], [x + top, 0], [[0, lighter(tone, -0.3)], [0.6, lighter(tone, -0.12)], [1, lighter(tone, -0.05)]])
  return group({},
    ellipse(x, y, top * 1.03, lip * 1.05, lighter(tone, 0.1)),
    ellipse(x, y, top * 0.96, lip * 0.93, inner),
    ellipse(x, y + lip * 0.3, top * 0.9, lip * 0.6, [0.55, 0.07, 205, 0.95]),
    ellipse(x - top * 0.25, y + lip * 0.22, top * 0.36, lip * 0.22, [0.93, 0.03, 200, 0.6], { filter: blur(sheet, 5) }))
}

/** Rim of the net cup in the lid, filled with clay pebbles. */
export function cupInLid(sheet, { x, y, radius, seed }) {
  const random = makeRandom(seed, 'lid-cup')
  const squash = 0.36
  const pebbles = Array.from({ length: 46 }, () => {
    const [turn, out] = [random.between(0, 6.28), Math.sqrt(random.next()) * radius * 0.8]
    return [x + Math.cos(turn) * out, y + Math.sin(turn) * out * squash, radius * random.between(0.11, 0.19)]
  }).sort((a, b) => a[1] - b[1]).map(([px, py, size]) => {
    const clay = [random.between(0.42, 0.58), 0.09, random.between(36, 54)]
    return ellipse(px + 1, py + size * 0.3, size, size * 0.7, [0.2, 0.05, 40]) + ellipse(px, py, size, size * 0.72, clay) + ellipse(
      px - size * 0.3, py - size * 0.25, size * 0.4, size * 0.26, lighter(clay, 0.14), { opacity: 0.7 },
    )
  })
  return group({},
    ellipse(x, y + 3, radius * 1.08, radius * squash * 1.12, [0.12, 0.02, 220, 0.6]),
    ellipse(x, y, radius, radius * squash, [0.22, 0.02, 220]),
    ellipse(x, y + radius * 0.03, radius * 0.86, radius * squash * 0.84, [0.15, 0.03, 45]),
    pebbles,
    stroke(`M${x - radius * 0.93} ${y}A${radius * 0.93} ${radius * squash * 0.93} 0 0 0 ${x + radius * 0.93} ${y}`, [0.3, 0.02, 220], radius * 0.1),
    stroke(
      `M${x - radius * 0.96} ${y - 1}A${radius * 0.96} ${radius * squash} 0 0 1 ${x + radius * 0.4} ${y - radius * squash * 0.9}`,
      [0.6, 0.02, 215, 0.7], radius * 0.035,
    ))
}

/** Paving of the terrace, sharp near us. */
export function floorTiles(sheet, y, tone) {
  const { width, height } = sheet
  const ground = sheet.linear([0, y], [0, height], [[0, lighter(tone, 0.05)], [1, lighter(tone, -0.1)]])
  const joints = Array.from({ length: 5 }, (_, row) => {
    const line = y + (height - y) * (row / 4) ** 1.6
    return stroke(`M-20 ${line}H${width + 20}`, lighter(tone, -0.14), 2 + row)
  })
  const rays = Array.from(
    { length: 11 },
    (_, index) => stroke(
      `M${width / 2 + (index - 5) * width * 0.16} ${y}L${width / 2 + (index - 5) * width * 0.34} ${height}`, lighter(tone, -0.14), 3,
    ),
  )
  return group(
    {}, rectangle(-40, y, width + 80, height - y + 40, ground), group({ opacity: 0.55, filter: blur(sheet, 1.6) }, joints, rays),
    rectangle(-40, y, width + 80, height - y + 40, lighter(tone, -0.12), { filter: cloud(sheet, '0.012 0.03', 12, 2), opacity: 0.35 }),
  )
}
