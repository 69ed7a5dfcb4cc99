/**
 * `npm run dev`: the same services as `npm start`, and Nuxt's development server, which rebuilds while files change.
 */
import { join } from 'node:path'
import { accountLines } from './lib/accounts.mjs'
import { lastWords, startApp } from './lib/app.mjs'
import { ensurePackages } from './lib/install.mjs'
import { HELP, demoFor, listeningPlace, readOptions } from './lib/options.mjs'
import { dataFolder, nuxtProgram } from './lib/paths.mjs'
import { claimDataFolder, noteRun, releaseDataFolder } from './lib/run-record.mjs'
import { say } from './lib/say.mjs'
import { ensureServicePrograms, startServices } from './lib/services.mjs'
import { isStopping, runCommand, whenStopping } from './lib/shutdown.mjs'

async function main() {
  const options = readOptions()
  if (options.help) {
    say(HELP)
    return 0
  }
  await claimDataFolder()
  whenStopping(releaseDataFolder)
  await ensureServicePrograms()
  await ensurePackages()
  const services = await startServices()
  const demo = demoFor(options.demo, services.privateDatabase)
  const place = await listeningPlace(options.port)
  if (demo) say(`${accountLines().join('\n')}\n`)
  const app = startApp([nuxtProgram, 'dev', '--host', place.host, '--port', String(place.port)], {
    env: { ...services.env, NUXT_DEMO: String(demo) },
    logFile: join(dataFolder, 'dev.log'),
    showAll: true,
  })
  noteRun({ command: process.pid, app: app.pid, origin: place.origin })
  await app.exited
  if (!isStopping()) say(await lastWords(app))
  return 1
}

await runCommand(main, 0)
