/**
 * `npm start`: from a bare clone to a running Stillroot. Nothing is imported here that an install must bring first.
 */
import { join } from 'node:path'
import { accountLines } from './lib/accounts.mjs'
import { lastWords, startApp, untilHealthy } from './lib/app.mjs'
import { ensureBuild } from './lib/build.mjs'
import { ensurePackages } from './lib/install.mjs'
import { HELP, demoFor, listeningPlace, readOptions } from './lib/options.mjs'
import { dataFolder, projectRoot } from './lib/paths.mjs'
import { claimDataFolder, noteRun, releaseDataFolder } from './lib/run-record.mjs'
import { say, step } from './lib/say.mjs'
import { ensureServicePrograms, startServices } from './lib/services.mjs'
import { isStopping, runCommand, whenStopping } from './lib/shutdown.mjs'

const output = join(projectRoot, '.output')

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
  await ensureBuild(output)
  const services = await startServices()
  const demo = demoFor(options.demo, services.privateDatabase)
  const place = await listeningPlace(options.port)
  const app = startApp([join(output, 'server/index.mjs')], {
    env: {
      ...services.env,
      NODE_ENV: 'production',
      HOST: place.host,
      PORT: String(place.port),
      NUXT_DEMO: String(demo),
      // An open page keeps its connection; without a limit, stopping would wait half a minute for it.
      NITRO_SHUTDOWN_TIMEOUT: '5000',
    },
    logFile: join(dataFolder, 'app.log'),
    showAll: false,
  })
  noteRun({ command: process.pid, app: app.pid, origin: place.origin })
  const growing = demo && services.freshDatabase ? ' and growing the demo club (a minute or two, this once)' : ''
  await step(`Starting the app${growing}`, () => untilHealthy(app, place.origin))
  welcome(place.origin, services.mailFolder, demo)
  await app.exited
  if (!isStopping()) say(await lastWords(app))
  return 1
}

/**
 * @param {string} origin
 * @param {string | undefined} mailFolder
 * @param {boolean} demo
 */
function welcome(origin, mailFolder, demo) {
  const mail = mailFolder ? [`Mail it sends lands in ${mailFolder}`] : []
  say(['', `Stillroot runs at ${origin}`, ...mail, ...(demo ? accountLines() : []), '', 'Ctrl-C stops it.'].join('\n'))
}

await runCommand(main, 0)
