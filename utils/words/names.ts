import type { ClubRole } from '#shared/domain/club.schema'
import type { EntryAction, TopUpKind } from '#shared/domain/entry.schema'
import type { PhotoSubject } from '#shared/domain/photo.schema'
import type { EndReason, Visibility } from '#shared/domain/plant.schema'
import type { VesselKind, VesselShape } from '#shared/domain/vessel.schema'
import type { Choice } from '~/types/ui'

export const SUBJECT_WORDS: Record<PhotoSubject, string> = {
  'roots': 'Roots',
  'leaf': 'Leaf',
  'whole': 'Whole plant',
  'fruit': 'Fruit',
  'set-up': 'Set-up',
  'label': 'Label',
}

export const ACTION_WORDS: Record<EntryAction, string> = {
  'set-up': 'Set up',
  'topped-up': 'Topped up',
  'changed-solution': 'Changed solution',
  'swirled': 'Swirled',
  'covered': 'Covered',
  'pruned': 'Pruned',
  'harvested': 'Harvested',
  'moved': 'Moved',
  'rained-in': 'Rained in',
}

export const TOP_UP_WORDS: Record<TopUpKind, string> = {
  'plain-water': 'Plain water',
  'half-strength': 'Half strength',
  'full-strength': 'Full strength',
  'other': 'Something else',
}

export const ROLE_WORDS: Record<ClubRole, string> = { grower: 'Grower', mentor: 'Mentor', steward: 'Steward' }

export const VISIBILITY_WORDS: Record<Visibility, string> = { private: 'Only you', club: 'Shared with the club' }

export const END_REASON_WORDS: Record<EndReason, string> = {
  'finished': 'Finished', 'died': 'Died', 'gave-up': 'Gave up', 'accident': 'Accident',
}

export const VESSEL_KIND_WORDS: Record<VesselKind, string> = {
  bucket: 'Bucket', tub: 'Tub', tote: 'Tote', bottle: 'Bottle', other: 'Something else',
}

export const VESSEL_SHAPE_WORDS: Record<VesselShape, string> = {
  round: 'Round', rectangular: 'With four sides', unmeasured: 'Not measured',
}

/** A word list as answers to choose from, in the order of `values`. */
export function choices<T extends string>(values: readonly T[], words: Record<T, string>): Choice<T>[] {
  return values.map(value => ({ value, label: words[value] }))
}
