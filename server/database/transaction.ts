import { setTimeout as wait } from 'node:timers/promises'
import { Transaction } from 'sequelize'
import { database } from './connection'
import { isRetryable } from './failures'

const ATTEMPTS = 5

/**
 * Runs `work` in one transaction at READ COMMITTED: all queries inside take
 * part. Deadlocks and lock time-outs are tried again up to five times, so
 * `work` may run more than once and must not touch anything but the database.
 */
export async function inTransaction<T>(work: () => Promise<T>): Promise<T> {
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
