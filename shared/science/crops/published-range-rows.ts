import type { Provenance, SourceKey } from '../sources'
import type { CropId } from './crop-ids'

/** `ph`: pH. `ec`: strength as electrical conductivity at 25 °C, mS/cm. */
export type RangedQuantity = 'ph' | 'ec'

/** A band that a publication gives for a crop, both ends included. */
export type PublishedRange = {
  readonly crops: readonly CropId[] | 'all'
  readonly quantity: RangedQuantity
  /** Equal to `high` where the publication prints a single value. */
  readonly low: number
  readonly high: number
  readonly source: SourceKey
  /** Page or table, empty where the source as a whole is meant. */
  readonly place: string
  readonly provenance: Provenance
  /** What the band holds for, in plain words. */
  readonly context: string
}

type LeafletRow = readonly [crop: CropId, ecLow: number, ecHigh: number, phLow: number, phHigh: number]

const leafletRows: readonly LeafletRow[] = [
  ['aubergine', 2.5, 3.5, 6.0, 6.0],
  ['basil', 1.0, 1.6, 5.5, 6.0],
  ['bean', 2.0, 4.0, 6.0, 6.0],
  ['broccoli', 2.8, 3.5, 6.0, 6.8],
  ['cabbage', 2.5, 3.0, 6.5, 7.0],
  ['celery', 1.8, 2.4, 6.5, 6.5],
  ['courgette', 1.8, 2.4, 6.0, 6.0],
  ['cucumber', 1.7, 2.0, 5.0, 5.5],
  ['leek', 1.4, 1.8, 6.5, 7.0],
  ['lettuce', 1.2, 1.8, 6.0, 7.0],
  ['okra', 2.0, 2.4, 6.5, 6.5],
  ['pak-choi', 1.5, 2.0, 7.0, 7.0],
  ['parsley', 1.8, 2.2, 6.0, 6.5],
  ['pepper', 0.8, 1.8, 5.5, 6.0],
  ['sage', 1.0, 1.6, 5.5, 6.5],
  ['spinach', 1.8, 2.3, 6.0, 7.0],
  ['strawberry', 1.8, 2.2, 6.0, 6.0],
  ['tomato', 2.0, 4.0, 6.0, 6.5],
]

const leaflet = { source: 'singh-dunn-2016', place: 'table 2', provenance: 'memory', context: 'hydroponics in general' } as const
const rockwool = { quantity: 'ec', source: 'sonneveld-voogt-2009', place: '', provenance: 'memory' } as const
const primer = { crops: ['pepper'], quantity: 'ec', source: 'produce-grower-peppers', place: '', provenance: 'seen' } as const
const handbook = { quantity: 'ec', source: 'carruthers-summary', place: '', provenance: 'seen' } as const

const leafyGreens = ['lettuce', 'pak-choi', 'spinach'] as const
const cucurbits = ['courgette', 'cucumber'] as const
const fruitingNightshades = ['aubergine', 'pepper', 'tomato'] as const

/**
 * Published bands of pH and strength, the rows of one crop in the order in
 * which they are shown. Sources disagree and are never averaged: pepper is 0.8
 * to 1.8 mS/cm in one and 2.0 to 2.5 in another.
 *
 * Left out: the lettuce handbook's 1.15 to 1.25 mS/cm, because it counts from
 * the strength of the source water and so cannot be held against a reading.
 *
 * @source singh-dunn-2016 table 2
 * @source sonneveld-voogt-2009 rockwool, drip and root zone
 */
export const PUBLISHED_RANGE_ROWS: readonly PublishedRange[] = [
  ...leafletRows.flatMap(([crop, ecLow, ecHigh, phLow, phHigh]): PublishedRange[] => [
    { ...leaflet, crops: [crop], quantity: 'ec', low: ecLow, high: ecHigh },
    { ...leaflet, crops: [crop], quantity: 'ph', low: phLow, high: phHigh },
  ]),
  { ...leaflet, crops: ['tomato'], quantity: 'ec', low: 2.0, high: 5.0, context: 'the same table as others quote it' },
  { ...primer, low: 0.5, high: 0.5, context: 'seedlings, before transplanting' },
  { ...primer, low: 2.0, high: 2.5, context: 'greenhouse, after transplanting' },
  { ...rockwool, crops: ['pepper'], low: 2.1, high: 2.1, context: 'rockwool, as the drip delivers it' },
  { ...rockwool, crops: ['pepper'], low: 2.7, high: 3.0, context: 'rockwool, in the root zone' },
  { ...rockwool, crops: ['tomato'], low: 2.6, high: 2.6, context: 'rockwool, as the drip delivers it' },
  { ...rockwool, crops: ['tomato'], low: 3.7, high: 4.0, context: 'rockwool, in the root zone' },
  { ...rockwool, crops: ['cucumber'], low: 2.2, high: 2.2, context: 'rockwool, as the drip delivers it' },
  { ...rockwool, crops: ['cucumber'], low: 2.7, high: 3.0, context: 'rockwool, in the root zone' },
  { ...handbook, crops: leafyGreens, low: 0.7, high: 1.5, context: 'leafy greens in winter' },
  { ...handbook, crops: leafyGreens, low: 1.5, high: 1.8, context: 'leafy greens in summer' },
  { ...handbook, crops: cucurbits, low: 1.6, high: 2.2, context: 'cucumber family' },
  { ...handbook, crops: fruitingNightshades, low: 2.5, high: 3.6, context: 'fruiting nightshades in summer' },
  { ...handbook, crops: fruitingNightshades, low: 3.6, high: 5.0, context: 'fruiting nightshades in winter' },
  {
    crops: ['basil'], quantity: 'ec', low: 0.5, high: 4.0, source: 'walters-currey-2018', place: '',
    provenance: 'seen', context: 'yield was the same across this band, at pH 6.0 and 22 °C',
  },
  {
    crops: ['lettuce'], quantity: 'ph', low: 5.6, high: 6.0, source: 'brechner-both-lettuce', place: '',
    provenance: 'memory', context: 'lettuce on ponds, set point 5.8',
  },
]
