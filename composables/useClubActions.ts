import { ref } from 'vue'
import type { FormAnswer } from '~/utils/offline/account-api'

/** Runs what a steward or member asks of the server, one after the other, and keeps the word on what went wrong. */
export function useClubActions() {
  const busy = ref(false)
  const failure = ref<string | null>(null)

  /** The answer's body; null when it did not work, with the reason in `failure`. */
  async function run<T>(work: () => Promise<FormAnswer<T>>): Promise<T | null> {
    if (busy.value) return null
    busy.value = true
    failure.value = null
    const answer = await work()
    busy.value = false
    if (answer.ok) return answer.body
    failure.value = answer.message
    return null
  }

  return { busy, failure, run }
}
