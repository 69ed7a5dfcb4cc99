import { memberRoleSchema } from '#shared/domain/club.schema'
import { changeRole } from '#server/services/clubs/memberships'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'
import { clubMemberParams } from '#server/utils/route-params'

export default defineRoute({ auth: 'account', params: clubMemberParams, body: memberRoleSchema }, async ({ account, params, body }) => ({
  membership: await changeRole(syncDependencies(), account.id, { clubId: params.id, accountId: params.accountId }, body.role),
}))
