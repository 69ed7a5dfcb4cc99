/**
 * Builds only when a source file changed. The stamp is a hash over the sources and lies inside the build, so
 * that a build that was cut off, or made by other means, is never taken for a current one.
 */
import { createHash } from 'node:crypto'
import { existsSync, readdirSync, readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { nuxtProgram, projectRoot } from './paths.mjs'
import { run } from './processes.mjs'
import { Refusal, step } from './say.mjs'

const NOT_SOURCES = new Set(['node_modules', 'tests', 'docs', 'scripts', 'bench', 'coverage', 'dist', 'test-results', join('server', 'uploads')])
const DOCUMENT = /\.(?:md|log)$/

/**
 * @param {string} [folder] relative to the project
 * @returns {string[]} paths in a fixed order
 */
function sourceFiles(folder = '') {
  const entries = readdirSync(join(projectRoot, folder), { withFileTypes: true })
  return entries
    .filter(entry => !entry.name.startsWith('.') && !NOT_SOURCES.has(join(folder, entry.name)) && !DOCUMENT.test(entry.name))
    .sort((a, b) => a.name < b.name ? -1 : 1)
    .flatMap(entry => entry.isDirectory() ? sourceFiles(join(folder, entry.name)) : [join(folder, entry.name)])
}

export function sourceHash() {
  const hash = createHash('sha256').update(process.versions.node)
  for (const file of sourceFiles()) {
    hash.update(`\0${file}\0`).update(readFileSync(join(projectRoot, file)))
  }
  return hash.digest('hex')
}

/**
 * @param {string} output
 * @param {string} hash
 */
function isCurrent(output, hash) {
  const stamp = join(output, 'stillroot-sources')
  return existsSync(stamp) && readFileSync(stamp, 'utf8') === hash
}

/**
 * @param {string} output the build's folder
 * @param {NodeJS.ProcessEnv} [env] where nuxt.config.ts should put it, if not in the usual place
 */
export async function ensureBuild(output, env = {}) {
  const hash = sourceHash()
  if (isCurrent(output, hash)) return
  await step('Building the app (half a minute)', async () => {
    const { code, lastLines } = await run(process.execPath, [nuxtProgram, 'build'], {
      env: { NODE_ENV: 'production', ...env },
    })
    if (code === 0) return
    throw new Refusal([...lastLines, '', 'The build failed; its last lines are above.'].join('\n'))
  })
  writeFileSync(join(output, 'stillroot-sources'), hash)
}
