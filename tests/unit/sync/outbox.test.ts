import { describe, expect, it } from 'vitest'
import { baseVersionFor, batchOf, sendable } from '#shared/sync/outbox'
import type { AttentionItem, OutboxItem } from '#shared/sync/outbox'
import type { Op } from '#shared/sync/protocol'
import { makeOp } from '../../support/ops'

const item = (op: Op): OutboxItem => ({ op, savedAt: '2026-06-01T00:00:00.000Z' })
const refused = (op: Op): AttentionItem => ({ op, code: 'invalid', message: 'no', issues: [], at: '2026-06-01T00:00:00.000Z' })

describe('baseVersionFor', () => {
  it('is the record’s version when nothing waits', () => {
    expect(baseVersionFor('a', 7, [])).toBe(7)
  })

  it('is no later than what the waiting operations on it had seen', () => {
    const waiting = makeOp({ entityId: 'a', baseVer: 4 })
    expect(baseVersionFor('a', 7, [waiting, makeOp({ entityId: 'b', baseVer: 1 })])).toBe(4)
  })
})

describe('sendable', () => {
  it('lets other records pass a refused one', () => {
    const stuck = makeOp({ entityId: 'a' })
    const behind = item(makeOp({ entityId: 'a' }))
    const other = item(makeOp({ entityId: 'b' }))
    expect(sendable([behind, other], [refused(stuck)])).toEqual([other])
  })

  it('holds what builds on a record whose making was refused, through every step', () => {
    const plant = makeOp({ kind: 'create', entityType: 'plant', entityId: 'plant' })
    const entry = item(makeOp({ kind: 'create', entityId: 'entry', fields: { plantId: 'plant' } }))
    const photo = item(makeOp({ kind: 'create', entityType: 'photo', entityId: 'photo', fields: { plantId: 'other', entryId: 'entry' } }))
    expect(sendable([entry, photo], [refused(plant)])).toEqual([])
  })

  it('does not hold what builds on a record of which only a change was refused', () => {
    const change = makeOp({ kind: 'patch', entityType: 'plant', entityId: 'plant' })
    const entry = item(makeOp({ kind: 'create', entityId: 'entry', fields: { plantId: 'plant' } }))
    expect(sendable([entry], [refused(change)])).toEqual([entry])
  })
})

describe('batchOf', () => {
  const note = (text: string) => item(makeOp({ fields: { note: text } }))

  it('keeps the order and stops at the number of operations', () => {
    const items = [note('1'), note('2'), note('3')]
    expect(batchOf(items, 2, 1_000_000)).toEqual(items.slice(0, 2))
  })

  it('counts bytes as they travel, so that a growing note in another script fits', () => {
    const wide = note('水'.repeat(1_000))
    const bytes = new TextEncoder().encode(JSON.stringify(wide.op)).length
    expect(batchOf([wide, note('x')], 50, bytes + 1)).toEqual([wide])
    expect(batchOf([note('x'), wide], 50, bytes)).toHaveLength(1)
  })

  it('sends one operation even when it is too large: the server says so, and it does not block the rest', () => {
    expect(batchOf([note('x'.repeat(5_000)), note('y')], 50, 100)).toHaveLength(1)
  })
})
