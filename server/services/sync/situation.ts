import type { Op } from '#shared/sync/protocol'
import { accountScope, clubScope } from '#shared/sync/protocol'
import { mayChange, sharedClubOf } from '#server/policies/records'
import type { Verdict } from '#server/policies/records'
import type { StoredRecord, SyncRepository } from './ports'

/** Most people of one conversation who are told of a new comment. */
const COMMENTERS_TOLD_MAX = 20

/** What an operation meets: its record, what that belongs to, and who may see it. */
export type Situation = {
  record: StoredRecord | null
  plant: StoredRecord | null
  entry: StoredRecord | null
  /** For a conflict: the record that has two values. */
  disputed: StoredRecord | null
  /** The feeds that see the record. */
  scopes: string[]
  /** Everybody who takes part in the conversation on the entry. */
  commenters: string[]
  verdict: Verdict
}

/** Reads the situation of an operation. Reads only; call again once the feeds are held. */
export async function readSituation(repository: SyncRepository, actorId: string, op: Op): Promise<Situation> {
  const record = await repository.find(op.entityType, op.entityId)
  const source = record?.data ?? op.fields
  const entry = hasEntry(op) ? await findRef(repository, 'entry', source.entryId) : null
  const plant = op.entityType === 'plant'
    ? record
    : await findRef(repository, 'plant', entry?.data.plantId ?? source.plantId)
  const disputed = record?.type === 'conflict'
    ? await findRef(repository, record.data.entityType === 'plant' ? 'plant' : disputedType(record), record.data.entityId)
    : null
  const clubs = await clubsOf(repository, op, record, plant)
  const roles = await Promise.all(clubs.map(club => repository.roleIn(club, actorId)))
  const verdict = belongsTogether(op, entry, plant)
    ? mayChange(op.entityType, op.kind, { actorId, record, plant, actorSharesClub: roles.some(role => role !== null) })
    : 'not_found'
  return {
    record,
    plant,
    entry,
    disputed,
    scopes: scopesOf(op, actorId, record, plant, clubs),
    commenters: op.entityType === 'comment' && entry ? await repository.commentersOn(entry.id, COMMENTERS_TOLD_MAX) : [],
    verdict,
  }
}

/** Every feed the operation may write to. */
export function scopesToLock(situation: Situation, actorId: string, op: Op): string[] {
  const scopes = new Set([...situation.scopes, accountScope(actorId), ...situation.commenters.map(accountScope)])
  if (op.entityType === 'plant') {
    // The club it may be shared with by this very operation, named now or named before.
    for (const club of [op.fields.clubId, situation.record?.data.clubId]) {
      if (typeof club === 'string') scopes.add(clubScope(club))
    }
  }
  if (op.entityType === 'conflict' && situation.record) {
    scopes.add(accountScope(String(situation.record.data.byAccountId)))
  }
  return [...scopes].sort()
}

function hasEntry(op: Op): boolean {
  return op.entityType === 'photo' || op.entityType === 'comment'
}

function disputedType(conflict: StoredRecord): StoredRecord['type'] {
  const type = conflict.data.entityType
  return type === 'vessel' || type === 'entry' || type === 'photo' || type === 'comment' ? type : 'plant'
}

/** A photo or comment names the plant of its entry, and an entry names a plant. */
function belongsTogether(op: Op, entry: StoredRecord | null, plant: StoredRecord | null): boolean {
  if (op.entityType === 'entry') return plant !== null
  if (!hasEntry(op)) return true
  if (!entry || !plant) return false
  return op.kind !== 'create' || op.fields.plantId === entry.data.plantId
}

async function findRef(repository: SyncRepository, type: StoredRecord['type'], id: unknown): Promise<StoredRecord | null> {
  return typeof id === 'string' ? repository.find(type, id) : null
}

async function clubsOf(
  repository: SyncRepository, op: Op, record: StoredRecord | null, plant: StoredRecord | null,
): Promise<string[]> {
  const plants = op.entityType === 'vessel' && record ? await repository.plantsInVessel(record.id) : [plant]
  return [...new Set(plants.map(sharedClubOf).filter(club => club !== null))]
}

function scopesOf(
  op: Op, actorId: string, record: StoredRecord | null, plant: StoredRecord | null, clubs: string[],
): string[] {
  if (op.entityType === 'notice') return [accountScope(actorId)]
  const owner = plant?.data.ownerId ?? record?.data.ownerId ?? actorId
  const own = [accountScope(String(owner))]
  if (op.entityType === 'comment') own.push(accountScope(String(record?.data.authorId ?? actorId)))
  if (op.entityType === 'conflict') return [...new Set([...own, accountScope(String(record?.data.byAccountId ?? actorId))])]
  return [...new Set([...own, ...clubs.map(clubScope)])]
}
