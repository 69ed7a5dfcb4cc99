import { describe, expect, it } from 'vitest'
import { entryFieldsSchema } from '#shared/domain/entry.schema'
import { ids, validEntry } from '~/tests/support/valid-fields'
import { changedFields, emptyLogForm, fieldIdOf, fromEntry, isEmptyForm, logFormSchema, toEntryFields } from '~/utils/log/log-form'
import type { LogForm } from '~/utils/log/log-form'

const visit = { plantId: ids.plant, timeZone: 'Europe/Lisbon', now: '2026-06-09T08:00:00.000Z' }
const filled = (change: Partial<LogForm>): LogForm => ({ ...emptyLogForm(), ...change })
const entry = { ...validEntry, id: ids.entry, authorId: ids.club, occurredAt: '2026-06-09T05:40:37.123Z', ph: 6.1, note: 'White roots.' }

describe('a form becomes an entry', () => {
  it('that the schema takes, now, with only what was typed', () => {
    const fields = toEntryFields(filled({ readings: { ...emptyLogForm().readings, ph: 6.1 }, note: '  White roots. ' }), visit)
    expect(entryFieldsSchema.safeParse(fields).success).toBe(true)
    expect(fields).toEqual({ ...validEntry, occurredAt: visit.now, recordedAt: visit.now, ph: 6.1, note: 'White roots.' })
  })

  it('at the time by the plant’s clock when it was earlier', () => {
    const fields = toEntryFields(filled({ moment: '2026-06-08T19:30' }), visit)
    expect([fields.occurredAt, fields.recordedAt]).toEqual(['2026-06-08T18:30:00.000Z', visit.now])
  })

  it('whose unreadable time the schema names', () => {
    const parsed = entryFieldsSchema.safeParse(toEntryFields(filled({ moment: '0000-00-00T00:00' }), visit))
    expect(parsed.error?.issues.map(issue => issue.path)).toContainEqual(['occurredAt'])
  })

  it('without the amounts of what was not done after all', () => {
    const amounts = { topUpLitres: 2, topUpWith: 'plain-water' as const, changeLitres: 7, harvestGrams: 90, harvestCount: 4 }
    expect(toEntryFields(filled({ amounts, actions: ['topped-up'] }), visit))
      .toMatchObject({ topUpLitres: 2, topUpWith: 'plain-water', changeLitres: null, harvestGrams: null, harvestCount: null })
  })

  it('with its actions in one order, whatever was tapped first', () => {
    expect(toEntryFields(filled({ actions: ['pruned', 'topped-up'] }), visit).actions).toEqual(['topped-up', 'pruned'])
  })
})

describe('an entry that is changed', () => {
  it('changes nothing when nothing was touched, not even the seconds', () => {
    expect(changedFields(entry, fromEntry(entry, visit.timeZone), visit)).toEqual({})
  })

  it('sends only what differs', () => {
    const form = fromEntry(entry, visit.timeZone)
    form.readings.ph = 6.3
    form.note = ''
    expect(changedFields(entry, form, visit)).toEqual({ ph: 6.3, note: null })
  })

  it('does not move to now when its time is emptied', () => {
    expect(changedFields(entry, { ...fromEntry(entry, visit.timeZone), moment: null }, visit)).toEqual({})
  })
})

describe('a draft', () => {
  it('keeps a form whatever was typed', () => {
    const form = filled({ readings: { ...emptyLogForm().readings, ph: 55 }, note: '🌱', moment: '2026-06-08T19:30' })
    expect(logFormSchema.parse(JSON.parse(JSON.stringify(form)))).toEqual(form)
  })

  it('of another shape is not taken up', () => {
    expect(logFormSchema.safeParse({ ph: 6 }).success).toBe(false)
  })

  it('says nothing while only the time was set', () => {
    expect([isEmptyForm(emptyLogForm()), isEmptyForm(filled({ moment: '2026-06-08T19:30' })), isEmptyForm(filled({ note: ' ' }))]).toEqual([true, true, true])
    expect([isEmptyForm(filled({ lookedNoChange: true })), isEmptyForm(filled({ actions: ['swirled'] }))]).toEqual([false, false])
  })
})

describe('a field', () => {
  it('is found where it stands', () => {
    expect(['ph', 'topUpLitres', 'occurredAt'].map(fieldIdOf)).toEqual(['reading-ph', 'topUpLitres', 'occurredAt'])
  })
})
