import { describe, expect, it } from 'vitest'
import { commentFieldsSchema, commentPatchSchema } from '#shared/domain/comment.schema'
import { conflictResolutionSchema } from '#shared/domain/conflict.schema'
import { noticePatchSchema } from '#shared/domain/notice.schema'
import { photoFieldsSchema, photoPatchSchema } from '#shared/domain/photo.schema'
import { accepts, wrongPaths } from '~/tests/support/schema-checks'
import { ids, validComment, validPhoto } from '~/tests/support/valid-fields'

describe('photo', () => {
  it('takes a whole record', () => {
    expect(wrongPaths(photoFieldsSchema, validPhoto)).toEqual([])
  })

  it.each([
    ['byteLength', 1, 8 * 1024 * 1024], ['widthPx', 1, 2_048], ['heightPx', 1, 2_048],
  ])('%s goes from %d to %d', (field, min, max) => {
    for (const right of [min, max]) expect(wrongPaths(photoFieldsSchema, { ...validPhoto, [field]: right })).toEqual([])
    for (const wrong of [min - 1, max + 1, 1.5, null]) expect(wrongPaths(photoFieldsSchema, { ...validPhoto, [field]: wrong })).toEqual([field])
  })

  it.each([
    ['subject', 'me'], ['sha256', 'AB'.repeat(32)], ['entryId', null], ['takenAt', '2026-06-09'],
  ])('refuses %s = %j', (field, value) => {
    expect(wrongPaths(photoFieldsSchema, { ...validPhoto, [field]: value })).toEqual([field])
  })

  it('carries no place', () => {
    expect(accepts(photoFieldsSchema, { ...validPhoto, latitude: 38.7 })).toBe(false)
  })

  it('is patched in what it shows, never in its bytes', () => {
    expect(accepts(photoPatchSchema, { subject: 'leaf' })).toBe(true)
    expect(accepts(photoPatchSchema, { sha256: validPhoto.sha256 })).toBe(false)
  })
})

describe('comment', () => {
  it('must say something, in at most 4,000 characters', () => {
    expect(wrongPaths(commentFieldsSchema, validComment)).toEqual([])
    expect(accepts(commentFieldsSchema, { ...validComment, text: 'a'.repeat(4_000) })).toBe(true)
    for (const wrong of ['', ' \n ', 'a'.repeat(4_001), null]) expect(wrongPaths(commentFieldsSchema, { ...validComment, text: wrong })).toContain('text')
  })

  it('keeps emoji and right-to-left text', () => {
    const text = 'שורשים לבנים 🌱 well done'
    const parsed = commentFieldsSchema.safeParse({ ...validComment, text })
    expect(parsed.success && parsed.data.text).toBe(text)
  })

  it('stays with its entry and its writer', () => {
    expect(accepts(commentPatchSchema, { text: 'Better words' })).toBe(true)
    expect(accepts(commentPatchSchema, { entryId: ids.entry })).toBe(false)
    expect(accepts(commentFieldsSchema, { ...validComment, authorId: ids.plant })).toBe(false)
  })
})

describe('notice and conflict', () => {
  it('lets a reader say that a notice was seen, or not yet', () => {
    expect(accepts(noticePatchSchema, { seenAt: '2026-06-09T05:40:00.000Z' })).toBe(true)
    expect(accepts(noticePatchSchema, { seenAt: null })).toBe(true)
    for (const wrong of [{}, { seenAt: 'now' }, { seenAt: null, code: 'both-kept' }]) expect(accepts(noticePatchSchema, wrong)).toBe(false)
  })

  it('lets a person choose one of the two kept values', () => {
    for (const choice of ['standing', 'other']) expect(accepts(conflictResolutionSchema, { choice })).toBe(true)
    for (const wrong of [{}, { choice: 'both' }, { choice: 'other', value: 1 }]) expect(accepts(conflictResolutionSchema, wrong)).toBe(false)
  })
})
