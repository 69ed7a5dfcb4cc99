import { listInvitations } from '#server/services/clubs/invitations'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'
import { clubParams } from '#server/utils/route-params'

export default defineRoute({ auth: 'account', params: clubParams }, async ({ account, params }) => ({
  invitations: await listInvitations(syncDependencies(), account.id, params.id),
}))
