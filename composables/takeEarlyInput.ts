import type { Ref } from 'vue'

/**
 * Takes up what was typed, or filled in by a password manager, while the page
 * that the server sent was not awake yet; waking up would empty the field.
 */
export function takeEarlyInput(fieldId: string, text: Ref<string>): void {
  if (!import.meta.client || !useNuxtApp().isHydrating) return
  const field = document.getElementById(fieldId)
  if (field instanceof HTMLInputElement && field.value !== '') text.value = field.value
}
