import { el } from './sheet.mjs'

/** Soft focus. */
export const blur = (sheet, radius) => sheet.filter([el('feGaussianBlur', { stdDeviation: radius })], 0.8)

/** Edges that look laid down by a brush: every outline is pushed about a little. */
export const brushed = (sheet, amount, size = 0.02, seed = 3) => sheet.filter([
  el('feTurbulence', { type: 'fractalNoise', baseFrequency: size, numOctaves: 3, seed, result: 'noise' }),
  el('feDisplacementMap', { in: 'SourceGraphic', in2: 'noise', scale: amount, xChannelSelector: 'R', yChannelSelector: 'G' }),
])

/** Light falling over raised lines: the drawn lines are the relief, the result is laid over with "soft-light". */
export const relief = (sheet, radius, height, azimuth = 225) => sheet.filter([
  el('feGaussianBlur', { in: 'SourceAlpha', stdDeviation: radius, result: 'height' }),
  el('feDiffuseLighting', { 'in': 'height', 'surfaceScale': height, 'diffuseConstant': 1, 'lighting-color': '#fff' },
    el('feDistantLight', { azimuth, elevation: 45 })),
])

/** A cloud of one colour, for mottling, sediment or stains. */
export const cloud = (sheet, frequency, seed, contrast = 2.2, octaves = 3) => sheet.filter([
  el('feTurbulence', { type: 'fractalNoise', baseFrequency: frequency, numOctaves: octaves, seed, result: 'noise' }),
  el('feColorMatrix', {
    in: 'noise', type: 'matrix', result: 'mask',
    values: `0 0 0 0 0  0 0 0 0 0  0 0 0 0 0  ${contrast} 0 0 0 ${(-0.5 * contrast + 0.3).toFixed(2)}`,
  }),
  el('feComposite', { in: 'SourceGraphic', in2: 'mask', operator: 'in' }),
])
