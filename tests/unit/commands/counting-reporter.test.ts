import { mkdtemp, readFile, rm } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest'
import type { TestModule } from 'vitest/node'
import CountingReporter, { sumCounts } from '~/scripts/lib/counting-reporter.mjs'

type State = 'passed' | 'failed' | 'skipped' | 'pending'

function moduleOf(states: State[], errors: { module?: number, suite?: number } = {}) {
  return {
    errors: () => Array.from({ length: errors.module ?? 0 }),
    children: {
      allTests: () => states.map(state => ({ result: () => ({ state }) })),
      allSuites: () => [{ errors: () => Array.from({ length: errors.suite ?? 0 }) }],
    },
  } as unknown as TestModule
}

let folder = ''
beforeEach(async () => {
  folder = await mkdtemp(join(tmpdir(), 'stillroot-unit-'))
  vi.stubEnv('STILLROOT_TIER_REPORT', join(folder, 'report.json'))
})
afterEach(async () => {
  vi.unstubAllEnvs()
  await rm(folder, { recursive: true })
})

async function countsOf(modules: TestModule[], unhandled: unknown[] = []) {
  new CountingReporter().onTestRunEnd(modules, unhandled)
  return JSON.parse(await readFile(join(folder, 'report.json'), 'utf8')) as unknown
}

describe('the counting reporter', () => {
  it.each([
    ['every test that passed', [moduleOf(['passed', 'passed'])], { passed: 2, failed: 0 }],
    ['a skipped test as failed', [moduleOf(['passed', 'skipped'])], { passed: 1, failed: 1 }],
    ['a test that never ended as failed', [moduleOf(['pending'])], { passed: 0, failed: 1 }],
    ['a file that could not be loaded as failed', [moduleOf([], { module: 1 })], { passed: 0, failed: 1 }],
    ['a file without tests as failed', [moduleOf([])], { passed: 0, failed: 1 }],
    ['a clean-up that threw as failed', [moduleOf(['passed'], { suite: 1 })], { passed: 1, failed: 1 }],
  ])('counts %s', async (_what, modules, expected) => {
    expect(await countsOf(modules)).toEqual(expected)
  })

  it('counts an error outside every test as failed', async () => {
    expect(await countsOf([moduleOf(['passed'])], [new Error('late')])).toEqual({ passed: 1, failed: 1 })
  })
})

describe('sumCounts', () => {
  it('adds tiers up', () => {
    expect(sumCounts([{ passed: 2, failed: 1 }, { passed: 3, failed: 0 }])).toEqual({ passed: 5, failed: 1 })
  })
})
