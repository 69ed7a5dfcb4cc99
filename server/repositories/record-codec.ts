import type { Attributes, Model, ModelStatic } from 'sequelize'
import type { RecordType } from '#shared/sync/protocol'
import { Club } from '../database/models/Club'
import { Comment } from '../database/models/Comment'
import { Conflict } from '../database/models/Conflict'
import { Entry } from '../database/models/Entry'
import { Membership } from '../database/models/Membership'
import { Notice } from '../database/models/Notice'
import { Photo } from '../database/models/Photo'
import { Plant } from '../database/models/Plant'
import { Vessel } from '../database/models/Vessel'
import type { StoredRecord } from '../services/sync/ports'

/** The table behind each kind of record. */
export const recordModels: Record<RecordType, ModelStatic<Model>> = {
  club: Club,
  membership: Membership,
  vessel: Vessel,
  plant: Plant,
  entry: Entry,
  photo: Photo,
  comment: Comment,
  conflict: Conflict,
  notice: Notice,
}

type Row = Record<string, unknown>
type FieldKind = 'instant' | 'boolean' | 'json' | 'plain'

const ROW_FIELDS = ['id', 'ver', 'deletedAt']

/** What a column holds, read from the model so that it is said only once. */
function kindOf(model: ModelStatic<Model>, field: string): FieldKind {
  const type = String(model.getAttributes()[field]?.type)
  if (type.startsWith('DATETIME')) return 'instant'
  if (type.startsWith('TINYINT')) return 'boolean'
  return type.startsWith('JSON') ? 'json' : 'plain'
}

/** A database row as a record: instants as ISO text, lists as lists. */
export function toRecord(type: RecordType, row: Row): StoredRecord {
  const model = recordModels[type]
  const data: Record<string, unknown> = {}
  for (const field of Object.keys(model.getAttributes())) {
    if (!ROW_FIELDS.includes(field)) data[field] = decode(kindOf(model, field), row[field])
  }
  return { type, id: String(row.id), ver: Number(row.ver), deleted: row.deletedAt !== null, data }
}

/** A record as a database row; fields the table does not know are left out. */
export function toRow(record: StoredRecord, at: Date): Attributes<Model> {
  const model = recordModels[record.type]
  const row: Row = { id: record.id, ver: record.ver, deletedAt: record.deleted ? at : null }
  for (const field of Object.keys(model.getAttributes())) {
    if (!ROW_FIELDS.includes(field)) row[field] = encode(kindOf(model, field), record.data[field] ?? null)
  }
  return row
}

function decode(kind: FieldKind, value: unknown): unknown {
  if (value === null || value === undefined) return null
  if (kind === 'instant') return value instanceof Date ? value.toISOString() : value
  if (kind === 'boolean') return Boolean(value)
  if (kind === 'json') return JSON.parse(String(value))
  return value
}

function encode(kind: FieldKind, value: unknown): unknown {
  if (value === null) return null
  if (kind === 'instant') return new Date(String(value))
  return value
}
