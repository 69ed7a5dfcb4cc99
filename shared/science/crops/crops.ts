import { CROP_IDS, type CropId } from './crop-ids'

export type Crop = {
  readonly id: CropId
  /** As a label: "Pepper". */
  readonly name: string
  readonly plural: string
  /** What growers elsewhere call it, so that a search by either word finds it. */
  readonly alsoCalled: string | null
}

const words: Record<CropId, readonly [name: string, plural: string, alsoCalled: string | null]> = {
  'aubergine': ['Aubergine', 'Aubergines', 'eggplant'],
  'basil': ['Basil', 'Basil plants', null],
  'bean': ['Bean', 'Beans', null],
  'broccoli': ['Broccoli', 'Broccoli plants', null],
  'cabbage': ['Cabbage', 'Cabbages', null],
  'celery': ['Celery', 'Celery plants', null],
  'courgette': ['Courgette', 'Courgettes', 'zucchini, marrow'],
  'cucumber': ['Cucumber', 'Cucumbers', null],
  'leek': ['Leek', 'Leeks', null],
  'lettuce': ['Lettuce', 'Lettuces', null],
  'okra': ['Okra', 'Okra plants', 'gumbo'],
  'pak-choi': ['Pak choi', 'Pak choi plants', 'bok choy'],
  'parsley': ['Parsley', 'Parsley plants', null],
  'pepper': ['Pepper', 'Peppers', 'chilli, capsicum'],
  'sage': ['Sage', 'Sage plants', null],
  'spinach': ['Spinach', 'Spinach plants', null],
  'strawberry': ['Strawberry', 'Strawberries', null],
  'tomato': ['Tomato', 'Tomatoes', null],
  'other': ['Another crop', 'Other crops', null],
}

/**
 * The crop behind an id, with the words people use for it.
 *
 * @source common practice, no source
 */
export function cropOf(id: CropId): Crop {
  const [name, plural, alsoCalled] = words[id]
  return { id, name, plural, alsoCalled }
}

/**
 * Every crop in the order of a picker: by name, "Another crop" last.
 *
 * @source common practice, no source
 */
export function allCrops(): Crop[] {
  return CROP_IDS.map(cropOf)
}
