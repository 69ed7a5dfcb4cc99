/**
 * A note in the data folder that says which processes use it: only one start at a time, and whatever a
 * killed start (power cut, `kill -9`) left running is found and ended by the next.
 */
import { accessSync, closeSync, constants, existsSync, mkdirSync, openSync, readFileSync, realpathSync, readlinkSync, rmSync, writeFileSync } from 'node:fs'
import { basename, dirname, join } from 'node:path'
import { dataFolder, projectRoot } from './paths.mjs'
import { commandLineOf, endForeign } from './processes.mjs'
import { Refusal, say } from './say.mjs'

const LEFTOVER_LIMIT_MILLISECONDS = 60_000
const recordFile = join(dataFolder, 'running.json')

/** @typedef {{ command: number, app?: number, origin?: string }} RunRecord */

/** @returns {RunRecord | undefined} */
function readRecord() {
  if (!existsSync(recordFile)) return undefined
  try {
    return JSON.parse(readFileSync(recordFile, 'utf8'))
  } catch {
    return undefined
  }
}

/** @param {number} pid */
function isOurCommand(pid) {
  if (pid === process.pid) return false
  const isCommand = commandLineOf(pid).some(word => /scripts\/(start|dev)\.mjs$/.test(word))
  return isCommand && workingFolderOf(pid) === realpathSync(projectRoot)
}

/** @param {number} pid */
function isOurApp(pid) {
  const words = commandLineOf(pid)
  return words.includes(join(projectRoot, '.output/server/index.mjs')) || words.includes(join(projectRoot, 'node_modules/nuxt/bin/nuxt.mjs'))
}

/**
 * @param {number} pid
 * @param {string} folder
 */
function isOurDatabase(pid, folder) {
  const [program = '', ...words] = commandLineOf(pid)
  return basename(program) === 'mariadbd' && words.includes(`--datadir=${folder}`)
}

/** @param {number} pid */
function workingFolderOf(pid) {
  try {
    return readlinkSync(`/proc/${pid}/cwd`)
  } catch {
    return undefined
  }
}

/** Takes the data folder for this command, or explains who has it. */
export async function claimDataFolder() {
  mkdirSync(dataFolder, { recursive: true, mode: 0o700 })
  refuseOthersFolder()
  const earlier = readRecord()
  if (earlier && isOurCommand(earlier.command)) throw new Refusal(alreadyRunning(earlier))
  if (earlier?.app) await endLeftover('An app', earlier.app, isOurApp)
  rmSync(recordFile, { force: true })
  try {
    // Fails when a second start got here in the same moment.
    closeSync(openSync(recordFile, 'wx', 0o600))
  } catch {
    throw new Refusal('Stillroot is being started from this folder at this very moment.')
  }
  noteRun({ command: process.pid })
}

function refuseOthersFolder() {
  try {
    accessSync(dataFolder, constants.R_OK | constants.W_OK | constants.X_OK)
  } catch {
    throw new Refusal(`${dataFolder} belongs to another account, probably of whoever started Stillroot here first. Start it as that account.`)
  }
}

/** @param {RunRecord} earlier */
function alreadyRunning(earlier) {
  const where = earlier.origin ? ` at ${earlier.origin}` : ''
  return `Stillroot already runs from this folder${where} (process ${earlier.command}). Stop that one first.`
}

/** @param {RunRecord} record */
export function noteRun(record) {
  writeFileSync(recordFile, JSON.stringify(record), { mode: 0o600 })
}

export function releaseDataFolder() {
  rmSync(recordFile, { force: true })
}

/**
 * @param {string} pidFile
 * @param {string} folder the server's data folder
 */
export async function endLeftoverDatabase(pidFile, folder) {
  if (!existsSync(pidFile)) return
  const pid = Number(readFileSync(pidFile, 'utf8'))
  if (Number.isInteger(pid) && pid > 0) {
    const socket = commandLineOf(pid).find(word => word.startsWith('--socket='))
    await endLeftover('A database server', pid, id => isOurDatabase(id, folder))
    removeSocketFolder(socket)
  }
  rmSync(pidFile, { force: true })
}

/** @param {string | undefined} socketArgument as the server was given it */
function removeSocketFolder(socketArgument) {
  const folder = dirname(socketArgument?.slice('--socket='.length) ?? '')
  if (/\/stillroot-\w{6}$/.test(folder)) rmSync(folder, { recursive: true, force: true })
}

/**
 * @param {string} what
 * @param {number} pid
 * @param {(pid: number) => boolean} isOurs
 */
async function endLeftover(what, pid, isOurs) {
  if (!isOurs(pid)) return
  say(`${what} from an earlier start that was cut short still runs (process ${pid}). Stopping it.`)
  if (await endForeign(pid, () => isOurs(pid), LEFTOVER_LIMIT_MILLISECONDS)) return
  throw new Refusal(`Process ${pid} does not end. Stop it by hand ("kill ${pid}"), then start again.`)
}
