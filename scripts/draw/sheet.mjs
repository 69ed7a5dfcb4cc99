import { css } from './colour.mjs'

/** Writes one SVG element. Missing attributes are left out. */
export function el(name, attributes = {}, ...children) {
  const written = Object.entries(attributes)
    .filter(([, value]) => value !== undefined && value !== null)
    .map(([key, value]) => ` ${key}="${value}"`)
    .join('')
  return `<${name}${written}>${children.flat(Infinity).join('')}</${name}>`
}

export const group = (attributes, ...children) => el('g', attributes, ...children)
export const path = (d, attributes) => el('path', { d, ...attributes })
export const fill = (d, colour, attributes = {}) => path(d, { fill: paint(colour), ...attributes })
export const stroke = (d, colour, width, attributes = {}) => path(d, {
  'fill': 'none', 'stroke': paint(colour), 'stroke-width': width,
  'stroke-linecap': 'round', 'stroke-linejoin': 'round', ...attributes,
})
export const ellipse = (cx, cy, rx, ry, colour, attributes = {}) => el('ellipse', { cx, cy, rx, ry, fill: paint(colour), ...attributes })
export const rectangle = (x, y, width, height, colour, attributes = {}) => el('rect', { x, y, width, height, fill: paint(colour), ...attributes })

const paint = colour => (Array.isArray(colour) ? css(colour) : colour)

/** One picture: collects its gradients, filters and clips, and writes the finished SVG. */
export function makeSheet(width, height) {
  const definitions = []
  function define(write) {
    const id = `d${definitions.length}`
    definitions.push(write(id))
    return `url(#${id})`
  }
  const stops = list => list.map(([offset, colour]) => el('stop', { 'offset': offset, 'stop-color': paint(colour) }))
  return {
    width,
    height,
    define,
    linear: (from, to, list) => define(id => el('linearGradient', {
      id, gradientUnits: 'userSpaceOnUse', x1: from[0], y1: from[1], x2: to[0], y2: to[1],
    }, stops(list))),
    radial: (centre, radius, list, transform) => define(id => el('radialGradient', {
      id, gradientUnits: 'userSpaceOnUse', cx: centre[0], cy: centre[1], r: radius, gradientTransform: transform,
    }, stops(list))),
    clip: (...shapes) => define(id => el('clipPath', { id }, shapes)),
    filter: (steps, reach = 0.2) => define(id => el('filter', {
      'id': id, 'x': -reach, 'y': -reach, 'width': 1 + reach * 2, 'height': 1 + reach * 2, 'color-interpolation-filters': 'sRGB',
    }, steps)),
    finish: (...children) => el('svg', {
      xmlns: 'http://www.w3.org/2000/svg', width, height, viewBox: `0 0 ${width} ${height}`,
    }, el('defs', {}, definitions), children),
  }
}
