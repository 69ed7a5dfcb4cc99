/**
 * The checks that read the code without running it. Each counts as one, passed or failed.
 */
import { eslintProgram, nuxtProgram, typescriptProgram } from './paths.mjs'
import { run } from './processes.mjs'
import { say } from './say.mjs'

/** @typedef {import('./counting-reporter.mjs').Counts} Counts */

/** @type {[string, () => Promise<boolean>][]} */
const checks = [
  // First, because it also writes the types and the rules that the linter reads.
  ['Types', () => succeeds([nuxtProgram, 'typecheck'])],
  ['Types of the commands', () => succeeds([typescriptProgram, '-p', 'scripts/jsconfig.json'])],
  ['Lint', () => succeeds([eslintProgram, '.', '--max-warnings=0'])],
]

/** @returns {Promise<Counts>} */
export async function runStaticChecks() {
  let passed = 0
  for (const [name, isFine] of checks) {
    const fine = await isFine()
    say(`  ${fine ? 'passed' : 'FAILED'}  ${name}`)
    if (fine) passed += 1
  }
  return { passed, failed: checks.length - passed }
}

/** @param {string[]} args */
async function succeeds(args) {
  const { code } = await run(process.execPath, args, { onLine: say })
  return code === 0
}
