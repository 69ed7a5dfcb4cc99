import { parseArgs } from 'node:util'
import { firstFreePort } from './ports.mjs'
import { Refusal, say } from './say.mjs'

const PREFERRED_PORT = 3000
const LOOPBACK = new Set(['127.0.0.1', 'localhost', '::1'])
const EVERY_ADDRESS = new Set(['0.0.0.0', '::'])

/** @typedef {{ port: number, demo: boolean | undefined, help: boolean }} Options */

/** @returns {Options} */
export function readOptions() {
  const { values } = parsed()
  const port = Number(values.port ?? process.env.PORT ?? PREFERRED_PORT)
  if (!Number.isInteger(port) || port < 1 || port > 65_535) throw new Refusal(`"${values.port ?? process.env.PORT}" is no port.`)
  return { port, demo: wantedDemo(values), help: values.help === true }
}

function parsed() {
  try {
    return parseArgs({
      options: {
        'port': { type: 'string' },
        'demo': { type: 'boolean' },
        'no-demo': { type: 'boolean' },
        'help': { type: 'boolean', short: 'h' },
      },
    })
  } catch (error) {
    throw new Refusal(`${error instanceof Error ? error.message : error}\n"npm start -- --help" lists what can be asked for.`)
  }
}

/** @param {{ 'demo'?: boolean, 'no-demo'?: boolean }} values */
function wantedDemo(values) {
  if (values['no-demo']) return false
  if (values.demo) return true
  if (process.env.NUXT_DEMO !== undefined) return process.env.NUXT_DEMO === 'true'
  return undefined
}

/**
 * The demo accounts' passwords are printed and public: they belong in a private database, and in one that
 * somebody else runs only when they ask.
 * @param {boolean | undefined} wanted
 * @param {boolean} privateDatabase
 */
export function demoFor(wanted, privateDatabase) {
  if (wanted !== undefined) return wanted
  if (!privateDatabase) say('No demo club is put into a database of your own; "npm start -- --demo" asks for it.')
  return privateDatabase
}

/** @param {number} preferred */
export async function listeningPlace(preferred) {
  const host = process.env.HOST || '127.0.0.1'
  const port = await firstFreePort(preferred, host)
  if (port !== preferred) say(`Port ${preferred} is taken; using ${port}.`)
  if (!LOOPBACK.has(host)) say(`Listening on ${host}: others on the network can reach this, demo accounts included.`)
  const reachable = EVERY_ADDRESS.has(host) ? '127.0.0.1' : host
  return { host, port, origin: `http://${reachable.includes(':') ? `[${reachable}]` : reachable}:${port}` }
}

export const HELP = `Starts Stillroot with all it needs, on this machine alone.

  npm start                     database, mail catcher and app, with the demo club
  npm start -- --port 8080      another port (or the environment variable PORT)
  npm start -- --no-demo        an empty garden
  npm run dev                   the same, rebuilding while files change

Environment: HOST (default 127.0.0.1), PORT, DATABASE_URL and SMTP_URL to use services of your own.
What is kept between starts lies in .data; deleting that folder starts from nothing.`
