import { accountScope } from '#shared/sync/protocol'
import type { Step } from './step'
import type { StoredRecord } from './ports'

/**
 * A change below a record raises the record's own version, so that whoever
 * deletes or edits it is known to have seen it or not. A record that was
 * deleted meanwhile comes back, because deleting it would hide new work from
 * its writer; a comment leaves it deleted, for that is its owner's decision.
 */
export async function touchParents(step: Step): Promise<void> {
  const { op, situation } = step
  if (op.entityType === 'photo' || op.entityType === 'comment') await touch(step, situation.entry)
  if (op.entityType !== 'plant') await touch(step, situation.plant)
}

async function touch(step: Step, parent: StoredRecord | null): Promise<void> {
  if (!parent) return
  const { op, situation, unit } = step
  const revive = parent.deleted && op.kind !== 'delete' && op.entityType !== 'comment'
  const scopes = situation.scopes.filter(scope => scope.startsWith('club:') || scope === accountScope(String(situation.plant?.data.ownerId)))
  await unit.update(parent, revive ? 'restore' : 'child', {}, scopes, parent.deleted && !revive)
  if (!revive) return
  await unit.notify('restored-by-edit', [String(situation.plant?.data.ownerId)], {
    plantId: situation.plant?.id,
    entryId: parent.type === 'entry' ? parent.id : null,
  }, parent.id)
}
