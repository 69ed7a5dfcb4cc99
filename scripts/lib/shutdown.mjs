/**
 * One list of what must be stopped, undone in reverse order: the app before the database it writes to.
 */
import { Refusal, explain, say } from './say.mjs'

const PARENT_CHECK_MILLISECONDS = 1_000

/** @typedef {() => unknown} Undo */

/** @type {Undo[]} */
const undos = []

/** @type {Promise<void> | undefined} */
let stopping

/** @param {Undo} undo */
export function whenStopping(undo) {
  undos.push(undo)
}

export function isStopping() {
  return stopping !== undefined
}

/** Called before anything is started: what begins after the list was worked off would never be stopped. */
export function refuseWhenStopping() {
  if (isStopping()) throw new Refusal('Stopping.')
}

async function undoAll() {
  for (let undo = undos.pop(); undo; undo = undos.pop()) {
    try {
      await undo()
    } catch (error) {
      say(explain(error))
    }
  }
}

export function stopEverything() {
  stopping ??= undoAll()
  return stopping
}

/**
 * @param {number} code
 * @returns {Promise<never>}
 */
export async function leave(code) {
  await stopEverything()
  process.exit(code)
}

/**
 * Ctrl-C, `kill` and a closed terminal all end the run the same way. A second signal changes nothing:
 * the database needs a second or two to write its last pages, and must get them.
 * @param {number} exitCode
 */
export function stopOnSignals(exitCode) {
  const stop = () => {
    if (isStopping()) return
    say('\nStopping …')
    void leave(exitCode).catch(() => process.exit(1))
  }
  for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.on(signal, stop)
  if (process.env.npm_lifecycle_event) whenParentEnds(stop)
  // With the terminal gone, a last word has nobody to go to and must not end the clean-up.
  for (const stream of [process.stdout, process.stderr]) stream.on('error', () => {})
}

/**
 * A signal sent to npm ends the shell between npm and this process without reaching here.
 * @param {() => void} stop
 */
function whenParentEnds(stop) {
  const parent = process.ppid
  const watch = setInterval(() => {
    if (process.ppid === parent) return
    clearInterval(watch)
    stop()
  }, PARENT_CHECK_MILLISECONDS)
  watch.unref()
}

/**
 * Runs a command's main function and turns what it throws into words and exit code 1.
 * @param {() => Promise<number>} main gives the exit code
 * @param {number} exitCodeOnSignal
 */
export async function runCommand(main, exitCodeOnSignal) {
  stopOnSignals(exitCodeOnSignal)
  try {
    await leave(await main())
  } catch (error) {
    // A step that fails because the whole run is being stopped is no news.
    if (!isStopping()) say(`\n${explain(error)}`)
    if (!isStopping()) await leave(1)
  }
}
