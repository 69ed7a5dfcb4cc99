import { done } from './step'
import type { Performed, Step } from './step'
import { touchParents } from './touch-parents'
import { unseenChanges } from './unseen-changes'

/**
 * Deletes a record, unless another device did something to it or below it that
 * the person deleting was not shown: then nothing is hidden and both are told.
 */
export async function applyDelete(step: Step): Promise<Performed> {
  const { op, situation, unit, actorId } = step
  const { record } = situation
  if (!record || record.deleted) return done(op, 'applied', record)
  if ((await unseenChanges(step, record)).length > 0) {
    await unit.notify('delete-refused', [actorId], {
      plantId: situation.plant?.id,
      entryId: record.type === 'entry' ? record.id : record.data.entryId,
    }, record.id)
    return done(op, 'merged', record, 'delete_refused')
  }
  const deleted = await unit.update(record, 'delete', {}, situation.scopes, true)
  await touchParents(step)
  return done(op, 'applied', deleted)
}
