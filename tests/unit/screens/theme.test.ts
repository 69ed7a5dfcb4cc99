import { describe, expect, it } from 'vitest'
import { themeBeforePaint } from '~/utils/theme'

/** Runs the script of the page's head on a page and a store that a test makes. */
function themeWith(getItem: () => string | null): string | undefined {
  const page = { documentElement: { dataset: {} as Record<string, string> } }
  new Function('document', 'localStorage', themeBeforePaint)(page, { getItem })
  return page.documentElement.dataset.theme
}

describe('the theme before the first paint', () => {
  it.each(['day', 'night'])('is %s when that was chosen', (theme) => {
    expect(themeWith(() => theme)).toBe(theme)
  })

  it.each([null, 'auto', 'sepia', ''])('follows the device for %j', (kept) => {
    expect(themeWith(() => kept)).toBeUndefined()
  })

  it('does not stop the page where a browser forbids its store', () => {
    expect(themeWith(() => {
      throw new Error('denied')
    })).toBeUndefined()
  })
})
