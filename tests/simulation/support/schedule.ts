import * as fc from 'fast-check'
import { settlePull, settlePush } from '~/utils/offline/settle'
import { FAULTS } from './faulty-transport'
import type { Fault } from './faulty-transport'
import { entryFields } from './entry-fields'
import { unlessFull } from './world'
import type { Device, World } from './world'

/** One thing that happens in a schedule. `pick` chooses among what is there at that moment. */
export type Step =
  | { kind: 'create' | 'delete' | 'comment' | 'poison' | 'resolve' | 'share', device: number, pick: number }
  | { kind: 'patch', device: number, pick: number, fields: string[] }
  | { kind: 'act', device: number, pick: number, action: string }
  | { kind: 'sync', device: number, faults: Fault[] }
  | { kind: 'stale-answer' | 'full' | 'expire', device: number, pick: number }
  | { kind: 'skew', device: number, years: number }
  | { kind: 'late-arrivals' }

const device = fc.nat({ max: 2 })
/** Mostly the same few records: only where people meet can they get in each other's way. */
const pick = fc.oneof({ weight: 3, arbitrary: fc.nat({ max: 1 }) }, { weight: 1, arbitrary: fc.nat({ max: 1_000 }) })
/** Often the one way of failing that lets a phone read what it could not yet write over. */
const faults = fc.oneof(
  { weight: 3, arbitrary: fc.array(fc.constantFrom(...FAULTS), { maxLength: 4 }) },
  { weight: 2, arbitrary: fc.constantFrom<Fault[]>(['drop-before'], ['records-away'], ['none', 'drop-after'], ['none', 'none', 'drop-after']) },
)
const PATCHED = ['note', 'ph'] as const
const ACTIONS = ['swirled', 'covered', 'pruned', 'moved'] as const

const step: fc.Arbitrary<Step> = fc.oneof(
  { weight: 2, arbitrary: fc.record({ kind: fc.constant('create' as const), device: fc.nat({ max: 1 }), pick }) },
  { weight: 10, arbitrary: fc.record({ kind: fc.constant('patch' as const), device: fc.nat({ max: 1 }), pick, fields: fc.subarray([...PATCHED], { minLength: 1, maxLength: 2 }) }) },
  { weight: 2, arbitrary: fc.record({ kind: fc.constant('act' as const), device: fc.nat({ max: 1 }), pick, action: fc.constantFrom(...ACTIONS) }) },
  { weight: 2, arbitrary: fc.record({ kind: fc.constant('delete' as const), device: fc.nat({ max: 1 }), pick }) },
  { weight: 5, arbitrary: fc.record({ kind: fc.constant('comment' as const), device, pick }) },
  { weight: 1, arbitrary: fc.record({ kind: fc.constantFrom('poison' as const, 'resolve' as const, 'share' as const), device, pick }) },
  { weight: 12, arbitrary: fc.record({ kind: fc.constant('sync' as const), device, faults }) },
  { weight: 3, arbitrary: fc.record({ kind: fc.constantFrom('stale-answer' as const, 'stale-answer' as const, 'full' as const, 'expire' as const), device, pick }) },
  { weight: 1, arbitrary: fc.record({ kind: fc.constant('skew' as const), device, years: fc.integer({ min: -10, max: 10 }) }) },
  { weight: 1, arbitrary: fc.record({ kind: fc.constant('late-arrivals' as const) }) },
)

export const schedule = fc.array(step, { minLength: 10, maxLength: 45 })

/** How many answers ago an answer may be that comes late. */
const STALE_WITHIN = 4
const YEAR = 365 * 24 * 60 * 60 * 1_000

/** Values are numbered, so that each can be followed from the hand that wrote it to where it stands. */
let written = 0

export async function play(world: World, steps: Step[]): Promise<void> {
  written = 0
  for (const event of steps) await playOne(world, event)
}

async function playOne(world: World, event: Step): Promise<void> {
  if (event.kind === 'late-arrivals') {
    for (const deliver of world.late.splice(0)) await deliver()
    return
  }
  const actor = world.devices[event.device]
  if (!actor) return
  switch (event.kind) {
    case 'sync':
      await world.sync(actor, event.faults)
      return
    case 'skew':
      actor.clockOffset = event.years * YEAR
      return
    case 'full':
      actor.fillOnce()
      return
    case 'expire':
      actor.signedIn = event.pick % 2 === 0
      return
    case 'stale-answer':
      await hearStaleAnswer(world, actor, event.pick)
      return
    default:
      await write(world, actor, event)
  }
}

type Writing = Extract<Step, { kind: 'create' | 'delete' | 'comment' | 'poison' | 'resolve' | 'share' | 'patch' | 'act' }>

async function write(world: World, actor: Device, event: Writing): Promise<void> {
  written += 1
  const entityId = world.newId()
  if (event.kind === 'create' || event.kind === 'poison') {
    const ph = event.kind === 'poison' ? 15 : null
    await world.save(actor, { kind: 'create', entityType: 'entry', entityId, fields: { ...entryFields(world), ph, note: `note ${written}` } })
    return
  }
  if (event.kind === 'share') {
    const fields = { visibility: event.pick % 2 ? 'private' : 'club' }
    await world.save(world.devices[event.device % 2] ?? actor, { kind: 'patch', entityType: 'plant', entityId: world.plantId, fields })
    return
  }
  if (event.kind === 'resolve') {
    const conflict = choose(await world.visible(actor, 'conflict'), event.pick)
    if (!conflict || conflict.data.resolvedAt !== null) return
    await world.save(actor, { kind: 'resolve', entityType: 'conflict', entityId: conflict.id, fields: { choice: event.pick % 2 ? 'other' : 'standing' } })
    return
  }
  const entry = choose(await world.visible(actor, 'entry'), event.pick)
  if (!entry) return
  if (event.kind === 'comment') {
    const fields = { plantId: world.plantId, entryId: entry.id, text: `comment ${written}`, writtenAt: iso(world) }
    await world.save(actor, { kind: 'create', entityType: 'comment', entityId, fields })
  } else if (event.kind === 'delete') {
    await world.save(actor, { kind: 'delete', entityType: 'entry', entityId: entry.id, fields: {} })
  } else if (event.kind === 'act') {
    const before = Array.isArray(entry.data.actions) ? entry.data.actions : []
    const actions = before.includes(event.action) ? before.filter(action => action !== event.action) : [...before, event.action]
    await world.save(actor, { kind: 'patch', entityType: 'entry', entityId: entry.id, fields: { actions } })
  } else {
    const fields = Object.fromEntries(fieldsOf(event).map(field => [field, valueFor(field)]))
    await world.save(actor, { kind: 'patch', entityType: 'entry', entityId: entry.id, fields })
  }
}

/** An answer from long ago reaches the phone once more, as when a second tab was slow. */
async function hearStaleAnswer(world: World, actor: Device, choice: number): Promise<void> {
  const pulled = choose(actor.pullAnswers.slice(-STALE_WITHIN), choice)
  if (pulled && choice % 2) await unlessFull(() => settlePull(actor.storage, actor.accountId, pulled.scope, pulled.response))
  const pushed = choose(actor.pushAnswers.slice(-STALE_WITHIN), choice)
  if (pushed && choice % 2 === 0) await unlessFull(() => settlePush(actor.storage, world.around(actor), actor.accountId, pushed))
}

function choose<T>(list: T[], choice: number): T | undefined {
  return list[choice % Math.max(1, list.length)]
}

function fieldsOf(event: Writing): string[] {
  return event.kind === 'patch' ? event.fields : []
}

function valueFor(field: string): unknown {
  return field === 'note' ? `note ${written}` : written / 1_000
}

function iso(world: World): string {
  return new Date(world.now).toISOString()
}
