import { viewInvitation } from '#server/services/clubs/invitations'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'
import { invitationTokenParams } from '#server/utils/route-params'

export default defineRoute({ auth: 'public', params: invitationTokenParams }, ({ params }) => (
  viewInvitation(syncDependencies(), params.token)
))
