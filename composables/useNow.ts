import { onScopeDispose, ref } from 'vue'

const TICK_MILLISECONDS = 30_000

/** The present moment, kept so while a screen stays open. */
export function useNow() {
  const now = ref(new Date())
  const timer = setInterval(() => now.value = new Date(), TICK_MILLISECONDS)
  onScopeDispose(() => clearInterval(timer))
  return now
}
