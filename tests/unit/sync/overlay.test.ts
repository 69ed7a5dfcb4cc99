import { describe, expect, it } from 'vitest'
import type { BaseRecord } from '#shared/sync/base-record'
import { overlay } from '#shared/sync/overlay'
import { makeOp } from '../../support/ops'

const base: BaseRecord = { type: 'entry', id: 'a', ver: 3, seen: 3, state: 'live', data: { id: 'a', note: 'old', ph: 6 }, scopes: ['user:1'] }

describe('overlay', () => {
  it('shows the server’s record when nothing waits', () => {
    expect(overlay(base, [], [], 'me')).toEqual({ id: 'a', ver: 3, data: base.data, unsent: false, attention: false })
  })

  it('lays waiting changes on top in order and says that they are unsent', () => {
    const shown = overlay(base, [makeOp({ fields: { note: 'new' } }), makeOp({ fields: { note: 'newer' } })], [], 'me')
    expect(shown?.data).toMatchObject({ note: 'newer', ph: 6 })
    expect(shown?.unsent).toBe(true)
  })

  it('shows a record that only this phone knows, as its owner’s', () => {
    const shown = overlay(null, [makeOp({ kind: 'create', entityId: 'b', fields: { note: 'first' } })], [], 'me')
    expect(shown).toMatchObject({ id: 'b', ver: 0, data: { id: 'b', note: 'first', authorId: 'me' }, unsent: true })
  })

  it('hides a record that this phone deleted', () => {
    expect(overlay(base, [makeOp({ kind: 'delete' })], [], 'me')).toBeNull()
    expect(overlay({ ...base, state: 'deleted', data: null }, [], [], 'me')).toBeNull()
  })

  it('keeps a record on the screen whose making was refused', () => {
    const shown = overlay(null, [], [makeOp({ kind: 'create', entityId: 'b', fields: { note: 'mine' } })], 'me')
    expect(shown).toMatchObject({ data: { note: 'mine' }, attention: true })
  })

  it('shows the server’s value where a change was refused, with a mark', () => {
    const shown = overlay(base, [], [makeOp({ fields: { note: 'refused' } })], 'me')
    expect(shown).toMatchObject({ data: { note: 'old' }, attention: true })
  })

  it('does not change the record it was given', () => {
    overlay(base, [makeOp({ fields: { note: 'new' } })], [], 'me')
    expect(base.data?.note).toBe('old')
  })
})
