import { joinClub } from '#server/services/clubs/joining'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'
import { invitationTokenParams } from '#server/utils/route-params'

export default defineRoute({ auth: 'account', params: invitationTokenParams }, ({ account, params }) => (
  joinClub(syncDependencies(), account.id, params.token)
))
