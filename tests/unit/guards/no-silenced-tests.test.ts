import ts from 'typescript'
import { describe, expect, it } from 'vitest'
import { projectFiles } from '~/tests/support/project-files'
import { nodesOf, parseProjectFile, parseText, placeOf, type ParsedFile } from '~/tests/support/syntax'

/**
 * Protects the meaning of a green run. A test that is skipped, postponed or
 * left alone with `only` is a safety net that is believed in and not there.
 */
const files = projectFiles('.ts', '.mjs', '.js').filter(path => path.startsWith('tests/'))

const silencers = new Set(['skip', 'only', 'todo', 'skipIf', 'runIf', 'fails', 'fixme'])
const silentNames = new Set(['xit', 'xtest', 'xdescribe', 'fit', 'fdescribe'])

function silenced(file: ParsedFile): string[] {
  return file.scripts.flatMap(script => [...nodesOf(script)].flatMap((node) => {
    const what = silencer(node)
    return what === null ? [] : [`${placeOf(script, node)} uses ${what}`]
  }))
}

function silencer(node: ts.Node): string | null {
  if (ts.isPropertyAccessExpression(node) && silencers.has(node.name.text)) return node.getText()
  if (ts.isPropertyAssignment(node) && silencers.has(node.name.getText())
    && node.initializer.kind === ts.SyntaxKind.TrueKeyword) return node.getText()
  if (ts.isCallExpression(node) && ts.isIdentifier(node.expression) && silentNames.has(node.expression.text)) return node.expression.text
  return null
}

describe('tests', { timeout: 60_000 }, () => {
  it('are there', () => {
    expect(files.filter(path => path.endsWith('.test.ts')).length).toBeGreaterThan(10)
  })

  it('all run', () => {
    expect(files.map(parseProjectFile).flatMap(silenced)).toEqual([])
  })
})

describe('the guard itself', () => {
  it.each([
    'it.skip(\'a\', f)', 'describe.only(\'a\', f)', 'test.todo(\'a\')', 'it.skipIf(slow)(\'a\', f)', 'it(\'a\', (context) => { context.skip() })',
    'it(\'a\', { only: true }, f)', 'xit(\'a\', f)', 'it.concurrent.only(\'a\', f)', 'it.only.each([1])(\'a\', f)',
  ])('finds %s', (text) => {
    expect(silenced(parseText('tests/x.test.ts', text))).toHaveLength(1)
  })

  it('lets the words pass where they silence nothing', () => {
    expect(silenced(parseText('tests/x.test.ts', 'it(\'skips only todo\', () => { list.slice(1) })'))).toEqual([])
  })
})
