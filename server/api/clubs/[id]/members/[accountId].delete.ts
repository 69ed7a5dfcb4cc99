import { endMembership } from '#server/services/clubs/memberships'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'
import { clubMemberParams } from '#server/utils/route-params'

export default defineRoute({ auth: 'account', params: clubMemberParams }, async ({ account, params }) => ({
  membership: await endMembership(syncDependencies(), account.id, { clubId: params.id, accountId: params.accountId }),
}))
