import type { Op, OpResult } from '#shared/sync/protocol'
import { opSchema } from '#shared/sync/protocol'
import { checkWith } from '#shared/sync/record-schemas'
import { sha256Of } from '#server/utils/sha256'
import { presentRecord } from '#server/presenters/record'
import { performOp } from './perform-op'
import { TemporaryFailure } from './ports'
import type { Receipt, SyncDependencies } from './ports'

/**
 * Carries out pushed operations, each in a transaction of its own.
 *
 * Guarantees: an operation takes effect at most once, however often it is sent
 * (its receipt is written with its effect); an answer other than `retry` is
 * only given after the commit; an operation that cannot be done is answered and
 * does not hold up those behind it, except those that build on it; when the
 * records cannot be reached, it and all behind it are left undone.
 */
export async function pushOps(dependencies: SyncDependencies, accountId: string, sent: unknown[]): Promise<OpResult[]> {
  const results: OpResult[] = []
  const missing = new Set<string>()
  let away = false
  for (const raw of sent) {
    const op = readOp(raw)
    if (!('op' in op)) {
      results.push(op.result)
      continue
    }
    const waits = away || buildsOn(op.op, missing)
    const result = waits ? retry(op.op, 'waits') : await runOp(dependencies, accountId, op.op)
    if (result.status === 'retry' && result.code === 'unavailable') away = true
    if (result.status === 'retry' || (result.status === 'rejected' && op.op.kind === 'create')) missing.add(op.op.entityId)
    results.push(result)
  }
  return results
}

function readOp(raw: unknown): { op: Op } | { result: OpResult } {
  const checked = checkWith(opSchema, raw)
  if (checked.ok) return { op: opSchema.parse(raw) }
  const opId = typeof raw === 'object' && raw !== null && 'opId' in raw ? String(raw.opId) : ''
  return {
    result: {
      opId, status: 'rejected', record: null, code: 'unreadable', message: 'This change could not be read.', issues: checked.issues,
    },
  }
}

function buildsOn(op: Op, missing: Set<string>): boolean {
  return [op.entityId, op.fields.plantId, op.fields.entryId, op.fields.vesselId]
    .some(id => typeof id === 'string' && missing.has(id))
}

async function runOp(dependencies: SyncDependencies, accountId: string, op: Op): Promise<OpResult> {
  const { repository } = dependencies
  const payload = sha256Of(canonicalJson(op))
  try {
    return await repository.transaction(async () => {
      const receipt = await repository.claimReceipt(accountId, op.opId, payload, dependencies.now().toISOString())
      if (receipt) return replay(dependencies, op, receipt, payload)
      const { result, record } = await performOp(dependencies, accountId, op)
      await repository.completeReceipt(accountId, op.opId, result)
      return { ...result, record: record ? presentRecord(record) : null }
    })
  } catch (error) {
    if (error instanceof TemporaryFailure) return retry(op, 'unavailable')
    dependencies.reportFault(error, { opKind: op.kind, entityType: op.entityType })
    return retry(op, 'fault')
  }
}

/** The operation was done before: say what came of it, with the record as it is now. */
async function replay(dependencies: SyncDependencies, op: Op, receipt: Receipt, payload: string): Promise<OpResult> {
  if (receipt.payloadSha256 !== payload || !receipt.result) {
    return {
      opId: op.opId, status: 'rejected', record: null, code: 'key_reused', message: 'Another change was sent under this change’s number.',
    }
  }
  if (receipt.result.status === 'rejected') return { ...receipt.result, record: null }
  const record = await dependencies.repository.find(op.entityType, op.entityId)
  return { ...receipt.result, status: 'duplicate', record: record ? presentRecord(record) : null }
}

function retry(op: Op, code: string): OpResult {
  return { opId: op.opId, status: 'retry', record: null, code }
}

/** The same text for the same operation, whatever order its fields came in. */
function canonicalJson(value: unknown): string {
  return JSON.stringify(value, (_key, inner: unknown) => (
    inner !== null && typeof inner === 'object' && !Array.isArray(inner)
      ? Object.fromEntries(Object.entries(inner).sort(([left], [right]) => (left < right ? -1 : 1)))
      : inner
  ))
}
