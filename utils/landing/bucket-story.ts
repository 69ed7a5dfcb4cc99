import { cupBottomCm } from '#shared/science/vessel/net-cup'
import { litresAtLevel } from '#shared/science/vessel/level-to-litres'
import { refillLimitCm } from '#shared/science/vessel/refill-limit'

/**
 * The invented plant of the first page: one bucket from set-up to its stop line.
 * Levels are made up; litres and limit are worked out as in the journal.
 */
export const STORY_DAYS = 28
/** Where the picture stands before anybody moves it. */
export const STORY_DAY_SHOWN = 18

const VESSEL = { shape: 'round', topDiameterCm: 28, bottomDiameterCm: 23, heightCm: 27 } as const
const CUP = { rimCm: 9, depthCm: 7 }
const START_CM = 22
const DROP_CM = 18.2

export const STORY_MEASURES = { topCm: VESSEL.topDiameterCm, bottomCm: VESSEL.bottomDiameterCm, heightCm: VESSEL.heightCm, cupRimCm: CUP.rimCm, cupDepthCm: CUP.depthCm }

/** A young plant drinks little, a grown one evenly more. */
export function storyLevelCm(day: number): number {
  return START_CM - DROP_CM * (day / STORY_DAYS) ** 1.7
}

export function storyLitres(day: number): number {
  return litresAtLevel(VESSEL, storyLevelCm(day))
}

/** Highest level to refill to on a day; null until the level has left the cup. */
export function storyLimitCm(day: number): number | null {
  const bottom = cupBottomCm(VESSEL.heightCm, CUP.depthCm)
  return refillLimitCm([{ atMs: 0, levelCm: START_CM }, { atMs: 1, levelCm: storyLevelCm(day) }], { cupBottomCm: bottom })
}

const CHAPTERS = [
  { from: 0, text: 'The water touches the net cup, and the seedling drinks from there.' },
  { from: 10, text: 'The level has left the cup. The first roots follow it down.' },
  { from: 14, text: 'The roots left in air grow fine hairs and breathe. Water poured above the dashed line may drown them.' },
  { from: 22, text: 'Now it drinks in big gulps. You see how long the water will last.' },
  { from: 27, text: 'The last tenth. Change the solution, or harvest.' },
]

/** What is going on in the bucket. */
export function storyChapter(day: number): string {
  return CHAPTERS.findLast(chapter => day >= chapter.from)?.text ?? ''
}
