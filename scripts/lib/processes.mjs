/**
 * Child processes. Each gets a process group of its own, so that Ctrl-C in the terminal reaches only the
 * command, which then stops its children in the right order.
 */
import { spawn } from 'node:child_process'
import { once } from 'node:events'
import { readFileSync } from 'node:fs'
import { createInterface } from 'node:readline'
import { setTimeout as delay } from 'node:timers/promises'
import { projectRoot } from './paths.mjs'
import { refuseWhenStopping, whenStopping } from './shutdown.mjs'

const KEPT_LINES = 60
const POLL_MILLISECONDS = 50
const PATIENCE_MILLISECONDS = 15_000

/**
 * @typedef {object} RunOptions
 * @property {NodeJS.ProcessEnv} [env] added to the environment of this process
 * @property {string} [cwd]
 * @property {(line: string) => void} [onLine] sees every line of both streams as it comes
 * @property {boolean} [letFinish] a stop waits for it: a package manager cut short leaves half-installed packages
 */

/** @typedef {{ code: number, lastLines: string[] }} RunResult */

/** How to stop each program that runs at the moment. @type {Set<() => Promise<unknown>>} */
const running = new Set()
let stopIsPlanned = false

function planStop() {
  if (stopIsPlanned) return
  stopIsPlanned = true
  whenStopping(() => Promise.all([...running].map(end => end())))
}

/**
 * Runs a program to its end; its output is kept, not shown.
 * @param {string} program
 * @param {string[]} args
 * @param {RunOptions} [options]
 * @returns {Promise<RunResult>}
 */
export async function run(program, args, options = {}) {
  refuseWhenStopping()
  planStop()
  const child = spawn(program, args, {
    cwd: options.cwd ?? projectRoot,
    env: { ...process.env, ...options.env },
    stdio: ['ignore', 'pipe', 'pipe'],
    detached: true,
  })
  const closed = once(child, 'close')
  const end = () => options.letFinish ? closed : endGroup(child, PATIENCE_MILLISECONDS)
  running.add(end)
  const lastLines = keepLines(child, options.onLine)
  try {
    const [code] = await closed
    return { code: code ?? 1, lastLines }
  } finally {
    running.delete(end)
  }
}

/**
 * @param {import('node:child_process').ChildProcess} child
 * @param {(line: string) => void} [onLine]
 */
export function keepLines(child, onLine) {
  /** @type {string[]} */
  const lines = []
  for (const stream of [child.stdout, child.stderr]) {
    if (!stream) continue
    createInterface({ input: stream }).on('line', (line) => {
      lines.push(line)
      if (lines.length > KEPT_LINES) lines.shift()
      onLine?.(line)
    })
  }
  return lines
}

/** @param {import('node:child_process').ChildProcess} child */
export function hasEnded(child) {
  return child.exitCode !== null || child.signalCode !== null
}

/**
 * Asks a child and its own children to end, and insists when the patience is over.
 * @param {import('node:child_process').ChildProcess} child
 * @param {number} patience milliseconds
 */
export async function endGroup(child, patience) {
  if (child.pid === undefined || hasEnded(child)) return
  const ended = once(child, 'exit')
  signalGroup(child.pid, 'SIGTERM')
  const inTime = await Promise.race([ended.then(() => true), delay(patience, false, { ref: false })])
  if (inTime) return
  signalGroup(child.pid, 'SIGKILL')
  await ended
}

/**
 * @param {number} pid
 * @param {NodeJS.Signals} signal
 */
function signalGroup(pid, signal) {
  try {
    process.kill(-pid, signal)
  } catch {
    // It ended between the question and the signal.
  }
}

/**
 * The words a process was started with; empty when there is no such process (or no /proc to ask).
 * @param {number} pid
 * @returns {string[]}
 */
export function commandLineOf(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').split('\0').filter(Boolean)
  } catch {
    return []
  }
}

/**
 * Ends a process that is not our child, asking `stillOurs` before each signal: a process id may be given anew.
 * @param {number} pid
 * @param {() => boolean} stillOurs
 * @param {number} patience milliseconds
 * @returns {Promise<boolean>} whether it is gone
 */
export async function endForeign(pid, stillOurs, patience) {
  const deadline = Date.now() + patience
  if (stillOurs()) process.kill(pid, 'SIGTERM')
  while (stillOurs() && Date.now() < deadline) await delay(POLL_MILLISECONDS)
  return !stillOurs()
}
