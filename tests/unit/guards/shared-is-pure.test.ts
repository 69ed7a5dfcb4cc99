import ts from 'typescript'
import { describe, expect, it } from 'vitest'
import { projectFiles } from '~/tests/support/project-files'
import { nodesOf, parseProjectFile, parseText, placeOf, type ParsedFile } from '~/tests/support/syntax'

/**
 * Protects that `shared/` gives the same answer on a phone, on the server and in
 * a test: time, randomness and storage come in as arguments. A clock read here
 * would make phone and server disagree about the same record.
 */
const files = projectFiles('.ts').filter(path => path.startsWith('shared/'))

/** Names of the world outside. */
const outside = new Set([
  'crypto', 'fetch', '$fetch', 'process', 'window', 'document', 'navigator', 'location', 'globalThis', 'self', 'global',
  'localStorage', 'sessionStorage', 'indexedDB', 'caches', 'performance', 'console', 'setTimeout', 'setInterval',
  'setImmediate', 'queueMicrotask', 'requestAnimationFrame', 'XMLHttpRequest', 'WebSocket', 'Worker', 'require', 'eval',
])

/** Members that read the clock, chance, or the time zone and language of the machine. */
const impureMembers = /^(?:Date\.now|Math\.random|Temporal\.Now)$/
const machineZone = /^(?:(?:get|set)(?:FullYear|Month|Date|Day|Hours|Minutes|Seconds|TimezoneOffset)|toLocale\w*String|toDateString|toTimeString)$/

function impurities(file: ParsedFile): string[] {
  return file.scripts.flatMap((script) => {
    const nodes = [...nodesOf(script)]
    const own = new Set(nodes.flatMap(node => declaredName(node) ?? []))
    return nodes.flatMap((node) => {
      const what = impurity(node, own)
      return what === null ? [] : [`${placeOf(script, node)} uses ${what}`]
    })
  })
}

function impurity(node: ts.Node, own: ReadonlySet<string>): string | null {
  if (ts.isPropertyAccessExpression(node)) {
    const member = node.name.text
    const whole = `${node.expression.getText()}.${member}`
    return impureMembers.test(whole) || machineZone.test(member) ? whole : null
  }
  if (ts.isNewExpression(node) && node.expression.getText() === 'Date' && (node.arguments?.length ?? 0) === 0) return 'new Date()'
  if (ts.isCallExpression(node) && node.expression.getText() === 'Date') return 'Date()'
  if (ts.isMetaProperty(node)) return 'import.meta'
  if (ts.isIdentifier(node) && outside.has(node.text) && !own.has(node.text) && isReference(node)) return node.text
  return null
}

function isReference(name: ts.Identifier): boolean {
  const parent = name.parent
  if (ts.isPropertyAccessExpression(parent)) return parent.expression === name
  if (ts.isPropertyAssignment(parent)) return parent.initializer === name
  return !ts.isPropertySignature(parent) && !ts.isMethodSignature(parent) && !ts.isQualifiedName(parent)
}

function declaredName(node: ts.Node): string | null {
  const declares = ts.isVariableDeclaration(node) || ts.isParameter(node) || ts.isFunctionDeclaration(node) || ts.isBindingElement(node)
  return declares && node.name && ts.isIdentifier(node.name) ? node.name.text : null
}

describe('shared/', { timeout: 60_000 }, () => {
  it('has files to look at', () => {
    expect(files.length).toBeGreaterThan(10)
  })

  it('reads no clock, rolls no dice and reaches for nothing outside', () => {
    expect(files.map(parseProjectFile).flatMap(impurities)).toEqual([])
  })
})

describe('the guard itself', () => {
  it.each([
    'Date.now()', 'new Date()', 'Date()', 'Math.random()', 'crypto.randomUUID()', 'fetch(address)', 'process.env.HOME',
    'window.name', 'new Date(0).getHours()', 'new Date(0).toLocaleDateString()', 'const now = Date.now', 'setTimeout(again, 5)',
    'const all = { crypto }', 'import.meta.env', 'console.error(1)',
  ])('finds %s', (text) => {
    expect(impurities(parseText('shared/x.ts', text))).toHaveLength(1)
  })

  it.each([
    'new Date(milliseconds)', 'Date.parse(text)', 'new Date(0).toISOString()', 'type A = { window: string, process: number }',
    'const a = { document: 1 }', 'record.location', 'function f(window: number) { return window }', 'Math.max(1, 2)',
  ])('lets %s pass', (text) => {
    expect(impurities(parseText('shared/x.ts', text))).toEqual([])
  })
})
