/**
 * The app as a child process: started, watched until it answers, ended.
 */
import { spawn } from 'node:child_process'
import { createWriteStream, mkdirSync } from 'node:fs'
import { dirname } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import { projectRoot } from './paths.mjs'
import { endGroup, hasEnded, keepLines } from './processes.mjs'
import { Refusal, say } from './say.mjs'
import { refuseWhenStopping, whenStopping } from './shutdown.mjs'

const START_LIMIT_MILLISECONDS = 600_000
const STOP_LIMIT_MILLISECONDS = 15_000
const POLL_MILLISECONDS = 200
const FOR_PEOPLE = '[stillroot]'

/**
 * @typedef {object} App
 * @property {number} pid
 * @property {Promise<string>} exited gives how it ended, in words
 * @property {string[]} lastLines
 * @property {() => boolean} hasEnded
 */

/**
 * @param {string[]} args what node runs
 * @param {{ env: NodeJS.ProcessEnv, logFile: string, showAll: boolean }} options
 * @returns {App}
 */
export function startApp(args, options) {
  refuseWhenStopping()
  mkdirSync(dirname(options.logFile), { recursive: true })
  const log = createWriteStream(options.logFile, { mode: 0o600 })
  const child = spawn(process.execPath, args, {
    cwd: projectRoot,
    env: { ...process.env, ...options.env },
    stdio: ['ignore', 'pipe', 'pipe'],
    detached: true,
  })
  const lastLines = keepLines(child, (line) => {
    log.write(`${line}\n`)
    if (options.showAll) say(line)
    else if (line.includes(FOR_PEOPLE)) say(`  ${line.slice(line.indexOf(FOR_PEOPLE) + FOR_PEOPLE.length).trim()}`)
  })
  const exited = new Promise((/** @type {(how: string) => void} */ resolve) => {
    child.once('error', error => resolve(error.message))
    child.once('close', (code, signal) => {
      log.end()
      resolve(signal ? `ended by ${signal}` : `exit code ${code}`)
    })
  })
  whenStopping(() => endGroup(child, STOP_LIMIT_MILLISECONDS))
  return { pid: child.pid ?? 0, exited, lastLines, hasEnded: () => hasEnded(child) }
}

/**
 * @param {string} origin
 * @returns {Promise<boolean>}
 */
async function answers(origin) {
  try {
    const response = await fetch(`${origin}/api/health`, { signal: AbortSignal.timeout(5_000) })
    const body = await response.json()
    return typeof body === 'object' && body !== null && 'ok' in body && body.ok === true
  } catch {
    return false
  }
}

/**
 * @param {App} app
 * @param {string} origin
 */
export async function untilHealthy(app, origin) {
  const deadline = Date.now() + START_LIMIT_MILLISECONDS
  while (!app.hasEnded()) {
    if (await answers(origin)) return
    if (Date.now() > deadline) throw new Refusal(`The app does not answer at ${origin}/api/health.`)
    await delay(POLL_MILLISECONDS)
  }
  throw new Refusal(await lastWords(app))
}

/** @param {App} app */
export async function lastWords(app) {
  const how = await app.exited
  return [`The app stopped (${how}). Its last lines:`, ...app.lastLines.slice(-20).map(line => `  ${line}`)].join('\n')
}
