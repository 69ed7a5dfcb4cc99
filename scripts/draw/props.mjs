import { ellipse, fill, group, rectangle, stroke } from './sheet.mjs'
import { blur, cloud } from './filters.mjs'
import { lighter } from './colour.mjs'
import { makeRandom } from './random.mjs'

const softShadow = (sheet, x, y, rx, ry) => ellipse(x, y, rx, ry, [0.1, 0.03, 50, 0.5], { filter: blur(sheet, ry * 0.45) })

/** Boards of a garden table seen from above at a slant. */
export function table(sheet, { top = 0, tone = [0.66, 0.06, 62], seed = 'table' }) {
  const random = makeRandom(seed)
  const { width, height } = sheet
  const count = 6
  const boards = Array.from({ length: count }, (_, index) => {
    const y = top + (height - top) * (index / count) ** 1.15
    const next = top + (height - top) * ((index + 1) / count) ** 1.15
    const wood = lighter(tone, random.around(0, 0.035))
    const veins = Array.from({ length: 9 }, () => {
      const line = random.between(y, next)
      return stroke(
        `M-20 ${line}C${width * 0.3} ${line + random.around(0, 16)} ${width * 0.6} ${line + random.around(0, 16)} ${width + 20} ${line + random.around(0, 8)}`,
        lighter(wood, random.around(-0.05, 0.05)), random.between(1, 5), { opacity: 0.45 },
      )
    })
    return group({}, rectangle(-20, y, width + 40, next - y + 1, wood), veins, rectangle(-20, next - 4, width + 40, 4, lighter(wood, -0.2), { opacity: 0.7 }))
  })
  return group({}, boards, rectangle(-20, top, width + 40, height - top, lighter(tone, 0.14), { filter: cloud(sheet, '0.004 0.05', 14, 2), opacity: 0.35 }))
}

/** A measuring jug of clear plastic, half full. */
export function jug(sheet, { x, y, width, height, level = 0.55 }) {
  const lip = width * 0.16
  const half = width / 2
  const foot = half * 0.82
  const waterY = y + height * (1 - level)
  const waterHalf = foot + (half - foot) * level
  const glass = sheet.linear(
    [x - half, 0], [x + half, 0],
    [[0, [0.95, 0.015, 210, 0.55]], [0.25, [1, 0, 0, 0.32]], [0.6, [0.85, 0.02, 210, 0.16]], [1, [0.75, 0.03, 215, 0.5]]],
  )
  const water = sheet.linear([x - half, 0], [x + half, 0], [[0, [0.6, 0.06, 215, 0.75]], [0.35, [0.82, 0.05, 205, 0.62]], [1, [0.52, 0.06, 220, 0.8]]])
  const marks = [0.3, 0.45, 0.6, 0.75].map(share => stroke(`M${x - half * 0.05} ${y + height * (1 - share)}h${half * 0.4}`, [0.35, 0.08, 25, 0.8], 3.2))
  return group({},
    softShadow(sheet, x + half * 0.5, y + height + 4, width * 0.72, lip * 0.9),
    stroke(
      `M${x + half * 0.9} ${y + height * 0.2}C${x + half * 1.75} ${y + height * 0.16} ${x + half * 1.8} ${y + height * 0.74} ${x + half * 0.8} ${y + height * 0.74}`,
      [0.72, 0.025, 215, 0.8], width * 0.1,
    ),
    stroke(
      `M${x + half * 0.95} ${y + height * 0.18}C${x + half * 1.68} ${y + height * 0.15} ${x + half * 1.74} ${y + height * 0.5} ${x + half * 1.5} ${y + height * 0.62}`,
      [0.98, 0.01, 210, 0.8], width * 0.03,
    ),
    fill(`M${x - waterHalf} ${waterY}L${x - foot} ${y + height}A${foot} ${lip * 0.8} 0 0 0 ${x + foot} ${y + height}L${x + waterHalf} ${waterY}Z`, water),
    ellipse(x, waterY, waterHalf, lip * 0.9, [0.88, 0.045, 205, 0.85]),
    ellipse(x - waterHalf * 0.3, waterY - 2, waterHalf * 0.4, lip * 0.3, [1, 0.01, 200, 0.7]),
    fill(
      `M${x - half} ${y}L${x - foot} ${y + height}A${foot} ${lip * 0.8} 0 0 0 ${x + foot} ${y + height}L${x + half} ${y}A${half} ${lip} 0 0 0 ${x - half} ${y}Z`,
      glass,
    ),
    marks,
    stroke(`M${x - half} ${y}A${half} ${lip} 0 0 0 ${x + half} ${y}A${half} ${lip} 0 0 0 ${x - half} ${y}`, [0.97, 0.01, 210, 0.85], 5),
    fill(
      `M${x - half * 0.96} ${y - lip * 0.3}Q${x - half * 1.14} ${y - lip * 0.5} ${x - half * 1.24} ${y - lip * 0.6}Q${x - half * 1.12} ${y + lip * 0.5} ${x - half * 0.97} ${y + lip * 0.9}Z`,
      [0.93, 0.02, 210, 0.75],
    ),
    stroke(`M${x - half * 0.78} ${y + height * 0.14}L${x - foot * 0.82} ${y + height * 0.86}`, [1, 0, 0, 0.75], width * 0.035, { filter: blur(sheet, 1.5) }))
}

/** A wooden spoon with a heap of fertiliser salt. */
export function spoon(sheet, { x, y, length, turn = -18 }) {
  const wood = sheet.linear([x, y - 40], [x, y + 40], [[0, [0.76, 0.085, 68]], [1, [0.52, 0.085, 56]]])
  const random = makeRandom('salt')
  const grains = Array.from({ length: 150 }, () => {
    const [out, angle] = [Math.sqrt(random.next()), random.between(0, 6.28)]
    return ellipse(
      x + Math.cos(angle) * out * 46, y - 6 + Math.sin(angle) * out * 22 - (1 - out) * 14, 2.8, 2.4,
      [random.between(0.82, 1), 0.02, random.between(180, 240)],
    )
  })
  return group({ transform: `rotate(${turn} ${x} ${y})` },
    softShadow(sheet, x + length * 0.45, y + 26, length * 0.55, 16),
    fill(`M${x + 50} ${y - 13}Q${x + length * 0.6} ${y - 12} ${x + length} ${y - 16}q16 14 0 32Q${x + length * 0.6} ${y + 12} ${x + 50} ${y + 13}Z`, wood),
    ellipse(x, y, 72, 42, wood), ellipse(x - 2, y - 3, 58, 30, [0.46, 0.07, 55]), ellipse(x, y - 6, 48, 24, [0.9, 0.02, 210]), grains)
}

/** An empty net cup standing on the table. */
export function standingCup(sheet, { x, y, top, bottom, height }) {
  const lip = top * 0.3
  const black = [0.24, 0.012, 225]
  const ribs = Array.from({ length: 13 }, (_, index) => {
    const bend = Math.sin((index / 12 - 0.5) * 3)
    const depth = Math.sqrt(1 - bend * bend)
    return stroke(`M${x + bend * top} ${y + depth * lip}L${x + bend * bottom} ${y + height + depth * lip * 0.6}`, black, 7) + stroke(
      `M${x + bend * top - 2} ${y + depth * lip}L${x + bend * bottom - 2} ${y + height + depth * lip * 0.6}`, [0.5, 0.015, 220, 0.6], 1.6,
    )
  })
  const bands = [0.35, 0.7, 1].map((share) => {
    const half = top + (bottom - top) * share
    return stroke(`M${x - half} ${y + height * share}A${half} ${lip * (1 - share * 0.35)} 0 0 0 ${x + half} ${y + height * share}`, black, 8)
  })
  return group({},
    softShadow(sheet, x + bottom * 0.6, y + height + lip * 0.5, bottom * 1.5, lip * 0.7),
    ellipse(x, y, top, lip, [0.13, 0.01, 225]), ellipse(x, y + height, bottom, lip * 0.6, [0.16, 0.01, 225, 0.85]), ribs, bands,
    stroke(`M${x - top} ${y}A${top} ${lip} 0 1 0 ${x + top} ${y}A${top} ${lip} 0 1 0 ${x - top} ${y}`, black, 13),
    stroke(`M${x - top} ${y - 4}A${top} ${lip} 0 0 1 ${x + top * 0.3} ${y - lip - 2}`, [0.62, 0.015, 215, 0.8], 3))
}

/** A lid with its hole, leaning or lying flat. */
export function looseLid(sheet, { x, y, radius, squash, turn = 0, tone }) {
  const face = sheet.linear(
    [x - radius, y - radius * squash], [x + radius, y + radius * squash],
    [[0, lighter(tone, 0.16)], [0.5, lighter(tone, 0.03)], [1, lighter(tone, -0.1)]],
  )
  return group({ transform: `rotate(${turn} ${x} ${y})` },
    softShadow(sheet, x + 22, y + radius * squash * 0.6, radius * 1.06, radius * squash * 0.72),
    ellipse(x, y + radius * 0.06, radius, radius * squash, lighter(tone, -0.14)),
    ellipse(x, y, radius, radius * squash, face),
    stroke(`M${x - radius * 0.9} ${y}a${radius * 0.9} ${radius * squash * 0.88} 0 1 1 0 0.1`, lighter(tone, -0.1), 4, { opacity: 0.7 }),
    ellipse(x, y + 3, radius * 0.47, radius * squash * 0.47, lighter(tone, 0.12)),
    ellipse(x, y, radius * 0.45, radius * squash * 0.45, [0.16, 0.03, 55]))
}

/** A shallow bowl seen from above at a slant: [what lies behind the food, what lies before it]. */
export function bowl(sheet, { x, y, radius, tone = [0.9, 0.02, 220] }) {
  const lip = radius * 0.42
  const inner = sheet.linear([x - radius, y - lip], [x + radius, y + lip], [[0, lighter(tone, -0.22)], [0.5, lighter(tone, -0.05)], [1, lighter(tone, 0.06)]])
  const outer = sheet.linear([x - radius, 0], [x + radius, 0], [[0, lighter(tone, -0.06)], [0.3, lighter(tone, 0.06)], [1, lighter(tone, -0.28)]])
  const front = `M${x - radius} ${y}A${radius} ${lip} 0 0 0 ${x + radius} ${y}Q${x + radius * 0.86} ${y + radius * 0.6} ${x + radius * 0.42} ${y + radius * 0.66}Q${x} ${y + radius * 0.74} ${x - radius * 0.42} ${y + radius * 0.66}Q${x - radius * 0.86} ${y + radius * 0.6} ${x - radius} ${y}Z`
  return [
    group(
      {}, softShadow(sheet, x + radius * 0.24, y + radius * 0.64, radius * 0.86, radius * 0.2), ellipse(x, y, radius, lip, inner),
      stroke(`M${x - radius} ${y}A${radius} ${lip} 0 0 1 ${x + radius} ${y}`, lighter(tone, 0.08), 9),
    ),
    group(
      {}, fill(front, outer), stroke(`M${x - radius} ${y}A${radius} ${lip} 0 0 0 ${x + radius} ${y}`, lighter(tone, 0.09), 9),
      stroke(
        `M${x - radius * 0.93} ${y + radius * 0.2}Q${x - radius * 0.6} ${y + radius * 0.5} ${x} ${y + radius * 0.53}Q${x + radius * 0.6} ${y + radius * 0.5} ${x + radius * 0.93} ${y + radius * 0.2}`,
        [0.5, 0.09, 245, 0.55], 10,
      ),
    ),
  ]
}
