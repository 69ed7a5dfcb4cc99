import { setTimeout as wait } from 'node:timers/promises'
import { Transaction } from 'sequelize'
import { database } from './connection'
import { isRetryable } from './failures'
import { atMost } from '../utils/at-most'

const ATTEMPTS = 5
/**
 * Fewer than the pool has connections: many phones that write to one club wait
 * for each other here, and the rest of the pool stays free for everybody else.
 */
const inTurn = atMost(6)

/**
 * Runs `work` in one transaction at READ COMMITTED: all queries inside take
 * part. Deadlocks and lock time-outs are tried again up to five times, so
 * `work` may run more than once and must not touch anything but the database.
 */
export function inTransaction<T>(work: () => Promise<T>): Promise<T> {
  return inTurn(() => withRetries(work))
}

async function withRetries<T>(work: () => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await database().transaction({ isolationLevel: Transaction.ISOLATION_LEVELS.READ_COMMITTED }, work)
    } catch (error) {
      if (attempt >= ATTEMPTS || !isRetryable(error)) throw error
      await wait(Math.random() * 20 * 2 ** attempt)
    }
  }
}

/** Runs reads that must all see one moment of the database. */
export async function inSnapshot<T>(work: () => Promise<T>): Promise<T> {
  return database().transaction({ isolationLevel: Transaction.ISOLATION_LEVELS.REPEATABLE_READ }, work)
}
