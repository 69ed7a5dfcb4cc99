/**
 * Crops the journal knows. An id never changes; names are for reading.
 *
 * @source common practice, no source
 */
export const CROP_IDS = [
  'aubergine', 'basil', 'bean', 'broccoli', 'cabbage', 'celery', 'courgette', 'cucumber', 'leek', 'lettuce',
  'okra', 'pak-choi', 'parsley', 'pepper', 'sage', 'spinach', 'strawberry', 'tomato', 'other',
] as const
export type CropId = (typeof CROP_IDS)[number]
