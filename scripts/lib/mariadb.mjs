/**
 * A private MariaDB server: its own data folder, loopback only, ended with the command that started it.
 *
 * Debian's service of the same name is never involved. Only the server's programs are installed, not the
 * package that starts a service, and `--no-defaults` keeps the machine's configuration out.
 */
import { spawn } from 'node:child_process'
import { chmodSync, closeSync, existsSync, mkdirSync, mkdtempSync, openSync, readFileSync, renameSync, rmSync, symlinkSync, writeFileSync } from 'node:fs'
import { connect } from 'node:net'
import { tmpdir } from 'node:os'
import { dirname, join } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import { findProgram, installDebianPackages } from './debian.mjs'
import { endGroup, hasEnded, run } from './processes.mjs'
import { freePort } from './ports.mjs'
import { Refusal, step } from './say.mjs'
import { refuseWhenStopping, whenStopping } from './shutdown.mjs'

// mariadb-install-db needs my_print_defaults, which Debian ships with the client.
const DEBIAN_PACKAGES = ['mariadb-server-core', 'mariadb-client-core']
const START_LIMIT_MILLISECONDS = 120_000
// An unclean stop costs a recovery at the next start, so the server gets the time to write its pages.
const STOP_LIMIT_MILLISECONDS = 60_000
const POLL_MILLISECONDS = 50
// The longest path a Unix socket may have is 107 characters; "/mariadb.sock" takes 13 of them.
const LONGEST_SOCKET_FOLDER = 94

/** @typedef {{ server: string, installer: string }} MariadbTools */
/** @typedef {{ port: number, pid: number, exited: Promise<void>, stop: () => Promise<void> }} MariadbServer */

/** @returns {MariadbTools | undefined} */
function findTools() {
  const server = findProgram('mariadbd')
  const installer = findProgram('mariadb-install-db')
  return server && installer ? { server, installer } : undefined
}

/** @returns {Promise<MariadbTools>} */
export async function ensureMariadb() {
  const present = findTools()
  if (present) return present
  await installDebianPackages('MariaDB', DEBIAN_PACKAGES)
  const installed = findTools()
  if (!installed) throw new Refusal('MariaDB was installed, but mariadbd or mariadb-install-db is not to be found.')
  return installed
}

/** As root the server must be told to stay root: the user "mysql" cannot enter folders closed to others. */
function userArguments() {
  return process.getuid?.() === 0 ? ['--user=root'] : []
}

/**
 * @param {MariadbTools} tools
 * @param {string} folder
 * @returns {Promise<boolean>} whether it was made just now
 */
export async function ensureDataFolder(tools, folder) {
  if (existsSync(join(folder, 'mysql'))) return false
  await step('Making the database\'s data folder', async () => {
    // Made beside its place and moved there when whole, so that a cut-off first start leaves no half folder.
    const draft = `${folder}.new`
    rmSync(draft, { recursive: true, force: true })
    mkdirSync(draft, { recursive: true, mode: 0o700 })
    await fillDataFolder(tools, draft)
    chmodSync(draft, 0o700)
    renameSync(draft, folder)
  })
  return true
}

/**
 * @param {MariadbTools} tools
 * @param {string} folder
 */
async function fillDataFolder(tools, folder) {
  // The installer is a shell script that stumbles over a space in a path, so it gets a link without one.
  const shortFolder = makeShortFolder()
  const link = join(shortFolder, 'data')
  symlinkSync(folder, link)
  const { code, lastLines } = await run(tools.installer, [
    '--no-defaults',
    `--datadir=${link}`,
    '--auth-root-authentication-method=normal',
    '--skip-test-db',
    '--skip-name-resolve',
    ...userArguments(),
  ])
  rmSync(shortFolder, { recursive: true, force: true })
  if (code !== 0) throw new Refusal([...lastLines, '', 'The database\'s data folder could not be made.'].join('\n'))
}

/** @param {string} folder */
export function serverArguments(folder) {
  return [
    '--bind-address=127.0.0.1',
    '--skip-name-resolve',
    // What the server said is saved must survive a power cut: no faster setting, not for tests either.
    '--innodb-flush-log-at-trx-commit=1',
    '--character-set-server=utf8mb4',
    '--collation-server=utf8mb4_unicode_ci',
    '--sql-mode=STRICT_ALL_TABLES,ERROR_FOR_DIVISION_BY_ZERO,NO_ZERO_DATE,NO_ZERO_IN_DATE,NO_ENGINE_SUBSTITUTION',
    '--default-time-zone=+00:00',
    '--local-infile=OFF',
    `--datadir=${folder}`,
  ]
}

function makeShortFolder() {
  const parent = tmpdir().length + '/stillroot-XXXXXX'.length <= LONGEST_SOCKET_FOLDER ? tmpdir() : '/tmp'
  return mkdtempSync(join(parent, 'stillroot-'))
}

/**
 * @param {MariadbTools} tools
 * @param {{ folder: string, logFile: string, pidFile: string, firstStatements: string[] }} options
 *   `firstStatements` run before the server takes a connection, one statement each
 * @returns {Promise<MariadbServer>}
 */
export async function startMariadb(tools, options) {
  refuseWhenStopping()
  const port = await freePort()
  const runtimeFolder = makeShortFolder()
  const initFile = join(runtimeFolder, 'init.sql')
  writeFileSync(initFile, `${options.firstStatements.join(';\n')};\n`, { mode: 0o600 })
  mkdirSync(dirname(options.logFile), { recursive: true })
  const log = openSync(options.logFile, 'w', 0o600)
  const child = spawn(tools.server, [
    '--no-defaults',
    ...userArguments(),
    ...serverArguments(options.folder),
    `--port=${port}`,
    `--socket=${join(runtimeFolder, 'mariadb.sock')}`,
    `--pid-file=${options.pidFile}`,
    `--init-file=${initFile}`,
  ], { stdio: ['ignore', log, log], detached: true })
  closeSync(log)
  const exited = new Promise(resolve => child.once('close', resolve)).then(() => {
    rmSync(runtimeFolder, { recursive: true, force: true })
  })
  const stop = async () => {
    await endGroup(child, STOP_LIMIT_MILLISECONDS)
    await exited
  }
  whenStopping(stop)
  try {
    await untilReady(child, port, options.logFile)
  } catch (error) {
    await stop()
    throw error
  }
  // It holds the password, and has been read.
  rmSync(initFile, { force: true })
  return { port, pid: child.pid ?? 0, exited, stop }
}

/**
 * @param {import('node:child_process').ChildProcess} child
 * @param {number} port
 * @param {string} logFile
 */
async function untilReady(child, port, logFile) {
  const deadline = Date.now() + START_LIMIT_MILLISECONDS
  while (!hasEnded(child) && Date.now() < deadline) {
    if (await greets(port) && !hasEnded(child)) return
    await delay(POLL_MILLISECONDS)
  }
  const lastLines = readFileSync(logFile, 'utf8').trimEnd().split('\n').slice(-15)
  throw new Refusal([...lastLines, '', `MariaDB did not start; its last lines are above, all of them in ${logFile}.`].join('\n'))
}

/**
 * MariaDB speaks first on a new connection; until it does, it is not ready.
 * @param {number} port
 * @returns {Promise<boolean>}
 */
function greets(port) {
  return new Promise((resolve) => {
    const socket = connect(port, '127.0.0.1')
    const finish = (/** @type {boolean} */ answer) => {
      socket.destroy()
      resolve(answer)
    }
    socket.setTimeout(2_000, () => finish(false))
    socket.once('data', () => finish(true))
    socket.once('error', () => finish(false))
    socket.once('close', () => resolve(false))
  })
}
