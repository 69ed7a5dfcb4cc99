import { ellipse, fill, group, stroke } from './sheet.mjs'
import { blur } from './filters.mjs'
import { blend, lighter } from './colour.mjs'
import { away, smooth } from './geometry.mjs'
import { makeRandom } from './random.mjs'

const GREEN_FRUIT = [0.66, 0.14, 128]
const ORANGE_FRUIT = [0.69, 0.18, 55]
const RED_FRUIT = [0.55, 0.21, 28]

/** A tomato from green (0) over orange (0.5) to red (1). */
export function tomatoFruit(sheet, { at: [x, y], radius, ripe, seed, calyxAngle = -Math.PI / 2 }) {
  const base = ripe < 0.5 ? blend(GREEN_FRUIT, ORANGE_FRUIT, ripe * 2) : blend(ORANGE_FRUIT, RED_FRUIT, ripe * 2 - 1)
  const round = sheet.radial([x - radius * 0.35, y - radius * 0.4], radius * 1.55, [
    [0, lighter(base, 0.13)], [0.4, base], [0.8, lighter(base, -0.14)], [1, lighter(base, -0.22)],
  ])
  return group({},
    ellipse(x, y, radius, radius * 0.94, round),
    ellipse(x + radius * 0.3, y + radius * 0.62, radius * 0.5, radius * 0.2, [0.9, 0.09, 80, 0.16], { filter: blur(sheet, radius * 0.08) }),
    ellipse(
      x - radius * 0.38, y - radius * 0.42, radius * 0.24, radius * 0.15, [1, 0.01, 90, 0.8],
      { transform: `rotate(-35 ${x - radius * 0.38} ${y - radius * 0.42})`, filter: blur(sheet, radius * 0.05) },
    ),
    calyx(away([x, y], calyxAngle, radius * 0.86), radius, seed, calyxAngle),
  )
}

function calyx([x, y], radius, seed, angle) {
  const random = makeRandom(seed, 'calyx')
  const sepals = Array.from({ length: 6 }, (_, index) => {
    const turn = angle + Math.PI + (index - 2.5) * 0.62 + random.around(0, 0.15)
    const tip = away([x, y], turn, radius * random.between(0.6, 0.85))
    const [left, right] = [away([x, y], turn - 0.55, radius * 0.28), away([x, y], turn + 0.55, radius * 0.28)]
    const shape = smooth([[x, y], left, tip, right], true)
    return fill(shape, [0.42, 0.11, 138]) + fill(smooth([[x, y], left, tip], true), [0.56, 0.13, 132])
  })
  return group({}, stroke(smooth([[x, y], away([x, y], angle, radius * 0.5)]), [0.55, 0.1, 130], radius * 0.13), sepals)
}

/** A star of petals: yellow and swept back for tomato, mauve for aubergine, white for pepper. */
export function starFlower(sheet, { at: [x, y], size, petal, heart, petals = 5, turn = 0, squash = 0.8, seed, cone = false }) {
  const random = makeRandom(seed, 'flower')
  const star = Array.from({ length: petals }, (_, index) => {
    const angle = turn + index / petals * Math.PI * 2
    const [cos, sin] = [Math.cos(angle), Math.sin(angle) * squash]
    const place = (out, across) => [x + cos * out * size - sin * across * size, y + sin * out * size + cos * across * size * squash]
    const wide = random.between(0.24, 0.31)
    const shape = smooth(
      [
        place(0.08, 0), place(0.35, -wide), place(0.72, -wide * 0.85), place(1.04, random.around(0, 0.06)), place(0.72, wide * 0.85),
        place(0.35, wide),
      ],
      true,
    )
    const light = -Math.cos(angle + 0.8)
    const tone = lighter(petal, light * 0.05)
    const sheen = sheet.linear([x, y], place(1, 0), [[0, lighter(tone, -0.12)], [0.35, tone], [0.8, lighter(tone, 0.06)], [1, lighter(tone, -0.02)]])
    const lines = [-0.16, -0.08, 0.08, 0.16].map(across => smooth([place(0.15, across * 0.3), place(0.5, across), place(0.9, across * 0.6)])).join('')
    return group(
      {}, fill(shape, sheen), size > 60 ? stroke(lines, lighter(tone, -0.09), 1.6, { opacity: 0.5 }) : '',
      stroke(smooth([place(0.12, 0), place(0.95, 0)]), lighter(petal, -0.1), size * 0.03, { opacity: 0.6 }),
      stroke(shape, lighter(petal, -0.12), size * 0.015, { opacity: 0.5 }),
    )
  })
  const round = sheet.radial([x - size * 0.08, y - size * 0.08], size * 0.4, [[0, lighter(heart, 0.1)], [1, lighter(heart, -0.14)]])
  if (cone) return group({}, star, antherCone(sheet, [x, y], size, heart))
  const anthers = Array.from({ length: petals + 1 }, (_, index) => {
    const angle = index / (petals + 1) * Math.PI * 2 + 0.3
    return ellipse(
      x + Math.cos(angle) * size * 0.13, y + Math.sin(angle) * size * 0.11, size * 0.1, size * 0.15, round,
      { transform: `rotate(${angle * 57 + 90} ${x + Math.cos(angle) * size * 0.13} ${y + Math.sin(angle) * size * 0.11})` },
    )
  })
  return group({}, star, anthers, ellipse(x, y, size * 0.06, size * 0.06, [0.8, 0.1, 120]))
}

/** Tomato anthers stand together as one pointed cone. */
function antherCone(sheet, [x, y], size, heart) {
  const tip = [x + size * 0.1, y + size * 0.46]
  const round = sheet.linear([x - size * 0.2, y], [x + size * 0.24, y + size * 0.1], [[0, lighter(heart, 0.12)], [0.5, heart], [1, lighter(heart, -0.16)]])
  const shape = smooth(
    [
      [x - size * 0.2, y - size * 0.06], [x, y - size * 0.18], [x + size * 0.2, y - size * 0.04], [x + size * 0.17, y + size * 0.2], tip,
      [x - size * 0.12, y + size * 0.18],
    ],
    true,
  )
  const seams = [-0.1, 0.02, 0.12].map(dx => smooth([[x + size * dx, y - size * 0.12], [x + size * dx * 1.1, y + size * 0.12], tip])).join('')
  return group(
    {}, fill(shape, [0.3, 0.08, 70, 0.35], { transform: `translate(${size * 0.06} ${size * 0.07})` }), fill(shape, round),
    stroke(seams, lighter(heart, -0.14), size * 0.02, { opacity: 0.7 }),
  )
}

/** A glossy long fruit (aubergine, pepper) hanging from its cap. */
export function longFruit(sheet, { at: [x, y], length, width, colour, cap, lean = 0 }) {
  const tip = [x + lean * length, y + length]
  const shape = smooth(
    [
      [x - width * 0.3, y], [x - width * 0.5 + lean * length * 0.4, y + length * 0.5], [tip[0] - width * 0.34, tip[1] - width * 0.18],
      [tip[0], tip[1]], [tip[0] + width * 0.36, tip[1] - width * 0.2], [x + width * 0.5 + lean * length * 0.4, y + length * 0.5],
      [x + width * 0.3, y],
    ],
    true,
  )
  const round = sheet.linear(
    [x - width * 0.6, y], [x + width * 0.6, y + width * 0.2],
    [[0, lighter(colour, -0.03)], [0.25, lighter(colour, 0.16)], [0.55, colour], [1, lighter(colour, -0.14)]],
  )
  const glint = smooth([
    [x - width * 0.22, y + length * 0.2], [x - width * 0.27 + lean * length * 0.4, y + length * 0.5],
    [x - width * 0.2 + lean * length * 0.6, y + length * 0.75],
  ])
  const teeth = smooth(
    [
      [x - width * 0.36, y - width * 0.14], [x - width * 0.42, y + width * 0.3], [x - width * 0.2, y + width * 0.12], [x, y + width * 0.42],
      [x + width * 0.2, y + width * 0.12], [x + width * 0.42, y + width * 0.28], [x + width * 0.36, y - width * 0.14],
    ],
    true,
  )
  return group(
    {}, fill(shape, round), stroke(glint, [1, 0.01, 320, 0.55], width * 0.1, { filter: blur(sheet, width * 0.03) }), fill(teeth, cap),
    stroke(`M${x} ${y}q${-width * 0.05} ${-width * 0.4} ${width * 0.1} ${-width * 0.6}`, cap, width * 0.18),
  )
}
