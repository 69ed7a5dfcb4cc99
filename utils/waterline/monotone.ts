/**
 * Cubic interpolation that keeps a falling run falling: no dip or bump between
 * two points that the points do not show.
 * Source: F. N. Fritsch and R. E. Carlson (1980), Monotone piecewise cubic
 * interpolation, SIAM Journal on Numerical Analysis 17(2):238-246; the tangent
 * limit is their circle of radius 3.
 */
export type Knot = { at: number, value: number }
export type Curve = { knots: Knot[], slopes: number[] }

/** Knots in rising order of `at`, no two at one place. */
export function monotoneCurve(knots: readonly Knot[]): Curve {
  const secants = knots.slice(1).map((knot, index) => {
    const before = knots[index] ?? knot
    return (knot.value - before.value) / (knot.at - before.at)
  })
  const slopes = knots.map((_, index) => {
    const left = secants[index - 1]
    const right = secants[index]
    if (left === undefined || right === undefined) return left ?? right ?? 0
    return left * right <= 0 ? 0 : (left + right) / 2
  })
  secants.forEach((secant, index) => limitSlopes(slopes, index, secant))
  return { knots: [...knots], slopes }
}

function limitSlopes(slopes: number[], index: number, secant: number): void {
  if (secant === 0) {
    slopes[index] = 0
    slopes[index + 1] = 0
    return
  }
  const start = (slopes[index] ?? 0) / secant
  const end = (slopes[index + 1] ?? 0) / secant
  const radius = Math.hypot(start, end)
  if (radius <= 3) return
  slopes[index] = (3 / radius) * start * secant
  slopes[index + 1] = (3 / radius) * end * secant
}

/** Value at a place; before the first knot and after the last it keeps their value. */
export function curveAt({ knots, slopes }: Curve, at: number): number {
  const next = knots.findIndex(knot => knot.at > at)
  const right = knots[next]
  const left = knots[next - 1]
  if (!right) return knots.at(-1)?.value ?? 0
  if (!left) return right.value
  const width = right.at - left.at
  const t = (at - left.at) / width
  const startSlope = (slopes[next - 1] ?? 0) * width
  const endSlope = (slopes[next] ?? 0) * width
  return left.value * (1 + 2 * t) * (1 - t) ** 2 + startSlope * t * (1 - t) ** 2
    + right.value * t ** 2 * (3 - 2 * t) - endSlope * t ** 2 * (1 - t)
}
