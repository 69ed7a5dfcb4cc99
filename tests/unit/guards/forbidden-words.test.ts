import { describe, expect, it } from 'vitest'
import { projectFiles, readProjectFile } from '~/tests/support/project-files'

/**
 * Protects whoever takes the project over: a path of one machine works nowhere
 * else, and a promise in a comment is kept by nobody. The words are put together
 * here so that this file does not find itself.
 */
const forbidden = [
  ...['work', 'tmp', 'root'].map(folder => ({
    what: `a path under ${folder} of one machine`, pattern: new RegExp(`(?<![\\w.~*-])/${folder}/`),
  })),
  ...[['TO', 'DO'], ['FIX', 'ME']].map(parts => ({
    what: `the promise ${parts.join('-')}`, pattern: new RegExp(`\\b${parts.join('')}\\b`),
  })),
]

/** Written by a package manager, or not text. */
const foreign = /(?:^|\/)(?:package-lock\.json)$|\.(?:png|jpe?g|webp|ico|woff2?|gif|pdf|zip|gz)$/

const files = projectFiles().filter(path => !foreign.test(path))

function found(path: string, text: string): string[] {
  return text.split('\n').flatMap((line, index) =>
    forbidden.filter(({ pattern }) => pattern.test(line)).map(({ what }) => `${path}:${index + 1} has ${what}`))
}

describe('words that do not belong here', { timeout: 60_000 }, () => {
  it('are looked for in every text file', () => {
    expect(files.length).toBeGreaterThan(50)
    expect(files).toContain('package.json')
  })

  it('are nowhere', () => {
    expect(files.flatMap(path => found(path, readProjectFile(path)))).toEqual([])
  })
})

describe('the guard itself', () => {
  it.each([
    ['/', 'work', '/main/a'], ['\'/', 'tmp', '/x\''], ['// TO', 'DO', ': later'], ['# FIX', 'ME'], ['=/', 'root', '/a'],
  ])('finds %s%s%s', (...parts) => {
    expect(found('x', parts.join(''))).toHaveLength(1)
  })

  it('lets paths inside the project and ordinary words pass', () => {
    expect(found('x', './tmp/a server/work/b mastodon todo list methodology')).toEqual([])
  })
})
