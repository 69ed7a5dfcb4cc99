import ts from 'typescript'
import { parse as parseComponent, type SFCScriptBlock, type SFCTemplateBlock } from 'vue/compiler-sfc'
import { readProjectFile } from './project-files'

/** One source file, parsed. A component has up to two scripts and a template, any other file one script. */
export type ParsedFile = {
  path: string
  scripts: ts.SourceFile[]
  /** Lines of script a person wrote; equal to the file's lines outside components. */
  scriptLines: number
  template: SFCTemplateBlock['ast'] | null
}

/** Parses a file of the project by its path from the root. */
export function parseProjectFile(path: string): ParsedFile {
  return parseText(path, readProjectFile(path))
}

/** Parses text as the file `path` would be parsed. Lines keep their numbers. */
export function parseText(path: string, text: string): ParsedFile {
  if (!path.endsWith('.vue')) {
    return { path, scripts: [parseScript(path, text)], scriptLines: lineCount(text), template: null }
  }
  const { descriptor, errors } = parseComponent(text, { filename: path })
  if (errors.length > 0) throw new Error(`${path} cannot be parsed: ${errors.map(error => error.message).join('; ')}`)
  const blocks = [descriptor.script, descriptor.scriptSetup].filter(block => block !== null)
  return {
    path,
    scripts: blocks.map(block => parseScript(path, atItsLine(block))),
    scriptLines: blocks.reduce((sum, block) => sum + lineCount(block.content.trim()), 0),
    template: descriptor.template?.ast ?? null,
  }
}

/** Every node of a script, from the outside in. */
export function* nodesOf(root: ts.Node): Generator<ts.Node> {
  yield root
  const children: ts.Node[] = []
  ts.forEachChild(root, (child) => {
    children.push(child)
  })
  for (const child of children) yield* nodesOf(child)
}

/** Where a node stands, as `path:line`. */
export function placeOf(script: ts.SourceFile, node: ts.Node): string {
  return `${script.fileName}:${script.getLineAndCharacterOfPosition(node.getStart(script)).line + 1}`
}

/** What a script imports: declarations, re-exports, `import()` as value and as type, `require`. Null when computed. */
export function importsOf(script: ts.SourceFile): { specifier: string | null, place: string }[] {
  return [...nodesOf(script)].flatMap((node) => {
    const source = importSource(node)
    return source === undefined
      ? []
      : [{ specifier: source && ts.isStringLiteralLike(source) ? source.text : null, place: placeOf(script, node) }]
  })
}

/** Undefined when the node imports nothing. */
function importSource(node: ts.Node): ts.Node | null | undefined {
  if (ts.isImportDeclaration(node)) return node.moduleSpecifier
  if (ts.isExportDeclaration(node)) return node.moduleSpecifier
  if (ts.isExternalModuleReference(node)) return node.expression
  if (ts.isImportTypeNode(node)) return ts.isLiteralTypeNode(node.argument) ? node.argument.literal : null
  if (!ts.isCallExpression(node)) return undefined
  const isImport = node.expression.kind === ts.SyntaxKind.ImportKeyword
    || (ts.isIdentifier(node.expression) && node.expression.text === 'require')
  return isImport ? node.arguments[0] ?? null : undefined
}

function parseScript(path: string, text: string): ts.SourceFile {
  const kind = path.endsWith('.mjs') || path.endsWith('.js') ? ts.ScriptKind.JS : ts.ScriptKind.TS
  return ts.createSourceFile(path, text, ts.ScriptTarget.Latest, true, kind)
}

function atItsLine(block: SFCScriptBlock): string {
  return '\n'.repeat(block.loc.start.line - 1) + block.content
}

/** Lines as an editor counts them: a last line break opens no further line. */
export function lineCount(text: string): number {
  return text === '' ? 0 : text.replace(/\n$/, '').split('\n').length
}
