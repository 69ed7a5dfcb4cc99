import { hasUnseenChanges } from '#shared/sync/merge'
import { done } from './step'
import type { Performed, Step } from './step'
import { touchParents } from './touch-parents'
import { SERVER_DEVICE_ID } from './work-unit'

/**
 * Deletes a record, unless another device did something to it or below it that
 * the person deleting was not shown: then nothing is hidden and both are told.
 */
export async function applyDelete(step: Step): Promise<Performed> {
  const { op, situation, unit, dependencies, actorId } = step
  const { record } = situation
  if (!record || record.deleted) return done(op, 'applied', record)
  const changes = await dependencies.repository.changesAfter(record.id, op.baseVer)
  // What the server noted by itself, such as that a picture has arrived, is nothing a person could miss.
  const unseen = changes.filter(change => change.deviceId !== SERVER_DEVICE_ID)
  if (hasUnseenChanges(op.deviceId, unseen)) {
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
