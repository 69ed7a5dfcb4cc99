import type { PhotoSubject } from '#shared/domain/photo.schema'

/** The colour a state is shown in; the words beside it say the same. */
export type Tone = 'leaf' | 'amber' | 'chilli' | 'water' | 'plain'

export type TabLink = { label: string, to: string }

/** One answer of a list of choices. */
export type Choice<T extends string = string> = { value: T, label: string }

/** Where a reading lies against what the crop wants. `far` asks for action, not only for a look. */
export type Verdict = { side: 'in' | 'below' | 'above', far?: boolean }

/** The span a crop wants a reading in. */
export type Aim = { low: number, high: number }

/** Whether the bytes of a photo are on this phone, still to come, or lost to it. */
export type PictureState = 'here' | 'waiting' | 'missing'

/** A photo as the screen shows it. */
export type PictureItem = {
  id: string
  src: string | null
  /** A tiny JPEG as base64, without its data: prefix. */
  placeholder: string | null
  subject: PhotoSubject
  day: number | null
  widthPx: number
  heightPx: number
  state: PictureState
}

/** A photo being added to an entry, before it is saved. */
export type PickedPhoto = {
  key: string
  src: string | null
  subject: PhotoSubject
  state: 'preparing' | 'ready' | 'failed'
  /** Why it cannot be used, when it failed. */
  message?: string
}

/** A comment with its writer's name. */
export type CommentItem = {
  id: string
  authorName: string
  /** What the writer is in the club, already in words; null for the plant's owner. */
  role: string | null
  text: string
  writtenAt: string
  unsent: boolean
  attention: boolean
  mine: boolean
}

/** Words of `FormErrorSummary`: which field, and what is wrong with it. */
export type FieldIssue = { fieldId: string, message: string }

/** A place of the app in the navigation. */
export type NavItem = { to: string, label: string, icon: string, count?: number }
