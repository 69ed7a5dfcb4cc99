/**
 * `npm run bench [name …]`: runs bench/*.bench.mjs one after the other, so that none disturbs another, and
 * prints the median of the repetitions. A ratio compares a row with the first row of the same unit.
 */
import { existsSync, readdirSync } from 'node:fs'
import { cpus } from 'node:os'
import { join } from 'node:path'
import { pathToFileURL } from 'node:url'
import { ensurePackages } from './lib/install.mjs'
import { median, tableLines } from './lib/bench-table.mjs'
import { projectRoot } from './lib/paths.mjs'
import { Refusal, say, step } from './lib/say.mjs'
import { runCommand } from './lib/shutdown.mjs'

const REPETITIONS = 5
const folder = join(projectRoot, 'bench')

/** @typedef {{ label: string, value: number, unit: string }} Row */
/** @typedef {{ name: string, run: () => Promise<Row[]> | Row[] }} Bench */

/** @param {string[]} wanted parts of file names; none means all */
function benchFiles(wanted) {
  const files = existsSync(folder) ? readdirSync(folder).filter(file => file.endsWith('.bench.mjs')).sort() : []
  const chosen = files.filter(file => wanted.length === 0 || wanted.some(part => file.includes(part)))
  if (chosen.length === 0) throw new Refusal(`Nothing to measure: no ${wanted.length > 0 ? 'matching ' : ''}bench/*.bench.mjs.`)
  return chosen
}

/**
 * @param {Bench} bench
 * @returns {Promise<Row[]>}
 */
async function repeated(bench) {
  // The first run warms the compiler and the disk's cache, and is thrown away.
  await bench.run()
  /** @type {Map<string, { row: Row, values: number[] }>} */
  const byLabel = new Map()
  for (let round = 0; round < REPETITIONS; round += 1) {
    for (const row of await bench.run()) {
      const known = byLabel.get(row.label) ?? { row, values: [] }
      known.values.push(row.value)
      byLabel.set(row.label, known)
    }
  }
  return [...byLabel.values()].map(({ row, values }) => ({ ...row, value: median(values) }))
}

async function main() {
  await ensurePackages()
  say(`Node ${process.versions.node}, ${cpus().length} × ${cpus()[0]?.model ?? 'unknown processor'}, median of ${REPETITIONS} runs`)
  for (const file of benchFiles(process.argv.slice(2))) {
    /** @type {Bench} */
    const bench = await import(pathToFileURL(join(folder, file)).href)
    const rows = await step(bench.name, () => repeated(bench))
    say(`${tableLines(rows).join('\n')}\n`)
  }
  return 0
}

await runCommand(main, 130)
