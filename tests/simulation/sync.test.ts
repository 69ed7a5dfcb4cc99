import * as fc from 'fast-check'
import { expect, it } from 'vitest'
import { violations } from './support/invariants'
import { play, schedule } from './support/schedule'
import { World } from './support/world'

const SCHEDULES = Number(process.env.STILLROOT_SCHEDULES ?? 1_000)
const seed = Number(process.env.STILLROOT_SEED ?? Math.floor(Math.random() * 2 ** 31))

/**
 * The shipped phone engine and the shipped services, with everything that can
 * happen between them. After each schedule the world heals, and then nothing
 * may be lost, done twice, overwritten unseen, or seen by the wrong person.
 */
it(`keeps every promise through ${SCHEDULES} schedules (seed ${seed})`, async () => {
  let played = 0
  await fc.assert(fc.asyncProperty(schedule, async (steps) => {
    const world = new World()
    await world.begin()
    await play(world, steps)
    await world.heal()
    played += 1
    expect(await violations(world)).toEqual([])
  }), { numRuns: SCHEDULES, seed })
  expect(played).toBeGreaterThanOrEqual(SCHEDULES)
}, 10 * 60_000)
