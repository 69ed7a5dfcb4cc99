import { join } from 'node:path'
import { fileURLToPath } from 'node:url'

export const projectRoot = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '')

/** Everything a start keeps between two runs: database, mail, secrets, logs. Not in git. */
export const dataFolder = join(projectRoot, '.data')

/** What can be made again at any time. Not in git. */
export const cacheFolder = join(projectRoot, '.cache')

export const nuxtProgram = join(projectRoot, 'node_modules/nuxt/bin/nuxt.mjs')
export const vitestProgram = join(projectRoot, 'node_modules/vitest/vitest.mjs')
export const eslintProgram = join(projectRoot, 'node_modules/eslint/bin/eslint.js')
export const typescriptProgram = join(projectRoot, 'node_modules/typescript/bin/tsc')
