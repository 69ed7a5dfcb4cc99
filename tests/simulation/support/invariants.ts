import { accountScope, clubScope } from '#shared/sync/protocol'
import { presentRecord } from '#server/presenters/record'
import { isVisibleInScope } from '#server/policies/records'
import type { EntityChange } from '#server/services/sync/ports'
import { sameValue } from '#shared/sync/merge'
import { sendable } from '#shared/sync/outbox'
import { prefixes } from '~/utils/offline/keys'
import { readAttention, readBases, readOutbox } from '~/utils/offline/stored-shapes'
import type { Device, LedgerLine, World } from './world'

/** Every way in which a healed world is not as it must be, in words. */
export async function violations(world: World): Promise<string[]> {
  const found = await Promise.all([
    everyOpIsSomewhereOnce(world), everyDeviceShowsTheServersRecords(world),
  ])
  return [
    ...found.flat(),
    ...effectsHappenOnce(world),
    ...valuesAreOnlyReplacedByWhoSawThem(world),
    ...deletionsHideNothingUnseen(world),
    ...world.devices.flatMap(device => device.versionsThatWentBack.map(line => `I8 a version went back: ${line}`)),
    ...world.wrongAccounts.map(line => `I10 ${line}`),
    ...world.faultsReported.map(error => `fault in a service: ${String(error)}`),
  ]
}

/** I1: applied, or refused and visible, or held behind a refused one. */
async function everyOpIsSomewhereOnce(world: World): Promise<string[]> {
  const problems: string[] = []
  const places = new Map<Device, Map<string, string>>()
  for (const device of world.devices) {
    const snapshot = await device.storage.read({ prefixes: [prefixes.outbox, prefixes.attention] })
    const outbox = readOutbox(snapshot)
    const attention = readAttention(snapshot)
    if (sendable(outbox, attention).length > 0) problems.push(`I6 ${device.name} still has something to send`)
    places.set(device, new Map([
      ...outbox.map(({ op }): [string, string] => [op.opId, 'held']), ...attention.map(({ op }): [string, string] => [op.opId, 'refused']),
    ]))
  }
  for (const { op, device } of world.ledger) {
    const receipt = world.repository.tables().receipts.get(`${device.accountId}/${op.opId}`)?.result
    const applied = receipt !== undefined && receipt !== null && receipt.status !== 'rejected'
    const onPhone = places.get(device)?.get(op.opId)
    if (Number(applied) + Number(onPhone !== undefined) !== 1) {
      problems.push(`I1 ${op.kind} ${op.entityType} ${op.opId} of ${device.name}: receipt ${receipt?.status ?? 'none'}, on the phone ${onPhone ?? 'nowhere'}`)
    }
  }
  return problems
}

function history(world: World): EntityChange[] {
  return [...world.repository.tables().changes.values()].flat()
}

/** I2: no operation has two effects on its record. */
function effectsHappenOnce(world: World): string[] {
  const seen = new Map<string, number>()
  for (const change of history(world)) {
    if (change.opId === null || change.kind === 'child' || change.kind === 'conflict') continue
    const key = `${change.opId}/${change.entityId}`
    seen.set(key, (seen.get(key) ?? 0) + 1)
  }
  return [...seen].filter(([, count]) => count > 1).map(([key, count]) => `I2 ${key} took effect ${count} times`)
}

/** I4: whoever replaced a value had it on the screen, or had written it on the same device. */
function valuesAreOnlyReplacedByWhoSawThem(world: World): string[] {
  const lines = new Map(world.ledger.map(line => [line.op.opId, line]))
  const problems: string[] = []
  for (const changes of world.repository.tables().changes.values()) {
    for (const change of changes) {
      const line = change.opId === null ? undefined : lines.get(change.opId)
      if (!line || line.op.kind !== 'patch' || line.op.entityId !== change.entityId) continue
      for (const [field, { from }] of Object.entries(change.fields)) {
        if (field === 'actions' || wasShown(line, field, from) || writtenBy(changes, change.ver, field) === line.op.deviceId) continue
        problems.push(`I4 ${line.device.name} replaced ${field} “${String(from)}” of ${change.entityId} without having seen it`)
      }
    }
  }
  return problems
}

function wasShown(line: LedgerLine, field: string, value: unknown): boolean {
  return sameValue(line.shown?.[field] ?? null, value)
}

function writtenBy(changes: EntityChange[], before: number, field: string): string | undefined {
  return changes.filter(change => change.ver < before && field in change.fields).at(-1)?.deviceId
}

/** I5: a deletion took place only where its author had seen all that others had done; comments on deleted entries are told. */
function deletionsHideNothingUnseen(world: World): string[] {
  const problems: string[] = []
  const baseVersions = new Map(world.ledger.map(({ op }) => [op.opId, op.baseVer]))
  const { changes, records } = world.repository.tables()
  for (const list of changes.values()) {
    for (const deletion of list.filter(change => change.kind === 'delete')) {
      const seen = baseVersions.get(deletion.opId ?? '') ?? 0
      const unseen = list.filter(({ ver, deviceId }) => ver > seen && ver < deletion.ver && deviceId !== deletion.deviceId)
      if (unseen.length > 0) problems.push(`I5 ${deletion.entityId} was deleted over ${unseen.length} unseen changes`)
    }
  }
  problems.push(...commentsDeletedUnseen(world))
  const notices = [...records.values()].filter(record => record.type === 'notice').map(record => record.data.subjectId)
  for (const comment of records.values()) {
    if (comment.type !== 'comment') continue
    const entry = records.get(`entry/${String(comment.data.entryId)}`)
    const entryHistory = changes.get(String(comment.data.entryId)) ?? []
    const lastDeletion = entryHistory.filter(change => change.kind === 'delete').at(-1)
    const commentedAfter = entryHistory.some(change => change.kind === 'child' && change.opId === changes.get(comment.id)?.[0]?.opId && change.ver > (lastDeletion?.ver ?? Infinity))
    if (entry?.deleted && commentedAfter && !notices.includes(comment.id)) problems.push(`I5 a comment on a deleted entry was told to nobody`)
  }
  return problems
}

/** A comment that was there when its entry was deleted stood on the screen of whoever deleted it. */
function commentsDeletedUnseen(world: World): string[] {
  const lines = new Map(world.ledger.map(line => [line.op.opId, line]))
  const { changes, order } = world.repository.tables()
  const comments = [...world.repository.tables().records.values()].filter(record => record.type === 'comment')
  return [...changes.values()].flat().filter(change => change.kind === 'delete' && change.entityType === 'entry').flatMap((deletion) => {
    const line = lines.get(deletion.opId ?? '')
    const unseen = comments.filter(({ id, data }) => {
      const made = changes.get(id)?.[0]
      return data.entryId === deletion.entityId && made && made.deviceId !== deletion.deviceId
        && (order.get(made) ?? 0) < (order.get(deletion) ?? 0) && !line?.comments.includes(id)
    })
    return unseen.map(({ id }) => `I5 ${deletion.entityId} was deleted with comment ${id}, which ${line?.device.name ?? 'nobody'} had not seen`)
  })
}

/** I6, I7: every device holds exactly what its person may see, as the server has it. */
async function everyDeviceShowsTheServersRecords(world: World): Promise<string[]> {
  const problems: string[] = []
  const { records } = world.repository.tables()
  for (const device of world.devices) {
    const bases = readBases(await device.storage.read({ prefixes: [prefixes.base] }))
    const held = new Map(bases.map(base => [`${base.type}/${base.id}`, base]))
    for (const [key, record] of records) {
      const plant = record.type === 'plant' ? record : records.get(`plant/${String(record.data.plantId)}`) ?? null
      const scopes = [accountScope(device.accountId), clubScope(world.club)]
      const visible = scopes.some(scope => isVisibleInScope(scope, record, plant, false))
      const base = held.get(key)
      held.delete(key)
      const told = presentRecord(record)
      if (visible && base?.ver !== told.ver) problems.push(`I7 ${device.name} has ${key} at ${base?.ver ?? 'nothing'}, the server at ${told.ver}`)
      else if (visible && JSON.stringify(base?.data) !== JSON.stringify(told.data)) problems.push(`I6 ${device.name} shows another ${key}`)
      else if (!visible && base) problems.push(`private: ${device.name} holds ${key}, which it may not see`)
    }
    for (const key of held.keys()) problems.push(`I6 ${device.name} holds ${key}, which does not exist`)
  }
  return problems
}
