import { join } from 'node:path'
import { projectRoot } from './paths.mjs'

/**
 * Loads one of the project's TypeScript files, which node of this version cannot read by itself.
 * @param {string} file from the project's root
 * @returns {Promise<Record<string, unknown>>}
 */
export async function loadTypescript(file) {
  const { runnerImport } = await import('vite')
  const { module } = await runnerImport(join(projectRoot, file), {
    root: projectRoot,
    configFile: false,
    logLevel: 'error',
    resolve: { alias: { '~': projectRoot, '#shared': join(projectRoot, 'shared') } },
  })
  return module
}
