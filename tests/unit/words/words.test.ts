import { describe, expect, it } from 'vitest'
import { amountWords, entryTitle, listed } from '~/utils/words/entry'
import { calendarDay, dayAndTime, daysAgo, dayWords, timeAgo, typedInLater } from '~/utils/words/moments'
import { aimWords, counted, litres } from '~/utils/words/numbers'
import { readingItems, readingText, verdictWords } from '~/utils/words/readings'
import { waterlineSentences } from '~/utils/words/waterline'
import { buildLevelLine } from '~/utils/waterline/level-line'

const quiet = { actions: [], lookedNoChange: false }

describe('what an entry is called', () => {
  it('is what was done', () => {
    expect(entryTitle({ ...quiet, actions: ['topped-up', 'pruned'] }, ['roots'])).toBe('Topped up and pruned')
  })

  it('is what the photos show when nothing was done, each once', () => {
    expect(entryTitle(quiet, ['roots', 'leaf', 'roots', 'whole'])).toBe('Roots, leaf and whole plant')
  })

  it('is the look, the readings or the note when there is nothing else', () => {
    expect(entryTitle({ ...quiet, lookedNoChange: true })).toBe('Looked, no change')
    expect(entryTitle({ ...quiet, ph: 0 })).toBe('Readings')
    expect(entryTitle({ ...quiet, ph: null })).toBe('Note')
  })

  it('lists nothing as nothing', () => {
    expect(listed([])).toBe('')
  })
})

describe('amounts', () => {
  it('say how much and of what', () => {
    expect(amountWords({ topUpLitres: 1.5, topUpWith: 'plain-water' }, 'en')).toEqual(['1.5 L plain water added'])
    expect(amountWords({ topUpWith: 'half-strength' }, 'en')).toEqual(['topped up with half strength'])
    expect(amountWords({ harvestGrams: 1250, harvestCount: 1 }, 'en')).toEqual(['1,250 g picked', '1 piece picked'])
    expect(amountWords({ changeLitres: null }, 'en')).toEqual([])
  })
})

describe('readings in words', () => {
  it('show pH and strength with a decimal, temperatures without', () => {
    expect(readingText('ph', 6, 'en')).toBe('pH 6.0')
    expect(readingText('ecMilliSiemensPerCm', 1.85, 'de')).toBe('EC 1,85')
    expect(readingText('waterCelsius', 26, 'en')).toBe('water 26 °C')
    expect(readingText('waterCelsius', 26.4, 'en')).toBe('water 26.4 °C')
  })

  it('leave out what was not read, and keep a zero', () => {
    expect(readingItems({ ph: null, airGapCm: 0 }, {}, 'en').map(item => item.text)).toEqual(['air gap 0 cm'])
  })

  it('never let the colour speak alone', () => {
    for (const side of ['in', 'below', 'above'] as const) {
      for (const far of [true, false]) {
        expect(verdictWords({ side, far }).text).not.toBe('')
      }
    }
  })

  it('tell below from above and far from near', () => {
    expect(verdictWords({ side: 'below' })).toMatchObject({ text: 'below', tone: 'amber' })
    expect(verdictWords({ side: 'above', far: true })).toMatchObject({ text: 'far too high', tone: 'chilli' })
  })
})

describe('moments', () => {
  const now = new Date('2026-06-09T10:00:00.000Z')

  it('tell a visit in the zone of the plant and the order of the reader', () => {
    expect(dayAndTime('2026-06-09T05:40:00.000Z', { timeZone: 'Europe/Lisbon', locale: 'en-GB', now })).toBe('9 June at 06:40')
    expect(dayAndTime('2026-06-09T23:40:00.000Z', { timeZone: 'Asia/Kolkata', locale: 'de', now })).toMatch(/^10\. Juni.*05:10$/)
  })

  it('name the year only when it is another', () => {
    expect(dayAndTime('2025-12-31T23:30:00.000Z', { timeZone: 'UTC', locale: 'en-GB', now })).toContain('2025')
    expect(dayAndTime('2025-12-31T23:30:00.000Z', { timeZone: 'Asia/Tokyo', locale: 'en-GB', now })).not.toContain('2025')
  })

  it('count days as people do', () => {
    expect([0, 1, 4, -1, -3].map(daysAgo)).toEqual(['today', 'yesterday', '4 days ago', 'tomorrow', 'in 3 days'])
    expect(dayWords(-2)).toBe('Day \u22122')
    expect(dayWords(null)).toBe('')
    expect(calendarDay('2026-06-09', 'en-GB')).toBe('9 June 2026')
  })

  it('grow coarser with time', () => {
    const ago = (minutes: number) => timeAgo(new Date(now.getTime() - minutes * 60_000).toISOString(), now)
    expect([0, 1, 59, 60, 1439, 1440, 7200].map(ago))
      .toEqual(['just now', '1 minute ago', '59 minutes ago', '1 hour ago', '23 hours ago', 'yesterday', '5 days ago'])
  })

  it('say that an entry was typed in later only after half a day', () => {
    expect(typedInLater('2026-06-09T00:00:00.000Z', '2026-06-09T12:00:00.000Z')).toBe(false)
    expect(typedInLater('2026-06-09T00:00:00.000Z', '2026-06-09T12:00:00.001Z')).toBe(true)
    expect(typedInLater('2026-06-09T12:00:00.000Z', '2026-06-08T12:00:00.000Z')).toBe(false)
  })
})

describe('numbers in words', () => {
  it('follow the reader and are not finer than they are worth', () => {
    expect(litres(6.14, 'de')).toBe('6,1 L')
    expect(litres(29.4, 'en')).toBe('29 L')
    expect(aimWords({ low: 5.6, high: 6.3 }, 'en')).toBe('aim 5.6 to 6.3')
    expect(counted(1, 'day', undefined, 'en')).toBe('1 day')
    expect(counted(0, 'day', undefined, 'en')).toBe('0 days')
  })
})

describe('the waterline in words', () => {
  it('begins with the refill limit and goes from the newest reading down', () => {
    const line = buildLevelLine(
      [{ day: 0.4, levelCm: 19.5 }, { day: 7.2, levelCm: 15 }, { day: 7.3, levelCm: 17 }],
      [{ day: 7.3, kind: 'changed-solution' }], 8)
    expect(waterlineSentences(line, 14.6, 'en')).toEqual([
      'Refill limit: 14.6 cm. Roots above it breathe air.',
      'Day 7: water 17 cm.',
      'Day 7: filled from 15 cm to 17 cm.',
      'Day 7: water 15 cm.',
      'Day 0: water 19.5 cm.',
    ])
  })

  it('calls a refill a refill, even where it ends no higher than the last reading', () => {
    const line = buildLevelLine([{ day: 1, levelCm: 18 }, { day: 4, levelCm: 18 }], [{ day: 4, kind: 'topped-up' }], 5)
    expect(waterlineSentences(line, null, 'en')).toEqual(['Day 4: water 18 cm.', 'Day 4: filled to 18 cm.', 'Day 1: water 18 cm.'])
  })

  it('leaves the limit out while there is none', () => {
    expect(waterlineSentences(buildLevelLine([], [], 3), null)).toEqual([])
  })
})
