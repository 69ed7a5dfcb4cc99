/** Points are [x, y] in px unless a function says otherwise. */

export const mid = (from, to, share) => from + (to - from) * share
export const midPoint = (from, to, share) => [mid(from[0], to[0], share), mid(from[1], to[1], share)]
export const clamp = (value, low, high) => Math.min(high, Math.max(low, value))
export const away = (point, angle, distance) => [point[0] + Math.cos(angle) * distance, point[1] + Math.sin(angle) * distance]
export const distance = (a, b) => Math.hypot(a[0] - b[0], a[1] - b[1])
export const degrees = value => value * Math.PI / 180

const short = value => Number(value.toFixed(1))
export const at = point => `${short(point[0])} ${short(point[1])}`

/** A soft line through all points (Catmull-Rom as cubic Bézier pieces). */
export function smooth(points, closed = false) {
  const count = points.length
  const pointAt = index => (closed ? points[(index + count) % count] : points[clamp(index, 0, count - 1)])
  let path = `M${at(points[0])}`
  for (let index = 0; index < (closed ? count : count - 1); index += 1) {
    const [before, from, to, after] = [pointAt(index - 1), pointAt(index), pointAt(index + 1), pointAt(index + 2)]
    const first = [from[0] + (to[0] - before[0]) / 6, from[1] + (to[1] - before[1]) / 6]
    const second = [to[0] - (after[0] - from[0]) / 6, to[1] - (after[1] - from[1]) / 6]
    path += `C${at(first)} ${at(second)} ${at(to)}`
  }
  return closed ? `${path}Z` : path
}

export function straight(points, closed = false) {
  return `M${points.map(at).join('L')}${closed ? 'Z' : ''}`
}

/** Direction of a line at one of its points, as an angle. */
export function headingAt(points, index) {
  const from = points[Math.max(0, index - 1)]
  const to = points[Math.min(points.length - 1, index + 1)]
  return Math.atan2(to[1] - from[1], to[0] - from[0])
}

/** Outline of a line that has a width of its own at every share of its length. */
export function ribbon(points, widthAt) {
  const left = []
  const right = []
  points.forEach((point, index) => {
    const half = widthAt(index / Math.max(1, points.length - 1)) / 2
    const angle = headingAt(points, index)
    left.push(away(point, angle - Math.PI / 2, half))
    right.push(away(point, angle + Math.PI / 2, half))
  })
  return smooth([...left, ...right.reverse()], true)
}

/** Points along a cubic Bézier curve. */
export function curve(p0, p1, p2, p3, steps = 16) {
  return Array.from({ length: steps + 1 }, (_, index) => {
    const t = index / steps
    const [a, b, c, d] = [(1 - t) ** 3, 3 * t * (1 - t) ** 2, 3 * t * t * (1 - t), t ** 3]
    return [a * p0[0] + b * p1[0] + c * p2[0] + d * p3[0], a * p0[1] + b * p1[1] + c * p2[1] + d * p3[1]]
  })
}

/** The point at a share of a line's list of points, between neighbours where it falls between. */
export function along(points, share) {
  const exact = clamp(share, 0, 1) * (points.length - 1)
  const index = Math.min(points.length - 2, Math.floor(exact))
  return midPoint(points[index], points[index + 1], exact - index)
}
