/**
 * The water surface over time, from what was logged. Guarantees:
 * - it passes through every reading and never leaves the span of the two
 *   readings it lies between;
 * - a change, a top-up or rain is a jump, never a slope: the reading logged
 *   with it is taken as the level after it;
 * - where nothing says what the level was (from the last reading before a jump
 *   to the jump, and from the last reading on) it holds the last level, and is
 *   marked a guess once that has gone on for longer than half a day.
 * Days are fractions counted from set-up.
 */
import type { Curve, Knot } from './monotone'
import { curveAt, monotoneCurve } from './monotone'

export type LevelReading = { day: number, levelCm: number }
export type LevelStepKind = 'set-up' | 'changed-solution' | 'topped-up' | 'rained-in'
export type LevelStep = { day: number, kind: LevelStepKind }
export type Piece = { kind: 'between' | 'guess', fromDay: number, toDay: number, curve: Curve }
export type Jump = { day: number, fromCm: number, toCm: number }
/** For so long the last level is as good as a reading. */
const STILL_KNOWN_DAYS = 0.5

export type LevelLine = { readings: LevelReading[], pieces: Piece[], jumps: Jump[] }

export function buildLevelLine(readings: readonly LevelReading[], steps: readonly LevelStep[], untilDay: number): LevelLine {
  const sorted = [...readings].sort((a, b) => a.day - b.day)
  const line: LevelLine = { readings: sorted, pieces: [], jumps: [] }
  let run: Knot[] = []
  for (const reading of sorted) {
    const before = run.at(-1)
    const step = before && lastStep(steps, before.at, reading.day)
    if (before && step) {
      closeRun(line, run)
      hold(line, before, step.day)
      line.jumps.push({ day: step.day, fromCm: before.value, toCm: reading.levelCm })
      hold(line, { at: step.day, value: reading.levelCm }, reading.day)
      run = []
    }
    // Two readings at one moment: the later one in the list stands, as in the log.
    if (run.at(-1)?.at === reading.day) run.pop()
    run.push({ at: reading.day, value: reading.levelCm })
  }
  closeRun(line, run)
  const last = run.at(-1)
  if (last) hold(line, last, untilDay)
  return line
}

function lastStep(steps: readonly LevelStep[], afterDay: number, upToDay: number): LevelStep | undefined {
  return steps
    .filter(step => step.kind !== 'set-up' && step.day > afterDay && step.day <= upToDay)
    .sort((a, b) => a.day - b.day)
    .at(-1)
}

function closeRun(line: LevelLine, run: Knot[]): void {
  const [first] = run
  const last = run.at(-1)
  if (!first || !last || first === last) return
  line.pieces.push({ kind: 'between', fromDay: first.at, toDay: last.at, curve: monotoneCurve(run) })
}

function hold(line: LevelLine, from: Knot, toDay: number): void {
  if (toDay <= from.at) return
  const curve = monotoneCurve([from, { at: toDay, value: from.value }])
  line.pieces.push({ kind: toDay - from.at > STILL_KNOWN_DAYS ? 'guess' : 'between', fromDay: from.at, toDay, curve })
}

/** The level on a day, after any jump of that moment; null where no reading reaches. */
export function levelOn(line: LevelLine, day: number): number | null {
  const piece = line.pieces.findLast(one => day >= one.fromDay && day <= one.toDay)
  if (piece) return curveAt(piece.curve, day)
  return line.readings.find(reading => reading.day === day)?.levelCm ?? null
}
