import ts from 'typescript'
import { describe, expect, it } from 'vitest'
import { layerOf, mayImport, resolveImport } from '~/tests/support/layers'
import { projectFiles } from '~/tests/support/project-files'
import { importsOf, nodesOf, parseProjectFile, parseText, placeOf, type ParsedFile } from '~/tests/support/syntax'

/**
 * Protects the one direction in which this project may depend on itself. A
 * store that reaches up into a component, or a page that opens the database,
 * makes both impossible to change alone; it starts with one import.
 */
const files = projectFiles('.ts', '.vue', '.mjs', '.js')

/** Only these may import the database's library; every other file asks a repository. */
const databaseLayers = new Set(['repository', 'database', 'transaction', 'tool'])

/** Names by which a page or component would reach for network or storage itself. */
const reachNames = new Set(['fetch', '$fetch', 'useFetch', 'useLazyFetch', 'indexedDB', 'XMLHttpRequest'])

function wrongImports(file: ParsedFile): string[] {
  const layer = layerOf(file.path)
  if (layer === null) return [`${file.path} lies in no layer`]
  return file.scripts.flatMap(importsOf).flatMap(({ specifier, place }) => {
    if (specifier === null) return layer === 'tool' ? [] : [`${place} imports a computed name`]
    const target = resolveImport(file.path, specifier)
    if (target === null) return mayUsePackage(layer, specifier) ? [] : [`${place} (${layer}) imports package ${specifier}`]
    if (target.endsWith('.css')) return []
    const targetLayer = layerOf(target.includes('.') || target.endsWith('/') ? target : `${target}.ts`)
    if (targetLayer === null) return layer === 'tool' ? [] : [`${place} imports ${specifier}, which lies in no layer`]
    return mayImport(layer, targetLayer) ? [] : [`${place} (${layer}) imports ${specifier} (${targetLayer})`]
  })
}

function mayUsePackage(layer: string, specifier: string): boolean {
  if (layer === 'shared') return specifier === 'zod/mini'
  if (/^(?:sequelize|mariadb|umzug)(?:\/|$)/.test(specifier)) return databaseLayers.has(layer)
  return true
}

function reachesOut(file: ParsedFile): string[] {
  return file.scripts.flatMap(script => [...nodesOf(script)].flatMap(node =>
    ts.isIdentifier(node) && reachNames.has(node.text) ? [`${placeOf(script, node)} uses ${node.text}`] : []))
}

function longRelative(file: ParsedFile): string[] {
  return file.scripts.flatMap(importsOf)
    .filter(({ specifier }) => specifier?.startsWith('../../') ?? false)
    .map(({ specifier, place }) => `${place} imports ${specifier}`)
}

function isScreen(path: string): boolean {
  const layer = layerOf(path)
  return layer === 'page' || layer === 'component'
}

describe('import direction', { timeout: 60_000 }, () => {
  it('has files to look at', () => {
    expect(files.length).toBeGreaterThan(20)
    expect(files.filter(isScreen).length).toBeGreaterThan(0)
  })

  it('holds for every import', () => {
    expect(files.map(parseProjectFile).flatMap(wrongImports)).toEqual([])
  })

  it('leaves network and storage out of pages and components', () => {
    expect(files.filter(isScreen).map(parseProjectFile).flatMap(reachesOut)).toEqual([])
  })

  it('climbs at most one folder; further away an alias says where', () => {
    expect(files.filter(path => layerOf(path) !== 'tool').map(parseProjectFile).flatMap(longRelative)).toEqual([])
  })
})

describe('the guard itself', () => {
  it.each([
    ['stores/entries.ts', 'import Sheet from \'~/components/base/Sheet.vue\''],
    ['pages/today.vue', '<script setup lang="ts">\nimport { open } from \'~/utils/offline/database\'\n</script>'],
    ['components/a/B.vue', '<script setup lang="ts">\nconst a = await import(\'../../server/utils/errors\')\n</script>'],
    ['server/api/x.get.ts', 'import { all } from \'#server/repositories/entries\''],
    ['server/services/x.ts', 'import { Op } from \'sequelize\''],
    ['server/services/x.ts', 'export { database } from \'../database/connection\''],
    ['server/repositories/x.ts', 'type A = import(\'../services/plants\').Plant'],
    ['shared/domain/x.ts', 'import { ref } from \'vue\''],
    ['shared/domain/x.ts', 'import { z } from \'zod\''],
    ['shared/domain/x.ts', 'import type { View } from \'~/types/view\''],
    ['shared/domain/x.ts', 'const a = await import(name)'],
    ['utils/words/x.ts', 'import { useEntries } from \'~/stores/entries\''],
    ['lib/x.ts', ''],
  ])('finds the wrong edge of %s in %j', (path, text) => {
    expect(wrongImports(parseText(path, text))).toHaveLength(1)
  })

  it.each([
    ['pages/today.vue', '<script setup lang="ts">\nimport Sheet from \'~/components/base/Sheet.vue\'\n</script>'],
    ['stores/entries.ts', 'import { open } from \'~/utils/offline/database\''],
    ['server/services/x.ts', 'import { inTransaction } from \'#server/database/transaction\''],
    ['server/repositories/x.ts', 'import type { Row } from \'../services/sync/ports\''],
    ['shared/domain/x.ts', 'import * as z from \'zod/mini\''],
  ])('lets the right edge of %s pass in %j', (path, text) => {
    expect(wrongImports(parseText(path, text))).toEqual([])
  })

  it('finds a page that fetches', () => {
    expect(reachesOut(parseText('pages/a.vue', '<script setup lang="ts">\nawait $fetch(\'/api/a\')\n</script>')))
      .toEqual(['pages/a.vue:2 uses $fetch'])
  })

  it('finds a long way up', () => {
    expect(longRelative(parseText('stores/a/b.ts', 'import { x } from \'../../utils/x\''))).toHaveLength(1)
  })
})
