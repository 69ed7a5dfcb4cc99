import { decidePatch } from '#shared/sync/merge'
import { accountScope } from '#shared/sync/protocol'
import { checkPlantLinks, tellSharingChange } from './plant-sharing'
import { done, refuse } from './step'
import type { Performed, Step } from './step'
import type { StoredRecord } from './ports'
import { touchParents } from './touch-parents'
import { unseenChanges } from './unseen-changes'

/** Merges a patch field by field; what another device wrote unseen stands, the other value is kept beside it. */
export async function applyPatch(step: Step): Promise<Performed> {
  const { op, situation, unit, dependencies } = step
  const { record } = situation
  if (!record) return refuse(op, 'not_found', 'What this belongs to is not there, or not yours to see.')

  const decision = decidePatch(record.data, step.fields, await unseenChanges(step, record))
  if (record.type === 'plant') {
    const issues = await checkPlantLinks(step, { ...record.data, ...decision.apply })
    if (issues.length > 0) return refuse(op, 'invalid', 'Something in this change needs another look.', issues)
  }

  let current = record
  if (Object.keys(decision.apply).length > 0 || record.deleted) {
    current = await unit.update(record, record.deleted ? 'restore' : 'patch', decision.apply, situation.scopes, false)
  }
  if (record.type === 'plant') await tellSharingChange(dependencies.repository, unit, record, current)
  if (record.deleted) await announceRestored(step, record)
  current = await keepOthers(step, current, decision.kept)
  if (current !== record && record.type !== 'notice') await touchParents(step)
  if (Object.keys(decision.kept).length > 0) return done(op, 'kept_both', current)
  return done(op, decision.merged ? 'merged' : 'applied', current)
}

async function keepOthers(step: Step, record: StoredRecord, kept: Record<string, unknown>): Promise<StoredRecord> {
  const entries = Object.entries(kept)
  if (entries.length === 0) return record
  const { unit, actorId, op, situation, dependencies } = step
  const owner = String(situation.plant?.data.ownerId ?? record.data.ownerId ?? actorId)
  for (const [field, otherValue] of entries) {
    const id = dependencies.newId()
    await unit.insert({
      type: 'conflict',
      id,
      ver: 1,
      deleted: false,
      data: {
        entityType: record.type,
        entityId: record.id,
        plantId: situation.plant?.id ?? null,
        field,
        otherValue,
        ownerId: record.data.authorId ?? owner,
        byAccountId: actorId,
        deviceId: op.deviceId,
        at: unit.at,
        resolvedAt: null,
      },
    }, [...new Set([accountScope(owner), accountScope(actorId)])])
    await unit.notify('both-kept', [owner, actorId], {
      plantId: situation.plant?.id,
      entryId: record.type === 'entry' ? record.id : record.data.entryId,
    }, id)
  }
  return unit.update(record, 'conflict', {}, situation.scopes)
}

async function announceRestored(step: Step, record: StoredRecord): Promise<void> {
  const { unit, situation, actorId } = step
  await unit.notify('restored-by-edit', [String(situation.plant?.data.ownerId ?? actorId)], {
    plantId: situation.plant?.id,
    entryId: record.type === 'entry' ? record.id : record.data.entryId,
  }, record.id)
}
