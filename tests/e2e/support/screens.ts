import type { Page } from 'playwright-core'
import { PASSWORD } from '../../support/api-client'

/** What people do on the screens, by the words they see. */
export async function signIn(page: Page, origin: string, email: string, password = PASSWORD): Promise<void> {
  await page.goto(`${origin}/sign-in`)
  await page.getByLabel('E-mail address').fill(email)
  await page.getByLabel('Password', { exact: true }).fill(password)
  await page.getByRole('button', { name: 'Sign in' }).click()
  await page.waitForURL('**/today')
}

/** The line that every screen shows, once it says this. */
export async function syncLineSays(page: Page, words: RegExp, timeout = 60_000): Promise<void> {
  await page.getByRole('status').filter({ hasText: words }).first().waitFor({ timeout })
}

/** After this, the app opens without a server. */
export async function readyForOffline(page: Page): Promise<void> {
  await page.evaluate(async () => {
    await navigator.serviceWorker.ready
    if (!navigator.serviceWorker.controller) {
      await new Promise(resolve => navigator.serviceWorker.addEventListener('controllerchange', resolve, { once: true }))
    }
  })
}
