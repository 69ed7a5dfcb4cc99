import ts from 'typescript'
import { describe, expect, it } from 'vitest'
import { projectFiles, readProjectFile } from '~/tests/support/project-files'
import { nodesOf, parseProjectFile, parseText, placeOf, type ParsedFile } from '~/tests/support/syntax'

/**
 * Protects three things at once. `any` switches the compiler off where it is
 * written and wherever its value goes. `v-html` would run what a stranger typed
 * into a note. A left-over `console.log` can print what a grower keeps private.
 */
const files = projectFiles('.ts', '.vue')
  .filter(path => !path.startsWith('tests/') && !path.startsWith('scripts/'))

const printers = new Set(['log', 'debug', 'dir', 'table', 'trace'])

function blunders(file: ParsedFile): string[] {
  const inScripts = file.scripts.flatMap(script => [...nodesOf(script)].flatMap((node) => {
    const what = blunder(node)
    return what === null ? [] : [`${placeOf(script, node)} uses ${what}`]
  }))
  return [...inScripts, ...rawMarkup(file.template).map(line => `${file.path}:${line} uses raw markup`)]
}

function blunder(node: ts.Node): string | null {
  if (node.kind === ts.SyntaxKind.AnyKeyword) return 'any'
  if (!ts.isPropertyAccessExpression(node)) return null
  if (node.expression.getText() === 'console' && printers.has(node.name.text)) return node.getText()
  return ['innerHTML', 'outerHTML', 'insertAdjacentHTML'].includes(node.name.text) ? node.name.text : null
}

type TemplateNode = {
  props?: { type: number, name: string, loc: { start: { line: number } } }[]
  children?: unknown[]
  branches?: unknown[]
}

/** Vue's syntax tree marks a directive with type 7. */
const DIRECTIVE = 7

/** Lines on which a template uses `v-html`. */
function rawMarkup(node: unknown): number[] {
  if (!isTemplateNode(node)) return []
  const here = (node.props ?? []).filter(prop => prop.type === DIRECTIVE && prop.name === 'html').map(prop => prop.loc.start.line)
  return [...here, ...[...(node.children ?? []), ...(node.branches ?? [])].flatMap(rawMarkup)]
}

function isTemplateNode(node: unknown): node is TemplateNode {
  return typeof node === 'object' && node !== null
}

describe('sources', { timeout: 60_000 }, () => {
  it('are there, with and without templates', () => {
    expect(files.length).toBeGreaterThan(20)
    expect(files.filter(path => path.endsWith('.vue')).length).toBeGreaterThan(0)
  })

  it('use no any, no raw markup and no console.log', () => {
    expect(files.map(parseProjectFile).flatMap(blunders)).toEqual([])
  })

  it('do not silence the compiler', () => {
    expect(files.filter(path => /@ts-(?:ignore|nocheck|expect-error)/.test(readProjectFile(path)))).toEqual([])
  })
})

describe('the guard itself', () => {
  it.each([
    ['x.ts', 'const a: any = 1'],
    ['x.ts', 'const a = b as any'],
    ['x.ts', 'function f(list: Array<any>) {}'],
    ['x.ts', 'console.log(1)'],
    ['x.ts', 'element.innerHTML = text'],
    ['x.vue', '<template><ul><li v-for="a in b"><p v-if="a" v-html="a" /></li></ul></template>'],
    ['x.vue', '<script setup lang="ts">\nconst a = defineModel<any>()\n</script>'],
  ])('finds what is wrong in %s: %s', (path, text) => {
    expect(blunders(parseText(path, text))).toHaveLength(1)
  })

  it('lets an honest file pass', () => {
    const text = '<script setup lang="ts">\nconst any = 1\n</script>\n<template><p v-text="any" /></template>'
    expect(blunders(parseText('x.vue', text))).toEqual([])
  })
})
