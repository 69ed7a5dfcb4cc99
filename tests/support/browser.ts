/**
 * A real browser in a phone's shape that remembers everything it had to complain about.
 */
import type { Browser, BrowserContext, BrowserContextOptions, ConsoleMessage, Page } from 'playwright-core'
import { chromium } from 'playwright-core'
import { fromTestCommand } from './environment'

const LOCAL_HOSTS = new Set(['127.0.0.1', 'localhost'])
const HYDRATION = /hydrat/i

const PHONE: BrowserContextOptions = {
  viewport: { width: 390, height: 844 },
  deviceScaleFactor: 2,
  hasTouch: true,
  isMobile: true,
  locale: 'en-GB',
  timezoneId: 'UTC',
}

export interface WatchedPage {
  page: Page
  context: BrowserContext
  /** Says that a complaint is meant to happen here, e.g. a failed request while the test is offline. */
  tolerate: (pattern: RegExp) => void
  complaints: () => string[]
  /** Fails the test when the pages of this context had anything to complain about. */
  assertClean: () => void
  close: () => Promise<void>
}

export function launchBrowser(): Promise<Browser> {
  return chromium.launch({
    executablePath: fromTestCommand('STILLROOT_CHROMIUM'),
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
      // A page that asks for anything outside gets nothing, besides being told on below.
      '--host-resolver-rules=MAP * ~NOTFOUND, EXCLUDE 127.0.0.1, EXCLUDE localhost',
    ],
  })
}

export async function newPhonePage(browser: Browser, options: BrowserContextOptions = {}): Promise<WatchedPage> {
  const context = await browser.newContext({ ...PHONE, ...options })
  const seen: string[] = []
  const tolerated: RegExp[] = []
  watch(context, complaint => seen.push(complaint))
  const complaints = () => seen.filter(text => !tolerated.some(pattern => pattern.test(text)))
  return {
    page: await context.newPage(),
    context,
    tolerate: pattern => tolerated.push(pattern),
    complaints,
    assertClean: () => {
      const open = complaints()
      if (open.length > 0) throw new Error(`The browser complained:\n${open.map(text => `- ${text}`).join('\n')}`)
    },
    close: () => context.close(),
  }
}

function watch(context: BrowserContext, complain: (text: string) => void) {
  context.on('console', (message) => {
    if (isComplaint(message)) complain(`console ${message.type()}: ${message.text()} (${message.location().url})`)
  })
  context.on('weberror', webError => complain(`page error: ${webError.error().stack ?? webError.error().message}`))
  context.on('request', (request) => {
    if (leavesThisMachine(request.url())) complain(`request to the outside: ${request.url()}`)
  })
  context.on('page', page => page.on('websocket', (socket) => {
    if (leavesThisMachine(socket.url())) complain(`connection to the outside: ${socket.url()}`)
  }))
}

/** Content-security violations arrive as console errors, hydration mismatches as either kind. */
function isComplaint(message: ConsoleMessage) {
  return message.type() === 'error' || (message.type() === 'warning' && HYDRATION.test(message.text()))
}

function leavesThisMachine(address: string) {
  const { protocol, hostname } = new URL(address)
  return !['data:', 'blob:', 'about:'].includes(protocol) && !LOCAL_HOSTS.has(hostname)
}
