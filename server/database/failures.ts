import { BaseError, ConnectionError, DatabaseError, UniqueConstraintError } from 'sequelize'

/** Lock wait ran out, deadlock, or a row changed since the snapshot: the whole transaction may be tried again. */
const RETRYABLE_CODES = [1_020, 1_205, 1_213]
/** The server went away, is shutting down, or takes no more connections. */
const AWAY_CODES = [1_040, 1_053, 1_129, 1_152, 1_184, 1_927, 2_002, 2_003, 2_006, 2_013, 45_009, 45_012, 45_013, 45_022, 45_025, 45_028, 45_034]

function driverCode(error: unknown): number | null {
  if (!(error instanceof DatabaseError)) return null
  const errno: unknown = Reflect.get(error.original, 'errno')
  return typeof errno === 'number' ? errno : null
}

/** True when trying the same transaction again may succeed at once. */
export function isRetryable(error: unknown): boolean {
  const code = driverCode(error)
  return code !== null && RETRYABLE_CODES.includes(code)
}

/** True when the database cannot be reached: nothing was changed, and later may do. */
export function isDatabaseAway(error: unknown): boolean {
  if (error instanceof ConnectionError) return true
  if (isRetryable(error)) return true
  const code = driverCode(error)
  if (code !== null && AWAY_CODES.includes(code)) return true
  return error instanceof BaseError && /timed? ?out|closed|ECONN/i.test(error.name)
}

export function isDuplicateKey(error: unknown): boolean {
  return error instanceof UniqueConstraintError
}
