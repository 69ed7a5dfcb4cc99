import { describe, expect, it } from 'vitest'
import { emptyVesselFields } from '#shared/domain/vessel.schema'
import { issueSentence } from '~/utils/log/issue-words'
import { aboveLimitWords, aboveRimWords, belowCupWords, levelHints, limitWords } from '~/utils/log/level-words'
import { emptyLogForm } from '~/utils/log/log-form'
import { rangeLines } from '~/utils/log/range-words'
import { entryValueWords } from '~/utils/words/conflict'

const bucket = {
  ...emptyVesselFields, name: 'Grey bucket', shape: 'round' as const, topLengthCm: 20, bottomLengthCm: 20, heightCm: 30, netCupDepthCm: 6,
}
const read = (change: Partial<ReturnType<typeof emptyLogForm>['readings']>) => ({ ...emptyLogForm().readings, ...change })

describe('what a level means', () => {
  it('is told beside it', () => {
    expect(levelHints(read({ waterLevelCm: 20 }), bucket)).toEqual({ waterLevelCm: '6.3 L left', airGapCm: '4 cm by the water level' })
    expect(levelHints(read({ airGapCm: 4 }), bucket)).toEqual({ airGapCm: '6.3 L left', waterLevelCm: '20 cm by the air gap' })
    expect(levelHints(read({ waterLevelCm: 20 }), null)).toEqual({})
  })

  it('is doubted above the rim', () => {
    expect(aboveRimWords(42, bucket)).toMatch(/only 30 cm high, and this says 42 cm.*save it as it is/)
    expect(aboveRimWords(30, bucket)).toBeNull()
    expect(aboveRimWords(42, null)).toBeNull()
  })

  it('is warned of only above the limit', () => {
    expect(aboveLimitWords(17.1, 17, bucket)).toMatch(/above the refill limit of 17 cm \(5\.3 L\)/)
    expect([aboveLimitWords(17, 17, bucket), aboveLimitWords(null, 17, bucket), aboveLimitWords(17, null, bucket)]).toEqual([null, null, null])
    expect(limitWords(17, null)).toMatch(/^Fill to 17 cm at most/)
    expect(limitWords(null, bucket)).toBeNull()
  })

  it('is warned of at set-up while the cup hangs dry', () => {
    expect(belowCupWords(20, bucket)).toMatch(/^The water ends 4 cm below the net cup\. .* at 24 cm \(7\.5 L\)/)
    expect([belowCupWords(24, bucket), belowCupWords(null, bucket), belowCupWords(20, null)]).toEqual([null, null, null])
  })
})

describe('an issue', () => {
  it.each([['ph', 'is above 14', 'pH is above 14.'], ['topUpLitres', 'is below 0', 'How much was added is below 0.'], ['elsewhere', 'is wrong', 'Something is wrong.']])(
    'of %s is a sentence', (path, message, sentence) => expect(issueSentence(path, message)).toBe(sentence),
  )
})

describe('published spans', () => {
  it('start with the one in use and name every source', () => {
    const [ph, ec] = rangeLines('pepper')
    expect(ph?.lines[0]).toMatchObject({ span: '5.5 to 6', used: true })
    expect(ec?.lines[0]).toMatchObject({ span: '0.8 to 1.8 mS/cm', used: true })
    expect([...ph?.lines ?? [], ...ec?.lines ?? []].filter(line => line.used)).toHaveLength(2)
    expect(ec?.lines.every(line => line.source.length > 20)).toBe(true)
    expect(ec?.lines[0]?.source).toMatch(/Value from memory\.$/)
  })

  it('may be missing', () => {
    expect(rangeLines('other')[1]?.lines).toEqual([])
  })
})

describe('a value kept twice', () => {
  it.each([
    ['ph', 6.9, 'pH 6.9'], ['note', 'White roots', '"White roots"'], ['note', null, 'nothing'], ['lookedNoChange', true, 'yes'],
    ['actions', ['topped-up', 'pruned'], 'Topped up and pruned'], ['actions', [], 'nothing'], ['topUpWith', 'plain-water', 'Plain water'],
    ['topUpLitres', 2.5, '2.5'],
  ])('of %s, %j, is said as %j', (field, value, words) => {
    expect(entryValueWords(field, value, { locale: 'en-GB' })).toBe(words)
  })

  it('tells a time by the plant’s clock', () => {
    expect(entryValueWords('occurredAt', '2026-06-09T05:40:00.000Z', { timeZone: 'Europe/Lisbon', locale: 'en-GB' })).toBe('9 June at 06:40')
  })
})
