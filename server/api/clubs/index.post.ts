import { clubFieldsSchema } from '#shared/domain/club.schema'
import { makeClub } from '#server/services/clubs/clubs'
import { syncDependencies } from '#server/services/sync/dependencies'
import { defineRoute } from '#server/utils/define-route'

export default defineRoute({ auth: 'account', body: clubFieldsSchema }, ({ account, body }) => (
  makeClub(syncDependencies(), account.id, body)
))
