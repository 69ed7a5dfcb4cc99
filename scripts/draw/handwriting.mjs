import { group, stroke } from './sheet.mjs'
import { smooth } from './geometry.mjs'
import { makeRandom } from './random.mjs'

/** Pen strokes of each letter in a box that is 1 high to the top of small letters; y runs down, the line is at 0. */
const LETTERS = {
  'a': { width: 0.95, strokes: [[[0.8, -0.85], [0.4, -1], [0.06, -0.6], [0.2, -0.08], [0.55, -0.12], [0.8, -0.55], [0.82, -0.9], [0.8, -0.3], [0.98, 0]]] },
  'b': { width: 0.85, strokes: [[[0.1, -1.9], [0.1, -0.9], [0.12, 0], [0.5, 0.02], [0.75, -0.45], [0.5, -0.9], [0.14, -0.55]]] },
  'c': { width: 0.75, strokes: [[[0.7, -0.82], [0.4, -1], [0.08, -0.6], [0.16, -0.1], [0.5, 0], [0.75, -0.2]]] },
  'd': {
    width: 0.95,
    strokes: [[
      [0.72, -0.8], [0.4, -0.98], [0.06, -0.55], [0.22, -0.05], [0.56, -0.15], [0.78, -0.7], [0.84, -1.9], [0.8, -0.5], [0.95, 0],
    ]],
  },
  'e': { width: 0.78, strokes: [[[0.1, -0.5], [0.5, -0.55], [0.68, -0.82], [0.4, -1], [0.08, -0.6], [0.18, -0.1], [0.5, 0], [0.76, -0.22]]] },
  'g': { width: 0.9, strokes: [[[0.76, -0.82], [0.4, -1], [0.08, -0.6], [0.22, -0.1], [0.6, -0.25], [0.78, -0.9], [0.8, 0.4], [0.45, 0.75], [0.12, 0.5]]] },
  'i': { width: 0.42, strokes: [[[0.14, -0.95], [0.14, -0.3], [0.36, 0]], [[0.16, -1.4], [0.2, -1.36]]] },
  'l': { width: 0.46, strokes: [[[0.16, -1.9], [0.14, -0.8], [0.2, -0.06], [0.44, -0.04]]] },
  'm': {
    width: 1.35,
    strokes: [[
      [0.08, -0.95], [0.12, -0.4], [0.12, 0], [0.14, -0.6], [0.4, -0.96], [0.62, -0.6], [0.62, 0], [0.66, -0.62], [0.94, -0.96],
      [1.14, -0.6], [1.16, -0.1], [1.34, 0],
    ]],
  },
  'n': { width: 0.9, strokes: [[[0.08, -0.95], [0.12, -0.4], [0.12, 0], [0.14, -0.6], [0.45, -0.96], [0.7, -0.6], [0.72, -0.1], [0.9, 0]]] },
  'o': { width: 0.86, strokes: [[[0.5, -0.98], [0.12, -0.7], [0.16, -0.1], [0.5, 0], [0.78, -0.4], [0.66, -0.9], [0.46, -0.98]]] },
  'p': { width: 0.85, strokes: [[[0.1, -0.95], [0.12, 0], [0.1, 0.8]], [[0.12, -0.6], [0.4, -0.98], [0.74, -0.6], [0.56, -0.06], [0.14, -0.1]]] },
  'r': { width: 0.7, strokes: [[[0.1, -0.95], [0.13, -0.4], [0.12, 0], [0.16, -0.6], [0.4, -0.95], [0.66, -0.86]]] },
  's': { width: 0.7, strokes: [[[0.6, -0.86], [0.34, -1], [0.12, -0.78], [0.36, -0.52], [0.6, -0.28], [0.4, 0], [0.08, -0.12]]] },
  't': { width: 0.66, strokes: [[[0.3, -1.6], [0.28, -0.6], [0.34, -0.04], [0.62, -0.1]], [[0.02, -1.02], [0.35, -1.06], [0.62, -1.04]]] },
  'u': { width: 0.92, strokes: [[[0.1, -0.95], [0.1, -0.4], [0.3, 0], [0.62, -0.2], [0.72, -0.92], [0.72, -0.3], [0.92, 0]]] },
  'y': { width: 0.85, strokes: [[[0.1, -0.95], [0.16, -0.4], [0.42, -0.2], [0.7, -0.5], [0.76, -0.95], [0.7, 0.2], [0.4, 0.75], [0.06, 0.6]]] },
  '0': { width: 1.05, strokes: [[[0.5, -1.75], [0.12, -1.2], [0.16, -0.3], [0.5, 0], [0.84, -0.4], [0.86, -1.3], [0.5, -1.75]]] },
  ' ': { width: 0.6, strokes: [] },
}

/** A word in soft pencil or marker; no two letters come out quite the same. */
export function written(text, { x, y, size, colour, seed, pen = 0.13, slant = 0.14 }) {
  const random = makeRandom(seed, text)
  let cursor = x
  const marks = [...text].map((letter) => {
    const { width, strokes } = LETTERS[letter]
    const rise = random.around(0, size * 0.05)
    const grow = size * random.between(0.94, 1.06)
    const lines = strokes.map(points => smooth(points.map(([px, py]) => [
      cursor + px * grow - py * grow * slant + random.around(0, size * 0.018), y + rise + py * grow + random.around(0, size * 0.018)])))
    cursor += width * size * 1.04
    return lines.map(line => stroke(line, colour, size * pen * random.between(0.88, 1.12)) + stroke(
      line, colour, size * pen * 0.5, { opacity: 0.5, transform: `translate(${random.around(0, 1.2)} 1.4)` },
    ))
  })
  return group({}, marks)
}
