import * as z from 'zod/mini'

/** Which of two kept values a person chose. */
export const conflictResolutionSchema = z.strictObject({ choice: z.enum(['standing', 'other']) })
export type ConflictResolution = z.infer<typeof conflictResolutionSchema>

/**
 * A value that lost no race: two devices changed one field without seeing each
 * other, the first to arrive stands in the record and the other is kept here
 * until somebody chooses.
 */
export type Conflict = {
  id: string
  entityType: string
  entityId: string
  plantId: string | null
  field: string
  otherValue: unknown
  byAccountId: string
  deviceId: string
  at: string
  resolvedAt: string | null
}
