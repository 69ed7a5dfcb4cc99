import { useSessionStore } from '~/stores/session'

/** Screens of the journal open for the account that this phone knows, with or without signal. */
export default defineNuxtRouteMiddleware(async (to) => {
  if (import.meta.server) return
  const session = useSessionStore()
  await session.start()
  if (!session.signedIn) return navigateTo({ path: '/sign-in', query: { next: to.fullPath } })
})
