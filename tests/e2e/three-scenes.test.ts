import { randomUUID } from 'node:crypto'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { mkdir } from 'node:fs/promises'
import { Jimp } from 'jimp'
import type { Browser } from 'playwright-core'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { dayBefore } from '#server/demo/local-time'
import { ApiClient } from '../support/api-client'
import type { RunningApp } from '../support/app-server'
import { startApp } from '../support/app-server'
import type { WatchedPage } from '../support/browser'
import { launchBrowser, newPhonePage } from '../support/browser'
import { readyForOffline, signIn, syncLineSays } from './support/screens'

/**
 * The job, once through: a grower logs beside the bucket while the server is
 * down, a club member reads along day by day, a mentor answers about a yellow
 * leaf. One server, three people, three phones.
 */
const SERVER_IS_DOWN = /Failed to load resource|net::ERR_/

let app: RunningApp
let browser: Browser
let grower: ApiClient
let member: ApiClient
let mentor: ApiClient
let plantId: string
let photoFile: string
const phones: WatchedPage[] = []

async function phoneOf(person: ApiClient): Promise<WatchedPage> {
  const phone = await newPhonePage(browser)
  phones.push(phone)
  await signIn(phone.page, app.origin, person.account.email)
  await syncLineSays(phone.page, /Everything is sent/)
  return phone
}

beforeAll(async () => {
  [app, browser] = await Promise.all([startApp(), launchBrowser()])
  grower = await new ApiClient(app.origin).signUp('Iris')
  member = await new ApiClient(app.origin).signUp('Noor')
  mentor = await new ApiClient(app.origin).signUp('Bram')
  const clubId = await grower.club('Roof', member)
  await grower.letIn(clubId, mentor, 'mentor')
  const vessel = grower.createVessel({
    name: 'Grey bucket', shape: 'round', topLengthCm: 28.5, bottomLengthCm: 26, heightCm: 35.5, netCupDepthCm: 12, lightProof: true,
  })
  const plant = grower.createPlant({
    name: 'Juniper', cropId: 'tomato', visibility: 'club', clubId, vesselId: vessel.entityId, timeZone: 'UTC', setUpOn: dayBefore(new Date(), 7, 'UTC'),
  })
  await grower.push(vessel, plant)
  plantId = plant.entityId
  const folder = join(tmpdir(), randomUUID())
  await mkdir(folder)
  photoFile = join(folder, 'roots.jpg')
  await new Jimp({ width: 1_600, height: 1_200, color: 0xe8dcc0ff }).write(`${folder}/roots.jpg`)
}, 180_000)

afterAll(async () => {
  for (const phone of phones) await phone.close()
  await browser?.close()
  await app?.dispose()
})

describe('the job', () => {
  it('a grower logs a root photo on day 7 while the server is down, and it is sent by itself', async () => {
    const { page, tolerate, assertClean } = await phoneOf(grower)
    await readyForOffline(page)
    await app.stop()
    tolerate(SERVER_IS_DOWN)

    // A cold start without a server, at an address that this browser never opened.
    await page.goto(`${app.origin}/log/${plantId}`)
    await page.getByRole('heading', { level: 1, name: /Juniper/ }).waitFor()
    await page.getByLabel('Take a photo').setInputFiles(photoFile)
    await page.getByRole('group', { name: /shows/i }).first().waitFor()
    await page.getByLabel('pH', { exact: true }).fill('6,1')
    await page.getByLabel('Strength (EC)').fill('2.1')
    await page.getByLabel('Water level').fill('21.5')
    await page.getByRole('button', { name: 'Save entry' }).click()

    await page.waitForURL(`**/plants/${plantId}**`)
    await page.getByText('Saved on this phone').first().waitFor()
    await page.getByText('not sent yet').first().waitFor()
    await page.getByText('pH 6.1').first().waitFor()
    await syncLineSays(page, /2 changes and 1 photo/)

    // Nothing is lost when the phone restarts meanwhile.
    await page.reload()
    await page.getByText('pH 6.1').first().waitFor()

    await app.restart()
    await syncLineSays(page, /Everything is sent/)
    expect(await page.getByText('not sent yet').count()).toBe(0)
    const rows = await grower.feed()
    expect(rows.filter(row => row.type === 'entry').map(row => row.data)).toMatchObject([
      { ph: 6.1, ecMilliSiemensPerCm: 2.1, waterLevelCm: 21.5, plantId },
    ])
    expect(rows.filter(row => row.type === 'photo').map(row => row.data)).toMatchObject([{ subject: 'roots', stored: true }])
    assertClean()
  })

  it('a member of the club reads that plant’s timeline day by day, and sees the picture', async () => {
    const { page, assertClean } = await phoneOf(member)
    await page.getByRole('link', { name: 'Club', exact: true }).click()
    await page.getByRole('link', { name: /Juniper/ }).first().click()
    await page.waitForURL(`**/plants/${plantId}**`)
    await page.getByRole('heading', { name: /Day 7/ }).first().waitFor()
    await page.getByText('pH 6.1').first().waitFor()
    const picture = page.getByRole('img', { name: /roots/i }).first()
    await picture.waitFor()
    await expect.poll(() => picture.evaluate(element => (element instanceof HTMLImageElement ? element.naturalWidth : 0))).toBeGreaterThan(0)
    expect(await page.getByRole('link', { name: /Edit/ }).count()).toBe(0)
    assertClean()
  })

  it('a mentor comments on a yellowing leaf, and the grower sees it', async () => {
    const entry = grower.createEntry(plantId, { occurredAt: new Date().toISOString(), recordedAt: new Date().toISOString(), note: 'Yellow between the veins of old leaves.' })
    await grower.done(entry)

    const theirs = await phoneOf(mentor)
    await theirs.page.goto(`${app.origin}/plants/${plantId}#entry-${entry.entityId}`)
    await theirs.page.getByText('Yellow between the veins of old leaves.').waitFor()
    const card = theirs.page.locator(`#entry-${entry.entityId}`)
    await card.getByRole('button', { name: /comment/i }).first().click()
    await card.getByRole('textbox', { name: /comment/i }).fill('Old leaves first: look at magnesium. What is the pH?')
    await card.getByRole('button', { name: 'Send comment' }).click()
    await syncLineSays(theirs.page, /Everything is sent/)
    theirs.assertClean()

    const mine = await phoneOf(grower)
    await mine.page.getByText(/Bram/).first().waitFor()
    await mine.page.goto(`${app.origin}/plants/${plantId}`)
    await mine.page.getByText('Old leaves first: look at magnesium. What is the pH?').first().waitFor()
    await mine.page.getByText(/mentor/i).first().waitFor()
    mine.assertClean()
  })

  it('says clearly what is wrong with a reading, on the form, and keeps everything else', async () => {
    const { page, assertClean } = await phoneOf(grower)
    const note = 'نص من اليمين إلى اليسار 🌱'
    await page.goto(`${app.origin}/log/${plantId}`)
    await page.getByLabel('What do you see?').fill(note)
    await page.getByLabel('pH', { exact: true }).fill('15')
    await page.getByLabel('Strength (EC)').fill('-1')
    await page.getByRole('button', { name: 'Save entry' }).click()
    await page.getByRole('alert').first().waitFor()
    expect(await page.getByLabel('pH', { exact: true }).getAttribute('aria-invalid')).toBe('true')
    expect(await page.getByLabel('Strength (EC)').getAttribute('aria-invalid')).toBe('true')
    await page.getByLabel('pH', { exact: true }).fill('5.9')
    await page.getByLabel('Strength (EC)').fill('1.9')
    await page.getByRole('button', { name: 'Save entry' }).click()
    await page.waitForURL(`**/plants/${plantId}**`)
    await page.getByText(note).first().waitFor()
    await syncLineSays(page, /Everything is sent/)
    const rows = await grower.feed()
    expect(rows.find(row => row.data?.note === note)?.data).toMatchObject({ ph: 5.9, ecMilliSiemensPerCm: 1.9 })
    assertClean()
  })

  it('keeps a change that the server refuses under “Needs attention”, and sends the rest', async () => {
    const { page, tolerate, assertClean } = await phoneOf(member)
    // Its picture is nobody’s but the grower’s from then on.
    tolerate(/api\/photos\/.*\/640/)
    await page.goto(`${app.origin}/plants/${plantId}`)
    await page.getByText('Yellow between the veins of old leaves.').waitFor()
    // The grower makes the plant private while the member writes.
    await grower.done(grower.op('patch', 'plant', plantId, 0, { visibility: 'private' }))
    const card = page.getByRole('article').filter({ hasText: 'Yellow between the veins' }).first()
    await card.getByRole('button', { name: /comment/i }).first().click()
    await card.getByRole('textbox', { name: /comment/i }).fill('I had that, too.')
    await card.getByRole('button', { name: 'Send comment' }).click()
    await syncLineSays(page, /needs attention/)
    await page.goto(`${app.origin}/attention`)
    await page.getByText('I had that, too.').first().waitFor()
    assertClean()
  })
})
