import { checkOpFields } from '#shared/sync/record-schemas'
import { liesInFuture } from '#shared/domain/entry.schema'
import type { FieldIssue, Op } from '#shared/sync/protocol'
import { applyCreate } from './apply-create'
import { applyDelete } from './apply-delete'
import { applyPatch } from './apply-patch'
import { applyResolve } from './apply-resolve'
import type { SyncDependencies } from './ports'
import { readSituation, scopesToLock } from './situation'
import type { Situation } from './situation'
import { refuse } from './step'
import type { Performed, Step } from './step'
import { WorkUnit } from './work-unit'

const LOCK_ROUNDS = 4

/** Checks, authorises and carries out one operation. Runs inside its transaction. */
export async function performOp(dependencies: SyncDependencies, actorId: string, op: Op): Promise<Performed> {
  const checked = checkOpFields(op)
  if (!checked.ok) return refuse(op, 'invalid', 'Something in this change needs another look.', checked.issues)
  const late = futureIssues(op, dependencies.now())
  if (late.length > 0) return refuse(op, 'invalid', 'This visit lies in the future.', late)

  const situation = await lockAndRead(dependencies, actorId, op)
  if (situation.verdict === 'not_found') return refuse(op, 'not_found', 'What this belongs to is not there, or not yours to see.')
  if (situation.verdict === 'not_allowed') return refuse(op, 'not_allowed', 'Only its owner may change this.')

  const unit = WorkUnit.ofOp(dependencies, actorId, op)
  const step: Step = { dependencies, actorId, op, fields: checked.fields, situation, unit }
  const performed = await carryOut(step)
  await unit.close()
  return performed
}

function carryOut(step: Step): Promise<Performed> {
  switch (step.op.kind) {
    case 'create': return applyCreate(step)
    case 'patch': return applyPatch(step)
    case 'delete': return applyDelete(step)
    case 'resolve': return applyResolve(step)
  }
}

/**
 * Holds every feed the operation may write to before it decides anything. Who
 * may see a record can change until the feeds are held, so it looks again and
 * holds what is new, a few times at most.
 */
async function lockAndRead(dependencies: SyncDependencies, actorId: string, op: Op): Promise<Situation> {
  const { repository } = dependencies
  let locked = scopesToLock(await readSituation(repository, actorId, op), actorId, op)
  for (let round = 0; round < LOCK_ROUNDS; round += 1) {
    await repository.lockScopes(locked)
    const situation = await readSituation(repository, actorId, op)
    const needed = scopesToLock(situation, actorId, op)
    if (needed.every(scope => locked.includes(scope))) return situation
    locked = needed
  }
  throw new Error('the readers of a record kept changing')
}

function futureIssues(op: Op, now: Date): FieldIssue[] {
  const { occurredAt } = op.fields
  if (op.entityType !== 'entry' || typeof occurredAt !== 'string') return []
  return liesInFuture(occurredAt, now.getTime()) ? [{ path: 'occurredAt', message: 'lies in the future' }] : []
}
