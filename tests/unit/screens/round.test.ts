import { createPinia, setActivePinia } from 'pinia'
import { beforeEach, describe, expect, it } from 'vitest'
import { nextTick, ref } from 'vue'
import { useRound } from '~/composables/useRound'
import { useJournalStore } from '~/stores/journal'
import type { View } from '~/types/view'
import { validEntry, validPlant } from '~/tests/support/valid-fields'

const ME = '11111111-1111-4111-8111-111111111111'
const now = ref(new Date('2026-06-20T12:00:00.000Z'))

function view(id: string, data: object): View<never> {
  return { id, ver: 1, unsent: false, attention: false, data: { id, ...data } as never }
}

function plant(id: string, changes: object = {}) {
  return view(id, { ...validPlant, ownerId: ME, timeZone: 'UTC', setUpOn: '2026-06-01', endedOn: null, endReason: null, name: id, ...changes })
}

function look(id: string, plantId: string, occurredAt: string) {
  return view(id, { ...validEntry, authorId: ME, plantId, occurredAt })
}

function shelf(...views: View<never>[]): ReadonlyMap<string, View<never>> {
  return new Map(views.map(one => [one.id, one]))
}

describe('today’s round', () => {
  beforeEach(() => {
    setActivePinia(createPinia())
    useJournalStore().phone = { accountId: ME } as never
  })
  const names = (round: ReturnType<typeof useRound>) => round.value.map(one => one.data.name)

  it('begins with the plant that nobody has looked at for longest', () => {
    const journal = useJournalStore()
    journal.shelves.plant = shelf(plant('fresh'), plant('forgotten'), plant('never', { setUpOn: '2026-06-10' })) as never
    journal.shelves.entry = shelf(look('1', 'fresh', '2026-06-19T08:00:00.000Z'), look('2', 'forgotten', '2026-06-04T08:00:00.000Z')) as never
    expect(names(useRound(now))).toEqual(['forgotten', 'never', 'fresh'])
  })

  it('leaves out what has ended and what is somebody else’s', () => {
    const journal = useJournalStore()
    journal.shelves.plant = shelf(plant('mine'), plant('ended', { endedOn: '2026-06-15' }), plant('theirs', { ownerId: '22222222-2222-4222-8222-222222222222' })) as never
    expect(names(useRound(now))).toEqual(['mine'])
  })

  it('does not move a row away from under the thumb when its look is saved', async () => {
    const journal = useJournalStore()
    journal.shelves.plant = shelf(plant('a'), plant('b')) as never
    journal.shelves.entry = shelf(look('1', 'b', '2026-06-18T08:00:00.000Z')) as never
    const round = useRound(now)
    expect(names(round)).toEqual(['a', 'b'])
    journal.shelves.entry = shelf(look('1', 'b', '2026-06-18T08:00:00.000Z'), look('2', 'a', '2026-06-20T11:00:00.000Z')) as never
    await nextTick()
    expect(names(round)).toEqual(['a', 'b'])
  })

  it('takes up a plant that was set up meanwhile', async () => {
    const journal = useJournalStore()
    journal.shelves.plant = shelf(plant('a')) as never
    const round = useRound(now)
    journal.shelves.plant = shelf(plant('a'), plant('b')) as never
    await nextTick()
    expect(names(round).sort()).toEqual(['a', 'b'])
  })
})
