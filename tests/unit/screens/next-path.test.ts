import { describe, expect, it } from 'vitest'
import { HOME, safeNext } from '~/utils/next-path'

describe('where sign-in leads to', () => {
  it.each(['/today', '/join/abc-DEF_123', '/plants/1?tab=2#entry-3', '/club/%2F%2Fx'])('follows %j', (path) => {
    expect(safeNext(path)).toBe(path)
  })

  it.each([
    'https://elsewhere.example', '//elsewhere.example', '/\\elsewhere.example', '\\\\elsewhere.example', '/a\\b',
    '/\t/elsewhere.example', '/\n/elsewhere.example', '/.//elsewhere.example', '/x/..//elsewhere.example',
    'javascript:alert(1)', 'today', '', ' /today', undefined, null, ['/today', '/club'], 7,
  ])('goes home instead of following %j', (asked) => {
    expect(safeNext(asked)).toBe(HOME)
  })

  it.each(['/sign-in', '/sign-up?next=%2Fclub', '/sign-in/'])('does not lead back to the form: %j', (asked) => {
    expect(safeNext(asked)).toBe(HOME)
  })

  it('stays on this site however it is read', () => {
    for (const asked of ['/a/../../..//x.example', '/%5Cx.example', '/@x.example', '/:80']) {
      expect(new URL(safeNext(asked), 'https://stillroot.example').host).toBe('stillroot.example')
    }
  })
})
