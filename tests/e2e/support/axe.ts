import { readFile } from 'node:fs/promises'
import { createRequire } from 'node:module'
import type { Page } from 'playwright-core'

const require = createRequire(import.meta.url)
let source: Promise<string> | null = null

/** What a page does wrong for people who do not see, hear or move well, in words. Empty when all is well. */
export async function axeViolations(page: Page): Promise<string[]> {
  source ??= readFile(require.resolve('axe-core/axe.min.js'), 'utf8')
  await page.evaluate(await source)
  return page.evaluate(async () => {
    const axe = Reflect.get(window, 'axe')
    const { violations } = await axe.run(document, {
      runOnly: { type: 'tag', values: ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa', 'best-practice'] },
    })
    return violations.flatMap((violation: { id: string, help: string, nodes: { target: unknown[], html: string }[] }) => (
      violation.nodes.map(node => `${violation.id}: ${violation.help} at ${node.target.join(' ')} ${node.html.slice(0, 120)}`)
    ))
  })
}
