import { randomBytes } from 'node:crypto'
import { uuidV7 } from '#shared/utils/uuid'
import { mariadbSyncRepository } from '#server/repositories/sync'
import { reportFault } from '#server/utils/report-fault'
import type { SyncDependencies } from './ports'

/** The services' surroundings in the running server. */
export function syncDependencies(): SyncDependencies {
  return {
    repository: mariadbSyncRepository,
    now: () => new Date(),
    newId: () => uuidV7(Date.now(), randomBytes(16)),
    reportFault: (error, { opKind, entityType }) => reportFault(`an operation failed (${opKind} ${entityType})`, error),
  }
}
