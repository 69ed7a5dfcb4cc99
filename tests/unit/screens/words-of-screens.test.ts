import { describe, expect, it } from 'vitest'
import { tokenIn } from '~/utils/invitation-link'
import { changeTitle, changeValues, issueSentences } from '~/utils/words/change'
import { errorsByField, issueWords } from '~/utils/words/issues'
import { byForgotten, lookWords } from '~/utils/words/looks'
import { noticeLink, noticeWords } from '~/utils/words/notices'
import { sharingWords } from '~/utils/words/sharing'
import { bytesWords } from '~/utils/words/storage'
import { waitingByKind } from '~/utils/words/waiting'

describe('looks', () => {
  it.each([[null, 'No look yet'], [0, 'Looked today'], [-1, 'Looked today'], [1, '1 day since the last look'], [12, '12 days since the last look']])(
    '%j days ago: %s', (days, words) => expect(lookWords(days, 'en')).toBe(words),
  )

  it('puts the plant that was forgotten for longest first', () => {
    const plants = [{ id: 'a', data: { name: 'Basil' } }, { id: 'b', data: { name: 'Aster' } }, { id: 'c', data: { name: 'Chive' } }]
    const days: Record<string, number> = { a: 2, b: 2, c: 9 }
    expect(plants.sort(byForgotten(plant => days[plant.id] ?? 0)).map(plant => plant.id)).toEqual(['c', 'b', 'a'])
  })
})

describe('issues', () => {
  it('become sentences with the name of their field', () => {
    expect(issueWords({ path: 'password', message: 'is shorter than 10 characters' }, { password: 'Password' })).toBe('Password is shorter than 10 characters.')
    expect(issueWords({ path: '', message: 'is no form' }, {})).toBe('Something in it is no form.')
  })

  it('show the first for each field', () => {
    const issues = [{ path: 'name', message: 'is empty' }, { path: 'name', message: 'is odd' }]
    expect(errorsByField(issues, { name: 'Name' })).toEqual({ name: 'Name is empty.' })
  })
})

describe('notices', () => {
  it('tell who did what, and lead to the entry', () => {
    expect(noticeWords('comment-added', 'Rosa', 'Juniper')).toBe('Rosa commented on Juniper')
    expect(noticeLink({ code: 'comment-added', plantId: 'p', entryId: 'e' })).toBe('/plants/p#entry-e')
    expect(noticeLink({ code: 'delete-refused', plantId: 'p', entryId: null })).toBe('/plants/p')
    expect(noticeLink({ code: 'both-kept', plantId: 'p', entryId: 'e' })).toBe('/attention')
    expect(noticeLink({ code: 'restored-by-edit', plantId: null, entryId: null })).toBeNull()
  })
})

describe('what waits', () => {
  it('counts each record once, and leaves out what was only marked as seen', () => {
    const ops = [
      { entityType: 'entry' as const, entityId: '1' }, { entityType: 'entry' as const, entityId: '1' }, { entityType: 'entry' as const, entityId: '2' },
      { entityType: 'photo' as const, entityId: '3' }, { entityType: 'notice' as const, entityId: '4' },
    ]
    expect(waitingByKind(ops, ['3', '5'], 'en')).toBe('2 visits and 2 photos')
    expect(waitingByKind([{ entityType: 'notice', entityId: '4' }], [])).toBeNull()
  })
})

describe('a refused change', () => {
  const op = {
    kind: 'create' as const,
    entityType: 'entry' as const,
    fields: { plantId: 'x', ph: 6.1, note: null, lookedNoChange: false, actions: ['topped-up'], occurredAt: '2026-06-09T05:40:00.000Z' },
  }

  it('is told by what it was', () => {
    expect(changeTitle(op, 'Juniper')).toBe('A visit: Juniper')
    expect(changeTitle({ kind: 'resolve', entityType: 'conflict' }, null)).toBe('A choice between two values')
  })

  it('shows what was typed, and nothing that only programs read', () => {
    const values = changeValues(op, { timeZone: 'UTC', locale: 'en' })
    expect(values.map(value => value.label)).toEqual(['pH', 'What was done', 'Day and time of the visit'])
    expect(values[1]?.text).toBe('Topped up')
  })

  it('shows what a change emptied', () => {
    expect(changeValues({ kind: 'patch', entityType: 'plant', fields: { place: null } })).toEqual([{ label: 'Place', text: 'nothing' }])
  })

  it('says what is wrong by the names of the screen', () => {
    expect(issueSentences({ entityType: 'plant' }, [{ path: 'clubId', message: 'is not a club of yours' }, { path: 'name', message: 'is empty' }]))
      .toEqual(['The club is not a club of yours.', 'Name is empty.'])
  })
})

describe('sharing', () => {
  it('says who will see what, and who no longer will', () => {
    expect(sharingWords({ name: 'Roof', members: 7 }, null)).toMatch(/^All 7 members of Roof/)
    expect(sharingWords(null, null)).toMatch(/^Only you see/)
    expect(sharingWords(null, 'Roof')).toContain('Roof stops seeing it')
  })
})

describe('an invitation that was pasted', () => {
  const token = 'A1b2C3d4E5f6G7h8_-A1b2C3d4E5f6G7h8'
  it.each([token, ` ${token}\n`, `/join/${token}`, `https://stillroot.example/join/${token}?x=1`, `https://stillroot.example/join/${token}/`])(
    'is found in %j', pasted => expect(tokenIn(pasted)).toBe(token),
  )
  it.each(['', 'join', 'https://stillroot.example/', 'https://stillroot.example/join/', 'short', `${token} and more`])(
    'is not found in %j', pasted => expect(tokenIn(pasted)).toBeNull(),
  )
})

describe('sizes', () => {
  it.each([[0, '0 kB'], [1, '1 kB'], [999_000, '999 kB'], [1_250_000, '1.3 MB'], [48_700_000, '49 MB']])('%d bytes are %s', (bytes, words) => {
    expect(bytesWords(bytes, 'en')).toBe(words)
  })
})
