/**
 * The built server as a test sees it: a process with an address, a database and a folder for photos, which
 * can be stopped, killed and started again on the same data.
 */
import type { ChildProcess } from 'node:child_process'
import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { mkdtemp, rm } from 'node:fs/promises'
import { createServer } from 'node:net'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { setTimeout as delay } from 'node:timers/promises'
import { createTestDatabase } from './database'
import { fromTestCommand } from './environment'

const START_LIMIT_MILLISECONDS = 60_000
const DEMO_START_LIMIT_MILLISECONDS = 300_000
const POLL_MILLISECONDS = 50

// Sealing session cookies takes a secret of 32 characters or more; a fixed one keeps sessions valid over a restart.
const SESSION_PASSWORD = 'a-session-password-for-tests-and-nothing-else'

export interface StartOptions {
  /** Grow the demo club at the first start. */
  demo?: boolean
  env?: Record<string, string>
  /** A database to use instead of a fresh one; it is not dropped by `dispose`. */
  databaseUrl?: string
  /** A folder to use instead of a fresh one; it is not removed by `dispose`. */
  uploadsDir?: string
  port?: number
}

export interface RunningApp {
  readonly origin: string
  readonly port: number
  /** Changes with every restart. */
  readonly pid: number
  readonly databaseUrl: string
  readonly uploadsDir: string
  /** Everything it printed, over all restarts. */
  logs: () => string
  stop: () => Promise<void>
  kill: () => Promise<void>
  /** Stops it if it runs, then starts it on the same data and port. */
  restart: () => Promise<void>
  dispose: () => Promise<void>
}

export async function startApp(options: StartOptions = {}): Promise<RunningApp> {
  const build = fromTestCommand('STILLROOT_TEST_BUILD')
  const scratch = await mkdtemp(join(tmpdir(), 'stillroot-app-'))
  const database = options.databaseUrl ? undefined : await createTestDatabase()
  const databaseUrl = options.databaseUrl ?? database?.url ?? ''
  const uploadsDir = options.uploadsDir ?? join(scratch, 'uploads')
  const port = options.port ?? await freePort()
  const origin = `http://127.0.0.1:${port}`
  const printed: string[] = []
  let child: ChildProcess | undefined

  async function start() {
    child = spawn(process.execPath, [join(build, 'server/index.mjs')], {
      // Not the project's folder: a server that leans on it must fail here.
      cwd: scratch,
      // Not the test runner's environment either, which says NODE_ENV=test and more.
      env: {
        PATH: process.env.PATH,
        NODE_ENV: 'production',
        HOST: '127.0.0.1',
        PORT: String(port),
        NUXT_DATABASE_URL: databaseUrl,
        NUXT_UPLOADS_DIR: uploadsDir,
        NUXT_SESSION_PASSWORD: SESSION_PASSWORD,
        NUXT_DEMO: String(options.demo ?? false),
        NITRO_SHUTDOWN_TIMEOUT: '2000',
        ...options.env,
      },
      stdio: ['ignore', 'pipe', 'pipe'],
    })
    child.stdout?.on('data', chunk => printed.push(String(chunk)))
    child.stderr?.on('data', chunk => printed.push(String(chunk)))
    await untilHealthy(child)
  }

  async function untilHealthy(started: ChildProcess) {
    const deadline = Date.now() + (options.demo ? DEMO_START_LIMIT_MILLISECONDS : START_LIMIT_MILLISECONDS)
    while (!hasEnded(started) && Date.now() < deadline) {
      if (await isHealthy(origin)) return
      await delay(POLL_MILLISECONDS)
    }
    await end('SIGKILL')
    throw new Error(`The app did not start on ${origin}. It printed:\n${printed.join('')}`)
  }

  async function end(signal: NodeJS.Signals) {
    if (!child || hasEnded(child)) return
    const ended = once(child, 'exit')
    child.kill(signal)
    await ended
  }

  // A test that throws before its clean-up must not leave a server behind.
  const endWithRunner = () => child?.kill('SIGKILL')
  process.once('exit', endWithRunner)

  async function dispose() {
    process.off('exit', endWithRunner)
    await end('SIGTERM')
    await database?.drop()
    await rm(scratch, { recursive: true, force: true })
  }

  try {
    await start()
  }
  catch (error) {
    await dispose()
    throw error
  }

  return {
    origin,
    port,
    get pid() { return child?.pid ?? 0 },
    databaseUrl,
    uploadsDir,
    logs: () => printed.join(''),
    stop: () => end('SIGTERM'),
    kill: () => end('SIGKILL'),
    restart: async () => {
      await end('SIGTERM')
      await start()
    },
    dispose,
  }
}

function hasEnded(child: ChildProcess) {
  return child.exitCode !== null || child.signalCode !== null
}

async function isHealthy(origin: string) {
  try {
    const response = await fetch(`${origin}/api/health`, { signal: AbortSignal.timeout(5_000) })
    const body: unknown = await response.json()
    return typeof body === 'object' && body !== null && 'ok' in body && body.ok === true
  }
  catch {
    return false
  }
}

async function freePort() {
  const probe = createServer().listen(0, '127.0.0.1')
  await once(probe, 'listening')
  const address = probe.address()
  probe.close()
  await once(probe, 'close')
  if (address === null || typeof address === 'string') throw new Error('No free port')
  return address.port
}
