import type { RecordType } from '#shared/sync/protocol'
import { sharedClubOf } from '#server/policies/records'
import { checkPlantLinks, tellSharingChange } from './plant-sharing'
import { done, refuse } from './step'
import type { Performed, Step } from './step'
import type { StoredRecord } from './ports'
import { touchParents } from './touch-parents'

/** Makes a record. An id that exists is refused: it was never this phone's new record. */
export async function applyCreate(step: Step): Promise<Performed> {
  const { op, situation, unit, dependencies } = step
  if (situation.record) return refuse(op, 'id_taken', 'This record exists already and was not made anew.')
  const record: StoredRecord = {
    type: op.entityType,
    id: op.entityId,
    ver: 1,
    deleted: false,
    data: { ...step.fields, ...serverFields(op.entityType, step.actorId) },
  }
  if (record.type === 'plant') {
    const issues = await checkPlantLinks(step, record.data)
    if (issues.length > 0) return refuse(op, 'invalid', 'Something in this change needs another look.', issues)
  }
  await unit.insert(record, situation.scopes)
  if (record.type === 'plant') await tellSharingChange(dependencies.repository, unit, null, record)
  await touchParents(step)
  if (record.type === 'comment') await announceComment(step, record)
  return done(op, 'applied', record)
}

function serverFields(type: RecordType, actorId: string): Record<string, unknown> {
  if (type === 'vessel' || type === 'plant') return { ownerId: actorId }
  if (type === 'photo') return { authorId: actorId, storedAt: null, placeholder: null, files: null }
  return { authorId: actorId }
}

/** Tells the plant's owner and everybody in the conversation; on a deleted entry its writer, too. */
async function announceComment(step: Step, comment: StoredRecord): Promise<void> {
  const { situation, unit, actorId } = step
  const owner = String(situation.plant?.data.ownerId)
  const about = { plantId: comment.data.plantId, entryId: comment.data.entryId }
  if (situation.entry?.deleted || situation.plant?.deleted) {
    await unit.notify('comment-on-deleted', [owner, actorId], about, comment.id)
    return
  }
  const readers = [owner, ...await stillReading(step)].filter(accountId => accountId !== actorId)
  await unit.notify('comment-added', readers, about, comment.id)
}

/** Those in the conversation who may still see the plant. */
async function stillReading(step: Step): Promise<string[]> {
  const club = sharedClubOf(step.situation.plant)
  if (!club) return []
  const readers: string[] = []
  for (const accountId of step.situation.commenters) {
    if (await step.dependencies.repository.roleIn(club, accountId)) readers.push(accountId)
  }
  return readers
}
