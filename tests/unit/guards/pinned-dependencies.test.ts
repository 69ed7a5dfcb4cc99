import { describe, expect, it } from 'vitest'
import { readProjectFile } from '~/tests/support/project-files'

/**
 * Protects a build that worked from one that will be different tomorrow: a
 * range lets a package change between two installations, and newer versions of
 * several packages here no longer run on this Node.
 */
const EXACT = /^\d+\.\d+\.\d+(?:-[\w.]+)?$/
const manifest: unknown = JSON.parse(readProjectFile('package.json'))
const lock: unknown = JSON.parse(readProjectFile('package-lock.json'))

function valueAt(value: unknown, ...keys: string[]): unknown {
  return keys.reduce<unknown>((inner, key) => isObject(inner) ? inner[key] : undefined, value)
}

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null
}

/** Every `name@version` in a group of dependencies, however deep overrides nest. */
function entriesOf(group: unknown): [name: string, version: unknown][] {
  if (!isObject(group)) return []
  return Object.entries(group).flatMap(([name, version]): [string, unknown][] =>
    isObject(version) ? entriesOf(version) : [[name, version]])
}

const groups = ['dependencies', 'devDependencies', 'optionalDependencies', 'peerDependencies', 'overrides']
const pinned = groups.flatMap(group => entriesOf(valueAt(manifest, group)))

function loose(entries: [string, unknown][]): string[] {
  return entries.filter(([, version]) => typeof version !== 'string' || !EXACT.test(version)).map(([name, version]) => `${name}@${version}`)
}

describe('dependencies', { timeout: 60_000 }, () => {
  it('are there', () => {
    expect(pinned.length).toBeGreaterThan(20)
  })

  it('name one exact version each', () => {
    expect(loose(pinned)).toEqual([])
  })

  it('are locked at that version', () => {
    const direct = ['dependencies', 'devDependencies'].flatMap(group => entriesOf(valueAt(manifest, group)))
    const drifted = direct.filter(([name, version]) => valueAt(lock, 'packages', `node_modules/${name}`, 'version') !== version)
    expect(drifted).toEqual([])
  })
})

describe('the guard itself', () => {
  it.each(['^1.2.3', '~1.2.3', '1.x', '*', 'latest', '>=1.0.0', '1.2', 'github:a/b', 'file:../a', '1.2.3 || 2.0.0'])('finds %s', (version) => {
    expect(loose([['a', version]])).toEqual([`a@${version}`])
  })

  it('lets an exact version and an exact pre-release pass', () => {
    expect(loose([['a', '1.2.3'], ['b', '1.0.0-rc.1']])).toEqual([])
  })
})
