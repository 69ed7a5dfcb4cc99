import { ellipse, fill, group, path, stroke } from './sheet.mjs'
import { blur, cloud, relief } from './filters.mjs'
import { blend, faded, lighter } from './colour.mjs'
import { along, at, headingAt, ribbon, smooth } from './geometry.mjs'
import { makeRandom } from './random.mjs'
import { outline, sideVeins } from './leaf-outline.mjs'
import { growVeinlets, rungs } from './veinlets.mjs'

/**
 * One leaf filling the frame. `bend` is the midrib in px from stalk to tip; the blade hangs on it.
 * `yellow` 0..1 fades the blade between the veins and leaves the veins green, worst at the edge.
 */
export function closeLeaf(sheet, { kind, seed, bend, length, green, between, veinColour, gloss = 0.5, yellow = 0, dew = 0 }) {
  const [left, right] = outline(kind, seed, 60)
  const place = ([u, v]) => {
    const exact = Math.min(bend.length - 1.001, Math.max(0, u * (bend.length - 1)))
    const index = Math.floor(exact)
    const [a, b] = [bend[index], bend[index + 1]]
    const angle = headingAt(bend, index) + Math.PI / 2
    const share = exact - index
    return [a[0] + (b[0] - a[0]) * share + Math.cos(angle) * v * length, a[1] + (b[1] - a[1]) * share + Math.sin(angle) * v * length]
  }
  const halves = [left, right].map(edge => straightEdge(edge, place))
  const whole = smooth([...left.map(place), ...right.slice(0, -1).reverse().map(place)], true)
  const shape = sheet.clip(fill(whole, '#fff'))
  const bySide = [[left, -1], [right, 1]].map(([edge, side]) => sideVeins(kind, seed, side, edge).map(line => line.map(place)))
  const veins = bySide.flat()
  const cross = bySide.flatMap((lines, side) => rungs(`${seed}${side}`, lines, along))
  const blade = blend(green, between, yellow)
  const net = network(seed, [...veins, ...cross, bend], cross, [...left.map(place), ...right.slice().reverse().map(place)])
  const veinTone = blend(veinColour, lighter(veinColour, 0.02), yellow)
  const greenHalo = blend(green, lighter(green, 0.04), 0.5)
  const glow = sheet.linear(
    place([0.5, -0.4]), place([0.5, 0.4]),
    [
      [0, faded(lighter(blade, 0.12), 0.75)], [0.48, faded(lighter(blade, 0.02), 0)], [0.52, faded(lighter(blade, -0.16), 0.62)],
      [1, faded(lighter(blade, 0.05), 0.3)],
    ],
  )
  return group({},
    group({ filter: blur(sheet, 22), opacity: 0.55, transform: 'translate(26 38)' }, fill(whole, [0.12, 0.04, 160])),
    group({ 'clip-path': shape },
      fill(whole, blade),
      fill(whole, lighter(blade, -0.1), { filter: cloud(sheet, 0.012, 7, 2.6), opacity: 0.6 }),
      yellow > 0 ? group(
        { filter: blur(sheet, 9) }, veins.map(line => stroke(smooth(line), greenHalo, 30 * (1.15 - yellow * 0.5))),
        stroke(smooth(bend), greenHalo, 46),
      ) : '',
      yellow > 0 ? group({ filter: blur(sheet, 2.5), opacity: 0.75 }, net.map(piece => stroke(piece.d, greenHalo, piece.width * 3.2))) : '',
      quilt(sheet, veins, net),
      fill(whole, glow),
      group({ opacity: 0.5 }, net.map(piece => stroke(piece.d, veinTone, piece.width))),
      veins.map(line => vein(line, veinTone, 7.5)),
      vein(bend, veinTone, 17),
      shine(sheet, { place, veins: veins.length, gloss, seed }),
      rim(sheet, halves, blade),
      dewDrops(seed, place, dew),
    ),
    stroke(whole, lighter(blade, 0.12), 2, { opacity: 0.6 }),
  )
}

const straightEdge = (edge, place) => smooth(edge.map(place))

/** Small veins, thick where many others hang on them. */
function network(seed, lines, cross, edgePoints) {
  const [xs, ys] = [edgePoints.map(point => point[0]), edgePoints.map(point => point[1])]
  const bounds = [Math.max(-20, Math.min(...xs)), Math.max(-20, Math.min(...ys)), Math.min(1300, Math.max(...xs)), Math.min(1300, Math.max(...ys))]
  const roots = lines.flatMap(line => thicken(line))
  const nodes = growVeinlets({ seed, bounds, roots, inside: point => contains(edgePoints, point), spread: 15, step: 6, most: 9000 })
  for (const node of nodes.slice().reverse()) {
    if (!node.loop) node.parent.weight += node.weight
  }
  const [thin, middling, thick] = [[], [], []]
  for (const node of nodes) {
    const list = node.weight > 14 ? thick : node.weight > 4 ? middling : thin
    list.push(`M${at(node.parent.point)}L${at(node.point)}`)
  }
  return [
    { d: thin.join(''), width: 0.9 }, { d: middling.join(''), width: 1.5 }, { d: thick.join(''), width: 2.2 },
    { d: cross.map(line => smooth(line)).join(''), width: 2.8 },
  ]
}

function thicken(line) {
  return line.slice(1).flatMap((point, index) => Array.from({ length: 8 }, (_, step) => [
    line[index][0] + (point[0] - line[index][0]) * step / 8, line[index][1] + (point[1] - line[index][1]) * step / 8,
  ]))
}

function contains(polygon, [x, y]) {
  let odd = false
  for (let i = 0, j = polygon.length - 1; i < polygon.length; j = i, i += 1) {
    const [[xi, yi], [xj, yj]] = [polygon[i], polygon[j]]
    if ((yi > y) !== (yj > y) && x < (xj - xi) * (y - yi) / (yj - yi) + xi) odd = !odd
  }
  return odd
}

/** The blade swells between its veins: the veins are the valleys of a lit relief. */
function quilt(sheet, veins, net) {
  const broad = group(
    { filter: relief(sheet, 13, -24), style: 'mix-blend-mode:soft-light', opacity: 0.6 },
    veins.map(line => stroke(smooth(line), '#000', 15)), path('M-400 -400h1v1h-1ZM1800 1500h1v1h-1Z', { fill: '#000' }),
  )
  const fine = group(
    { filter: relief(sheet, 2.2, -4), style: 'mix-blend-mode:soft-light', opacity: 0.55 },
    net.map(piece => stroke(piece.d, '#000', piece.width * 1.6)), path('M-400 -400h1v1h-1ZM1800 1500h1v1h-1Z', { fill: '#000' }),
  )
  return [broad, fine]
}

function vein(line, colour, width) {
  const thickness = share => Math.max(1.2, width * (1 - share * 0.88))
  const lower = line.map(([x, y]) => [x + width * 0.22, y + width * 0.26])
  const upper = line.map(([x, y]) => [x - width * 0.1, y - width * 0.12])
  return group({},
    fill(ribbon(lower, share => thickness(share) * 1.25), [0.15, 0.05, 150, 0.4]),
    fill(ribbon(line, thickness), colour),
    fill(ribbon(upper, share => thickness(share) * 0.4), lighter(colour, 0.1), { opacity: 0.8 }),
  )
}

function shine(sheet, { place, gloss, seed }) {
  const random = makeRandom(seed, 'shine')
  const streaks = Array.from({ length: 13 }, () => {
    const u = random.between(0.12, 0.85)
    const v = -random.between(0.04, 0.22)
    const points = [[u - 0.05, v], [u, v - 0.012], [u + 0.06, v - 0.03]].map(place)
    return fill(ribbon(points, share => 26 * Math.sin(Math.PI * Math.min(0.98, Math.max(0.02, share)))), [1, 0.01, 180, random.between(0.1, 0.34)])
  })
  return group({ filter: blur(sheet, 8), opacity: gloss, style: 'mix-blend-mode:screen' }, streaks)
}

function rim(sheet, halves, blade) {
  return group(
    { filter: blur(sheet, 7) }, stroke(halves[0], lighter(blade, 0.2), 9, { opacity: 0.5 }),
    stroke(halves[1], [0.15, 0.05, 150], 16, { opacity: 0.35 }),
  )
}

function dewDrops(seed, place, count) {
  const random = makeRandom(seed, 'dew')
  return Array.from({ length: count }, () => {
    const [x, y] = place([random.between(0.1, 0.9), random.around(0, 0.2)])
    const size = random.between(4, 13)
    return group({},
      ellipse(x + size * 0.2, y + size * 0.35, size, size * 0.9, [0.15, 0.06, 150, 0.5]),
      ellipse(x, y, size, size * 0.92, [0.75, 0.08, 140, 0.45]),
      ellipse(x + size * 0.25, y + size * 0.35, size * 0.55, size * 0.35, [0.97, 0.06, 120, 0.6]),
      ellipse(x - size * 0.35, y - size * 0.35, size * 0.26, size * 0.22, [1, 0, 0, 0.95]))
  })
}
