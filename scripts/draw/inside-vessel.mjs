import { ellipse, fill, group, rectangle, stroke } from './sheet.mjs'
import { blur, cloud } from './filters.mjs'
import { makeRandom } from './random.mjs'
import { vary } from './colour.mjs'

/** A vessel cut open: its far wall, its near cut edges, the lid's edge and the wet on the wall. */

const trapezoid = ({ middle, topY, topHalf, floorY, floorHalf, lip }) =>
  `M${middle - topHalf} ${topY}H${middle + topHalf}L${middle + floorHalf} ${floorY}A${floorHalf} ${lip} 0 0 1 ${middle - floorHalf} ${floorY}Z`

export function farWall(sheet, wall, { seed, tone = [0.36, 0.035, 205] }) {
  const { middle, topY, topHalf, floorY, floorHalf, lip } = wall
  const [l, c, h] = tone
  const round = sheet.linear([middle - topHalf, 0], [middle + topHalf, 0], [
    [0, [l * 0.42, c, h]], [0.16, [l * 0.8, c, h]], [0.36, [l * 1.3, c * 1.1, h]], [0.62, [l, c, h]], [0.86, [l * 0.6, c, h]], [1, [l * 0.32, c, h]],
  ])
  const shade = sheet.linear([0, topY], [0, floorY], [[0, [0.08, 0.02, 220, 0.62]], [0.22, [0.08, 0.02, 220, 0.08]], [1, [0.08, 0.02, 220, 0.3]]])
  const shape = trapezoid(wall)
  return group({ 'clip-path': sheet.clip(fill(shape, '#fff')) },
    fill(shape, round),
    fill(shape, [0.9, 0.02, 200, 0.1], { filter: cloud(sheet, '0.012 0.004', 5, 2) }),
    fill(shape, shade),
    group(
      { filter: blur(sheet, 30) },
      fill(
        `M${middle - topHalf * 0.7} ${topY}L${middle - topHalf * 0.3} ${topY}L${middle + topHalf * 0.1} ${floorY}L${middle - topHalf * 0.5} ${floorY}Z`,
        [0.95, 0.03, 95, 0.12],
      ),
    ),
    ellipse(middle, floorY, floorHalf, lip, [l * 0.5, c, h]),
    rings(wall, seed),
  )
}

/** The faint lines earlier water levels left on the wall. */
function rings({ middle, topHalf, topY, floorY, lip }, seed) {
  const random = makeRandom(seed, 'rings')
  return Array.from({ length: 4 }, () => {
    const y = random.between(topY + 60, floorY - 80)
    return stroke(
      `M${middle - topHalf} ${y - lip * 0.3}A${topHalf} ${lip} 0 0 1 ${middle + topHalf} ${y - lip * 0.3}`, [0.85, 0.02, 90, 0.07],
      random.between(2, 5),
    )
  })
}

export function droplets(wall, { seed, fromY, toY, count = 150 }) {
  const random = makeRandom(seed, 'drops')
  const { middle, topHalf } = wall
  if (toY - fromY < 30) return ''
  return Array.from({ length: count }, () => {
    const x = middle + random.sign() * topHalf * (1 - random.next() ** 1.7 * 0.95) * 0.96
    const y = random.between(fromY, toY)
    const size = random.between(1.1, 4.2) * (random.chance(0.08) ? 1.6 : 1)
    const run = random.chance(0.07) ? random.between(14, 60) : 0
    return group({ opacity: random.between(0.35, 0.85) },
      run > 0 ? stroke(`M${x} ${y - run}V${y}`, [0.9, 0.02, 200, 0.22], size * 0.9) : '',
      ellipse(x + 0.6, y + 1, size, size * 1.16, [0.1, 0.02, 220, 0.5]),
      ellipse(x, y, size, size * 1.16, [0.75, 0.03, 205, 0.45]),
      ellipse(x - size * 0.3, y - size * 0.4, size * 0.34, size * 0.34, [1, 0, 0, 0.95]),
      ellipse(x + size * 0.25, y + size * 0.5, size * 0.4, size * 0.22, [0.97, 0.02, 195, 0.5]),
    )
  })
}

/** The two cut edges of the wall and the lid above. */
export function nearEdges(sheet, { middle, topY, topHalf, floorY, floorHalf, lip }, tone) {
  const [l, c, h] = tone
  const thick = 15
  const edge = (side) => {
    const paint = sheet.linear(
      [middle + side * topHalf, 0], [middle + side * (topHalf + thick), 0],
      [[0, [l * 0.55, c, h]], [0.5, [l * 1.25, c, h]], [1, [l * 0.8, c, h]]],
    )
    return fill(
      `M${middle + side * topHalf} ${topY}h${side * thick}L${middle + side * (floorHalf + thick)} ${floorY + 6}Q${middle + side * floorHalf} ${floorY + 30} ${middle} ${floorY + lip + 14}L${middle} ${floorY + lip}A${floorHalf} ${lip} 0 0 ${side > 0 ? 0 : 1} ${middle + side * floorHalf} ${floorY}Z`,
      paint,
    )
  }
  return group({}, edge(-1), edge(1))
}

export function lid(sheet, { middle, topY, topHalf }, y, tone) {
  const [l, c, h] = tone
  const paint = sheet.linear([0, y - 34], [0, y + 8], [[0, [l * 1.7, c, h]], [0.35, [l * 1.15, c, h]], [1, [l * 0.6, c, h]]])
  return group({},
    rectangle(middle - topHalf - 34, y - 34, topHalf * 2 + 68, 40, paint, { rx: 10 }),
    rectangle(middle - topHalf - 34, y - 6, 42, topY - y + 44, paint, { rx: 6 }),
    rectangle(middle + topHalf - 8, y - 6, 42, topY - y + 44, paint, { rx: 6 }),
  )
}

/** The net cup with clay pebbles showing through its slots; its foot is painted again over the roots that leave it. */
export function netCup(sheet, { middle, topY, bottomY, topHalf, bottomHalf, seed }) {
  const random = makeRandom(seed, 'cup')
  const outline = `M${middle - topHalf} ${topY}H${middle + topHalf}L${middle + bottomHalf} ${bottomY}Q${middle} ${bottomY + 18} ${middle - bottomHalf} ${bottomY}Z`
  const inside = sheet.clip(fill(outline, '#fff'))
  const footClip = sheet.clip(rectangle(middle - topHalf, bottomY - 26, topHalf * 2, 60, '#fff'))
  const pebbles = Array.from({ length: 130 }, () => {
    const x = middle + random.between(-topHalf, topHalf)
    const y = random.between(topY - 10, bottomY + 8)
    const size = random.between(11, 23)
    const clay = vary(random, [0.5, 0.085, 45], 1.6)
    return group({},
      ellipse(x + 2, y + 4, size, size * 0.86, [0.14, 0.03, 40, 0.6]),
      ellipse(x, y, size, size * 0.86, clay),
      ellipse(x - size * 0.25, y - size * 0.3, size * 0.5, size * 0.4, [clay[0] + 0.13, clay[1] * 0.8, clay[2] + 8, 0.5]))
  })
  const plastic = [0.2, 0.015, 220]
  const ribs = Array.from({ length: 11 }, (_, index) => {
    const share = (index / 10) * 2 - 1
    const bend = Math.sin(share * 1.45)
    return stroke(`M${middle + bend * topHalf} ${topY}L${middle + bend * bottomHalf} ${bottomY + 8}`, plastic, 10 + 5 * Math.cos(share * 1.4))
      + stroke(`M${middle + bend * topHalf - 3} ${topY}L${middle + bend * bottomHalf - 3} ${bottomY}`, [0.55, 0.02, 215, 0.5], 1.8)
  })
  const bands = [0.36, 0.72, 0.98].map((share) => {
    const half = topHalf + (bottomHalf - topHalf) * share
    const y = topY + (bottomY - topY) * share
    return stroke(`M${middle - half} ${y}Q${middle} ${y + 18} ${middle + half} ${y}`, plastic, 13)
      + stroke(`M${middle - half} ${y - 4}Q${middle} ${y + 14} ${middle + half} ${y - 4}`, [0.52, 0.02, 215, 0.4], 2)
  })
  const round = sheet.linear(
    [middle - topHalf, 0], [middle + topHalf, 0],
    [[0, [0.08, 0.02, 220, 0.75]], [0.3, [0.08, 0.02, 220, 0]], [0.65, [0.08, 0.02, 220, 0.12]], [1, [0.08, 0.02, 220, 0.8]]],
  )
  return {
    cup: group({ 'clip-path': inside }, fill(outline, [0.16, 0.03, 45]), pebbles, ribs, bands, fill(outline, round)),
    foot: group({ 'clip-path': inside }, bands.at(-1), ribs.map(rib => group({ 'clip-path': footClip }, rib))),
  }
}
