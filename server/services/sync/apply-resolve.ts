import { done, refuse } from './step'
import type { Performed, Step } from './step'
import { scopesOfRecord } from './scopes'

/** A person chose between two kept values. The choice is a change like any other, with its line in the history. */
export async function applyResolve(step: Step): Promise<Performed> {
  const { op, situation, unit, fields } = step
  const conflict = situation.record
  if (!conflict) return refuse(op, 'not_found', 'What this belongs to is not there, or not yours to see.')
  if (conflict.data.resolvedAt !== null) return done(op, 'merged', conflict, 'resolved_before')
  if (fields.choice === 'other' && situation.disputed) {
    await unit.update(situation.disputed, 'patch', {
      [String(conflict.data.field)]: conflict.data.otherValue,
    }, scopesOfRecord(situation.disputed, situation.plant))
  }
  const resolved = await unit.update(conflict, 'patch', { resolvedAt: unit.at }, situation.scopes)
  return done(op, 'applied', resolved)
}
