/**
 * Colours as [lightness 0..1, chroma 0..0.4, hue in degrees, alpha 0..1] of CSS oklch().
 * Steps in this space look even to the eye, so shading by numbers stays natural.
 */

export function css([lightness, chroma, hue, alpha = 1]) {
  return `oklch(${lightness.toFixed(3)} ${chroma.toFixed(3)} ${hue.toFixed(1)} / ${alpha.toFixed(3)})`
}

export function lighter([l, c, h, a = 1], by) {
  return [Math.min(1, Math.max(0, l + by)), c, h, a]
}

export function faded([l, c, h], alpha) {
  return [l, c, h, alpha]
}

/** Mixes on the straight line between two colours, so no foreign hue appears on the way. */
export function blend(first, second, share) {
  const [l1, c1, h1, a1 = 1] = first
  const [l2, c2, h2, a2 = 1] = second
  const x = mid(c1 * cosine(h1), c2 * cosine(h2), share)
  const y = mid(c1 * sine(h1), c2 * sine(h2), share)
  return [mid(l1, l2, share), Math.hypot(x, y), Math.atan2(y, x) * 180 / Math.PI, mid(a1, a2, share)]
}

export function vary(random, [l, c, h, a = 1], amount = 1) {
  return [random.around(l, 0.035 * amount), Math.max(0, random.around(c, 0.012 * amount)), random.around(h, 5 * amount), a]
}

const mid = (from, to, share) => from + (to - from) * share
const cosine = degrees => Math.cos(degrees * Math.PI / 180)
const sine = degrees => Math.sin(degrees * Math.PI / 180)
