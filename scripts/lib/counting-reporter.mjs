/**
 * Writes what a vitest run came to, as { passed, failed }, to the file named in STILLROOT_TIER_REPORT.
 *
 * Only a test that ran and passed counts as passed: a skipped one, one left to do, a file that could not be
 * loaded and an error outside every test all count as failed.
 */
import { writeFileSync } from 'node:fs'

/** @typedef {{ passed: number, failed: number }} Counts */

/**
 * @param {import('vitest/node').TestModule} module
 * @returns {Counts}
 */
function countModule(module) {
  const tests = [...module.children.allTests()]
  const passed = tests.filter(test => test.result().state === 'passed').length
  const suiteErrors = [...module.children.allSuites()].flatMap(suite => suite.errors()).length
  const failed = tests.length - passed + module.errors().length + suiteErrors
  // A file of no tests proves nothing, whatever its state says.
  return { passed, failed: passed + failed === 0 ? 1 : failed }
}

/** @param {Counts[]} all */
export function sumCounts(all) {
  return all.reduce((sum, one) => ({ passed: sum.passed + one.passed, failed: sum.failed + one.failed }), { passed: 0, failed: 0 })
}

/** One of vitest's reporters, see "Custom reporters" in its manual. */
export default class CountingReporter {
  /**
   * @param {ReadonlyArray<import('vitest/node').TestModule>} modules
   * @param {ReadonlyArray<unknown>} unhandledErrors
   */
  onTestRunEnd(modules, unhandledErrors) {
    const file = process.env.STILLROOT_TIER_REPORT
    if (!file) return
    const counts = sumCounts(modules.map(countModule))
    writeFileSync(file, JSON.stringify({ passed: counts.passed, failed: counts.failed + unhandledErrors.length }))
  }
}
