import { rootsScene } from './scene-roots.mjs'
import { leafScene } from './scene-leaf.mjs'
import { wholeScene } from './scene-whole.mjs'
import { toteScene } from './scene-lettuce.mjs'
import { basilHarvest, labelScene, lettuceHarvest, setUpScene, tomatoHarvest } from './scene-table.mjs'
import { flowerScene, trussScene } from './scene-close.mjs'

/** Measures in cm, as in the demo's vessels, so that a drawn air gap is the logged one. */
const BUCKET = { top: 29, bottom: 26, cupBottom: 23.5, cupDepth: 12, cupRim: 15, cupBottomRadius: 5.4 }
const TUB = { top: 24, bottom: 21, cupBottom: 14.5, cupDepth: 7.5, cupRim: 7.6, cupBottomRadius: 2.9 }
const SMALL_BUCKET = { top: 26.5, bottom: 22, cupBottom: 17, cupDepth: 11, cupRim: 15, cupBottomRadius: 5.2 }
const BOTTLE = { top: 15.5, bottom: 15.5, cupBottom: 19, cupDepth: 5, cupRim: 5, cupBottomRadius: 1.9 }
const TOTE = { top: 60, bottom: 54, cupBottom: 15, cupDepth: 5, cupRim: 5, cupBottomRadius: 1.9 }

const MAUVE = { petal: [0.64, 0.13, 312], heart: [0.82, 0.165, 90] }
const WHITE = { petal: [0.95, 0.012, 110], heart: [0.6, 0.09, 290] }
const YOUNG_AUBERGINE = { length: 0.15, width: 0.085, colour: [0.27, 0.08, 320], cap: [0.45, 0.08, 140] }

const tomato = { seed: 'button', vessel: BUCKET, count: 32 }
const tomatoRoots = day => (gap, more) => () => rootsScene({ ...tomato, day, gap, ...more })
const tomatoWhole = plant => () => wholeScene({ kind: 'tomato', seed: 'button', plant })
const aubergine = { seed: 'plum', vessel: BUCKET, count: 26, tone: [0.4, 0.05, 245], cmPerDay: 1 }
const aubergineWhole = (light, plant) => () => wholeScene({ kind: 'aubergine', seed: 'plum', light, vessel: { tone: 'blue' }, plant })
const doorVessel = { top: 190, bottom: 168, height: 290, cup: 76, tone: 'cream' }
const basilWhole = (seed, vessel, plant, light) => () => wholeScene({ kind: 'basil', seed, light, vessel, at: [480, 905], plant })
const lettuce = { seed: 'row', vessel: TOTE, count: 24, tone: [0.62, 0.03, 85], cmPerDay: 0.6, lastBirth: 16, clump: 0.62 }
const tote = more => () => toteScene({ seed: 'row', ...more })

export const pictures = {
  'tomato-set-up': () => setUpScene({ seed: 'button' }),
  'tomato-label': () => labelScene({ seed: 'button', lines: ['tomato', 'day 0'] }),
  'tomato-roots-00': tomatoRoots(0)(0, { soak: 1.5 }),
  'tomato-roots-07': tomatoRoots(7)(0, { soak: 0.5 }),
  'tomato-roots-14': tomatoRoots(14)(3, { fuzz: 0.4 }),
  'tomato-roots-21': tomatoRoots(21)(6, { fuzz: 0.7 }),
  'tomato-roots-28': tomatoRoots(28)(9, { fuzz: 0.9 }),
  'tomato-roots-35': tomatoRoots(35)(11.5, { fuzz: 1, colour: 'cream' }),
  'tomato-whole-00': tomatoWhole({ height: 210, leaves: 6 }),
  'tomato-whole-14': tomatoWhole({ height: 360, leaves: 9, trusses: [{ share: 0.72, side: 1, flowers: 3 }] }),
  'tomato-whole-28': tomatoWhole({ height: 490, leaves: 13, trusses: [{ share: 0.66, side: 1, flowers: 3 }, { share: 0.5, side: -1, fruits: [0, 0, 0] }] }),
  'tomato-whole-44': tomatoWhole({
    height: 560, leaves: 14, yellow: 0.25,
    trusses: [
      { share: 0.68, side: 1, fruits: [0, 0, 0.1] }, { share: 0.5, side: -1, fruits: [0.3, 0.6, 0.88] },
      { share: 0.4, side: 1, fruits: [0.45, 0.92] },
    ],
  }),
  'tomato-leaf-10': () => leafScene({ kind: 'tomato', seed: 'button-leaf', dew: 9 }),
  'tomato-flower-08': () => trussScene({ seed: 'buttonf', flowers: 5 }),
  'tomato-fruit-42': () => trussScene({ seed: 'button', fruits: [0.72, 0.45, 0.2, 0.06, 0.03, 0] }),
  'tomato-harvest-47': () => tomatoHarvest({ seed: 'button', count: 18 }),

  'basil-whole-03': basilWhole('door', doorVessel, { height: 270, pairs: 3, stems: 3, shoots: false }, 'morning'),
  'basil-leaf-07': () => leafScene({ kind: 'basil', seed: 'door-leaf', dew: 5, light: 'noon' }),
  'basil-leaf-18': () => leafScene({ kind: 'basil', seed: 'door-leaf', yellow: 0.85, light: 'noon' }),
  'basil-whole-18': basilWhole('door', doorVessel, { height: 540, pairs: 5, yellowTop: 0.95 }, 'noon'),
  'basil-roots-18': () => rootsScene({ seed: 'door', vessel: TUB, day: 18, gap: 4, count: 32, fuzz: 0.5, clump: 0.7, cmPerDay: 0.75, tone: [0.62, 0.03, 85] }),
  'basil-leaf-26': () => leafScene({ kind: 'basil', seed: 'door-leaf', yellow: 0.22, neighbours: 0.3, light: 'noon' }),
  'basil-harvest-29': () => basilHarvest({ seed: 'door' }),

  'pepper-whole-16': () => wholeScene({
    kind: 'pepper', seed: 'window', light: 'cloudy', vessel: { tone: 'terracotta', height: 290 }, at: [480, 910],
    plant: { height: 420, leaves: 15, size: 0.36, flowers: [{ x: 0.12, y: 0.66, size: 0.05, ...WHITE }] },
  }),

  'lettuce-set-up': tote({ size: 0.12, leaves: 6 }),
  'lettuce-roots-14': () => rootsScene({ ...lettuce, day: 14, gap: 1.5, fuzz: 0.3 }),
  'lettuce-whole-21': tote({ size: 0.68, leaves: 15 }),
  'lettuce-roots-28': () => rootsScene({ ...lettuce, day: 28, gap: 7, fuzz: 0.9 }),
  'lettuce-whole-34': tote({ size: 1, leaves: 19 }),
  'lettuce-harvest-36': () => lettuceHarvest({ seed: 'row' }),

  'bottle-basil-roots-08': () => rootsScene({
    seed: 'kitchen', vessel: BOTTLE, day: 8, gap: 1, count: 26, clump: 0.7, cmPerDay: 0.8, tone: [0.7, 0.012, 230], lastBirth: 14,
  }),
  'bottle-basil-whole-20': basilWhole(
    'kitchen', { top: 122, bottom: 122, height: 300, cup: 58, tone: 'silver', band: false }, { height: 500, pairs: 5 }, 'morning',
  ),

  'aubergine-roots-14': () => rootsScene({ ...aubergine, day: 14, gap: 3.5, fuzz: 0.4 }),
  'aubergine-roots-22': () => rootsScene({ ...aubergine, day: 22, gap: 8, fuzz: 0.3, colour: 'tan' }),
  'aubergine-flower-26': () => flowerScene({ seed: 'plum' }),
  'aubergine-whole-30': aubergineWhole(
    'evening',
    {
      height: 540, leaves: 13, flowers: [{ x: 0.1, y: 0.68, size: 0.062, ...MAUVE }, { x: -0.16, y: 0.8, size: 0.05, ...MAUVE, turn: 1 }],
      fruits: [{ x: -0.12, y: 0.55, ...YOUNG_AUBERGINE }],
    },
  ),
  'aubergine-roots-31': () => rootsScene({ ...aubergine, day: 31, gap: 9.5, fuzz: 0.7, colour: 'tan', newColour: 'white', newShare: 0.75 }),

  'lost-pepper-whole-14': () => wholeScene({
    kind: 'pepper', seed: 'corner', light: 'noon', vessel: { tone: 'slate', height: 290 }, at: [480, 910],
    plant: { height: 330, leaves: 12, size: 0.36, droop: 1, yellow: 0.35 },
  }),
  'lost-pepper-roots-16': () => rootsScene({
    seed: 'corner', vessel: SMALL_BUCKET, day: 12, gap: 1.5, count: 20, colour: 'brown', water: 'murky', bushy: 0.7, clump: 1.5,
  }),

  'second-lettuce-label': () => labelScene({ seed: 'second', lines: ['lettuce', 'day 0'], tone: 'cream', turn: 3 }),
}
