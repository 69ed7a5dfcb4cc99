import { useJournalStore } from '~/stores/journal'
import { useSessionStore } from '~/stores/session'

/**
 * Puts the phone side together: opens the journal and starts syncing whenever
 * something suggests that it may work now. None of these hints is trusted to
 * come; the runner's own clock is.
 */
export default defineNuxtPlugin((nuxtApp) => {
  const session = useSessionStore()
  const journal = useJournalStore()
  const kick = () => journal.phone?.runner.kick()

  window.addEventListener('online', kick)
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'visible') kick()
  })
  nuxtApp.hook('app:mounted', () => void session.start())
})
