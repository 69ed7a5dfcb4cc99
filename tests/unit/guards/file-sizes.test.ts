import { describe, expect, it } from 'vitest'
import { projectFiles, readProjectFile } from '~/tests/support/project-files'
import { lineCount, parseProjectFile, parseText, type ParsedFile } from '~/tests/support/syntax'

/**
 * Protects against the one big page and the one class that owns everything: a
 * file that nobody can read in one sitting is changed by guessing.
 */
const SCRIPT_LINES_MAX = 150
const FILE_LINES_MAX = 300

const files = projectFiles('.ts', '.vue', '.mjs', '.js', '.css')
const components = files.filter(path => path.endsWith('.vue'))

function longScript(file: ParsedFile): string[] {
  return file.scriptLines > SCRIPT_LINES_MAX ? [`${file.path}: ${file.scriptLines} lines of script`] : []
}

function longFile(path: string, text: string): string[] {
  const lines = lineCount(text)
  return lines > FILE_LINES_MAX ? [`${path}: ${lines} lines`] : []
}

describe('sizes', { timeout: 60_000 }, () => {
  it('have files and components to look at', () => {
    expect(files.length).toBeGreaterThan(50)
    expect(components.length).toBeGreaterThan(5)
  })

  it(`keep every component's script to ${SCRIPT_LINES_MAX} lines`, () => {
    expect(components.map(parseProjectFile).flatMap(longScript)).toEqual([])
  })

  it(`keep every file to ${FILE_LINES_MAX} lines`, () => {
    expect(files.flatMap(path => longFile(path, readProjectFile(path)))).toEqual([])
  })
})

describe('the guard itself', () => {
  const component = (lines: number) =>
    parseText('x.vue', `<template><p /></template>\n<script setup lang="ts">\n${'const a = 1\n'.repeat(lines)}</script>`)

  it('finds a script of one line too many and lets the last allowed one pass', () => {
    expect(longScript(component(150))).toEqual([])
    expect(longScript(component(151))).toEqual(['x.vue: 151 lines of script'])
  })

  it('finds a file of one line too many and lets the last allowed one pass', () => {
    expect(longFile('x.ts', 'a\n'.repeat(300))).toEqual([])
    expect(longFile('x.ts', 'a\n'.repeat(301))).toEqual(['x.ts: 301 lines'])
  })
})
