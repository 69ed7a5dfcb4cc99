/** Repeatable randomness: the same seed draws the same picture on every machine. */

/** Turns words and numbers into one 32-bit seed. */
export function seedOf(...parts) {
  let hash = 2166136261
  for (const character of parts.join('|')) {
    hash = Math.imul(hash ^ character.charCodeAt(0), 16777619)
  }
  return hash >>> 0
}

/** A source of numbers from 0 (included) to 1 (excluded), with the kinds of chance the drawings need. */
export function makeRandom(...parts) {
  let state = seedOf(...parts)
  function next() {
    state = (state + 0x6D2B79F5) >>> 0
    let mixed = Math.imul(state ^ (state >>> 15), state | 1)
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61)
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296
  }
  return {
    next,
    between: (low, high) => low + (high - low) * next(),
    around: (middle, spread) => middle + spread * (next() + next() + next() - 1.5) / 1.5,
    pick: list => list[Math.floor(next() * list.length)],
    chance: share => next() < share,
    sign: () => (next() < 0.5 ? -1 : 1),
  }
}
