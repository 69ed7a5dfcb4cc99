/// <reference lib="webworker" />
import { clientsClaim } from 'workbox-core'
import { cleanupOutdatedCaches, matchPrecache, precacheAndRoute } from 'workbox-precaching'
import { NavigationRoute, registerRoute } from 'workbox-routing'

declare const self: ServiceWorkerGlobalScope

/** How long a page may take to come from the server before the stored shell opens instead. */
const NAVIGATION_MILLISECONDS = 4_000
/** The page without content that every address can start from. */
const SHELL = '/200.html'

precacheAndRoute(self.__WB_MANIFEST)
cleanupOutdatedCaches()
clientsClaim()

// Records and photos never go through a cache that is keyed by address: they
// belong to an account, and the journal's own store keeps them.
registerRoute(new NavigationRoute(openPage, { denylist: [/^\/api\//] }))

async function openPage({ request }: { request: Request }): Promise<Response> {
  try {
    return await fetch(request, { signal: AbortSignal.timeout(NAVIGATION_MILLISECONDS) })
  } catch {
    return await matchPrecache(SHELL) ?? Response.error()
  }
}

// A new version waits until the person says so.
self.addEventListener('message', (event) => {
  if (event.data?.type === 'SKIP_WAITING') void self.skipWaiting()
})
