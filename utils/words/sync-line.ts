import type { Tone } from '~/types/ui'
import { counted } from './numbers'

/** What a phone knows about what it has not sent. */
export type SyncSituation = {
  reason: 'sent' | 'sending' | 'no-signal' | 'server' | 'signed-out' | 'other-account' | 'update-needed' | 'store'
  changes: number
  photos: number
  attention: number
  /** An older tab keeps a new version of the store from opening. */
  oldTab: boolean
}

export type SyncWords = { text: string, tone: Tone, act: 'attention' | 'sign-in' | 'reload' | null, actLabel?: string }

/** "2 changes and 1 photo"; null when nothing waits. */
export function waitingWords(changes: number, photos: number, locale?: string): string | null {
  const parts = [
    ...(changes > 0 ? [counted(changes, 'change', 'changes', locale)] : []),
    ...(photos > 0 ? [counted(photos, 'photo', 'photos', locale)] : []),
  ]
  return parts.length > 0 ? parts.join(' and ') : null
}

const acts = {
  'attention': { act: 'attention', actLabel: 'See what to do' },
  'sign-in': { act: 'sign-in', actLabel: 'Sign in' },
  'reload': { act: 'reload', actLabel: 'Reload' },
  'none': { act: null },
} as const

/** The line that every screen shows: what is safe, and what has to happen for the rest. */
export function syncLine(situation: SyncSituation, locale?: string): SyncWords {
  const { changes, photos, attention } = situation
  if (situation.oldTab) {
    return { text: 'An older tab of Stillroot is open. Close the other tabs, then reload.', tone: 'chilli', ...acts.reload }
  }
  const waiting = waitingWords(changes, photos, locale)
  if (attention > 0) {
    const text = `${counted(attention, 'needs', 'need', locale)} attention`
    return { text: waiting ? `${text}, ${waiting} not sent` : text, tone: 'chilli', ...acts.attention }
  }
  return reasonWords(situation, waiting, changes + photos, locale)
}

function reasonWords(situation: SyncSituation, waiting: string | null, count: number, locale?: string): SyncWords {
  const wait = count === 1 ? 'waits' : 'wait'
  const items = counted(count, 'item', 'items', locale)
  switch (situation.reason) {
    case 'signed-out':
      return { text: waiting ? `Sign in to send ${items}` : 'Signed out. What is on this phone stays here.', tone: 'amber', ...acts['sign-in'] }
    case 'other-account':
      return { text: waiting ? `Somebody else is signed in here. Sign in again to send ${items}` : 'Somebody else is signed in here', tone: 'amber', ...acts['sign-in'] }
    case 'update-needed':
      return { text: waiting ? `Reload to get the new version, then ${waiting} can go` : 'Reload to get the new version', tone: 'amber', ...acts.reload }
    case 'store':
      return { text: 'This browser’s store does not answer. Reload the page.', tone: 'chilli', ...acts.reload }
    case 'no-signal':
      return waiting
        ? { text: `${waiting} ${wait} for signal`, tone: 'amber', ...acts.none }
        : { text: 'No signal. Everything is sent.', tone: 'water', ...acts.none }
    case 'server':
      return waiting
        ? { text: `${waiting} ${wait} for the server`, tone: 'amber', ...acts.none }
        : { text: 'The server does not answer. Everything is sent.', tone: 'water', ...acts.none }
    case 'sending':
      return { text: `Sending ${waiting ?? 'what is new'}`, tone: 'amber', ...acts.none }
    case 'sent':
      return { text: 'Everything is sent', tone: 'leaf', ...acts.none }
  }
}
