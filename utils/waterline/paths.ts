export type Point = { x: number, y: number }

const short = (value: number): string => String(Math.round(value * 100) / 100)

/** An open line through points; empty for fewer than two. */
export function linePath(points: readonly Point[]): string {
  if (points.length < 2) return ''
  return points.map(({ x, y }, index) => `${index === 0 ? 'M' : 'L'}${short(x)} ${short(y)}`).join('')
}

export function areaPath(points: readonly Point[]): string {
  return points.length < 3 ? '' : `${linePath(points)}Z`
}

/** A soft line: each point is the handle of a curve between the middles of its neighbours. */
export function softPath(points: readonly Point[]): string {
  const [first, ...rest] = points
  const last = rest.at(-1)
  if (!first || !last) return ''
  const curves = rest.slice(0, -1).map((point, index) => {
    const next = rest[index + 1] ?? point
    return `Q${short(point.x)} ${short(point.y)} ${short((point.x + next.x) / 2)} ${short((point.y + next.y) / 2)}`
  })
  return `M${short(first.x)} ${short(first.y)}${curves.join('')}L${short(last.x)} ${short(last.y)}`
}

/** A number from 0 to 1 that looks random and is the same each time, so that a drawing does not jump. */
export function steadyNoise(seed: number): number {
  const value = Math.sin(seed * 12.9898 + 4.137) * 43_758.5453
  return value - Math.floor(value)
}
