import type { Entry, EntryFields, ReadingField } from '#shared/domain/entry.schema'
import { READING_FIELD_NAMES } from '#shared/domain/entry.schema'
import type { PlantFields } from '#shared/domain/plant.schema'
import type { VesselFields } from '#shared/domain/vessel.schema'
import { dayNumber } from '#shared/science/time/day-number'
import { refillLimitCm } from '#shared/science/vessel/refill-limit'
import type { LevelReading, LevelStep, LevelStepKind } from '~/utils/waterline/level-line'
import type { Readings } from '~/utils/words/readings'
import { cupBottomOf, levelOf } from './vessel-water'
import { shareOfDay } from './zoned-time'

type PlantClock = Pick<PlantFields, 'setUpOn' | 'timeZone'>
type Kept = { id: string, data: Entry }

const STEP_KINDS: readonly LevelStepKind[] = ['set-up', 'changed-solution', 'topped-up', 'rained-in']

/** Day of the plant's life on which an instant falls, by the clock beside the plant. */
export function dayOf(plant: PlantClock, instant: string): number {
  return dayNumber(instant, plant.setUpOn, plant.timeZone)
}

/** The same with the part of the day that has passed: the place of an instant along the rail. */
export function dayPosition(plant: PlantClock, instant: string): number {
  return dayOf(plant, instant) + shareOfDay(instant, plant.timeZone)
}

/** Entries, newest first, by the plant's days, newest first. */
export function groupByDay<T extends Kept>(entries: readonly T[], plant: PlantClock): { day: number, entries: T[] }[] {
  const groups = new Map<number, T[]>()
  for (const entry of entries) {
    const day = dayOf(plant, entry.data.occurredAt)
    const group = groups.get(day)
    if (group) group.push(entry)
    else groups.set(day, [entry])
  }
  return [...groups].map(([day, group]) => ({ day, entries: group })).sort((left, right) => right.day - left.day)
}

/** The newest value of each reading, and the entry of the newest among them. */
export function latestReadings(entries: readonly Kept[]): { readings: Partial<Readings>, entry: Kept | null } {
  const readings: Partial<Readings> = {}
  let newest: Kept | null = null
  const wanted = new Set<ReadingField>(READING_FIELD_NAMES)
  for (const entry of entries) {
    for (const field of wanted) {
      const value = entry.data[field]
      if (value === null) continue
      readings[field] = value
      newest ??= entry
      wanted.delete(field)
    }
    if (wanted.size === 0) break
  }
  return { readings, entry: newest }
}

/** The newest level, read or worked out from a gap, with its entry. */
export function latestLevel(entries: readonly Kept[], vessel: VesselFields | null): { levelCm: number, entry: Kept } | null {
  for (const entry of entries) {
    const levelCm = levelOf(entry.data, vessel)
    if (levelCm !== null) return { levelCm, entry }
  }
  return null
}

/** What the rail is drawn from, oldest first. */
export function railOf(entries: readonly Kept[], plant: PlantClock, vessel: VesselFields | null): { readings: LevelReading[], steps: LevelStep[] } {
  const readings: LevelReading[] = []
  const steps: LevelStep[] = []
  for (const { data } of [...entries].reverse()) {
    const day = dayPosition(plant, data.occurredAt)
    const levelCm = levelOf(data, vessel)
    if (levelCm !== null) readings.push({ day, levelCm })
    for (const kind of STEP_KINDS) if (data.actions.includes(kind)) steps.push({ day, kind })
  }
  return { readings, steps }
}

/** The highest level the plant may be refilled to, from what was read up to now. */
export function refillLimitOf(
  entries: readonly { data: Pick<EntryFields, 'occurredAt' | 'waterLevelCm' | 'airGapCm' | 'actions'> }[],
  vessel: VesselFields | null,
  plant: PlantClock,
): number | null {
  const levels = entries.flatMap(({ data }) => {
    const levelCm = levelOf(data, vessel)
    const day = dayOf(plant, data.occurredAt)
    return levelCm === null ? [] : [{ day, atMs: Date.parse(data.occurredAt), levelCm, solutionChange: data.actions.includes('changed-solution') }]
  }).sort((left, right) => left.atMs - right.atMs)
  // While the vessel is being set up nothing hangs in the air yet: only how it was left that day counts.
  const settingUp = levels.filter(level => level.day <= 0).slice(-1)
  return refillLimitCm([...settingUp, ...levels.filter(level => level.day > 0)], { cupBottomCm: cupBottomOf(vessel) })
}
