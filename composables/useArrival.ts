import { computed, watch } from 'vue'
import { useSessionStore } from '~/stores/session'
import { useSyncStore } from '~/stores/sync'
import { safeNext } from '~/utils/next-path'

/** Where sign-in and sign-up lead to, and the way there for who is signed in already. */
export function useArrival() {
  const session = useSessionStore()
  const sync = useSyncStore()
  const route = useRoute()
  const next = computed(() => safeNext(route.query.next))
  const query = computed(() => (next.value === safeNext(undefined) ? '' : `?next=${encodeURIComponent(next.value)}`))
  const mustSignIn = computed(() => sync.reason === 'signed-out' || sync.reason === 'other-account')

  if (import.meta.client) {
    watch(() => session.signedIn && !mustSignIn.value, (settled) => {
      if (settled) void navigateTo(next.value, { replace: true })
    }, { immediate: true })
  }

  return { next, query }
}
