import { pullQuerySchema } from '#shared/sync/protocol'
import { syncDependencies } from '#server/services/sync/dependencies'
import { pullFeed } from '#server/services/sync/pull'
import { defineRoute } from '#server/utils/define-route'

export default defineRoute({ auth: 'account', actingAccount: true, query: pullQuerySchema }, ({ account, query }) => (
  pullFeed(syncDependencies(), account.id, query)
))
