import { readdirSync, readFileSync } from 'node:fs'
import { extname, join, relative, sep } from 'node:path'
import { fileURLToPath } from 'node:url'

/** Folder of the project, two above this file. */
export const projectRoot = fileURLToPath(new URL('../../', import.meta.url))

/** Made by tools, or by people who use the app; nothing in them is ours. */
const foreignFolders = new Set([
  'node_modules', '.git', '.nuxt', '.output', '.data', '.cache', '.ci', 'dist', 'coverage', 'test-results', 'uploads',
])

/** Paths of the project's own files from its root, with `/` between folders, sorted. */
export function projectFiles(...extensions: string[]): string[] {
  return walk(projectRoot)
    .map(path => relative(projectRoot, path).split(sep).join('/'))
    .filter(path => extensions.length === 0 || extensions.includes(extname(path)))
    .toSorted()
}

/** Text of one file of the project. */
export function readProjectFile(path: string): string {
  return readFileSync(join(projectRoot, path), 'utf8')
}

function walk(folder: string): string[] {
  return readdirSync(folder, { withFileTypes: true }).flatMap((item) => {
    const path = join(folder, item.name)
    if (item.isDirectory()) return foreignFolders.has(item.name) ? [] : walk(path)
    return item.isFile() ? [path] : []
  })
}
