/**
 * `npm test [tier …] [vitest arguments]`: from a bare clone to a verdict. The last line is always the plain
 * count, and the exit code says the same.
 */
import { sumCounts } from './lib/counting-reporter.mjs'
import { ensurePackages } from './lib/install.mjs'
import { Refusal, explain, say } from './lib/say.mjs'
import { isStopping, runCommand, stopEverything } from './lib/shutdown.mjs'
import { createProvisions } from './lib/test-provisions.mjs'
import { TIERS, runTier } from './lib/tiers.mjs'

const EXIT_CODE_ON_SIGNAL = 130

/** @param {string[]} words */
function readArguments(words) {
  const tiers = words.filter(word => word in TIERS)
  const others = words.filter(word => !(word in TIERS))
  const unknown = others.find((word, index) => !/^-|[./]/.test(word) && !others[index - 1]?.startsWith('-'))
  if (unknown) throw new Refusal(`There is no tier "${unknown}". The tiers: ${Object.keys(TIERS).join(', ')}.`)
  return { tiers: tiers.length > 0 ? tiers : Object.keys(TIERS), vitestArguments: others }
}

/** @param {string[]} words */
async function runTiers(words) {
  const { tiers, vitestArguments } = readArguments(words)
  await ensurePackages()
  const provisions = createProvisions()
  const all = []
  for (const tier of tiers) {
    if (!isStopping()) all.push(await runTier(tier, provisions, vitestArguments))
  }
  return sumCounts(all)
}

async function main() {
  const counts = await runTiers(process.argv.slice(2)).catch((error) => {
    say(explain(error))
    return { passed: 0, failed: 1 }
  })
  if (isStopping()) return EXIT_CODE_ON_SIGNAL
  await stopEverything()
  say(`\n${counts.passed} passed, ${counts.failed} failed`)
  return counts.failed === 0 && counts.passed > 0 ? 0 : 1
}

await runCommand(main, EXIT_CODE_ON_SIGNAL)
