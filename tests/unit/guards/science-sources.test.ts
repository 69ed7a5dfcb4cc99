import ts from 'typescript'
import { describe, expect, it } from 'vitest'
import { SOURCES } from '#shared/science/sources'
import { projectFiles } from '~/tests/support/project-files'
import { nodesOf, parseProjectFile, parseText, placeOf, type ParsedFile } from '~/tests/support/syntax'

/**
 * Protects that every number can be looked up: each exported function and
 * constant of `shared/science` says after `@source` which publication it comes
 * from, or that it is a fact of the trade without one. A source that nothing
 * cites is a claim of support that is not there.
 */
const REGISTRY = 'shared/science/sources.ts'
const TRADE = 'common practice, no source'
const files = projectFiles('.ts').filter(path => path.startsWith('shared/science/') && path !== REGISTRY)

function isExported(node: ts.Node): node is ts.FunctionDeclaration | ts.VariableStatement | ts.ClassDeclaration {
  const exportable = ts.isFunctionDeclaration(node) || ts.isVariableStatement(node) || ts.isClassDeclaration(node)
  return exportable && (node.modifiers?.some(modifier => modifier.kind === ts.SyntaxKind.ExportKeyword) ?? false)
}

function documented(node: ts.FunctionDeclaration | ts.VariableStatement | ts.ClassDeclaration): ts.Node {
  return ts.isVariableStatement(node) ? node.declarationList.declarations[0] ?? node : node
}

/** What stands after each `@source`. */
function sourceTags(node: ts.Node): string[] {
  return ts.getJSDocTags(node)
    .filter(tag => tag.tagName.text === 'source')
    .map(tag => (ts.getTextOfJSDocComment(tag.comment) ?? '').trim())
}

function hasWords(node: ts.Node): boolean {
  return ts.getJSDocCommentsAndTags(node)
    .some(doc => ts.isJSDoc(doc) && (ts.getTextOfJSDocComment(doc.comment) ?? '').trim() !== '')
}

function isKnown(tag: string): boolean {
  return tag === TRADE || Object.hasOwn(SOURCES, tag.split(/[\s,;]/)[0] ?? '')
}

function unsourced(file: ParsedFile): string[] {
  return file.scripts.flatMap(script => script.statements.filter(isExported).flatMap((statement) => {
    const node = documented(statement)
    const tags = sourceTags(node)
    const place = placeOf(script, node)
    if (!hasWords(node)) return [`${place} has no doc comment`]
    if (tags.length === 0) return [`${place} names no @source`]
    return tags.filter(tag => !isKnown(tag)).map(tag => `${place} names "${tag}", which is not in the registry`)
  }))
}

/** Keys after `@source` and in `source` fields of tables. */
function citations(file: ParsedFile): string[] {
  return file.scripts.flatMap(script => [
    ...script.statements.filter(isExported).flatMap(statement => sourceTags(documented(statement)).map(tag => tag.split(/[\s,;]/)[0] ?? '')),
    ...[...nodesOf(script)].flatMap(node =>
      ts.isPropertyAssignment(node) && node.name.getText() === 'source' && ts.isStringLiteralLike(node.initializer)
        ? [node.initializer.text]
        : []),
  ])
}

describe('sources of shared/science', { timeout: 60_000 }, () => {
  it('has files and sources to look at', () => {
    expect(files.length).toBeGreaterThan(5)
    expect(Object.keys(SOURCES).length).toBeGreaterThan(5)
  })

  it('are named by every exported function and constant', () => {
    expect(files.map(parseProjectFile).flatMap(unsourced)).toEqual([])
  })

  it('are all cited', () => {
    const cited = new Set(files.map(parseProjectFile).flatMap(citations))
    expect(Object.keys(SOURCES).filter(key => !cited.has(key))).toEqual([])
  })

  it('say author, title, place and how the values came here', () => {
    for (const source of Object.values(SOURCES)) {
      for (const field of ['authors', 'title', 'where', 'note'] as const) {
        expect(source[field].trim(), `${field} of "${source.title}"`).not.toBe('')
      }
    }
  })
})

describe('the guard itself', () => {
  it.each([
    ['export function f() {}', 'has no doc comment'],
    ['/** What it does. */\nexport function f() {}', 'names no @source'],
    ['/** @source kratky-2004 */\nexport const A = 1', 'has no doc comment'],
    ['/**\n * What.\n *\n * @source nobody-1900 p. 3\n */\nexport const A = 1', 'names "nobody-1900 p. 3"'],
    ['/**\n * What.\n *\n * @source common knowledge\n */\nexport class A {}', 'names "common knowledge"'],
  ])('finds %j', (text, problem) => {
    expect(unsourced(parseText('shared/science/x.ts', text))).toEqual([expect.stringContaining(problem)])
  })

  it('accepts a key with its page, and common practice', () => {
    const text = '/**\n * What.\n *\n * @source kratky-2004 p. 83\n * @source common practice, no source\n */\nexport function f() {}'
    expect(unsourced(parseText('shared/science/x.ts', text))).toEqual([])
    expect(citations(parseText('shared/science/x.ts', text))).toContain('kratky-2004')
  })
})
