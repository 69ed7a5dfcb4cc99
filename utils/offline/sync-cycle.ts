import { batchOf, sendable } from '#shared/sync/outbox'
import type { OutboxItem } from '#shared/sync/outbox'
import { accountScope, clubScope, PULL_LIMIT_MAX, PUSH_BYTES_MAX, PUSH_OPS_MAX } from '#shared/sync/protocol'
import { keys, prefixes } from './keys'
import type { Answer, JournalStorage, Surroundings, SyncTransport } from './ports'
import { leaveScope, recoverFromRestore, restartScope, setAside, settlePull, settlePush } from './settle'
import { readAttention, readBases, readCursor, readOutbox } from './stored-shapes'

/**
 * How a cycle ended.
 * - `done`: everything that can be sent was, and every feed is read to its end.
 * - `wait`: try again later; nothing is lost.
 * - `signed-out`, `other-account`, `update-needed`: a person has to do something first.
 */
export type CycleOutcome =
  | { kind: 'done' }
  | { kind: 'wait', why: 'unreachable' | 'server', retryAfterSeconds: number | null }
  | { kind: 'signed-out' }
  | { kind: 'other-account' }
  | { kind: 'update-needed' }

export type SyncContext = {
  storage: JournalStorage
  transport: SyncTransport
  around: Surroundings
  accountId: string
}

/** Room for the rest of the request around its operations, bytes. */
const ENVELOPE_BYTES = 1_024

/** Sends what waits, then reads every feed. May run in several tabs at once: receipts and versions keep it right. */
export async function runSyncCycle(context: SyncContext): Promise<CycleOutcome> {
  const pushed = await pushAll(context)
  if (pushed.kind !== 'done' && pushed.kind !== 'wait') return pushed
  const pulled = await pullAll(context)
  return pulled.kind === 'done' ? pushed : pulled
}

async function pushAll(context: SyncContext): Promise<CycleOutcome> {
  const { storage, transport, around, accountId } = context
  let opsMax = PUSH_OPS_MAX
  for (;;) {
    const batch = await nextBatch(storage, opsMax)
    if (batch.length === 0) return { kind: 'done' }
    const answer = await transport.push(accountId, batch.map(item => item.op))
    if (answer.kind === 'answered') {
      const settled = await settlePush(storage, around, accountId, answer.body)
      if (settled === 0) return { kind: 'wait', why: 'server', retryAfterSeconds: null }
      continue
    }
    if (!isUnreadable(answer)) return outcomeOf(answer)
    const [first] = batch
    if (batch.length === 1 && first) await setAside(storage, around, first.op, 'unreadable', 'The server cannot read this change.')
    opsMax = Math.max(1, Math.floor(batch.length / 2))
  }
}

async function nextBatch(storage: JournalStorage, opsMax: number): Promise<OutboxItem[]> {
  const snapshot = await storage.read({ prefixes: [prefixes.outbox, prefixes.attention] })
  return batchOf(sendable(readOutbox(snapshot), readAttention(snapshot)), opsMax, PUSH_BYTES_MAX - ENVELOPE_BYTES)
}

/** The request as a whole was refused for what is in it: smaller requests find out which change it is. */
function isUnreadable(answer: Answer<unknown>): boolean {
  return answer.kind === 'refused' && [400, 413, 422].includes(answer.status)
}

async function pullAll(context: SyncContext): Promise<CycleOutcome> {
  const done = new Set<string>()
  for (;;) {
    const scope = (await scopesOf(context)).find(candidate => !done.has(candidate))
    if (!scope) return { kind: 'done' }
    const outcome = await pullScope(context, scope)
    if (outcome === 'restart') {
      done.clear()
      continue
    }
    if (outcome.kind !== 'done') return outcome
    done.add(scope)
  }
}

/** The person's own feed first: it tells of which clubs the others are. */
async function scopesOf({ storage, accountId }: SyncContext): Promise<string[]> {
  const prefix = prefixes.baseOf('membership')
  const memberships = readBases(await storage.read({ prefixes: [prefix] }), prefix)
  const clubs = memberships
    .filter(base => base.state === 'live' && base.data?.accountId === accountId)
    .map(base => clubScope(String(base.data?.clubId)))
  return [accountScope(accountId), ...new Set(clubs)]
}

async function pullScope(context: SyncContext, scope: string): Promise<CycleOutcome | 'restart'> {
  const { storage, transport, around, accountId } = context
  for (;;) {
    const snapshot = await storage.read({ keys: [keys.cursor(scope), keys.epoch] })
    const answer = await transport.pull(accountId, scope, readCursor(snapshot, keys.cursor(scope)), PULL_LIMIT_MAX)
    if (answer.kind !== 'answered') return afterRefusedPull(context, scope, answer)
    const known = snapshot.get(keys.epoch)
    if (known !== undefined && known !== answer.body.epoch) {
      await recoverFromRestore(storage, around, answer.body.epoch)
      return { kind: 'wait', why: 'server', retryAfterSeconds: 0 }
    }
    await settlePull(storage, accountId, scope, answer.body)
    if (!answer.body.more) return { kind: 'done' }
  }
}

async function afterRefusedPull(context: SyncContext, scope: string, answer: Answer<unknown>): Promise<CycleOutcome | 'restart'> {
  if (answer.kind === 'refused' && answer.status === 410) {
    await restartScope(context.storage, scope)
    return 'restart'
  }
  if (answer.kind === 'refused' && answer.code === 'not_found' && scope.startsWith('club:')) {
    await leaveScope(context.storage, scope)
    return { kind: 'done' }
  }
  return outcomeOf(answer)
}

function outcomeOf(answer: Answer<unknown>): CycleOutcome {
  if (answer.kind !== 'refused') return { kind: 'wait', why: 'unreachable', retryAfterSeconds: null }
  if (answer.status === 401) return { kind: 'signed-out' }
  if (answer.status === 409 && answer.code === 'account_mismatch') return { kind: 'other-account' }
  if (answer.status === 426) return { kind: 'update-needed' }
  return { kind: 'wait', why: 'server', retryAfterSeconds: answer.retryAfterSeconds }
}
