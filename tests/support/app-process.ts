import type { ChildProcess } from 'node:child_process'
import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { setTimeout as delay } from 'node:timers/promises'

const POLL_MILLISECONDS = 50

export interface AppProcessOptions {
  program: string
  workingFolder: string
  origin: string
  env: Record<string, string | undefined>
  startLimitMilliseconds: number
}

/** A server that can be started again after it ended; what it prints is kept over all its lives. */
export class AppProcess {
  private child: ChildProcess | undefined
  private readonly printed: string[] = []

  // A test that throws before its clean-up must not leave a server behind.
  private readonly endWithRunner = () => this.child?.kill('SIGKILL')

  constructor(private readonly options: AppProcessOptions) {
    process.once('exit', this.endWithRunner)
  }

  get pid() {
    return this.child?.pid ?? 0
  }

  logs() {
    return this.printed.join('')
  }

  async start() {
    const { program, workingFolder, env } = this.options
    const child = spawn(process.execPath, [program], { cwd: workingFolder, env, stdio: ['ignore', 'pipe', 'pipe'] })
    this.child = child
    child.stdout.on('data', chunk => this.printed.push(String(chunk)))
    child.stderr.on('data', chunk => this.printed.push(String(chunk)))
    await this.untilHealthy(child)
  }

  async end(signal: NodeJS.Signals) {
    if (!this.child || hasEnded(this.child)) return
    const ended = once(this.child, 'exit')
    this.child.kill(signal)
    await ended
  }

  async dispose() {
    process.off('exit', this.endWithRunner)
    await this.end('SIGTERM')
  }

  private async untilHealthy(child: ChildProcess) {
    const { origin, startLimitMilliseconds } = this.options
    const deadline = Date.now() + startLimitMilliseconds
    while (!hasEnded(child) && Date.now() < deadline) {
      if (await isHealthy(origin)) return
      await delay(POLL_MILLISECONDS)
    }
    await this.end('SIGKILL')
    throw new Error(`The app did not start on ${origin}. It printed:\n${this.logs()}`)
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
  } catch {
    return false
  }
}
