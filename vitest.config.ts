import { fileURLToPath } from 'node:url'
import { defineVitestProject } from '@nuxt/test-utils/config'
import { playwright } from '@vitest/browser-playwright'
import type { TestProjectInlineConfiguration } from 'vitest/config'
import { defineConfig } from 'vitest/config'

const root = fileURLToPath(new URL('.', import.meta.url)).replace(/\/$/, '')
const alias = { '~': root, '#shared': `${root}/shared`, '#server': `${root}/server` }

// A test of a server, or of a page in a browser, waits for real programs.
const patience = { testTimeout: 60_000, hookTimeout: 120_000 }

function nodeProject(name: string, test: TestProjectInlineConfiguration['test'] = {}): TestProjectInlineConfiguration {
  return { resolve: { alias }, test: { name, include: [`tests/${name}/**/*.test.ts`], environment: 'node', ...test } }
}

const projects = {
  unit: () => nodeProject('unit'),
  nuxt: () => defineVitestProject({
    test: {
      name: 'nuxt',
      include: ['tests/nuxt/**/*.test.ts'],
      environment: 'nuxt',
      environmentOptions: { nuxt: { domEnvironment: 'happy-dom', mock: { indexedDb: true } } },
    },
  }),
  contract: (): TestProjectInlineConfiguration => ({
    resolve: { alias },
    test: {
      name: 'contract',
      include: ['tests/contract/**/*.test.ts'],
      browser: {
        enabled: true,
        headless: true,
        screenshotFailures: false,
        provider: playwright({
          launchOptions: {
            executablePath: process.env.STILLROOT_CHROMIUM ?? '/usr/bin/chromium',
            args: ['--no-sandbox', '--disable-gpu'],
          },
        }),
        instances: [{ browser: 'chromium' }],
      },
    },
  }),
  integration: () => nodeProject('integration', { ...patience, maxWorkers: 2 }),
  simulation: () => nodeProject('simulation', { testTimeout: 120_000 }),
  e2e: () => nodeProject('e2e', { ...patience, fileParallelism: false }),
}

// Setting a project up costs seconds where it loads the whole app, so a run of one tier sets up only that one.
const wanted = process.env.STILLROOT_TIERS?.split(',')

export default defineConfig({
  test: {
    allowOnly: false,
    projects: await Promise.all(Object.entries(projects)
      .filter(([name]) => wanted?.includes(name) ?? true)
      .map(([, project]) => project())),
  },
})
