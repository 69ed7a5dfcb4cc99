import type { EntityChange, StoredRecord } from './ports'
import type { Step } from './step'

/**
 * What others did to a record, or below it, after the version its writer was
 * shown. A device is only itself under its own account: its id is no secret and
 * must not let anybody pass for it. What the server noted by itself, such as
 * that a picture has arrived, is nothing a person could miss.
 */
export async function unseenChanges({ dependencies, actorId, op }: Step, record: StoredRecord): Promise<EntityChange[]> {
  const changes = await dependencies.repository.changesAfter(record.id, op.baseVer)
  return changes.filter(change => (
    change.opId !== null && !(change.accountId === actorId && change.deviceId === op.deviceId)
  ))
}
