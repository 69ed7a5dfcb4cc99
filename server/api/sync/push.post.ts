import { PUSH_BYTES_MAX, pushRequestSchema, SYNC_SCHEMA_OLDEST } from '#shared/sync/protocol'
import type { PushResponse } from '#shared/sync/protocol'
import { syncDependencies } from '#server/services/sync/dependencies'
import { pushOps } from '#server/services/sync/push'
import { defineRoute } from '#server/utils/define-route'

export default defineRoute({
  auth: 'account', actingAccount: true, body: pushRequestSchema, bodyBytesMax: PUSH_BYTES_MAX,
}, async ({ account, body }): Promise<PushResponse> => {
  const dependencies = syncDependencies()
  const epoch = await dependencies.repository.epoch()
  return {
    results: await pushOps(dependencies, account.id, body.ops),
    serverTime: dependencies.now().toISOString(),
    epoch,
    minSchema: SYNC_SCHEMA_OLDEST,
  }
})
