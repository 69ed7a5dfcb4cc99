import { mkdir } from 'node:fs/promises'
import { join } from 'node:path'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import accounts from '#server/demo/accounts.json'
import type { RunningApp } from '../support/app-server'
import { startApp } from '../support/app-server'
import type { WatchedPage } from '../support/browser'
import { launchBrowser, newPhonePage } from '../support/browser'
import { axeViolations } from './support/axe'
import { signIn, syncLineSays } from './support/screens'

/**
 * Every screen with the demo's records and with none, on a phone and on a wide
 * screen, by day and by night: free of axe's violations, and nothing to
 * complain about in the console. Pictures of all of them are left behind.
 */
const PICTURES = process.env.STILLROOT_SCREENSHOTS ?? join(process.cwd(), 'test-results/screens')

const looks = [
  { name: 'phone-day', viewport: { width: 390, height: 844 }, colorScheme: 'light' },
  { name: 'phone-night', viewport: { width: 390, height: 844 }, colorScheme: 'dark' },
  { name: 'wide-day', viewport: { width: 1_280, height: 800 }, colorScheme: 'light', isMobile: false, hasTouch: false },
  { name: 'wide-night', viewport: { width: 1_280, height: 800 }, colorScheme: 'dark', isMobile: false, hasTouch: false },
] as const

let app: RunningApp
let browser: Browser

beforeAll(async () => {
  [app, browser] = await Promise.all([startApp({ demo: true }), launchBrowser()])
  await mkdir(PICTURES, { recursive: true })
}, 360_000)

afterAll(async () => {
  await browser?.close()
  await app?.dispose()
})

/** Opens a page, waits until it has settled, and says everything that is wrong with it. */
async function look({ page }: WatchedPage, path: string, name: string): Promise<string[]> {
  await page.goto(app.origin + path)
  await page.getByRole('heading', { level: 1 }).first().waitFor()
  await page.waitForLoadState('networkidle')
  await page.waitForTimeout(400)
  await page.screenshot({ path: join(PICTURES, `${name}.png`), fullPage: true })
  const headings = await page.getByRole('heading', { level: 1 }).count()
  const title = await page.title()
  return [
    ...await axeViolations(page),
    ...headings === 1 ? [] : [`${headings} level-one headings`],
    ...title.length > 3 ? [] : ['no title'],
  ].map(problem => `${name}: ${problem}`)
}

describe.each(looks)('$name', ({ name, ...options }) => {
  it('shows every public page without a fault', async () => {
    const phone = await newPhonePage(browser, options)
    phone.tolerate(/\/no-such-page|status of 404/)
    const problems: string[] = []
    for (const [path, short] of [['/', 'landing'], ['/sign-in', 'sign-in'], ['/sign-up', 'sign-up'], [`/join/${'A'.repeat(43)}`, 'join-unknown'], ['/no-such-page', 'not-found']] as const) {
      problems.push(...await look(phone, path, `${name}-${short}`))
    }
    await phone.close()
    expect(problems).toEqual([])
    phone.assertClean()
  })

  it('shows every screen of the journal with real records without a fault', async () => {
    const phone = await newPhonePage(browser, options)
    const [first] = accounts
    if (!first) throw new Error('the demo has no accounts')
    await signIn(phone.page, app.origin, first.email, first.password)
    await syncLineSays(phone.page, /Everything is sent/)
    await phone.page.goto(`${app.origin}/plants`)
    const plant = await phone.page.getByRole('link', { name: /Button/ }).first().getAttribute('href')
    if (!plant) throw new Error('the demo’s grower has no plant')
    const log = plant.replace('/plants/', '/log/')
    const problems: string[] = []
    for (const [path, short] of [
      ['/today', 'today'], ['/plants', 'plants'], ['/plants/new', 'plant-new'], [plant, 'plant'], [`${plant}/edit`, 'plant-edit'], [log, 'log'],
      ['/log', 'log-choose'], ['/club', 'club'], ['/attention', 'attention'], ['/settings', 'settings'],
    ] as const) {
      problems.push(...await look(phone, path, `${name}-${short}`))
    }
    await phone.page.goto(`${app.origin}/club`)
    const members = await phone.page.locator('a[href$="/members"]').first().getAttribute('href')
    problems.push(...await look(phone, members ?? '/club', `${name}-members`))
    await phone.close()
    expect(problems).toEqual([])
    phone.assertClean()
  })
})

describe('an empty journal', () => {
  it('teaches the next step on every screen', async () => {
    const phone = await newPhonePage(browser)
    await phone.page.goto(`${app.origin}/sign-up`)
    await phone.page.getByLabel('Your name').fill('Sol')
    await phone.page.getByLabel('E-mail address').fill('sol@terrace.example')
    await phone.page.getByLabel('Password', { exact: true }).fill('seven quiet buckets')
    await phone.page.getByRole('button', { name: 'Start my journal' }).click()
    await phone.page.waitForURL('**/today')
    const problems: string[] = []
    for (const [path, short] of [['/today', 'today'], ['/plants', 'plants'], ['/log', 'log'], ['/club', 'club'], ['/attention', 'attention']] as const) {
      problems.push(...await look(phone, path, `empty-${short}`))
    }
    await phone.close()
    expect(problems).toEqual([])
    phone.assertClean()
  })
})
