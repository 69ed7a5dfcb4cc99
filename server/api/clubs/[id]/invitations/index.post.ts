import { invitationRequestSchema } from '#shared/domain/club.schema'
import { invite } from '#server/services/clubs/invitations'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'
import { clubParams } from '#server/utils/route-params'

export default defineRoute({ auth: 'account', params: clubParams, body: invitationRequestSchema }, ({ account, params, body }) => (
  invite(syncDependencies(), account.id, params.id, body)
))
