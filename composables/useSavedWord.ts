import { useState } from '#imports'

/** A word about something just saved, shown by the screen that comes next. */
export function useSavedWord() {
  return useState<string | null>('saved-word', () => null)
}
