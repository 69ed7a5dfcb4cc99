import { withdrawInvitation } from '#server/services/clubs/invitations'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'
import { clubInvitationParams } from '#server/utils/route-params'

export default defineRoute({ auth: 'account', params: clubInvitationParams }, async ({ account, params }) => {
  await withdrawInvitation(syncDependencies(), account.id, params.id, params.invitationId)
  return { withdrawn: true }
})
