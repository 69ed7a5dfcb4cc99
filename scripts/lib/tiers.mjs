/**
 * The tiers of tests, cheapest first, and how one is run and counted.
 */
import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { fileURLToPath } from 'node:url'
import { vitestProgram } from './paths.mjs'
import { run } from './processes.mjs'
import { explain, inWords, say } from './say.mjs'
import { runStaticChecks } from './static-checks.mjs'

/** @typedef {import('./counting-reporter.mjs').Counts} Counts */
/** @typedef {import('./test-provisions.mjs').Provision} Provision */
/** @typedef {ReturnType<typeof import('./test-provisions.mjs').createProvisions>} Provisions */

/** @type {Record<string, Provision[]>} */
export const TIERS = {
  static: [],
  unit: [],
  nuxt: [],
  contract: ['chromium'],
  integration: ['database', 'build'],
  simulation: [],
  e2e: ['database', 'build', 'chromium'],
}

const reporter = fileURLToPath(new URL('./counting-reporter.mjs', import.meta.url))

/**
 * @param {string} tier
 * @param {Provisions} provisions
 * @param {string[]} vitestArguments
 * @returns {Promise<Counts>}
 */
export async function runTier(tier, provisions, vitestArguments) {
  const started = performance.now()
  say(`\n── ${tier} ──`)
  const counts = await countsOf(tier, provisions, vitestArguments)
  say(`${tier}: ${counts.passed} of ${counts.passed + counts.failed} passed in ${inWords(performance.now() - started)}`)
  return counts
}

/**
 * @param {string} tier
 * @param {Provisions} provisions
 * @param {string[]} vitestArguments
 * @returns {Promise<Counts>}
 */
async function countsOf(tier, provisions, vitestArguments) {
  try {
    if (tier === 'static') return await runStaticChecks()
    const env = await provisions.environmentFor(TIERS[tier] ?? [])
    return await runVitest(tier, env, join(provisions.scratch, `${tier}.json`), vitestArguments)
  } catch (error) {
    // One tier that cannot be set up must not hide what the others would have said.
    say(explain(error))
    return { passed: 0, failed: 1 }
  }
}

/**
 * @param {string} tier
 * @param {Record<string, string>} env
 * @param {string} reportFile
 * @param {string[]} vitestArguments
 * @returns {Promise<Counts>}
 */
async function runVitest(tier, env, reportFile, vitestArguments) {
  const { code } = await run(process.execPath, [
    vitestProgram, 'run', '--reporter=default', `--reporter=${reporter}`, ...vitestArguments,
  ], {
    env: {
      ...env,
      STILLROOT_TIERS: tier,
      STILLROOT_TIER_REPORT: reportFile,
      // The output goes through a pipe, so the runner cannot see for itself whether a person looks on.
      ...(process.stdout.isTTY ? { FORCE_COLOR: '1' } : { NO_COLOR: '1' }),
    },
    onLine: say,
  })
  /** @type {Counts} */
  const counts = existsSync(reportFile) ? JSON.parse(readFileSync(reportFile, 'utf8')) : { passed: 0, failed: 0 }
  // The runner's own verdict counts as well: no test at all, a broken configuration, a crash at the end.
  const ranNothing = counts.passed + counts.failed === 0
  const failedOtherwise = code !== 0 && counts.failed === 0
  return ranNothing || failedOtherwise ? { ...counts, failed: counts.failed + 1 } : counts
}
