import type * as z from 'zod/mini'
import { commentFieldsSchema, commentPatchSchema } from '../domain/comment.schema'
import { conflictResolutionSchema } from '../domain/conflict.schema'
import { entryFieldsSchema, entryPatchSchema } from '../domain/entry.schema'
import { noticePatchSchema } from '../domain/notice.schema'
import { photoFieldsSchema, photoPatchSchema } from '../domain/photo.schema'
import { plantFieldsSchema, plantPatchSchema } from '../domain/plant.schema'
import { vesselFieldsSchema, vesselPatchSchema } from '../domain/vessel.schema'
import type { FieldIssue, Op, OpKind, RecordType } from './protocol'

const schemas: Partial<Record<RecordType, Partial<Record<OpKind, z.ZodMiniType>>>> = {
  vessel: { create: vesselFieldsSchema, patch: vesselPatchSchema },
  plant: { create: plantFieldsSchema, patch: plantPatchSchema },
  entry: { create: entryFieldsSchema, patch: entryPatchSchema },
  photo: { create: photoFieldsSchema, patch: photoPatchSchema },
  comment: { create: commentFieldsSchema, patch: commentPatchSchema },
  conflict: { resolve: conflictResolutionSchema },
  notice: { patch: noticePatchSchema },
}

/** Records that a person may delete; an entry takes its photos and comments with it out of sight. */
const deletable: readonly RecordType[] = ['vessel', 'plant', 'entry', 'photo', 'comment']

type Checked = { ok: true, fields: Record<string, unknown> } | { ok: false, issues: FieldIssue[] }

/**
 * Checks the fields of an operation with the schema that its form used.
 * Never throws; a kind that the record does not know is an issue at `kind`.
 */
export function checkOpFields(op: Pick<Op, 'kind' | 'entityType' | 'fields'>): Checked {
  if (op.kind === 'delete') {
    return deletable.includes(op.entityType)
      ? { ok: true, fields: {} }
      : { ok: false, issues: [{ path: 'kind', message: `A ${op.entityType} cannot be deleted this way` }] }
  }
  const schema = schemas[op.entityType]?.[op.kind]
  if (!schema) {
    return { ok: false, issues: [{ path: 'kind', message: `A ${op.entityType} does not take "${op.kind}"` }] }
  }
  return checkWith(schema, op.fields)
}

/** Checks `value` and says every problem with its path, as forms and answers show it. */
export function checkWith(schema: z.ZodMiniType, value: unknown): Checked {
  const parsed = schema.safeParse(value)
  if (!parsed.success) {
    return {
      ok: false,
      issues: parsed.error.issues.map(issue => ({ path: issue.path.join('.'), message: issue.message })),
    }
  }
  return { ok: true, fields: fieldsOf(parsed.data) }
}

function fieldsOf(value: unknown): Record<string, unknown> {
  return typeof value === 'object' && value !== null ? { ...value } : {}
}
