import { setTimeout as wait } from 'node:timers/promises'
import { defineNitroPlugin, useRuntimeConfig } from '#imports'
import { closeDatabase, database, openDatabase } from '../database/connection'
import { isDatabaseAway } from '../database/failures'
import { migrator } from '../database/migrate'
import { initModels } from '../database/models/init-models'
import { assertRequiredSettings } from '../database/required-settings'
import { seedDemo } from '../demo/seed'
import { clearUploadTemp } from '../photos/photo-files'
import { closePhotoWorker } from '../photos/process-photo'
import { becomeReady } from '../services/readiness'
import { readConfiguration } from '../utils/configuration'
import type { Configuration } from '../utils/configuration'

/** Tries to reach the database for half a minute before giving up. */
const ATTEMPTS = 60
const PAUSE_MILLISECONDS = 500

export default defineNitroPlugin((nitro) => {
  if (import.meta.prerender) return
  const config = useRuntimeConfig()
  const starting = Promise.resolve().then(() => start(readConfiguration({
    databaseUrl: config.databaseUrl,
    uploadsDir: config.uploadsDir,
    smtpUrl: config.smtpUrl,
    demo: config.demo,
    sessionPassword: config.session.password,
  })))
  becomeReady(starting)
  starting.catch((error: unknown) => {
    console.error(`[stillroot] ${error instanceof Error ? error.message : String(error)}`)
    process.exit(1)
  })
  nitro.hooks.hook('close', async () => {
    await closePhotoWorker()
    await closeDatabase()
  })
})

async function start(config: Configuration): Promise<void> {
  initModels(openDatabase(config.databaseUrl))
  await reach()
  await assertRequiredSettings()
  const applied = await migrator().up()
  for (const { name } of applied) console.info(`[stillroot] database step ${name} done`)
  await clearUploadTemp(config.uploadsDir)
  if (config.demo) await seedDemo(config.uploadsDir)
}

async function reach(): Promise<void> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      await database().authenticate()
      return
    } catch (error) {
      if (attempt >= ATTEMPTS || !isDatabaseAway(error)) throw error
      await wait(PAUSE_MILLISECONDS)
    }
  }
}
