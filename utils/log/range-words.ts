import type { CropId } from '#shared/science/crops/crop-ids'
import { primaryRange, publishedRanges } from '#shared/science/crops/published-ranges'
import type { PublishedRange, RangedQuantity } from '#shared/science/crops/published-ranges'
import { SOURCES } from '#shared/science/sources'
import { number } from '~/utils/words/numbers'

export type RangeLine = { key: string, span: string, context: string, source: string, used: boolean }

const TITLES: readonly [RangedQuantity, string, string][] = [['ph', 'pH', ''], ['ec', 'Strength (EC)', ' mS/cm']]

/** Every published span for a crop, the one in use first, each with its source. */
export function rangeLines(cropId: CropId): { title: string, lines: RangeLine[] }[] {
  return TITLES.map(([quantity, title, unit]) => {
    const used = primaryRange(cropId, quantity)
    const others = publishedRanges(cropId, quantity).filter(range => range !== used)
    return { title, lines: (used ? [used, ...others] : others).map((range, index) => lineOf(range, unit, used !== null && index === 0)) }
  })
}

function lineOf(range: PublishedRange, unit: string, used: boolean): RangeLine {
  const span = range.low === range.high ? number(range.low, 2) : `${number(range.low, 2)} to ${number(range.high, 2)}`
  return { key: `${range.source} ${range.context} ${span}`, span: `${span}${unit}`, context: range.context, source: sourceWords(range), used }
}

function sourceWords({ source, place, provenance }: PublishedRange): string {
  const { authors, year, title, where } = SOURCES[source]
  const parts = [`${authors}${year === null ? '' : ` (${year})`}: ${title}. ${where}`, place && !where.includes(place) ? place : '']
  const honest = provenance === 'memory' ? ' Value from memory.' : ''
  return `${parts.filter(Boolean).join(', ')}.${honest}`
}
