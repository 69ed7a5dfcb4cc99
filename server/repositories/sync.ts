import { Op as Where, QueryTypes } from 'sequelize'
import { CLUB_ROLES } from '#shared/domain/club.schema'
import type { ClubRole } from '#shared/domain/club.schema'
import { RECORD_TYPES } from '#shared/sync/protocol'
import type { RecordType } from '#shared/sync/protocol'
import { database } from '../database/connection'
import { isDatabaseAway, isDuplicateKey } from '../database/failures'
import { Account } from '../database/models/Account'
import { Comment } from '../database/models/Comment'
import { Membership } from '../database/models/Membership'
import { inSnapshot, inTransaction } from '../database/transaction'
import { TemporaryFailure } from '../services/sync/ports'
import type { EntityChange, FeedRef, Receipt, StoredRecord, SyncRepository } from '../services/sync/ports'
import { recordModels, toRecord, toRow } from './record-codec'

/** The records in MariaDB. Every query takes part in the transaction that is going on. */
export const mariadbSyncRepository: SyncRepository = {
  transaction: work => orTemporary(() => inTransaction(work)),
  snapshot: work => orTemporary(() => inSnapshot(work)),

  async claimReceipt(accountId, opId, payloadSha256, at) {
    try {
      await write('INSERT INTO op_receipt (account_id, op_id, payload_sha256, result, at) VALUES (?, ?, ?, NULL, ?)', [
        accountId, opId, payloadSha256, new Date(at),
      ])
      return null
    } catch (error) {
      if (!isDuplicateKey(error)) throw error
      return readReceipt(accountId, opId)
    }
  },

  async completeReceipt(accountId, opId, result) {
    await write('UPDATE op_receipt SET result = ? WHERE account_id = ? AND op_id = ?', [JSON.stringify(result), accountId, opId])
  },

  async lockScopes(scopes) {
    for (const scope of scopes) {
      await write('INSERT INTO scope_counter (scope, seq) VALUES (?, 0) ON DUPLICATE KEY UPDATE seq = seq', [scope])
    }
  },

  async appendFeed(scope, refs) {
    if (refs.length === 0) return
    await write('INSERT INTO scope_counter (scope, seq) VALUES (?, ?) ON DUPLICATE KEY UPDATE seq = seq + VALUES(seq)', [scope, refs.length])
    const [counter] = await read<{ seq: number }>('SELECT seq FROM scope_counter WHERE scope = ?', [scope])
    const first = Number(counter?.seq) - refs.length + 1
    const places = refs.map(() => '(?, ?, ?, ?, ?)').join(', ')
    await write(
      `INSERT INTO feed_row (scope, seq, entity_type, entity_id, entity_ver) VALUES ${places}`,
      refs.flatMap((ref, index) => [scope, first + index, ref.type, ref.id, ref.ver]),
    )
  },

  async feedAfter(scope, since, limit) {
    const rows = await read<{ seq: number, type: string, id: string, ver: number }>(
      'SELECT seq, entity_type AS type, entity_id AS id, entity_ver AS ver FROM feed_row WHERE scope = ? AND seq > ? ORDER BY seq LIMIT ?',
      [scope, since, limit],
    )
    return rows.map(row => ({ seq: Number(row.seq), type: recordType(row.type), id: row.id, ver: Number(row.ver) }))
  },

  async feedMinimum(scope) {
    const [row] = await read<{ minimum: number }>('SELECT min_seq AS minimum FROM scope_counter WHERE scope = ?', [scope])
    return Number(row?.minimum ?? 0)
  },

  async epoch() {
    const [row] = await read<{ epoch: string }>('SELECT epoch FROM sync_epoch WHERE only_row = 1', [])
    return String(row?.epoch)
  },

  async find(type, id) {
    const [record] = await this.findMany([{ type, id }])
    return record ?? null
  },

  async findMany(refs) {
    const found = await Promise.all(RECORD_TYPES.map(type => (
      readRecords(type, refs.filter(ref => ref.type === type).map(ref => ref.id))
    )))
    return found.flat()
  },

  async insert(record) {
    await recordModels[record.type].create(toRow(record, new Date()))
  },

  async update(record) {
    const { id, ...columns } = toRow(record, new Date())
    await recordModels[record.type].update(columns, { where: { id } })
  },

  async changesAfter(entityId, ver) {
    const rows = await read<Omit<EntityChange, 'fields' | 'at'> & { fields: string, at: Date }>(
      `SELECT entity_type AS entityType, entity_id AS entityId, ver, kind, account_id AS accountId,
        device_id AS deviceId, op_id AS opId, fields, at
       FROM entity_change WHERE entity_id = ? AND ver > ? ORDER BY ver`,
      [entityId, ver],
    )
    return rows.map(row => ({
      ...row,
      at: row.at.toISOString(),
      fields: JSON.parse(row.fields),
    }))
  },

  async appendChange(change) {
    await write(
      `INSERT INTO entity_change (entity_id, ver, entity_type, kind, account_id, device_id, op_id, fields, at)
       VALUES (?, ?, ?, ?, ?, ?, ?, ?, ?)`,
      [
        change.entityId, change.ver, change.entityType, change.kind, change.accountId, change.deviceId, change.opId,
        JSON.stringify(change.fields), new Date(change.at),
      ],
    )
  },

  async roleIn(clubId, accountId) {
    const membership = await Membership.findOne({ where: { clubId, accountId, deletedAt: null } })
    return membership ? clubRole(membership.role) : null
  },

  async descendantsOf(plantId) {
    const found = await Promise.all((['comment', 'photo', 'entry'] as const).map(async (type) => {
      const rows = await recordModels[type].findAll({ attributes: ['id', 'ver'], where: { plantId }, raw: true })
      return rows.map((row): FeedRef => ({ type, id: String(Reflect.get(row, 'id')), ver: Number(Reflect.get(row, 'ver')) }))
    }))
    return found.flat()
  },

  async plantsInVessel(vesselId) {
    const rows = await recordModels.plant.findAll({ where: { vesselId, deletedAt: null }, raw: true })
    return rows.map(row => toRecord('plant', { ...row }))
  },

  async commentersOn(entryId, limit) {
    const rows = await Comment.findAll({ attributes: ['authorId'], where: { entryId, deletedAt: null }, group: ['authorId'], limit, raw: true })
    return rows.map(row => row.authorId)
  },
}

async function readRecords(type: RecordType, ids: string[]): Promise<StoredRecord[]> {
  if (ids.length === 0) return []
  const rows = await recordModels[type].findAll({ where: { id: { [Where.in]: ids } }, raw: true })
  const records = rows.map(row => toRecord(type, { ...row }))
  return type === 'membership' ? withDisplayNames(records) : records
}

/** A member's name lives with the account, not with each membership. */
async function withDisplayNames(memberships: StoredRecord[]): Promise<StoredRecord[]> {
  const ids = memberships.map(membership => String(membership.data.accountId))
  const accounts = await Account.findAll({ attributes: ['id', 'displayName'], where: { id: { [Where.in]: ids } } })
  const names = new Map(accounts.map(account => [account.id, account.displayName]))
  return memberships.map(membership => ({
    ...membership,
    data: { ...membership.data, displayName: names.get(String(membership.data.accountId)) ?? null },
  }))
}

async function readReceipt(accountId: string, opId: string): Promise<Receipt> {
  const [row] = await read<{ payloadSha256: string, result: string | null }>(
    'SELECT payload_sha256 AS payloadSha256, result FROM op_receipt WHERE account_id = ? AND op_id = ?', [accountId, opId],
  )
  if (!row) throw new TemporaryFailure('a receipt vanished while it was read')
  return { payloadSha256: row.payloadSha256, result: row.result === null ? null : JSON.parse(row.result) }
}

async function write(sql: string, replacements: unknown[]): Promise<void> {
  await database().query(sql, { replacements, type: QueryTypes.RAW })
}

async function read<T extends object>(sql: string, replacements: unknown[]): Promise<T[]> {
  return database().query<T>(sql, { replacements, type: QueryTypes.SELECT })
}

async function orTemporary<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work()
  } catch (error) {
    if (isDatabaseAway(error)) throw new TemporaryFailure('the records cannot be reached', { cause: error })
    throw error
  }
}

function recordType(text: string): RecordType {
  const type = RECORD_TYPES.find(known => known === text)
  if (!type) throw new Error(`the feed names an unknown kind of record: ${text}`)
  return type
}

function clubRole(text: string): ClubRole {
  const role = CLUB_ROLES.find(known => known === text)
  if (!role) throw new Error(`a membership names an unknown role: ${text}`)
  return role
}
