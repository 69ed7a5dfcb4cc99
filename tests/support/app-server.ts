/**
 * The built server as a test sees it: an address, a database and a folder for photos, and a process that can
 * be stopped, killed and started again on the same data.
 */
import { mkdtemp, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { freePort } from '~/scripts/lib/ports.mjs'
import { AppProcess } from './app-process'
import { createTestDatabase } from './database'
import { fromTestCommand } from './environment'

const START_LIMIT_MILLISECONDS = 60_000
const DEMO_START_LIMIT_MILLISECONDS = 300_000

// Sealing session cookies takes 32 characters or more; a fixed password keeps sessions valid over a restart.
const SESSION_PASSWORD = 'a-session-password-for-tests-and-nothing-else'

export interface StartOptions {
  /** Grow the demo club at the first start. */
  demo?: boolean
  env?: Record<string, string>
  /** A database to use instead of a fresh one; `dispose` leaves it. */
  databaseUrl?: string
  /** A folder to use instead of a fresh one; `dispose` leaves it. */
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
  /** Stops it and removes what was made for it. */
  dispose: () => Promise<void>
}

export async function startApp(options: StartOptions = {}): Promise<RunningApp> {
  const program = join(fromTestCommand('STILLROOT_TEST_BUILD'), 'server/index.mjs')
  const scratch = await mkdtemp(join(tmpdir(), 'stillroot-app-'))
  const ownDatabase = options.databaseUrl ? undefined : await createTestDatabase()
  const place = {
    port: options.port ?? await freePort(),
    databaseUrl: options.databaseUrl ?? ownDatabase?.url ?? '',
    uploadsDir: options.uploadsDir ?? join(scratch, 'uploads'),
  }
  const app = new AppProcess({
    program,
    // Not the project's folder: a server that leans on it must fail here.
    workingFolder: scratch,
    origin: `http://127.0.0.1:${place.port}`,
    env: environmentFor(place, options),
    startLimitMilliseconds: options.demo ? DEMO_START_LIMIT_MILLISECONDS : START_LIMIT_MILLISECONDS,
  })
  const dispose = async () => {
    await app.dispose()
    await ownDatabase?.drop()
    await rm(scratch, { recursive: true, force: true })
  }
  try {
    await app.start()
  } catch (error) {
    await dispose()
    throw error
  }
  return {
    ...place,
    origin: `http://127.0.0.1:${place.port}`,
    get pid() { return app.pid },
    logs: () => app.logs(),
    stop: () => app.end('SIGTERM'),
    kill: () => app.end('SIGKILL'),
    restart: async () => {
      await app.end('SIGTERM')
      await app.start()
    },
    dispose,
  }
}

function environmentFor(place: { port: number, databaseUrl: string, uploadsDir: string }, options: StartOptions) {
  return {
    // Nothing else of the test runner's environment, which says NODE_ENV=test and more.
    PATH: process.env.PATH,
    NODE_ENV: 'production',
    HOST: '127.0.0.1',
    PORT: String(place.port),
    NUXT_DATABASE_URL: place.databaseUrl,
    NUXT_UPLOADS_DIR: place.uploadsDir,
    NUXT_SESSION_PASSWORD: SESSION_PASSWORD,
    NUXT_DEMO: String(options.demo ?? false),
    NITRO_SHUTDOWN_TIMEOUT: '2000',
    ...options.env,
  }
}
