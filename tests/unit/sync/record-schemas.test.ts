import { describe, expect, it } from 'vitest'
import { OP_KINDS, RECORD_TYPES, type OpKind, type RecordType } from '#shared/sync/protocol'
import { checkOpFields, checkWith } from '#shared/sync/record-schemas'
import { entryFieldsSchema } from '#shared/domain/entry.schema'
import { validComment, validEntry, validPhoto, validPlant, validVessel } from '~/tests/support/valid-fields'

/** Everything a phone may do to a record, with fields that are right for it. */
const allowed: [RecordType, OpKind, Record<string, unknown>][] = [
  ['vessel', 'create', validVessel],
  ['vessel', 'patch', { name: 'Red bucket' }],
  ['vessel', 'delete', {}],
  ['plant', 'create', validPlant],
  ['plant', 'patch', { place: 'South wall' }],
  ['plant', 'delete', {}],
  ['entry', 'create', validEntry],
  ['entry', 'patch', { ph: 5.9 }],
  ['entry', 'delete', {}],
  ['photo', 'create', validPhoto],
  ['photo', 'patch', { subject: 'leaf' }],
  ['photo', 'delete', {}],
  ['comment', 'create', validComment],
  ['comment', 'patch', { text: 'Better words' }],
  ['comment', 'delete', {}],
  ['conflict', 'resolve', { choice: 'other' }],
  ['notice', 'patch', { seenAt: null }],
]

const forbidden = RECORD_TYPES.flatMap(entityType => OP_KINDS.map(kind => ({ entityType, kind })))
  .filter(({ entityType, kind }) => !allowed.some(([type, allowedKind]) => type === entityType && allowedKind === kind))

describe('checkOpFields', () => {
  it.each(allowed)('lets a %s take "%s"', (entityType, kind, fields) => {
    expect(checkOpFields({ entityType, kind, fields })).toEqual({ ok: true, fields })
  })

  it('leaves most pairs of record and kind out', () => {
    expect(forbidden).toHaveLength(RECORD_TYPES.length * OP_KINDS.length - allowed.length)
  })

  it.each(forbidden)('refuses $kind of a $entityType', ({ entityType, kind }) => {
    const checked = checkOpFields({ entityType, kind, fields: {} })
    expect(checked).toMatchObject({ ok: false, issues: [{ path: 'kind' }] })
  })

  it('takes nothing along on a deletion', () => {
    expect(checkOpFields({ entityType: 'plant', kind: 'delete', fields: { name: 'gone' } })).toEqual({ ok: true, fields: {} })
  })

  it('says every problem with its path', () => {
    const checked = checkOpFields({ entityType: 'entry', kind: 'create', fields: { ...validEntry, ph: 15, actions: ['danced'] } })
    expect(checked).toMatchObject({ ok: false, issues: [{ path: 'ph', message: 'is above 14' }, { path: 'actions.0' }] })
  })

  it('refuses a field that nobody may write', () => {
    for (const field of ['id', 'ownerId', 'authorId', 'ver', 'constructor']) {
      expect(checkOpFields({ entityType: 'plant', kind: 'patch', fields: { [field]: 'x' } }).ok, field).toBe(false)
    }
  })

  it('does not hand a prototype on', () => {
    const fields: Record<string, unknown> = JSON.parse('{"__proto__":{"ownerId":"x"},"name":"a"}')
    const checked = checkOpFields({ entityType: 'plant', kind: 'patch', fields })
    if (checked.ok) expect('ownerId' in checked.fields).toBe(false)
    expect('ownerId' in {}).toBe(false)
  })

  it('leaves what it was given alone', () => {
    const fields = Object.freeze({ ...validEntry })
    const checked = checkOpFields({ entityType: 'entry', kind: 'create', fields })
    expect(checked.ok && checked.fields).not.toBe(fields)
  })
})

describe('checkWith', () => {
  it.each([null, undefined, 7, 'entry', [], [validEntry]])('refuses %j without throwing', (value) => {
    expect(checkWith(entryFieldsSchema, value)).toMatchObject({ ok: false, issues: [{ path: '' }] })
  })
})
