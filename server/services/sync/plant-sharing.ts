import type { FieldIssue } from '#shared/sync/protocol'
import { clubScope } from '#shared/sync/protocol'
import { sharedClubOf } from '#server/policies/records'
import type { Step } from './step'
import type { StoredRecord, SyncRepository } from './ports'
import type { WorkUnit } from './work-unit'

/** A plant may only name its owner's own vessel, and a club that its owner belongs to. */
export async function checkPlantLinks(step: Step, data: Record<string, unknown>): Promise<FieldIssue[]> {
  const { repository } = step.dependencies
  const issues: FieldIssue[] = []
  if (typeof data.vesselId === 'string') {
    const vessel = await repository.find('vessel', data.vesselId)
    if (vessel?.data.ownerId !== step.actorId) issues.push({ path: 'vesselId', message: 'is not one of your vessels' })
  }
  if (data.visibility === 'club' && data.clubId === null) issues.push({ path: 'clubId', message: 'is missing: choose the club' })
  if (data.visibility === 'club' && typeof data.clubId === 'string' && !await repository.roleIn(data.clubId, step.actorId)) {
    issues.push({ path: 'clubId', message: 'is not a club of yours' })
  }
  return issues
}

/**
 * When a plant is shared or taken back, its whole story is told to the club's
 * feed again. What readers get for each row is decided when they ask: the
 * record, or word that it is no longer theirs to see. What is below a record is
 * told before it.
 */
export async function tellSharingChange(
  repository: SyncRepository, unit: WorkUnit, before: StoredRecord | null, after: StoredRecord,
): Promise<void> {
  const clubBefore = sharedClubOf(before)
  const clubAfter = sharedClubOf(after)
  const vesselChanged = before?.data.vesselId !== after.data.vesselId
  if (clubBefore === clubAfter && !(clubAfter && vesselChanged)) return
  const vessels = await vesselsOf(repository, before, after)
  const story = clubBefore === clubAfter ? vessels : [...vessels, ...await repository.descendantsOf(after.id), after]
  for (const club of new Set([clubBefore, clubAfter])) {
    if (club) unit.tell([clubScope(club)], story)
  }
}

function vesselsOf(repository: SyncRepository, ...plants: (StoredRecord | null)[]): Promise<StoredRecord[]> {
  const ids = plants.map(plant => plant?.data.vesselId).filter(id => typeof id === 'string')
  return repository.findMany([...new Set(ids)].map(id => ({ type: 'vessel', id })))
}
